using ClubBench.Calculation.Elliptic;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Low-pass filters with notches, and the guard of a receiver against strong stations below its band.</summary>
internal static class NotchedFilterSheets
{
    private static readonly SourceRef Synthesis = SourceRef.Derived("elliptic functions and zero shifting");
    private static readonly WorksheetInput Order = new("notched-order", QuantityKind.Count, 5, 3, 7);
    private static readonly WorksheetInput Edge = new("edge", QuantityKind.Frequency, 8e6);

    public static IReadOnlyList<Worksheet> All { get; } =
    [
        new("elliptic-low-pass", "filters", Synthesis, [Order, Edge, FilterWorksheets.ReturnLoss, new("modular-angle", QuantityKind.Angle, 35, 1, 80)], v =>
            Odd(v) ? Answer(EllipticDesign.Of(Task(v), v["modular-angle"])) : Conflict("worksheet-conflict.notched-order", Order.Name)),
        new("elliptic-with-notch", "filters", Synthesis, [Order, Edge with { DefaultSi = 7.5e6 }, FilterWorksheets.ReturnLoss, new("notch", QuantityKind.Frequency, 14.06e6)], v =>
            Odd(v) ? Answer(EllipticDesign.WithLowestNotchAt(Task(v), v.Hertz("notch"))) : Conflict("worksheet-conflict.notched-order", Order.Name)),
        new("high-pass-guard", "filters", FilterWorksheets.Prototype,
            [Order with { Name = "order" }, Edge with { DefaultSi = 1.75e6 }, FilterWorksheets.ReturnLoss, new("unwanted-frequency", QuantityKind.Frequency, 1e6), new("frequency", QuantityKind.Frequency, 1.81e6)], v =>
        {
            var prototype = LowPassPrototype.Chebyshev(v.Whole("order"), PassBandRipple.FromReturnLoss(v.Db("return-loss")));
            if (prototype.Order % 2 == 0) return Conflict("worksheet-conflict.order-even", "order");
            var guard = new HighPassGuard(prototype, v.Hertz("edge"), FilterWorksheets.Line);
            return Of([.. Parts(guard.ToLadder()), Figure.Of("rejection", guard.Attenuation(v.Hertz("unwanted-frequency"))), Figure.Of("loss", guard.Attenuation(v.Hertz("frequency")))]);
        }),
    ];

    private static bool Odd(WorksheetValues v) => v.Whole(Order.Name) % 2 == 1;

    private static EllipticTask Task(WorksheetValues v) => new(v.Whole(Order.Name), PassBandRipple.FromReturnLoss(v.Db("return-loss")), v.Hertz(Edge.Name), FilterWorksheets.Line);

    private static Outcome<WorksheetAnswer> Answer(EllipticDesign design) => design.Filter is { } filter
        ? Judged(
            design.Refusal == EllipticRefusal.None ? "worksheet-verdict.parts-exist" : "worksheet-verdict.parts-too-small",
            [.. Parts(filter.ToLadder()), .. filter.Notches.Select(n => Figure.Of("notch", n)), Figure.Of("stop-loss", filter.Prototype.Wanted.StopBandLoss)])
        : design.Refusal == EllipticRefusal.NotchOutOfReach
            ? Conflict("worksheet-conflict.notch-out-of-reach", "notch", Edge.Name)
            : Conflict("worksheet-conflict.angle-too-large", Order.Name, "return-loss");

    private static IEnumerable<Figure> Parts(Ladder ladder) => ladder.Elements.SelectMany(PartsOf);

    private static IEnumerable<Figure> PartsOf(LadderElement arm)
    {
        if (arm.IsTrap) return [Figure.Of("trap-coil", arm.Inductance!.Value), Figure.Of("trap-capacitor", arm.Capacitance!.Value)];
        var place = arm.Position == LadderPosition.Shunt ? "shunt" : "series";
        return [arm.Inductance is { } coil ? Figure.Of($"{place}-coil", coil) : Figure.Of($"{place}-capacitor", arm.Capacitance!.Value)];
    }
}
