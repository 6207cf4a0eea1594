namespace ClubBench.Calculation.Quantities;

/// <summary>A frequency, stored in hertz. Above zero and finite. Immutable.</summary>
public readonly record struct Frequency : IComparable<Frequency>
{
    private Frequency(double hertz) => Hertz = Guard.Positive(hertz, nameof(hertz));

    /// <summary>Value in Hz.</summary>
    public double Hertz { get; }

    /// <summary>Value in kilohertz.</summary>
    public double Kilohertz => Hertz / 1e3;

    /// <summary>Value in megahertz.</summary>
    public double Megahertz => Hertz / 1e6;

    /// <summary>From a value in Hz. Above zero and finite.</summary>
    public static Frequency FromHertz(double hertz) => new(hertz);

    /// <summary>From a value in kilohertz. Above zero and finite.</summary>
    public static Frequency FromKilohertz(double kilohertz) => new(kilohertz * 1e3);

    /// <summary>From a value in megahertz. Above zero and finite.</summary>
    public static Frequency FromMegahertz(double megahertz) => new(megahertz * 1e6);

    /// <summary>Angular frequency 2 pi f in radians per second.</summary>
    public double RadiansPerSecond => 2 * Math.PI * Hertz;

    /// <summary>The n-th harmonic.</summary>
    public Frequency Harmonic(int n) => new(n * Hertz);

    /// <summary>Scaled by a pure number.</summary>
    public static Frequency operator *(Frequency a, double k) => new(a.Hertz * k);

    /// <summary>Scaled by a pure number.</summary>
    public static Frequency operator *(double k, Frequency a) => new(a.Hertz * k);

    /// <summary>Divided by a pure number.</summary>
    public static Frequency operator /(Frequency a, double k) => new(a.Hertz / k);

    /// <summary>Ratio of two, a pure number.</summary>
    public static double operator /(Frequency a, Frequency b) => a.Hertz / b.Hertz;

    /// <summary>Compares the values.</summary>
    public static bool operator <(Frequency a, Frequency b) => a.Hertz < b.Hertz;

    /// <summary>Compares the values.</summary>
    public static bool operator >(Frequency a, Frequency b) => a.Hertz > b.Hertz;

    /// <summary>Compares the values.</summary>
    public static bool operator <=(Frequency a, Frequency b) => a.Hertz <= b.Hertz;

    /// <summary>Compares the values.</summary>
    public static bool operator >=(Frequency a, Frequency b) => a.Hertz >= b.Hertz;

    /// <inheritdoc/>
    public int CompareTo(Frequency other) => Hertz.CompareTo(other.Hertz);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(Hertz, "Hz");
}
