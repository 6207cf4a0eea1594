using System.Numerics;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.LowPassLadder;

/// <summary>A computed low-pass ladder between 50 ohm ends.</summary>
internal sealed class LowPassModel : IStageModel, IPasses, IPresents
{
    private static readonly SourceRef ChainMatrix = new("pozar-microwave", "chain matrix", SourceStatus.Published);

    /// <summary>A ladder that loses less at the club's frequency passes it: the cut-off counts from there, else from half the band.</summary>
    private const double PassesDb = 1;
    private readonly Surroundings _surroundings;

    public LowPassModel(LowPassStage stage, Surroundings surroundings)
    {
        (_surroundings, Ladder) = (surroundings, stage.Ladder(surroundings.Learnt));
        var band = surroundings.Band;
        Loss = LossAt(surroundings.Reference);
        WorstLoss = band.Points(17).Max(LossAt);
        WorstReturnLoss = Ladder.WorstReturnLoss(band, LowPassStage.Line, LowPassStage.Line);
        CutOff = Ladder.CutOff3dB(Loss.Db < PassesDb ? surroundings.Reference : band.High / 2, LowPassStage.Line, LowPassStage.Line);
        Second = AtHarmonic(2);
        Third = AtHarmonic(3);
    }

    public Ladder Ladder { get; }

    /// <summary>Loss at the club's frequency.</summary>
    public Decibels Loss { get; }

    /// <summary>Largest loss over the band.</summary>
    public Decibels WorstLoss { get; }

    /// <summary>Smallest return loss over the band.</summary>
    public Decibels WorstReturnLoss { get; }

    /// <summary>3 dB cut-off; null when the ladder already blocks the band.</summary>
    public Frequency? CutOff { get; }

    /// <summary>Smallest loss at the second harmonic of either band end.</summary>
    public Decibels Second { get; }

    /// <summary>Smallest loss at the third harmonic of either band end.</summary>
    public Decibels Third { get; }

    public IReadOnlyList<Figure> Figures =>
    [
        Computed("second-harmonic", Second),
        Computed("loss", Loss),
        Computed("return-loss", WorstReturnLoss),
        .. CutOff is { } f ? [Figure.Of("cut-off", f, WorkingOf(f)) with { Digits = 4 }] : Array.Empty<Figure>(),
        Computed("third-harmonic", Third),
    ];

    public TwoPort At(Frequency frequency) => Ladder.At(frequency);

    public Complex Impedance(string port, Frequency at)
    {
        var twoPort = Ladder.At(at);
        return port == LowPassLadderKind.Input
            ? twoPort.InputImpedance(_surroundings.Neighbour(LowPassLadderKind.Output, at))
            : twoPort.OutputImpedance(_surroundings.Neighbour(LowPassLadderKind.Input, at));
    }

    /// <summary>Smallest loss at a harmonic over both ends of the band.</summary>
    public Decibels AtHarmonic(int order)
    {
        var (low, high) = (LossAt(_surroundings.Band.Low.Harmonic(order)), LossAt(_surroundings.Band.High.Harmonic(order)));
        return low < high ? low : high;
    }

    public Decibels LossAt(Frequency f) => Ladder.Loss(f, LowPassStage.Line, LowPassStage.Line);

    private Figure Computed(string name, Decibels value) => Figure.Of(name, value, WorkingOf(_surroundings.Reference));

    private static Working WorkingOf(Frequency at) => new("ladder-analysis", [Figure.Of("at", at), Figure.Of("line", LowPassStage.Line)], ChainMatrix);
}
