using System.Collections.Immutable;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Emissions;

/// <summary>How a final stage works, as far as its harmonics go.</summary>
public enum StageClass
{
    /// <summary>Not stated.</summary>
    Unknown,

    /// <summary>Class A, lightly driven.</summary>
    ClassA,

    /// <summary>Class AB with one device.</summary>
    ClassAbSingle,

    /// <summary>Class AB push-pull.</summary>
    ClassAbPushPull,

    /// <summary>Class B or C with one device and an untuned output, choke or broadband transformer.</summary>
    ClassCBroadband,

    /// <summary>Class C with a tuned output of loaded Q 3 to 5.</summary>
    ClassCTuned,

    /// <summary>Class D or any square switched drive.</summary>
    ClassD,

    /// <summary>Class E with loaded Q about 5.</summary>
    ClassE,
}

/// <summary>Typical level of one harmonic ahead of the output filter.</summary>
/// <param name="Stage">Class of the stage.</param>
/// <param name="Harmonic">2 to 5.</param>
/// <param name="Level">Level relative to the carrier, negative.</param>
/// <param name="LowEnd">Weakest level commonly met, or null where not stated.</param>
/// <param name="HighEnd">Strongest level commonly met, or null where not stated.</param>
/// <param name="StandardUncertainty">One standard deviation.</param>
/// <param name="Source">Origin.</param>
public sealed record RawHarmonicLevel(
    StageClass Stage, int Harmonic, Decibels Level, Decibels? LowEnd, Decibels? HighEnd, Decibels StandardUncertainty, SourceRef Source);

/// <summary>Typical harmonics by class of stage, from <c>Tables/raw-harmonics.csv</c>. A measured level always replaces them. Immutable, thread safe.</summary>
public static class RawHarmonicLevels
{
    /// <summary>Every row, in file order.</summary>
    public static ImmutableArray<RawHarmonicLevel> All { get; } = [.. CsvTable.Read("raw-harmonics", Row)];

    /// <summary>The typical level, or null where the table has none.</summary>
    public static RawHarmonicLevel? Find(StageClass stage, int harmonic) => All.FirstOrDefault(r => r.Stage == stage && r.Harmonic == harmonic);

    private static RawHarmonicLevel Row(CsvRow r) => new(
        Enum.TryParse<StageClass>(r.Text("stage_class"), out var stage) && stage != StageClass.Unknown ? stage : throw r.Fault("stage_class", "no such class"),
        (int)r.Number("harmonic"),
        Decibels.FromDb(r.Number("level_dbc")),
        Optional(r.OptionalNumber("level_low_dbc")),
        Optional(r.OptionalNumber("level_high_dbc")),
        Decibels.FromDb(r.Number("standard_uncertainty_db")),
        r.Source());

    private static Decibels? Optional(double? db) => db is { } value ? Decibels.FromDb(value) : null;
}
