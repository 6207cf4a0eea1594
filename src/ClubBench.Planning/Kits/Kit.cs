using ClubBench.Calculation.Quantities;

namespace ClubBench.Planning.Kits;

/// <summary>How the rig is used.</summary>
public enum Mode
{
    /// <summary>On-off telegraphy.</summary>
    Cw,

    /// <summary>Single sideband, lower.</summary>
    LowerSideband,

    /// <summary>Single sideband, upper.</summary>
    UpperSideband,

    /// <summary>Both sidebands without carrier.</summary>
    DoubleSideband,

    /// <summary>Amplitude modulation.</summary>
    AmplitudeModulation,
}

/// <summary>A published design on its design band. One revision; immutable once a plan uses it.</summary>
/// <param name="Id">Identity of the kit over all revisions.</param>
/// <param name="Revision">Counts up from 1.</param>
/// <param name="Name">Name of the design.</param>
/// <param name="BoardIssue">The designer's own revision mark.</param>
/// <param name="Mode">Mode of operation.</param>
/// <param name="Band">Frequencies the papers give for it.</param>
/// <param name="SupplyVoltage">Supply it is meant for.</param>
/// <param name="OutputPower">Output the papers claim; null for a receiver.</param>
/// <param name="Scheme">How the frequencies come about.</param>
/// <param name="Stages">Its functional blocks.</param>
/// <param name="Connections">Which port is wired to which.</param>
/// <param name="BringUp">Stage keys in the order they are brought up.</param>
/// <param name="Notes">Remarks of whoever entered it.</param>
public sealed record Kit(
    Guid Id,
    int Revision,
    string Name,
    string BoardIssue,
    Mode Mode,
    FrequencyRange Band,
    Voltage SupplyVoltage,
    Power? OutputPower,
    FrequencyScheme Scheme,
    IReadOnlyList<StageDocument> Stages,
    IReadOnlyList<Connection> Connections,
    IReadOnlyList<string> BringUp,
    string Notes = "")
{
    /// <summary>The stage with this key. Throws when there is none.</summary>
    public StageDocument Stage(string key) =>
        Stages.FirstOrDefault(s => s.Key == key) ?? throw new KeyNotFoundException($"The kit has no stage {key}.");

    /// <summary>The same kit with one stage replaced.</summary>
    public Kit With(StageDocument stage) => this with { Stages = [.. Stages.Select(s => s.Key == stage.Key ? stage : s)] };
}
