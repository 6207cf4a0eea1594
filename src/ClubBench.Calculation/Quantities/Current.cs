namespace ClubBench.Calculation.Quantities;

/// <summary>A current, stored in ampere; the name of the value says peak, RMS or direct. Finite, either sign. Immutable.</summary>
public readonly record struct Current : IComparable<Current>
{
    private Current(double ampere) => Ampere = Guard.Finite(ampere, nameof(ampere));

    /// <summary>Value in A.</summary>
    public double Ampere { get; }

    /// <summary>Value in milliampere.</summary>
    public double Milliampere => Ampere / 1e-3;

    /// <summary>From a value in A. Finite, either sign.</summary>
    public static Current FromAmpere(double ampere) => new(ampere);

    /// <summary>From a value in milliampere. Finite, either sign.</summary>
    public static Current FromMilliampere(double milliampere) => new(milliampere * 1e-3);

    /// <summary>Sum of two.</summary>
    public static Current operator +(Current a, Current b) => new(a.Ampere + b.Ampere);

    /// <summary>Difference of two; throws where the result would leave the permitted range.</summary>
    public static Current operator -(Current a, Current b) => new(a.Ampere - b.Ampere);

    /// <summary>Scaled by a pure number.</summary>
    public static Current operator *(Current a, double k) => new(a.Ampere * k);

    /// <summary>Scaled by a pure number.</summary>
    public static Current operator *(double k, Current a) => new(a.Ampere * k);

    /// <summary>Divided by a pure number.</summary>
    public static Current operator /(Current a, double k) => new(a.Ampere / k);

    /// <summary>Ratio of two, a pure number.</summary>
    public static double operator /(Current a, Current b) => a.Ampere / b.Ampere;

    /// <summary>Compares the values.</summary>
    public static bool operator <(Current a, Current b) => a.Ampere < b.Ampere;

    /// <summary>Compares the values.</summary>
    public static bool operator >(Current a, Current b) => a.Ampere > b.Ampere;

    /// <summary>Compares the values.</summary>
    public static bool operator <=(Current a, Current b) => a.Ampere <= b.Ampere;

    /// <summary>Compares the values.</summary>
    public static bool operator >=(Current a, Current b) => a.Ampere >= b.Ampere;

    /// <inheritdoc/>
    public int CompareTo(Current other) => Ampere.CompareTo(other.Ampere);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(Ampere, "A");
}
