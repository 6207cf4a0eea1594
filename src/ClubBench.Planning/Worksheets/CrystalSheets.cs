using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Single crystals: what they are, where a load takes them, how they are measured.</summary>
internal static class CrystalSheets
{
    private static readonly SourceRef Equivalent = SourceRef.Derived("series arm with a capacitor across it");
    private static readonly WorksheetInput Series = new("series-resonance", QuantityKind.Frequency, 7.03e6);
    private static readonly WorksheetInput Motional = new("motional-capacitance", QuantityKind.Capacitance, 18e-15);
    private static readonly WorksheetInput Static = new("static-capacitance", QuantityKind.Capacitance, 4.5e-12);
    private static readonly WorksheetInput Loss = new("motional-resistance", QuantityKind.Resistance, 20);

    public static IReadOnlyList<Worksheet> All { get; } =
    [
        new("crystal-parameters", "crystals", Equivalent, [Series, Motional, Static, Loss], v =>
        {
            var crystal = Of(v);
            return WorksheetAnswer.Of(
                Figure.Of("motional-inductance", crystal.MotionalInductance), Figure.Of("parallel-resonance", crystal.ParallelResonance) with { Digits = 8 }, Figure.Of("crystal-q", QuantityKind.Number, crystal.UnloadedQ!.Value),
                Figure.Of("capacitance-ratio", QuantityKind.Number, crystal.CapacitanceRatio), Figure.Of("figure-of-merit", QuantityKind.Number, crystal.FigureOfMerit!.Value));
        }),
        new("crystal-load", "crystals", Equivalent, [Series, Motional, Static, Loss, new("load-capacitance", QuantityKind.Capacitance, 30e-12)], v =>
        {
            var (crystal, load) = (Of(v), v.Farad("load-capacitance"));
            return WorksheetAnswer.Of(
                Figure.Of("loaded-frequency", crystal.LoadedFrequency(load)) with { Digits = 8 }, Figure.Of("slope-per-picofarad", QuantityKind.FrequencyShift, crystal.LoadedSlopeHertzPerPicofarad(load)), Figure.Of("loss-resistance", crystal.EffectiveResistance(load)));
        }),
        new("crystal-pair", "crystals", SourceRef.Derived("two series arms side by side"), [Series, Motional, Static, Loss, new("difference", QuantityKind.Frequency, 300, 0)], v =>
            Judged(Phrases.CodeOf(ParallelCrystals.Judge(Of(v), v["difference"])), Figure.Of("midway-resistance", ParallelCrystals.MidwayResistance(Of(v), v["difference"])))),
        new("crystal-by-two-loads", "crystals", SourceRef.Derived("exact inversion of the loaded frequency"),
            [
                Series with { DefaultSi = 10_115_800 }, new("first-load", QuantityKind.Capacitance, 22e-12), new("first-frequency", QuantityKind.Frequency, 10_119_607),
                new("second-load", QuantityKind.Capacitance, 68e-12), new("second-frequency", QuantityKind.Frequency, 10_117_213),
            ], v =>
        {
            var measured = MotionalMeasurement.FromTwoLoads(v.Hertz(Series.Name), new(v.Farad("first-load"), v.Hertz("first-frequency")), new(v.Farad("second-load"), v.Hertz("second-frequency")));
            return measured.Crystal is { } crystal
                ? WorksheetAnswer.Of(Figure.Of("motional-capacitance", crystal.MotionalCapacitance), Figure.Of("static-capacitance", crystal.StaticCapacitance))
                : Conflict("worksheet-conflict.crystal-readings", "first-load", "first-frequency", "second-load", "second-frequency");
        }),
        new("crystal-by-sweep", "crystals", new("iec-60444-1", "transmission through the crystal", SourceStatus.FromMemory),
            [new("peak", QuantityKind.Frequency, 7.03e6), new("bandwidth", QuantityKind.Frequency, 251.5), new("loss", QuantityKind.Decibels, 5.105, 0, 100), new("source", QuantityKind.Resistance, 12.5), new("load", QuantityKind.Resistance, 12.5)], v =>
        {
            var sweep = new TransmissionMeasurement(v.Hertz("peak"), v["bandwidth"], v.Db("loss"), v.Ohm("source"), v.Ohm("load"));
            return WorksheetAnswer.Of(Figure.Of("motional-resistance", sweep.MotionalResistance), Figure.Of("motional-inductance", sweep.MotionalInductance), Figure.Of("motional-capacitance", sweep.MotionalCapacitance));
        }),
        new("intermediate-frequency", "receiver", SourceRef.Derived("sum and difference"), [new("signal", QuantityKind.Frequency, 14.06e6), new("intermediate", QuantityKind.Frequency, 4.915e6), new("injection", QuantityKind.Count, 1, 1, 3)], v =>
        {
            var scheme = new FrequencyScheme(v.Whole("injection") switch { 1 => InjectionSide.HighSide, 2 => InjectionSide.LowSide, _ => InjectionSide.SumToIntermediate }, v.Hertz("intermediate"));
            return scheme.OscillatorFor(v.Hertz("signal")) is { } oscillator && scheme.ImageOf(v.Hertz("signal")) is { } image
                ? Judged(scheme.InvertsSpectrum ? "worksheet-verdict.inverts" : "worksheet-verdict.keeps-sideband", Figure.Of("oscillator", oscillator), Figure.Of("image", image))
                : Conflict("worksheet-conflict.no-oscillator", "signal", "intermediate", "injection");
        }),
        new("noise-cascade", "receiver", new("friis-1944", "noise figure of a chain", SourceStatus.Published),
            [.. new[] { ("first", -6.5, 6.5), ("second", -0.5, 0.5), ("third", 60.0, 5.0) }.SelectMany(s => new WorksheetInput[] { new($"{s.Item1}-gain", QuantityKind.Decibels, s.Item2, -100, 200), new($"{s.Item1}-noise", QuantityKind.Decibels, s.Item3, 0, 100) }), new("bandwidth", QuantityKind.Frequency, 500)], v =>
        {
            var chain = new[] { "first", "second", "third" }.Select(s => new ReceiverStage(v.Db($"{s}-gain"), v.Db($"{s}-noise"))).ToList();
            var noise = Cascade.NoiseFigure(chain);
            return WorksheetAnswer.Of(Figure.Of("noise-figure", noise), Figure.Of("gain", Cascade.Gain(chain)), Figure.Of("smallest-signal", Cascade.MinimumDiscernibleSignal(noise, v["bandwidth"])));
        }),
    ];

    private static CrystalParameters Of(WorksheetValues v) => new(v.Hertz(Series.Name), v.Farad(Motional.Name), v.Farad(Static.Name), v.Ohm(Loss.Name));
}
