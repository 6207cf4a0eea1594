using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.PulledCrystalOscillator;

/// <summary>A computed pulled crystal oscillator. Without a usable frequency there is no range, and the refusal says why.</summary>
internal sealed class OscillatorModel : IStageModel, IGenerates
{
    private static readonly SourceRef LoopSource = SourceRef.Derived("zero of the loop reactance");
    private readonly OscillatorStage _stage;
    private readonly PulledCrystalLoop _loop;
    private readonly List<Figure> _figures = [];

    public OscillatorModel(OscillatorStage stage, Surroundings surroundings)
    {
        (_stage, _loop) = (stage, stage.Loop());
        Refusal = _loop.Refusal();
        if (Refusal != LoopRefusal.None) return;
        Range = _loop.Range();
        ClubTuning = TuningFor(surroundings.Reference);
        StartUp = OscillatorStartUp.At(_loop, _stage.Least, OscillatorStage.ChokeQ, stage.Pair, stage.TransconductanceSiemens);
        OneCrystal = OneCrystalRange();
        AddFigures();
    }

    /// <summary>Why there is no usable frequency; None when there is.</summary>
    public LoopRefusal Refusal { get; }

    /// <summary>Both ends of the dial, or null.</summary>
    public PulledCrystalRange? Range { get; }

    /// <summary>The dial with only one of two crystals connected: the quick test for an open joint; null where there is but one.</summary>
    public PulledCrystalRange? OneCrystal { get; }

    /// <summary>Start-up margin at the top of the dial, where the crystal looks most resistive.</summary>
    public OscillatorStartUp? StartUp { get; }

    /// <summary>Tuning capacitance that gives the club's frequency; null when the dial does not reach it.</summary>
    public Capacitance? ClubTuning { get; }

    public FrequencyRange? Covers => Range?.Frequencies;

    /// <summary>Enough for the follower behind it (typical of such an oscillator).</summary>
    public Power Available => Power.FromMilliwatt(1);

    public IReadOnlyList<Figure> Figures => _figures;

    /// <summary>Receive offset at a dial position in Hz; null without an offset capacitor or a usable loop.</summary>
    public double? OffsetHertz(Capacitance tuning)
    {
        if (Range is null || _stage.OffsetCapacitor?.Value(PartValue.Capacitance) is not { } farad) return null;
        var added = Capacitance.FromFarad(farad);
        return _stage.OffsetPlace.With(_loop, added).RefusalAt(tuning) == LoopRefusal.None ? ReceiveOffset.At(_loop, _stage.OffsetPlace, added, tuning) : null;
    }

    /// <summary>Offset at the dial position it is quoted at.</summary>
    public double? QuotedOffsetHertz => OffsetHertz(_stage.Quoted);

    private PulledCrystalRange? OneCrystalRange()
    {
        if (_stage.Crystals.Count < 2) return null;
        var single = _stage.Loop(crystals: 1);
        return single.Refusal() == LoopRefusal.None ? single.Range() : null;
    }

    /// <summary>Method: bisection over the dial, on which the frequency falls steadily with capacitance.</summary>
    private Capacitance? TuningFor(Frequency wanted)
    {
        if (!Range!.Frequencies.Contains(wanted)) return null;
        var (least, most) = (_stage.Least.Farad, _stage.Most.Farad);
        for (var i = 0; i < 50; i++)
        {
            var middle = 0.5 * (least + most);
            if (_loop.FrequencyAt(Capacitance.FromFarad(middle)) > wanted) least = middle;
            else most = middle;
        }

        return Capacitance.FromFarad(0.5 * (least + most));
    }

    private void AddFigures()
    {
        var range = Range!;
        Add("lowest-frequency", QuantityKind.Frequency, range.Low.Hertz, 7);
        Add("highest-frequency", QuantityKind.Frequency, range.High.Hertz, 7);
        Add("span", QuantityKind.Frequency, range.SpanHertz, 3);
        if (QuotedOffsetHertz is { } quoted) Add("receive-offset", QuantityKind.FrequencyShift, quoted, 3);
        if (OffsetHertz(_stage.Least) is { } top) Add("offset-top", QuantityKind.FrequencyShift, top, 3);
        if (OffsetHertz(_stage.Most) is { } bottom) Add("offset-bottom", QuantityKind.FrequencyShift, bottom, 3);
        if (ClubTuning is { } club && OffsetHertz(club) is { } there) Add("offset-club", QuantityKind.FrequencyShift, there, 3);
        Add("start-up-margin", QuantityKind.Number, StartUp!.Margin, 2);
        if (OneCrystal is { } one)
        {
            Add("one-crystal-low", QuantityKind.Frequency, one.Low.Hertz, 7);
            Add("one-crystal-high", QuantityKind.Frequency, one.High.Hertz, 7);
            Add("one-crystal-span", QuantityKind.Frequency, one.SpanHertz, 3);
        }
    }

    private void Add(string name, QuantityKind kind, double si, int digits) => _figures.Add(new Figure(name, kind, si, Working: WorkingOf(), Digits: digits));

    private Working WorkingOf() => new(
        "pulled-crystal-loop",
        [
            Figure.Of("crystal", QuantityKind.Frequency, _stage.Crystals[0].Need(PartValue.Frequency)),
            Figure.Of("crystals", QuantityKind.Count, _stage.Crystals.Count),
            Figure.Of("series-inductance", _loop.SeriesInductance),
            Figure.Of("tuning-least", _stage.Least),
            Figure.Of("tuning-most", _stage.Most),
            Figure.Of("oscillator-capacitance", _loop.OscillatorCapacitance),
        ],
        LoopSource);
}
