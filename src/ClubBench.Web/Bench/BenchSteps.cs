using ClubBench.Club.Entities;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Plans;

namespace ClubBench.Web.Bench;

/// <summary>What stands on one screen of the builder's page.</summary>
/// <param name="Id">Its place in the address.</param>
public abstract record BenchStep(string Id);

/// <summary>Parts that leave and parts that go in.</summary>
public sealed record FitStep(string Id, CardContent Card) : BenchStep(Id);

/// <summary>One coil to wind and, where the plan expects it, to measure before it goes in.</summary>
public sealed record WindStep(string Id, WindingRow Winding, ExpectedReading? Expected) : BenchStep(Id);

/// <summary>What to look at before power comes on.</summary>
public sealed record PowerStep(string Id, CardNotes Notes) : BenchStep(Id);

/// <summary>One reading.</summary>
public sealed record MeasureStep(string Id, ExpectedReading Expected) : BenchStep(Id);

/// <summary>The stage is through: how it stands, what was read, what to do when it will not come right.</summary>
public sealed record DoneStep(string Id) : BenchStep(Id);

/// <summary>A stage of the board with its screens.</summary>
public sealed record StageScreens(BenchStage Stage, IReadOnlyList<BenchStep> Steps)
{
    public string Key => Stage.Key;

    public string Kind => Stage.Kind;

    public StageAction Action => Stage.Action;

    public StageProgress Progress => Stage.Progress;

    public StageHold Hold => Stage.Hold;

    public CardContent Card => Stage.Card;

    /// <summary>Whether the newest standing reading of any point is outside its window.</summary>
    public bool IsOut => Stage.Readings.Where(r => !r.IsReplaced).GroupBy(r => r.Point, StringComparer.Ordinal).Any(g => g.Last().Advice.Verdict is ReadingVerdict.Out or ReadingVerdict.Stop);

    public StageLook Look => StageLook.Of(Progress, Hold, IsOut);

    public static StageScreens Of(BenchStage stage) => new(stage, [.. StepsOf(stage)]);

    /// <summary>The next step's address, or the list of all stages after the last.</summary>
    public string After(BenchStep step)
    {
        var next = Steps.ToList().IndexOf(step) + 1;
        return next < Steps.Count ? Steps[next].Id : "all";
    }

    private static IEnumerable<BenchStep> StepsOf(BenchStage stage)
    {
        var card = stage.Card;
        var wound = card.Windings.Select(w => w.Designator).ToHashSet(StringComparer.Ordinal);
        if (card.Remove.Count > 0 || card.Fit.Count > 0) yield return new FitStep($"{stage.Key}-parts", card);
        foreach (var winding in card.Windings)
            yield return new WindStep($"{stage.Key}-{winding.Designator}", winding, stage.Expected.FirstOrDefault(e => e.Winding?.Designator == winding.Designator));
        if (card.Notes.BeforePower.Count > 0 || card.Notes.Cautions.Count > 0) yield return new PowerStep($"{stage.Key}-power", card.Notes);
        foreach (var expected in stage.Expected.Where(e => e.Winding is null || !wound.Contains(e.Winding.Designator))) yield return new MeasureStep(expected.Point, expected);
        yield return new DoneStep($"{stage.Key}-done");
    }
}
