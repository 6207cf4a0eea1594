using ClubBench.Calculation.Windings;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Cards;

/// <summary>What a card is built from.</summary>
/// <param name="Kind">The stage's kind.</param>
/// <param name="Before">The kit's stage.</param>
/// <param name="After">The planned stage.</param>
/// <param name="Changes">What changes.</param>
/// <param name="Action">What the plan says.</param>
/// <param name="Why">Why; null where it is kept.</param>
/// <param name="Drawing">Schematic.</param>
/// <param name="Expected">Expected readings.</param>
/// <param name="Notes">Checks, ladder, cautions.</param>
/// <param name="Taken">The alternative taken; null where nothing changes.</param>
/// <param name="Alternatives">All of them, best first.</param>
/// <param name="Plots">Plots of the plan.</param>
internal sealed record CardInput(
    IStageKind Kind,
    StageDocument Before,
    StageDocument After,
    IReadOnlyList<PartChange> Changes,
    StageAction Action,
    Finding? Why,
    Schematic Drawing,
    IReadOnlyList<ExpectedReading> Expected,
    CardNotes Notes,
    Alternative? Taken,
    IReadOnlyList<Alternative> Alternatives,
    IReadOnlyList<Plot> Plots);

/// <summary>Puts a build card together from a planned stage.</summary>
internal static class CardBuilder
{
    public static CardContent Build(CardInput input) =>
        new(
            input.After.Key,
            input.After.Kind,
            input.Action,
            input.Why,
            input.Drawing,
            [.. input.Changes.Select(c => c.Before).OfType<Part>()],
            FittingRows(input),
            [.. input.Changes.Select(c => c.After).OfType<Part>().Select(p => WindingRowOf(p, input.Expected)).OfType<WindingRow>()],
            input.Notes,
            input.Expected,
            Substitute.Of(input.Kind.Description, input.Taken, input.Alternatives),
            ResponseOf(input.Plots));

    /// <summary>The response without what only ranks alternatives, and without the marks: those figures stand among the readings.</summary>
    private static Plot? ResponseOf(IReadOnlyList<Plot> plots) =>
        plots.FirstOrDefault(p => p.Code == "plot.response") is { } response ? response with { Limits = [.. response.Limits.Where(l => !l.IsWish)], Marks = [] } : null;

    /// <summary>Equal parts stand together; small flat parts first, windings after them, devices last (common practice of fitting).</summary>
    private static IReadOnlyList<FittingRow> FittingRows(CardInput input) =>
    [
        .. input.Changes.Select(c => c.After).OfType<Part>()
            .Select(p => (Part: p, Role: input.Kind.Description.Role(p.Role)!))
            .GroupBy(x => (x.Role.Class, x.Role.IsTuned, Text: PartText.Short(x.Part, x.Role.Class, System.Globalization.CultureInfo.InvariantCulture), x.Part.Type))
            .OrderBy(g => FittingOrder(g.Key.Class))
            .Select((g, i) => Row([.. g.Select(x => x.Part)], g.Key.Class, g.Key.IsTuned, Pocket(i))),
    ];

    private static FittingRow Row(IReadOnlyList<Part> parts, PartClass @class, bool tuned, string pocket) =>
        new([.. parts.Select(p => p.Designator)], parts[0], PartText.Markings(parts[0], @class), parts[0].Value(PartValue.ParallelCapacitance) is null ? 1 : 2, tuned, pocket);

    private static string Pocket(int index) => ((char)('a' + Math.Min(index, 25))).ToString();

    private static int FittingOrder(PartClass @class) => @class switch
    {
        PartClass.Resistor => 0,
        PartClass.Capacitor => 1,
        PartClass.MouldedChoke => 2,
        PartClass.Trimmer or PartClass.VariableCapacitor => 3,
        PartClass.Crystal => 4,
        PartClass.Winding => 5,
        _ => 6,
    };

    private static WindingRow? WindingRowOf(Part part, IReadOnlyList<ExpectedReading> expected)
    {
        if (WindingPart.Of(part, LearntValues.None) is not { } winding) return null;
        var reading = expected.FirstOrDefault(e => e.Winding?.Designator == part.Designator);
        var link = winding.LinkTurns is { } n ? new ToroidWinding(winding.Core, n, winding.Wire).CutLength : default(Calculation.Quantities.Length?);
        return new WindingRow(
            part.Designator,
            winding.Core.Designation,
            winding.Core is IronPowderCore iron ? PartText.PaintOf(iron) : "",
            winding.Turns,
            winding.LinkTurns,
            Figure.Of("wire", winding.Wire.Bare),
            Figure.Of("cut", winding.Winding.CutLength),
            link is { } l ? Figure.Of("link-cut", l) : null,
            reading is null ? null : Figure.Of("low", QuantityKind.Inductance, reading.LowSi),
            reading is null ? null : Figure.Of("high", QuantityKind.Inductance, reading.HighSi));
    }
}
