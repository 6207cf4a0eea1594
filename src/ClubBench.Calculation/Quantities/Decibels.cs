namespace ClubBench.Calculation.Quantities;

/// <summary>A ratio of powers in decibels: a gain, a loss, a margin. Finite, either sign. Not a level: see <see cref="PowerLevel"/>. Immutable.</summary>
public readonly record struct Decibels : IComparable<Decibels>
{
    private Decibels(double db) => Db = Guard.Finite(db, nameof(db));

    /// <summary>Value in dB.</summary>
    public double Db { get; }

    /// <summary>Ratio of powers, 10^(dB/10).</summary>
    public double PowerRatio => Math.Pow(10, Db / 10);

    /// <summary>Ratio of voltages or currents in equal resistances, 10^(dB/20).</summary>
    public double AmplitudeRatio => Math.Pow(10, Db / 20);

    /// <summary>No change: 0 dB.</summary>
    public static Decibels Zero => default;

    /// <summary>From a value in dB.</summary>
    public static Decibels FromDb(double db) => new(db);

    /// <summary>From a ratio of powers above zero.</summary>
    public static Decibels FromPowerRatio(double ratio) => new(10 * Math.Log10(Guard.Positive(ratio, nameof(ratio))));

    /// <summary>From a ratio of amplitudes above zero.</summary>
    public static Decibels FromAmplitudeRatio(double ratio) => new(20 * Math.Log10(Guard.Positive(ratio, nameof(ratio))));

    /// <summary>Two gains in a row.</summary>
    public static Decibels operator +(Decibels a, Decibels b) => new(a.Db + b.Db);

    /// <summary>Difference of two gains.</summary>
    public static Decibels operator -(Decibels a, Decibels b) => new(a.Db - b.Db);

    /// <summary>A gain turned into the loss of the same size, and back.</summary>
    public static Decibels operator -(Decibels a) => new(-a.Db);

    /// <summary>Scaled by a pure number (n equal stages).</summary>
    public static Decibels operator *(Decibels a, double k) => new(a.Db * k);

    /// <summary>Compares the values.</summary>
    public static bool operator <(Decibels a, Decibels b) => a.Db < b.Db;

    /// <summary>Compares the values.</summary>
    public static bool operator >(Decibels a, Decibels b) => a.Db > b.Db;

    /// <summary>Compares the values.</summary>
    public static bool operator <=(Decibels a, Decibels b) => a.Db <= b.Db;

    /// <summary>Compares the values.</summary>
    public static bool operator >=(Decibels a, Decibels b) => a.Db >= b.Db;

    /// <inheritdoc/>
    public int CompareTo(Decibels other) => Db.CompareTo(other.Db);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(Db, "dB");
}
