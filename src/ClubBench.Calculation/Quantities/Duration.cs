namespace ClubBench.Calculation.Quantities;

/// <summary>A span of time in a circuit, stored in second (the calendar uses <see cref="TimeSpan"/>). Zero or above, finite. Immutable.</summary>
public readonly record struct Duration : IComparable<Duration>
{
    private Duration(double second) => Second = Guard.NotNegative(second, nameof(second));

    /// <summary>Value in s.</summary>
    public double Second { get; }

    /// <summary>Value in millisecond.</summary>
    public double Millisecond => Second / 1e-3;

    /// <summary>Value in nanosecond.</summary>
    public double Nanosecond => Second / 1e-9;

    /// <summary>From a value in s. Zero or above, finite.</summary>
    public static Duration FromSecond(double second) => new(second);

    /// <summary>From a value in millisecond. Zero or above, finite.</summary>
    public static Duration FromMillisecond(double millisecond) => new(millisecond * 1e-3);

    /// <summary>From a value in nanosecond. Zero or above, finite.</summary>
    public static Duration FromNanosecond(double nanosecond) => new(nanosecond * 1e-9);

    /// <summary>Sum of two.</summary>
    public static Duration operator +(Duration a, Duration b) => new(a.Second + b.Second);

    /// <summary>Difference of two; throws where the result would leave the permitted range.</summary>
    public static Duration operator -(Duration a, Duration b) => new(a.Second - b.Second);

    /// <summary>Scaled by a pure number.</summary>
    public static Duration operator *(Duration a, double k) => new(a.Second * k);

    /// <summary>Scaled by a pure number.</summary>
    public static Duration operator *(double k, Duration a) => new(a.Second * k);

    /// <summary>Divided by a pure number.</summary>
    public static Duration operator /(Duration a, double k) => new(a.Second / k);

    /// <summary>Ratio of two, a pure number.</summary>
    public static double operator /(Duration a, Duration b) => a.Second / b.Second;

    /// <summary>Compares the values.</summary>
    public static bool operator <(Duration a, Duration b) => a.Second < b.Second;

    /// <summary>Compares the values.</summary>
    public static bool operator >(Duration a, Duration b) => a.Second > b.Second;

    /// <summary>Compares the values.</summary>
    public static bool operator <=(Duration a, Duration b) => a.Second <= b.Second;

    /// <summary>Compares the values.</summary>
    public static bool operator >=(Duration a, Duration b) => a.Second >= b.Second;

    /// <inheritdoc/>
    public int CompareTo(Duration other) => Second.CompareTo(other.Second);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(Second, "s");
}
