using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>What a chosen limit set asks of unwanted emissions. The licence decides.</summary>
internal static class EmissionLimitSheet
{
    // The sets in the order the input's label numbers them.
    private static readonly string[] Sets = ["fcc-97307d-new", "fcc-97307d-before-2003", "fcc-97307e", "itu-a-amateur"];

    public static Worksheet Sheet { get; } = new(
        "emission-limit", "transmitter", new("cfr-47-97", "97.307", SourceStatus.Published),
        [new("limit-set", QuantityKind.Count, 1, 1, Sets.Length), new("power", QuantityKind.Power, 1.1), new("frequency", QuantityKind.Frequency, 14.06e6)],
        v => Answer(EmissionLimitSet.Find(Sets[v.Whole("limit-set") - 1])!.Required(v.Watt("power"), v.Hertz("frequency"))));

    private static Outcome<WorksheetAnswer> Answer(EmissionLimitAnswer answer) => answer switch
    {
        { Attenuation: { } wanted, Rule: { } rule } => Outcome<WorksheetAnswer>.Success(new([Figure.Of("limit", wanted)]) { Source = rule.Source }),
        { Refusal: EmissionLimitRefusal.PowerOutsideSet } => Conflict("worksheet-conflict.power-outside-set", "limit-set", "power"),
        _ => Conflict("worksheet-conflict.carrier-outside-set", "limit-set", "frequency"),
    };
}
