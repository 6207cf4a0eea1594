using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Worksheets;

/// <summary>Low-pass ladders as built, with the losses of their parts.</summary>
internal static class LadderSheets
{
    private static readonly SourceRef ChainMatrix = new("pozar-microwave", "chain matrix", SourceStatus.Published);

    public static Worksheet FiveElements { get; } = Sheet(
        "five-element-ladder", 7.1e6,
        ("first-capacitor", 387.23e-12), ("first-coil", 1.36503e-6), ("second-capacitor", 717.46e-12), ("second-coil", 1.36503e-6), ("third-capacitor", 387.23e-12));

    public static Worksheet SevenElements { get; } = Sheet(
        "seven-element-ladder", 10.1e6,
        ("first-capacitor", 270e-12), ("first-coil", 0.9e-6), ("second-capacitor", 510e-12), ("second-coil", 1.024e-6), ("third-capacitor", 510e-12), ("third-coil", 0.9e-6), ("fourth-capacitor", 270e-12));

    private static Worksheet Sheet(string id, double frequencyHz, params IReadOnlyList<(string Name, double Si)> parts) => new(
        id, "filters", ChainMatrix,
        [
            .. parts.Select((p, i) => new WorksheetInput(p.Name, IsCoil(i) ? QuantityKind.Inductance : QuantityKind.Capacitance, p.Si)),
            new("coil-q", QuantityKind.Number, 150),
            new("capacitor-q", QuantityKind.Number, 1000),
            new("frequency", QuantityKind.Frequency, frequencyHz),
        ],
        v => WorksheetAnswer.Of([.. Figures(v, new Ladder(parts.Select((p, i) => Arm(v, p.Name, i))))]));

    private static bool IsCoil(int place) => place % 2 == 1;

    private static LadderElement Arm(WorksheetValues v, string name, int place) => IsCoil(place)
        ? LadderElement.SeriesInductor(v.Henry(name), v["coil-q"])
        : LadderElement.ShuntCapacitor(v.Farad(name), v["capacitor-q"]);

    private static IEnumerable<Figure> Figures(WorksheetValues v, Ladder ladder)
    {
        var (at, line) = (v.Hertz("frequency"), FilterWorksheets.Line);
        yield return Figure.Of("loss", ladder.Loss(at, line, line));
        yield return Figure.Of("return-loss", ladder.ReturnLoss(at, line, line));
        if (ladder.CutOff3dB(at, line, line) is { } cutOff) yield return Figure.Of("half-power-frequency", cutOff);
        yield return Figure.Of("second-harmonic", ladder.Loss(at.Harmonic(2), line, line));
        yield return Figure.Of("third-harmonic", ladder.Loss(at.Harmonic(3), line, line));
    }
}
