namespace ClubBench.Calculation.Quantities;

/// <summary>A resistance, stored in ohm. Zero or above, finite. Immutable.</summary>
public readonly record struct Resistance : IComparable<Resistance>
{
    private Resistance(double ohm) => Ohm = Guard.NotNegative(ohm, nameof(ohm));

    /// <summary>Value in ohm.</summary>
    public double Ohm { get; }

    /// <summary>Value in kiloohm.</summary>
    public double Kiloohm => Ohm / 1e3;

    /// <summary>From a value in ohm. Zero or above, finite.</summary>
    public static Resistance FromOhm(double ohm) => new(ohm);

    /// <summary>From a value in kiloohm. Zero or above, finite.</summary>
    public static Resistance FromKiloohm(double kiloohm) => new(kiloohm * 1e3);

    /// <summary>Sum of two.</summary>
    public static Resistance operator +(Resistance a, Resistance b) => new(a.Ohm + b.Ohm);

    /// <summary>Difference of two; throws where the result would leave the permitted range.</summary>
    public static Resistance operator -(Resistance a, Resistance b) => new(a.Ohm - b.Ohm);

    /// <summary>Scaled by a pure number.</summary>
    public static Resistance operator *(Resistance a, double k) => new(a.Ohm * k);

    /// <summary>Scaled by a pure number.</summary>
    public static Resistance operator *(double k, Resistance a) => new(a.Ohm * k);

    /// <summary>Divided by a pure number.</summary>
    public static Resistance operator /(Resistance a, double k) => new(a.Ohm / k);

    /// <summary>Ratio of two, a pure number.</summary>
    public static double operator /(Resistance a, Resistance b) => a.Ohm / b.Ohm;

    /// <summary>Compares the values.</summary>
    public static bool operator <(Resistance a, Resistance b) => a.Ohm < b.Ohm;

    /// <summary>Compares the values.</summary>
    public static bool operator >(Resistance a, Resistance b) => a.Ohm > b.Ohm;

    /// <summary>Compares the values.</summary>
    public static bool operator <=(Resistance a, Resistance b) => a.Ohm <= b.Ohm;

    /// <summary>Compares the values.</summary>
    public static bool operator >=(Resistance a, Resistance b) => a.Ohm >= b.Ohm;

    /// <inheritdoc/>
    public int CompareTo(Resistance other) => Ohm.CompareTo(other.Ohm);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(Ohm, "ohm");
}
