namespace ClubBench.Calculation.Quantities;

/// <summary>A length, stored in metre. Zero or above, finite. Immutable.</summary>
public readonly record struct Length : IComparable<Length>
{
    private Length(double metre) => Metre = Guard.NotNegative(metre, nameof(metre));

    /// <summary>Value in m.</summary>
    public double Metre { get; }

    /// <summary>Value in millimetre.</summary>
    public double Millimetre => Metre / 1e-3;

    /// <summary>Value in centimetre.</summary>
    public double Centimetre => Metre / 1e-2;

    /// <summary>From a value in m. Zero or above, finite.</summary>
    public static Length FromMetre(double metre) => new(metre);

    /// <summary>From a value in millimetre. Zero or above, finite.</summary>
    public static Length FromMillimetre(double millimetre) => new(millimetre * 1e-3);

    /// <summary>From a value in centimetre. Zero or above, finite.</summary>
    public static Length FromCentimetre(double centimetre) => new(centimetre * 1e-2);

    /// <summary>Sum of two.</summary>
    public static Length operator +(Length a, Length b) => new(a.Metre + b.Metre);

    /// <summary>Difference of two; throws where the result would leave the permitted range.</summary>
    public static Length operator -(Length a, Length b) => new(a.Metre - b.Metre);

    /// <summary>Scaled by a pure number.</summary>
    public static Length operator *(Length a, double k) => new(a.Metre * k);

    /// <summary>Scaled by a pure number.</summary>
    public static Length operator *(double k, Length a) => new(a.Metre * k);

    /// <summary>Divided by a pure number.</summary>
    public static Length operator /(Length a, double k) => new(a.Metre / k);

    /// <summary>Ratio of two, a pure number.</summary>
    public static double operator /(Length a, Length b) => a.Metre / b.Metre;

    /// <summary>Compares the values.</summary>
    public static bool operator <(Length a, Length b) => a.Metre < b.Metre;

    /// <summary>Compares the values.</summary>
    public static bool operator >(Length a, Length b) => a.Metre > b.Metre;

    /// <summary>Compares the values.</summary>
    public static bool operator <=(Length a, Length b) => a.Metre <= b.Metre;

    /// <summary>Compares the values.</summary>
    public static bool operator >=(Length a, Length b) => a.Metre >= b.Metre;

    /// <inheritdoc/>
    public int CompareTo(Length other) => Metre.CompareTo(other.Metre);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(Metre, "m");
}
