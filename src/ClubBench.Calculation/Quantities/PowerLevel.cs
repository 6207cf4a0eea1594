namespace ClubBench.Calculation.Quantities;

/// <summary>A power as a level in dB above one milliwatt. Two levels differ by <see cref="Decibels"/>; they do not add. Immutable.</summary>
public readonly record struct PowerLevel : IComparable<PowerLevel>
{
    private PowerLevel(double dbm) => Dbm = Guard.Finite(dbm, nameof(dbm));

    /// <summary>Value in dBm.</summary>
    public double Dbm { get; }

    /// <summary>From a value in dBm.</summary>
    public static PowerLevel FromDbm(double dbm) => new(dbm);

    /// <summary>The power of this level.</summary>
    public Power ToPower() => Power.FromWatt(1e-3 * Math.Pow(10, Dbm / 10));

    /// <summary>A level after a gain.</summary>
    public static PowerLevel operator +(PowerLevel level, Decibels gain) => new(level.Dbm + gain.Db);

    /// <summary>A level after a loss.</summary>
    public static PowerLevel operator -(PowerLevel level, Decibels loss) => new(level.Dbm - loss.Db);

    /// <summary>How far one level lies above another.</summary>
    public static Decibels operator -(PowerLevel a, PowerLevel b) => Decibels.FromDb(a.Dbm - b.Dbm);

    /// <summary>Compares the values.</summary>
    public static bool operator <(PowerLevel a, PowerLevel b) => a.Dbm < b.Dbm;

    /// <summary>Compares the values.</summary>
    public static bool operator >(PowerLevel a, PowerLevel b) => a.Dbm > b.Dbm;

    /// <summary>Compares the values.</summary>
    public static bool operator <=(PowerLevel a, PowerLevel b) => a.Dbm <= b.Dbm;

    /// <summary>Compares the values.</summary>
    public static bool operator >=(PowerLevel a, PowerLevel b) => a.Dbm >= b.Dbm;

    /// <inheritdoc/>
    public int CompareTo(PowerLevel other) => Dbm.CompareTo(other.Dbm);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(Dbm, "dBm");
}
