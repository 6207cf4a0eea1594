using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Whether a trimmer reaches the band on every board.</summary>
internal static class TrimmerCoverageSheet
{
    // A fixed seed, so that two people see the same count.
    private const ulong Seed = 30;

    public static Worksheet Sheet { get; } = new(
        "trimmer-coverage", "tuned-circuits", SourceRef.Derived("worst case over independent limits; yield by drawing boards"),
        [
            new("inductance", QuantityKind.Inductance, 1.4e-6),
            new("inductance-tolerance", QuantityKind.Ratio, 0.05, 0, 0.9),
            new("fixed-capacitor", QuantityKind.Capacitance, 68e-12, 0),
            new("fixed-tolerance", QuantityKind.Ratio, 0.02, 0, 0.9),
            new("trimmer-least", QuantityKind.Capacitance, 5e-12),
            new("trimmer-most", QuantityKind.Capacitance, 20e-12),
            new("stray-least", QuantityKind.Capacitance, 3e-12, 0),
            new("stray-most", QuantityKind.Capacitance, 7e-12, 0),
            new("lowest-frequency", QuantityKind.Frequency, 14.0e6),
            new("highest-frequency", QuantityKind.Frequency, 14.35e6),
            new("boards", QuantityKind.Count, 40, 1, 10_000),
        ],
        v =>
        {
            if (v["trimmer-most"] < v["trimmer-least"]) return Conflict("worksheet-conflict.upside-down", "trimmer-least", "trimmer-most");
            if (v["stray-most"] < v["stray-least"]) return Conflict("worksheet-conflict.upside-down", "stray-least", "stray-most");
            if (v["highest-frequency"] < v["lowest-frequency"]) return Conflict("worksheet-conflict.upside-down", "lowest-frequency", "highest-frequency");
            return Answer(TrimmerCoverage.Of(Circuit(v)), v.Whole("boards"));
        });

    private static TrimmedCircuit Circuit(WorksheetValues v) => new(
        v.Henry("inductance"), v["inductance-tolerance"], v.Farad("fixed-capacitor"), v["fixed-tolerance"], v.Farad("trimmer-least"), v.Farad("trimmer-most"),
        v.Farad("stray-least"), v.Farad("stray-most"), new FrequencyRange(v.Hertz("lowest-frequency"), v.Hertz("highest-frequency")));

    private static Outcome<WorksheetAnswer> Answer(TrimmerCoverage coverage, int boards)
    {
        var reached = coverage.Yield(Seed);
        return Judged(
            coverage.Covered ? "worksheet-verdict.covered" : "worksheet-verdict.not-covered",
            Figure.Of("margin-high", QuantityKind.Capacitance, coverage.MarginHighPicofarad * 1e-12),
            Figure.Of("margin-low", QuantityKind.Capacitance, coverage.MarginLowPicofarad * 1e-12),
            Figure.Of("nominal-lowest", coverage.NominalRange.Low),
            Figure.Of("nominal-highest", coverage.NominalRange.High),
            Figure.Of("trimmer-needed", coverage.NeededTrimmerMaximum),
            Figure.Of("yield", QuantityKind.Ratio, reached.Share),
            Figure.Of("boards-short", QuantityKind.Count, boards - reached.Expected(boards)));
    }
}
