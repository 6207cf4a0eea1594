using ClubBench.Calculation.Tables;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Figures;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Whether a winding fits in one layer on a ring, and the wire it takes.</summary>
internal static class ToroidFitSheet
{
    public static Worksheet Sheet { get; } = new(
        "toroid-fit", "windings", SourceRef.Derived("wires on the circle of their centres; slack and tails are common practice"),
        [
            new("outer-diameter", QuantityKind.Length, 9.53e-3),
            new("inner-diameter", QuantityKind.Length, 5.21e-3),
            new("core-height", QuantityKind.Length, 3.25e-3),
            new("wire-diameter", QuantityKind.Length, 0.4e-3),
            new("turns", QuantityKind.Count, 15, 1, 10_000),
            new("gap-angle", QuantityKind.Angle, ToroidWinding.UsualGapDegrees, 0, 350),
        ],
        v => v["inner-diameter"] < v["outer-diameter"]
            ? Answer(new ToroidWinding(Ring(v), v.Whole("turns"), Wire.Millimetre(v.Metre("wire-diameter").Millimetre)), v["gap-angle"])
            : Conflict("worksheet-conflict.hole-too-large", "outer-diameter", "inner-diameter"));

    // Only the dimensions count here: any listed ring lends the rest.
    private static ToroidCore Ring(WorksheetValues v) => Cores.IronPowder[0] with
    {
        OuterDiameter = v.Metre("outer-diameter"), InnerDiameter = v.Metre("inner-diameter"), Height = v.Metre("core-height"),
    };

    private static Outcome<WorksheetAnswer> Answer(ToroidWinding winding, double gapDegrees)
    {
        var capacity = ToroidWinding.CapacityOf(winding.Core, winding.Wire, gapDegrees);
        return Judged(
            winding.Turns <= capacity ? "worksheet-verdict.fits" : "worksheet-verdict.does-not-fit",
            Figure.Of("overall-diameter", winding.Wire.Overall),
            Figure.Of("turns-that-fit", QuantityKind.Count, capacity),
            Figure.Of("length-per-turn", winding.LengthPerTurn),
            Figure.Of("cut-length", winding.CutLength),
            Figure.Of("cut-length-to-adjust", winding.CutLengthToAdjust));
    }
}
