using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Output filters.</summary>
internal static class FilterWorksheets
{
    /// <summary>Resistance on both sides of every filter here.</summary>
    internal static readonly Resistance Line = Resistance.FromOhm(50);

    /// <summary>Low-pass prototypes with even ripple.</summary>
    internal static readonly SourceRef Prototype = new("matthaei-young-jones", "sections 4.03 to 4.05", SourceStatus.Published);

    /// <summary>Return loss a design with even ripple can be asked for: the limits of the prototype.</summary>
    internal static readonly WorksheetInput ReturnLoss = new("return-loss", QuantityKind.Decibels, 20, 3.1, 46);

    public static IReadOnlyList<Worksheet> All { get; } =
    [
        new("chebyshev-low-pass", "filters", Prototype, [new("order", QuantityKind.Count, 5, 3, 9), new("edge", QuantityKind.Frequency, 8e6), ReturnLoss], v =>
            v.Whole("order") % 2 == 0 ? Conflict("worksheet-conflict.order-even", "order") : Of([.. Elements(Design(v, v.Whole("order")))])),
        LadderSheets.FiveElements,
        LadderSheets.SevenElements,
        LowPassSearchSheet.Sheet,
        .. NotchedFilterSheets.All,
        BandPassSheets.Coupled,
        BandPassSheets.Trap,
    ];

    internal static LowPassDesign Design(WorksheetValues v, int order) =>
        LowPassPrototype.Chebyshev(order, PassBandRipple.FromReturnLoss(v.Db("return-loss"))).Denormalise(v.Hertz("edge"), Line);

    internal static IEnumerable<Figure> Elements(LowPassDesign design) =>
        design.Capacitors.Select(c => Figure.Of("shunt-capacitor", c)).Concat(design.Coils.Select(l => Figure.Of("series-coil", l)));
}
