using System.Text.Json;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Planning.Cards;
using ClubBench.Web.State;
using ClubBench.Web.Texts;
using Microsoft.AspNetCore.Components;
using Microsoft.Extensions.Localization;

namespace ClubBench.Web.Bench;

/// <summary>A reading of this board, ready to be shown.</summary>
public sealed record ShownReading(string Stage, string Point, string Label, string Value, string Verdict, BenchAdvice Advice);

/// <summary>Everything the builder's page of one board shows and its script needs.</summary>
public sealed record BenchModel(
    OpenedBoard Board,
    string Call,
    string Token,
    string Start,
    IReadOnlyList<StageScreens> Stages,
    IReadOnlyList<BenchPoint> Points,
    IReadOnlyList<ShownReading> Readings,
    BenchWords Words,
    IStringLocalizer<NightTexts> Texts)
{
    private const string ScriptTexts = "js.";
    private static readonly JsonSerializerOptions ForScript = new(JsonSerializerDefaults.Web);

    public string Tag => Board.Tag;

    public string KitName => Board.KitName;

    public string PlanName => Board.PlanName;

    public string BandName => Board.BandName;

    public string Path => $"/bench/{Uri.EscapeDataString(Tag)}";

    public string BandStyle => BandLook.Of(BandName);

    /// <summary>What the script starts from. The encoder leaves no angle bracket in it.</summary>
    public string Json => JsonSerializer.Serialize(
        new
        {
            board = Tag,
            token = Token,
            start = Start,
            entriesUrl = $"{Path}/entries",
            changesUrl = $"{Path}/changes",
            points = Points,
            texts = Texts.GetAllStrings(includeParentCultures: true).Where(t => t.Name.StartsWith(ScriptTexts, StringComparison.Ordinal)).ToDictionary(t => t.Name[ScriptTexts.Length..], t => t.Value),
        },
        ForScript);

    public string At(string part) => $"{Path}#{part}";

    public BenchPoint PointOf(string point) => Points.First(p => p.Point == point);

    public BenchAdvice? LastAdviceOf(string point) => Readings.LastOrDefault(r => r.Point == point)?.Advice;

    public IReadOnlyList<ShownReading> ReadingsOf(string stage) => [.. Readings.Where(r => r.Stage == stage)];

    public MarkupString? DrawingOf(StageScreens stage) => BenchDrawings.Schematic(stage.Card, Words.StageHeading(stage));

    public MarkupString? SketchOf(WindingRow winding) => BenchDrawings.Winding(winding);
}
