using ClubBench.Calculation.Tables;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Which way and how many turns after a reading.</summary>
internal static class WindingAdjustmentSheet
{
    public static Worksheet Sheet { get; } = new(
        "winding-adjustment", "windings", SourceRef.CommonPractice("inductance by the square of the turns; the cheapest step first"),
        [
            new("turns", QuantityKind.Count, 15, 1, 10_000),
            new("wanted-inductance", QuantityKind.Inductance, 0.675e-6),
            new("read-inductance", QuantityKind.Inductance, 0.725e-6),
            new("uncertainty", QuantityKind.Ratio, 0.02, 0, 0.5),
            new("trim-share", QuantityKind.Ratio, 0, 0, 0.9),
            new("spread-share", QuantityKind.Ratio, AdjustmentLimits.Usual.SpreadMaximum, 0, 0.5),
        ],
        v =>
        {
            var reading = new WindingReading(v.Whole("turns"), v["read-inductance"] / v["wanted-inductance"], v["uncertainty"])
            {
                Trim = v["trim-share"], Limits = new AdjustmentLimits(v["spread-share"], v["spread-share"]),
            };
            var result = WindingAdjustment.For(reading);
            return Judged(
                Phrases.CodeOf(result.Action),
                Figure.Of("deviation", QuantityKind.Ratio, reading.Ratio - 1),
                Figure.Of("turn-change", QuantityKind.Number, result.TurnChange),
                Figure.Of("first-step", QuantityKind.Number, result.FirstStep),
                Figure.Of("deviation-left", QuantityKind.Ratio, result.Residual));
        });
}
