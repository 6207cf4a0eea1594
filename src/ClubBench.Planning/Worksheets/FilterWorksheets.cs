using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Worksheets;

/// <summary>Output filters.</summary>
internal static class FilterWorksheets
{
    private static readonly Resistance Line = Resistance.FromOhm(50);

    public static IReadOnlyList<Worksheet> All { get; } =
    [
        new("chebyshev-low-pass", "filters", SourceRef.Derived(), [new("order", QuantityKind.Count, 7), new("edge", QuantityKind.Frequency, 16e6), new("return-loss", QuantityKind.Decibels, 20)], v =>
            v["order"] is 3 or 5 or 7 or 9 ? Elements(LowPassPrototype.Chebyshev((int)v["order"], PassBandRipple.FromReturnLoss(Decibels.FromDb(v["return-loss"]))).Denormalise(Frequency.FromHertz(v["edge"]), Line)) : null),
        new("five-element-ladder", "filters", SourceRef.Derived(), Ladder(("first-capacitor", 390e-12), ("first-coil", 1.254e-6), ("second-capacitor", 750e-12), ("second-coil", 1.254e-6), ("third-capacitor", 390e-12)), v =>
        {
            var ladder = new Ladder(
            [
                LadderElement.ShuntCapacitor(Capacitance.FromFarad(v["first-capacitor"]), 1000), LadderElement.SeriesInductor(Inductance.FromHenry(v["first-coil"]), 150),
                LadderElement.ShuntCapacitor(Capacitance.FromFarad(v["second-capacitor"]), 1000), LadderElement.SeriesInductor(Inductance.FromHenry(v["second-coil"]), 150),
                LadderElement.ShuntCapacitor(Capacitance.FromFarad(v["third-capacitor"]), 1000),
            ]);
            var at = Frequency.FromHertz(v["frequency"]);
            return [Figure.Of("loss", ladder.Loss(at, Line, Line)), Figure.Of("return-loss", ladder.ReturnLoss(at, Line, Line)), Figure.Of("second-harmonic", ladder.Loss(at.Harmonic(2), Line, Line)), Figure.Of("third-harmonic", ladder.Loss(at.Harmonic(3), Line, Line))];
        }),
    ];

    private static IReadOnlyList<WorksheetInput> Ladder(params IReadOnlyList<(string Name, double Si)> elements) =>
    [
        .. elements.Select((e, i) => new WorksheetInput(e.Name, i % 2 == 0 ? QuantityKind.Capacitance : QuantityKind.Inductance, e.Si)),
        new("frequency", QuantityKind.Frequency, 7.03e6),
    ];

    private static IReadOnlyList<Figure> Elements(LowPassDesign design) =>
    [
        .. design.Capacitors.Select(c => Figure.Of("shunt-capacitor", c)),
        .. design.Coils.Select(l => Figure.Of("series-coil", l)),
    ];
}
