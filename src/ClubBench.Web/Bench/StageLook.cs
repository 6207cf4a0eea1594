using ClubBench.Club.Entities;

namespace ClubBench.Web.Bench;

/// <summary>How the state of a stage is shown: the sign, the text key of its word, and whether it is framed.</summary>
public sealed record StageLook(string Glyph, string Word, bool IsFramed)
{
    /// <summary>All signs a state may have.</summary>
    public static IReadOnlyList<string> Glyphs { get; } = ["none", "built", "powered", "measured", "signed", "outside", "help", "part"];

    /// <summary>A hold stands before everything, then a reading outside its window, then the progress.</summary>
    public static StageLook Of(StageProgress progress, StageHold hold, bool isOut) => (hold, progress) switch
    {
        (StageHold.Mentor, _) => new("help", "state.help", true),
        (StageHold.Part, _) => new("part", "state.part", true),
        (_, StageProgress.Signed) => new("signed", "state.signed", false),
        _ when isOut => new("outside", "state.outside", true),
        (_, StageProgress.Measured) => new("measured", "state.measured", false),
        (_, StageProgress.Powered) => new("powered", "state.powered", false),
        (_, StageProgress.BeingBuilt) => new("built", "state.built", false),
        _ => new("none", "state.none", false),
    };
}
