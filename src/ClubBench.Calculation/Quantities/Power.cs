namespace ClubBench.Calculation.Quantities;

/// <summary>A power, stored in watt. Not a level: see <see cref="PowerLevel"/>. Zero or above, finite. Immutable.</summary>
public readonly record struct Power : IComparable<Power>
{
    private Power(double watt) => Watt = Guard.NotNegative(watt, nameof(watt));

    /// <summary>Value in W.</summary>
    public double Watt { get; }

    /// <summary>Value in milliwatt.</summary>
    public double Milliwatt => Watt / 1e-3;

    /// <summary>From a value in W. Zero or above, finite.</summary>
    public static Power FromWatt(double watt) => new(watt);

    /// <summary>From a value in milliwatt. Zero or above, finite.</summary>
    public static Power FromMilliwatt(double milliwatt) => new(milliwatt * 1e-3);

    /// <summary>The same power as a level above one milliwatt. Throws for zero power, which has no level.</summary>
    public PowerLevel ToLevel() => PowerLevel.FromDbm(10 * Math.Log10(Watt / 1e-3));

    /// <summary>Sum of two.</summary>
    public static Power operator +(Power a, Power b) => new(a.Watt + b.Watt);

    /// <summary>Difference of two; throws where the result would leave the permitted range.</summary>
    public static Power operator -(Power a, Power b) => new(a.Watt - b.Watt);

    /// <summary>Scaled by a pure number.</summary>
    public static Power operator *(Power a, double k) => new(a.Watt * k);

    /// <summary>Scaled by a pure number.</summary>
    public static Power operator *(double k, Power a) => new(a.Watt * k);

    /// <summary>Divided by a pure number.</summary>
    public static Power operator /(Power a, double k) => new(a.Watt / k);

    /// <summary>Ratio of two, a pure number.</summary>
    public static double operator /(Power a, Power b) => a.Watt / b.Watt;

    /// <summary>Compares the values.</summary>
    public static bool operator <(Power a, Power b) => a.Watt < b.Watt;

    /// <summary>Compares the values.</summary>
    public static bool operator >(Power a, Power b) => a.Watt > b.Watt;

    /// <summary>Compares the values.</summary>
    public static bool operator <=(Power a, Power b) => a.Watt <= b.Watt;

    /// <summary>Compares the values.</summary>
    public static bool operator >=(Power a, Power b) => a.Watt >= b.Watt;

    /// <inheritdoc/>
    public int CompareTo(Power other) => Watt.CompareTo(other.Watt);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(Watt, "W");
}
