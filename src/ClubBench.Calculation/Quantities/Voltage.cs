namespace ClubBench.Calculation.Quantities;

/// <summary>A voltage, stored in volt; the name of the value says peak, peak to peak or RMS. Finite, either sign. Immutable.</summary>
public readonly record struct Voltage : IComparable<Voltage>
{
    private Voltage(double volt) => Volt = Guard.Finite(volt, nameof(volt));

    /// <summary>Value in V.</summary>
    public double Volt { get; }

    /// <summary>Value in millivolt.</summary>
    public double Millivolt => Volt / 1e-3;

    /// <summary>From a value in V. Finite, either sign.</summary>
    public static Voltage FromVolt(double volt) => new(volt);

    /// <summary>From a value in millivolt. Finite, either sign.</summary>
    public static Voltage FromMillivolt(double millivolt) => new(millivolt * 1e-3);

    /// <summary>Sum of two.</summary>
    public static Voltage operator +(Voltage a, Voltage b) => new(a.Volt + b.Volt);

    /// <summary>Difference of two; throws where the result would leave the permitted range.</summary>
    public static Voltage operator -(Voltage a, Voltage b) => new(a.Volt - b.Volt);

    /// <summary>Scaled by a pure number.</summary>
    public static Voltage operator *(Voltage a, double k) => new(a.Volt * k);

    /// <summary>Scaled by a pure number.</summary>
    public static Voltage operator *(double k, Voltage a) => new(a.Volt * k);

    /// <summary>Divided by a pure number.</summary>
    public static Voltage operator /(Voltage a, double k) => new(a.Volt / k);

    /// <summary>Ratio of two, a pure number.</summary>
    public static double operator /(Voltage a, Voltage b) => a.Volt / b.Volt;

    /// <summary>Compares the values.</summary>
    public static bool operator <(Voltage a, Voltage b) => a.Volt < b.Volt;

    /// <summary>Compares the values.</summary>
    public static bool operator >(Voltage a, Voltage b) => a.Volt > b.Volt;

    /// <summary>Compares the values.</summary>
    public static bool operator <=(Voltage a, Voltage b) => a.Volt <= b.Volt;

    /// <summary>Compares the values.</summary>
    public static bool operator >=(Voltage a, Voltage b) => a.Volt >= b.Volt;

    /// <inheritdoc/>
    public int CompareTo(Voltage other) => Volt.CompareTo(other.Volt);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(Volt, "V");
}
