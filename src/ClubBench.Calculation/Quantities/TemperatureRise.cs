namespace ClubBench.Calculation.Quantities;

/// <summary>A difference of temperatures, stored in kelvin. Finite, either sign. Immutable.</summary>
public readonly record struct TemperatureRise : IComparable<TemperatureRise>
{
    private TemperatureRise(double kelvin) => Kelvin = Guard.Finite(kelvin, nameof(kelvin));

    /// <summary>Value in K.</summary>
    public double Kelvin { get; }

    /// <summary>From a value in K. Finite, either sign.</summary>
    public static TemperatureRise FromKelvin(double kelvin) => new(kelvin);

    /// <summary>Sum of two.</summary>
    public static TemperatureRise operator +(TemperatureRise a, TemperatureRise b) => new(a.Kelvin + b.Kelvin);

    /// <summary>Difference of two; throws where the result would leave the permitted range.</summary>
    public static TemperatureRise operator -(TemperatureRise a, TemperatureRise b) => new(a.Kelvin - b.Kelvin);

    /// <summary>Scaled by a pure number.</summary>
    public static TemperatureRise operator *(TemperatureRise a, double k) => new(a.Kelvin * k);

    /// <summary>Scaled by a pure number.</summary>
    public static TemperatureRise operator *(double k, TemperatureRise a) => new(a.Kelvin * k);

    /// <summary>Divided by a pure number.</summary>
    public static TemperatureRise operator /(TemperatureRise a, double k) => new(a.Kelvin / k);

    /// <summary>Ratio of two, a pure number.</summary>
    public static double operator /(TemperatureRise a, TemperatureRise b) => a.Kelvin / b.Kelvin;

    /// <summary>Compares the values.</summary>
    public static bool operator <(TemperatureRise a, TemperatureRise b) => a.Kelvin < b.Kelvin;

    /// <summary>Compares the values.</summary>
    public static bool operator >(TemperatureRise a, TemperatureRise b) => a.Kelvin > b.Kelvin;

    /// <summary>Compares the values.</summary>
    public static bool operator <=(TemperatureRise a, TemperatureRise b) => a.Kelvin <= b.Kelvin;

    /// <summary>Compares the values.</summary>
    public static bool operator >=(TemperatureRise a, TemperatureRise b) => a.Kelvin >= b.Kelvin;

    /// <inheritdoc/>
    public int CompareTo(TemperatureRise other) => Kelvin.CompareTo(other.Kelvin);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(Kelvin, "K");
}
