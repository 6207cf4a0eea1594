using System.Numerics;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.SingleTunedFrontEnd;

/// <summary>A computed front end: what it tunes, how broadly, and what it loses.
/// Method: parallel resonant circuit between the line through the link and the load at its top, the trimmer set as near to resonance as it goes.</summary>
internal sealed class FrontEndModel : IStageModel, IAddsNoise, IPasses, IPresents
{
    private readonly FrontEndStage _stage;
    private readonly LearntValues _learnt;
    private readonly Capacitance _tunedTo;

    public FrontEndModel(FrontEndStage stage, Surroundings surroundings)
    {
        (_stage, _learnt, Reference) = (stage, surroundings.Learnt, surroundings.Reference);
        Tank = stage.Tank(_learnt);
        Needed = TunedCircuit.CapacitanceFor(Tank.Inductance, Reference);
        Reactance = TunedCircuit.Reactance(Tank.Inductance, Reference);
        Load = LoadIn(surroundings.Neighbour(SingleTunedFrontEndKind.Output, Reference));
        LoadedQ = 1 / (((1 / stage.SourceAtTop.Ohm) + (1 / Load.Ohm)) * Reactance.Ohm);
        Bandwidth = new ResonatorLoading(Reference, Reactance, stage.CoilQ, stage.SourceAtTop, Load).Bandwidth3dB;
        _tunedTo = Needed < Tank.Least ? Tank.Least : Needed > Tank.Most ? Tank.Most : Needed;
        Loss = At(Reference).Loss(FrontEndStage.FedFrom, Load);
    }

    /// <summary>The club's frequency.</summary>
    public Frequency Reference { get; }

    public TunablePlace Tank { get; }

    /// <summary>Capacitance that tunes to the club's frequency, strays included.</summary>
    public Capacitance Needed { get; }

    public Resistance Reactance { get; }

    /// <summary>Resistance of what follows, across the whole coil.</summary>
    public Resistance Load { get; }

    /// <summary>Loaded Q by source and load alone: the coil's own loss lowers it a little more.</summary>
    public double LoadedQ { get; }

    /// <summary>Width between the 3 dB points, the coil's own loss included.</summary>
    public Frequency Bandwidth { get; }

    /// <summary>Transducer loss at the club's frequency with the trimmer as near to it as it goes.</summary>
    public Decibels Loss { get; }

    public IReadOnlyList<Figure> Figures =>
    [
        Figure.Of("loss", Loss, LoadWorking) with { Digits = 2 },
        Figure.Of("tunes-low", Tank.Lowest, TankWorking) with { Digits = 3 },
        Figure.Of("tunes-high", Tank.Highest, TankWorking) with { Digits = 4 },
        Figure.Of("needed-capacitance", Needed, NeededWorking) with { Digits = 3 },
        Figure.Of("tank-least", Tank.Least, TankWorking),
        Figure.Of("tank-most", Tank.Most, TankWorking),
        Figure.Of("loaded-q", QuantityKind.Number, LoadedQ, LoadWorking) with { Digits = 2 },
        Figure.Of("bandwidth", Bandwidth, LoadWorking) with { Digits = 2 },
    ];

    /// <summary>A passive circuit adds as much noise as it loses; mismatch counts as loss, on the safe side.</summary>
    public Decibels NoiseFigure(Frequency at) => LossAt(at);

    public Decibels ReceiveGain(Frequency at) => -LossAt(at);

    public TwoPort At(Frequency frequency)
    {
        var ratio = _stage.Turns / _stage.LinkTurns;
        var coil = TunedCircuit.Reactance(Tank.Inductance, frequency).Ohm;
        var susceptance = (frequency.RadiansPerSecond * _tunedTo.Farad) - (1 / coil);
        return new TwoPort(1 / ratio, Complex.Zero, Complex.Zero, ratio).Then(TwoPort.Shunt(new Complex(1 / (_stage.CoilQ * coil), susceptance)));
    }

    public Complex Impedance(string port, Frequency at) =>
        port == SingleTunedFrontEndKind.Input ? At(at).InputImpedance(Load.Ohm) : At(at).OutputImpedance(FrontEndStage.FedFrom.Ohm);

    private Decibels LossAt(Frequency at) => At(at).Loss(FrontEndStage.FedFrom, Load);

    /// <summary>Parallel resistance of an impedance; its reactance is part of the strays.</summary>
    private static Resistance LoadIn(Complex impedance) =>
        Complex.Reciprocal(impedance) is { Real: > 0 } admittance ? Resistance.FromOhm(1 / admittance.Real) : Resistance.FromOhm(SingleTunedFrontEndKind.NominalLoadOhm);

    private Figure Inductance => WindingPart.Of(_stage.Winding, _learnt)?.Figure() ?? Figure.Of("inductance", Tank.Inductance);

    private Working NeededWorking => new("resonance", [Inductance, Figure.Of("at", Reference)], SourceRef.Derived("resonance of coil and whole capacitance"));

    private Working TankWorking => new(
        "tuned-tank",
        [
            Inductance,
            Figure.Of("fixed", Tank.Fixed),
            Figure.Of("trimmer-least", Tank.TrimmerLeast),
            Figure.Of("trimmer-most", Tank.TrimmerMost),
            Figure.Of("stray", Tank.Stray),
        ],
        SourceRef.Derived("resonance of coil and whole capacitance"));

    private Working LoadWorking => new(
        "tank-loading",
        [
            Figure.Of("reactance", Reactance),
            Figure.Of("turns", QuantityKind.Count, _stage.Turns),
            Figure.Of("link", QuantityKind.Count, _stage.LinkTurns),
            Figure.Of("line", FrontEndStage.FedFrom),
            Figure.Of("load", Load),
            new Figure("coil-q", QuantityKind.Number, _stage.CoilQ, From: Provenance.CommonPractice),
        ],
        SourceRef.Derived("ideal link; short links on iron powder couple less"));
}
