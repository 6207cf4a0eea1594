using System.Numerics;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.GilbertProductDetector;

/// <summary>A product detector: the same on any HF band. Impedances are from memory of data sheets; the papers' oscillator level, where
/// they give none, is not made up here.</summary>
internal sealed class DetectorModel(DetectorStage stage, Surroundings surroundings) : IStageModel, IAddsNoise, IMixes, IPresents
{
    private static readonly Capacitance PinCapacitance = Capacitance.FromPicofarad(3);

    /// <summary>Across both signal pins, 1.5 kohm each.</summary>
    public static Resistance SignalInput { get; } = Resistance.FromOhm(3000);

    public static Resistance OscillatorInput { get; } = Resistance.FromOhm(18_000);

    public static Resistance AudioOutput { get; } = Resistance.FromOhm(1500);

    /// <summary>Reactance of the smallest bypass capacitor at the lower end of the band; null without one.</summary>
    public Resistance? BypassReactance { get; } = stage.Bypasses.Count == 0
        ? null
        : TunedCircuit.Reactance(Capacitance.FromFarad(stage.Bypasses.Min(b => b.Need(PartValue.Capacitance))), surroundings.Band.Low);

    public IReadOnlyList<Figure> Figures =>
    [
        stage.ConversionGain,
        stage.NoiseFigure,
        stage.OscillatorLow,
        stage.OscillatorHigh,
        FromMemory("signal-resistance", SignalInput),
        FromMemory("oscillator-resistance", OscillatorInput),
        .. stage.Supply is { } v ? [Figure.Stated("supply-voltage", QuantityKind.Voltage, v.Volt)] : Array.Empty<Figure>(),
        .. BypassReactance is { } x ? [Figure.Of("bypass-reactance", x, BypassWorking) with { Digits = 2 }] : Array.Empty<Figure>(),
    ];

    public string OscillatorPort => GilbertProductDetectorKind.Oscillator;

    public (Voltage Low, Voltage High) Window => (Voltage.FromVolt(stage.OscillatorLow.Si), Voltage.FromVolt(stage.OscillatorHigh.Si));

    public Decibels NoiseFigure(Frequency at) => Decibels.FromDb(stage.NoiseFigure.Si);

    public Decibels ReceiveGain(Frequency at) => Decibels.FromDb(stage.ConversionGain.Si);

    public Complex Impedance(string port, Frequency at) => port switch
    {
        GilbertProductDetectorKind.Signal => WithPin(SignalInput, at),
        GilbertProductDetectorKind.Oscillator => WithPin(OscillatorInput, at),
        _ => AudioOutput.Ohm,
    };

    private static Complex WithPin(Resistance resistance, Frequency at) =>
        1 / new Complex(1 / resistance.Ohm, at.RadiansPerSecond * PinCapacitance.Farad);

    private static Figure FromMemory(string name, Resistance value) => Figure.Of(name, value) with { From = Provenance.FromMemory, Digits = 2 };

    private Working BypassWorking => new(
        "capacitor-reactance",
        [Figure.Stated("bypass", QuantityKind.Capacitance, stage.Bypasses.Min(b => b.Need(PartValue.Capacitance))), Figure.Of("at", surroundings.Band.Low)],
        SourceRef.Derived("reactance of a capacitor"));
}
