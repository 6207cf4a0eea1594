namespace ClubBench.Calculation.Quantities;

/// <summary>A magnetic flux density, stored in tesla. Zero or above, finite. Immutable.</summary>
public readonly record struct MagneticFluxDensity : IComparable<MagneticFluxDensity>
{
    private MagneticFluxDensity(double tesla) => Tesla = Guard.NotNegative(tesla, nameof(tesla));

    /// <summary>Value in T.</summary>
    public double Tesla { get; }

    /// <summary>Value in gauss.</summary>
    public double Gauss => Tesla / 1e-4;

    /// <summary>Value in millitesla.</summary>
    public double Millitesla => Tesla / 1e-3;

    /// <summary>From a value in T. Zero or above, finite.</summary>
    public static MagneticFluxDensity FromTesla(double tesla) => new(tesla);

    /// <summary>From a value in gauss. Zero or above, finite.</summary>
    public static MagneticFluxDensity FromGauss(double gauss) => new(gauss * 1e-4);

    /// <summary>From a value in millitesla. Zero or above, finite.</summary>
    public static MagneticFluxDensity FromMillitesla(double millitesla) => new(millitesla * 1e-3);

    /// <summary>Scaled by a pure number.</summary>
    public static MagneticFluxDensity operator *(MagneticFluxDensity a, double k) => new(a.Tesla * k);

    /// <summary>Scaled by a pure number.</summary>
    public static MagneticFluxDensity operator *(double k, MagneticFluxDensity a) => new(a.Tesla * k);

    /// <summary>Divided by a pure number.</summary>
    public static MagneticFluxDensity operator /(MagneticFluxDensity a, double k) => new(a.Tesla / k);

    /// <summary>Ratio of two, a pure number.</summary>
    public static double operator /(MagneticFluxDensity a, MagneticFluxDensity b) => a.Tesla / b.Tesla;

    /// <summary>Compares the values.</summary>
    public static bool operator <(MagneticFluxDensity a, MagneticFluxDensity b) => a.Tesla < b.Tesla;

    /// <summary>Compares the values.</summary>
    public static bool operator >(MagneticFluxDensity a, MagneticFluxDensity b) => a.Tesla > b.Tesla;

    /// <summary>Compares the values.</summary>
    public static bool operator <=(MagneticFluxDensity a, MagneticFluxDensity b) => a.Tesla <= b.Tesla;

    /// <summary>Compares the values.</summary>
    public static bool operator >=(MagneticFluxDensity a, MagneticFluxDensity b) => a.Tesla >= b.Tesla;

    /// <inheritdoc/>
    public int CompareTo(MagneticFluxDensity other) => Tesla.CompareTo(other.Tesla);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(Tesla, "T");
}
