using System.Numerics;
using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.TunedDriver;

/// <summary>A computed tuned driver: does the tank tune, what load does the link show, how much power is there.
/// Method: the smaller of what the voltage swing and the standing current allow; drive from the emitter resistance and the current gain.</summary>
internal sealed class DriverModel : IStageModel, IAmplifies, IPresents
{
    private readonly DriverStage _stage;

    public DriverModel(DriverStage stage, Surroundings surroundings)
    {
        _stage = stage;
        At = surroundings.Reference;
        Inductance = stage.Inductance(surroundings.Learnt);
        Needed = TunedCircuit.CapacitanceFor(Inductance, At);
        Tank = new TunablePlace(Inductance, stage.Fixed, stage.TrimmerLeast, stage.TrimmerMost, stage.Stray);
        Reactance = TunedCircuit.Reactance(Inductance, At);
        var load = surroundings.Neighbour(TunedDriverKind.Output, At);
        LinkLoad = load.Real > 0 ? load.Real : stage.LoadOhm;
        var ratio = stage.Turns / stage.LinkTurns;
        Load = Resistance.FromOhm(LinkLoad * ratio * ratio);
        var losses = Resistance.FromOhm(stage.CoilQ * Reactance.Ohm);
        LoadedQ = Load.Ohm * losses.Ohm / (Load.Ohm + losses.Ohm) / Reactance.Ohm;
        Available = Power.FromWatt(Math.Min(
            stage.PeakSwing.Volt * stage.PeakSwing.Volt / (2 * Load.Ohm),
            stage.Collector.Ampere * stage.Collector.Ampere * Load.Ohm / 2));
    }

    public Frequency At { get; }

    public Inductance Inductance { get; }

    /// <summary>Capacitance that tunes the tank to the club's frequency, strays included.</summary>
    public Capacitance Needed { get; }

    public TunablePlace Tank { get; }

    public Resistance Reactance { get; }

    /// <summary>What hangs on the link.</summary>
    public double LinkLoad { get; }

    /// <summary>What the collector sees through the link.</summary>
    public Resistance Load { get; }

    public double LoadedQ { get; }

    /// <summary>Most power there is, voltage and current considered.</summary>
    public Power Available { get; }

    public IReadOnlyList<Figure> Figures =>
    [
        Figure.Of("available-power", Available, LinkWorking),
        Figure.Of("tunes-low", Tank.Lowest, TankWorking) with { Digits = 4 },
        Figure.Of("tunes-high", Tank.Highest, TankWorking) with { Digits = 4 },
        Figure.Of("needed-capacitance", Needed, TankWorking) with { Digits = 4 },
        Figure.Of("tank-least", Tank.Least, TankWorking),
        Figure.Of("tank-most", Tank.Most, TankWorking),
        Figure.Of("reactance", Reactance, TankWorking) with { Digits = 4 },
        Figure.Of("load", Load, LinkWorking),
        Figure.Of("loaded-q", QuantityKind.Number, LoadedQ, LinkWorking) with { Digits = 2 },
        Figure.Of("gain", Gain(At)),
    ];

    public Power MostOutput(Frequency at) => Available;

    /// <summary>Peak base voltage times peak base current over two: the emitter resistance sets the voltage, current gain and bias resistors the current.</summary>
    public Power DriveFor(Power output, Frequency at)
    {
        var peak = Math.Sqrt(2 * output.Watt / Load.Ohm);
        var emitter = CouplingCapacitor.EmitterResistance(_stage.Collector).Ohm + _stage.UnbypassedOhm;
        var input = 1 / ((1 / (CurrentGainAt(at) * emitter)) + (1 / _stage.BiasOhm));
        return Power.FromWatt(peak * emitter * peak * emitter / (2 * input));
    }

    public Decibels Gain(Frequency at) => Decibels.FromPowerRatio(Available / DriveFor(Available, at));

    public Complex Impedance(string port, Frequency at)
    {
        if (port != TunedDriverKind.Input) return _stage.LoadOhm;
        var emitter = CouplingCapacitor.EmitterResistance(_stage.Collector).Ohm + _stage.UnbypassedOhm;
        return 1 / ((1 / (CurrentGainAt(at) * emitter)) + (1 / _stage.BiasOhm));
    }

    private double CurrentGainAt(Frequency at) =>
        Transistors.Find(_stage.Transistor.Type) is { TransitionFrequencyForVerdict: { } ft } device ? new CurrentGain(device.CurrentGainMin ?? 100, ft).At(at) : 20;

    private Working TankWorking => new(
        "tuned-tank",
        [
            WindingPart.Of(_stage.Winding, LearntValues.None)?.Figure() ?? Figure.Of("inductance", Inductance),
            Figure.Of("fixed", _stage.Fixed),
            Figure.Of("trimmer-least", _stage.TrimmerLeast),
            Figure.Of("trimmer-most", _stage.TrimmerMost),
            Figure.Of("stray", _stage.Stray),
        ],
        SourceRef.Derived("resonance of the whole tank"));

    private Working LinkWorking => new(
        "link-load",
        [
            Figure.Of("turns", QuantityKind.Count, _stage.Turns),
            Figure.Of("link", QuantityKind.Count, _stage.LinkTurns),
            Figure.Of("link-load", QuantityKind.Resistance, LinkLoad),
            Figure.Of("swing", QuantityKind.Voltage, _stage.PeakSwing.Volt),
            Figure.Of("collector-current", _stage.Collector),
        ],
        SourceRef.Derived("ideal link; short links on iron powder couple less"));
}
