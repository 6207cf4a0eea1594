using System.Numerics;
using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.UntunedBuffer;

/// <summary>A computed buffer: the same on any band while its capacitors are large enough and its devices fast enough.</summary>
internal sealed class BufferModel : IStageModel, IAmplifies, IDrivesMixer, IPresents
{
    private static readonly Resistance FollowerInput = Resistance.FromOhm(10_000);
    private readonly BufferStage _stage;

    public BufferModel(BufferStage stage, Surroundings surroundings)
    {
        (_stage, Low) = (stage, surroundings.Band.Low);
        CouplingLoss = stage.Couplings.Select(c => CouplingCapacitor.Loss(Farads(c), Low, stage.AroundCoupling)).DefaultIfEmpty(Decibels.Zero).Max();
        var emitter = CouplingCapacitor.EmitterResistance(stage.Collector).Ohm + stage.UnbypassedOhm;
        BypassLoss = stage.Bypasses.Select(c => CouplingCapacitor.Loss(Farads(c), Low, Resistance.FromOhm(emitter))).DefaultIfEmpty(Decibels.Zero).Max();
    }

    /// <summary>Lower end of the band, where capacitors are weakest.</summary>
    public Frequency Low { get; }

    /// <summary>Loss in the worst coupling capacitor.</summary>
    public Decibels CouplingLoss { get; }

    /// <summary>Gain lost in the worst bypass capacitor.</summary>
    public Decibels BypassLoss { get; }

    public IReadOnlyList<Figure> Figures =>
    [
        Figure.Of("output-power", _stage.Output),
        Figure.Of("tap-voltage", QuantityKind.PeakToPeakVoltage, _stage.TapPeakToPeak.Volt),
        Figure.Of("coupling-loss", CouplingLoss),
        Figure.Of("bypass-loss", BypassLoss),
    ];

    public Power MostOutput(Frequency at) => _stage.Output;

    /// <summary>A follower in front: the oscillator gives what the high input resistance takes.</summary>
    public Power DriveFor(Power output, Frequency at) => output / Gain(at).PowerRatio;

    /// <summary>Typical of a follower with one amplifying transistor (common practice).</summary>
    public Decibels Gain(Frequency at) => Decibels.FromDb(16) - CouplingLoss - BypassLoss;

    public (Voltage OpenPeakToPeak, Complex Source) Drive(string port, Frequency at) =>
        (_stage.TapPeakToPeak, new Complex(0, -TunedCircuit.Reactance(Farads(_stage.Tap), at).Ohm));

    public Complex Impedance(string port, Frequency at) => port == UntunedBufferKind.Input ? FollowerInput.Ohm : 50;

    private static Capacitance Farads(Part part) => Capacitance.FromFarad(part.Need(PartValue.Capacitance));
}
