using System.Numerics;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;
using Tap = ClubBench.Calculation.Switching.SeriesTunedTap;

namespace ClubBench.Planning.StageKinds.SeriesTunedTap;

/// <summary>A computed receive tap: the capacitance it needs, its loss on receive, what the transmitter feels of it.</summary>
internal sealed class TapModel : IStageModel, IPasses, IPresents
{
    private readonly TapStage _stage;
    private readonly Capacitance _tunedTo;

    public TapModel(TapStage stage, Surroundings surroundings)
    {
        _stage = stage;
        Reference = surroundings.Reference;
        Place = stage.Place;
        Tap = new Tap(stage.Inductance, stage.ChokeQ, Reference, TapStage.Ends, TapStage.Ends);
        Power = surroundings.WantedPower;
        DiodeCurrent = Power is { } power ? Tap.DiodeCurrent(power) : null;
        _tunedTo = Needed < Place.Least ? Place.Least : Needed > Place.Most ? Place.Most : Needed;
        Loss = At(Reference).Loss(TapStage.Ends, TapStage.Ends);
    }

    public Frequency Reference { get; }

    public TunablePlace Place { get; }

    public Tap Tap { get; }

    /// <summary>Power on the line while transmitting; null for a receiver.</summary>
    public Power? Power { get; }

    /// <summary>Peak current in the clamp diodes while transmitting into a good load.</summary>
    public Current? DiodeCurrent { get; }

    /// <summary>Capacitance that tunes to the club's frequency.</summary>
    public Capacitance Needed => Tap.Capacitor;

    /// <summary>Loss on receive, the trimmer as near to resonance as it goes.</summary>
    public Decibels Loss { get; }

    public IReadOnlyList<Figure> Figures =>
    [
        Figure.Of("needed-capacitance", Needed, ResonanceWorking) with { Digits = 3 },
        Figure.Of("tap-least", Place.Least),
        Figure.Of("tap-most", Place.Most),
        Figure.Of("reactance", Tap.Reactance, ResonanceWorking) with { Digits = 3 },
        Figure.Of("receive-loss", Loss, LossWorking) with { Digits = 2 },
        Figure.Of("bandwidth", Frequency.FromHertz(Tap.BandwidthHertz), LossWorking) with { Digits = 2 },
        Figure.Of("transmit-return-loss", Tap.TransmitReturnLoss, LineWorking) with { Digits = 3 },
        .. DiodeCurrent is { } i ? [Figure.Of("diode-current", i, LineWorking) with { Digits = 2 }] : Array.Empty<Figure>(),
    ];

    /// <summary>Line to receiver on receive.</summary>
    public TwoPort At(Frequency frequency) => TwoPort.Series(SeriesImpedance(frequency));

    /// <summary>On the line the transmitter meets the choke, its far end grounded by the diodes; the receiver meets the line through the whole tap.</summary>
    public Complex Impedance(string port, Frequency at) =>
        port == SeriesTunedTapKind.Line ? ChokeImpedance(at) : SeriesImpedance(at) + TapStage.Ends.Ohm;

    private Complex ChokeImpedance(Frequency at)
    {
        var x = TunedCircuit.Reactance(_stage.Inductance, at).Ohm;
        return new Complex(x / _stage.ChokeQ, x);
    }

    private Complex SeriesImpedance(Frequency at) => ChokeImpedance(at) - new Complex(0, TunedCircuit.Reactance(_tunedTo, at).Ohm);

    private Figure Inductance => Figure.Stated("inductance", QuantityKind.Inductance, _stage.Inductance.Henry);

    private Working ResonanceWorking => new("resonance", [Inductance, Figure.Of("at", Reference)], SourceRef.Derived("resonance of choke and capacitance in series"));

    private Working LossWorking => new(
        "tap-loss",
        [
            Figure.Of("reactance", Tap.Reactance),
            new Figure("choke-q", QuantityKind.Number, _stage.ChokeQ, From: Provenance.CommonPractice),
            Figure.Of("ends", TapStage.Ends),
            Figure.Of("tuned-to", _tunedTo),
        ],
        SourceRef.Derived("series circuit between equal resistances"));

    private Working LineWorking => new(
        "tap-on-transmit",
        [
            Figure.Of("reactance", Tap.Reactance),
            Figure.Of("ends", TapStage.Ends),
            .. Power is { } p ? [Figure.Of("power", p)] : Array.Empty<Figure>(),
        ],
        SourceRef.Derived("diodes ground the far end of the choke"));
}
