using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Plans;

/// <summary>What a plan says of a stage, mildest first.</summary>
public enum StageAction
{
    /// <summary>Leave it as it is.</summary>
    Keep,

    /// <summary>Keep, then measure.</summary>
    Check,

    /// <summary>These parts change.</summary>
    Change,

    /// <summary>This circuit will not do there.</summary>
    Rethink,
}

/// <summary>How grave a finding is.</summary>
public enum Severity
{
    /// <summary>Good to know.</summary>
    Note,

    /// <summary>Look twice.</summary>
    Warning,

    /// <summary>Will not work, or must not go on the air.</summary>
    Fault,
}

/// <summary>Something a stage or budget has to say. Words are rendered from the code.</summary>
/// <param name="Code">Stable code, a key of the texts ("filter.loss-in-band").</param>
/// <param name="Severity">How grave.</param>
/// <param name="Stage">Stage key; empty for the whole plan.</param>
/// <param name="Designator">Part concerned, or null.</param>
/// <param name="Figures">Figures for the text, by name.</param>
/// <param name="AtLeast">The mildest action that would answer it.</param>
/// <param name="OpenItem">Code of the open item this keeps open while it stands; null for none.</param>
public sealed record Finding(
    string Code,
    Severity Severity,
    string Stage,
    string? Designator,
    IReadOnlyList<Figure> Figures,
    StageAction AtLeast,
    string? OpenItem = null);

/// <summary>What the chain asks of a stage.</summary>
/// <param name="Code">Stable code: see <see cref="DemandCodes"/>.</param>
/// <param name="At">The frequency it is asked at.</param>
/// <param name="Wanted">How much.</param>
/// <param name="AskedBy">Id of the budget that asks.</param>
public sealed record Demand(string Code, Frequency At, Figure Wanted, string AskedBy);

/// <summary>Codes of demands that budgets make and stage kinds answer.</summary>
public static class DemandCodes
{
    /// <summary>Attenuation of a harmonic beyond the carrier's, dB at least.</summary>
    public const string HarmonicAttenuation = "harmonic-attenuation";

    /// <summary>The same with the wish margin on top; ranks alternatives only.</summary>
    public const string HarmonicAttenuationWish = "harmonic-attenuation-wish";

    /// <summary>Output power, watt at least.</summary>
    public const string OutputPower = "output-power";

    /// <summary>Local-oscillator voltage peak to peak at a mixer, a window.</summary>
    public const string OscillatorLevelLow = "oscillator-level-low";

    /// <summary>Upper end of the oscillator window.</summary>
    public const string OscillatorLevelHigh = "oscillator-level-high";
}

/// <summary>Something that must not be forgotten and is not settled. A plan with one cannot be issued.</summary>
/// <param name="Code">What it is about: see <see cref="OpenItemCodes"/>.</param>
/// <param name="Stage">Stage key; empty for the whole plan.</param>
/// <param name="ClosedBy">What settles it: "choice", "confirmation" or "measurement".</param>
/// <param name="Because">The finding that keeps it open.</param>
public sealed record OpenItem(string Code, string Stage, string ClosedBy, Finding? Because);

/// <summary>Codes of open items.</summary>
public static class OpenItemCodes
{
    /// <summary>Transmit-receive offset.</summary>
    public const string Offset = "offset";

    /// <summary>Receive tap of the transmit-receive switch.</summary>
    public const string ReceiveTap = "receive-tap";

    /// <summary>Feedback pair of an oscillator.</summary>
    public const string FeedbackPair = "feedback-pair";

    /// <summary>Coupling and bypass capacitors.</summary>
    public const string CouplingCapacitors = "coupling-capacitors";

    /// <summary>Reactance of chokes and broadband windings.</summary>
    public const string ChokeReactance = "choke-reactance";

    /// <summary>Output filter.</summary>
    public const string OutputFilter = "output-filter";

    /// <summary>Gain of a device on the new band.</summary>
    public const string DeviceGain = "device-gain";

    /// <summary>Coverage of the oscillator.</summary>
    public const string OscillatorRange = "oscillator-range";

    /// <summary>Local-oscillator level at a mixer.</summary>
    public const string OscillatorLevel = "oscillator-level";

    /// <summary>A tuned circuit whose trimmer does not reach.</summary>
    public const string TunedCircuit = "tuned-circuit";

    /// <summary>Harmonics in the antenna.</summary>
    public const string Harmonics = "harmonics";

    /// <summary>Heat.</summary>
    public const string Heat = "heat";

    /// <summary>The limit set has not been confirmed by the coordinator.</summary>
    public const string LimitConfirmation = "limit-confirmation";

    /// <summary>Something the rig must have and the kit does not name.</summary>
    public const string MissingStage = "missing-stage";

    /// <summary>A stage that will not do on the new band.</summary>
    public const string Rethink = "rethink";
}
