using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Mixing;

/// <summary>Kind of mixer.</summary>
public enum MixerKind
{
    /// <summary>Not stated.</summary>
    Unknown,

    /// <summary>Diode ring for +7 dBm of oscillator.</summary>
    DiodeRingLevel7,

    /// <summary>Two diodes, single balanced.</summary>
    SingleBalancedDiodes,

    /// <summary>Two diodes back to back with the oscillator at half the frequency.</summary>
    AntiparallelPair,

    /// <summary>Dual-gate field-effect transistor.</summary>
    DualGateMosfet,

    /// <summary>Single junction field-effect transistor.</summary>
    SingleJfet,

    /// <summary>Integrated transistor tree.</summary>
    GilbertCell,

    /// <summary>Field-effect switches driven by logic.</summary>
    FetSwitch,
}

/// <summary>A figure between two typical ends.</summary>
/// <param name="Low">Lower end.</param>
/// <param name="High">Upper end; equal to the lower where one value is stated.</param>
public sealed record Typical<T>(T Low, T High);

/// <summary>Typical figures of a kind of mixer. A data sheet or a measurement replaces them.</summary>
/// <param name="Kind">Kind.</param>
/// <param name="Gain">Conversion gain, negative for a loss.</param>
/// <param name="NoiseFigure">Single-sideband noise figure.</param>
/// <param name="OscillatorLevel">Oscillator level into 50 ohm; null where a voltage is stated instead.</param>
/// <param name="OscillatorPeakToPeak">Oscillator voltage, peak to peak; null where a level is stated instead or logic drives it.</param>
/// <param name="InputIntercept">Third-order input intercept.</param>
/// <param name="Source">Where the row comes from.</param>
public sealed record MixerFigures(
    MixerKind Kind,
    Typical<Decibels> Gain,
    Typical<Decibels> NoiseFigure,
    Typical<PowerLevel>? OscillatorLevel,
    Typical<Voltage>? OscillatorPeakToPeak,
    Typical<PowerLevel> InputIntercept,
    SourceRef Source)
{
    /// <summary>Least isolation from oscillator to signal port at HF.</summary>
    public Decibels LeastIsolation { get; init; }

    /// <summary>Loss of an ideal switching mixer, 20 log10(pi/2). Source: derived.</summary>
    public static Decibels IdealSwitchingLoss { get; } = Decibels.FromAmplitudeRatio(Math.PI / 2);

    /// <summary>Single-sideband noise figure of a diode mixer from its loss (zero or above): half a decibel more. Source: mixer-terms-note.</summary>
    public static Decibels PassiveNoiseFigure(Decibels loss) => Decibels.FromDb(Guard.NotNegative(loss.Db, nameof(loss)) + 0.5);

    /// <summary>Figures of every kind, from <c>Tables/mixers.csv</c>.</summary>
    public static IReadOnlyDictionary<MixerKind, MixerFigures> All { get; } = CsvTable.Read("mixers", Row).ToDictionary(m => m.Kind);

    private static MixerFigures Row(CsvRow r) => new(
        KindOf(r),
        Pair(r, "gain_db", Decibels.FromDb)!,
        Pair(r, "nf_db", Decibels.FromDb)!,
        Pair(r, "lo_dbm", PowerLevel.FromDbm),
        Pair(r, "lo_vpp", Voltage.FromVolt),
        Pair(r, "iip3_dbm", PowerLevel.FromDbm)!,
        r.Source())
    {
        LeastIsolation = Decibels.FromDb(r.Number("isolation_db_min")),
    };

    private static Typical<T>? Pair<T>(CsvRow r, string column, Func<double, T> from) =>
        (r.OptionalNumber(column + "_min"), r.OptionalNumber(column + "_max")) is ({ } low, { } high) ? new Typical<T>(from(low), from(high)) : null;

    private static MixerKind KindOf(CsvRow r) => r.Text("kind") switch
    {
        "diode_ring_level7" => MixerKind.DiodeRingLevel7,
        "single_balanced_diodes" => MixerKind.SingleBalancedDiodes,
        "antiparallel_pair" => MixerKind.AntiparallelPair,
        "dual_gate_mosfet" => MixerKind.DualGateMosfet,
        "single_jfet" => MixerKind.SingleJfet,
        "gilbert_cell" => MixerKind.GilbertCell,
        "fet_switch" => MixerKind.FetSwitch,
        var other => throw r.Fault("kind", $"'{other}' is not a kind of mixer"),
    };
}
