using System.Globalization;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Text;
using ClubBench.Web.Texts;
using Microsoft.Extensions.Localization;

namespace ClubBench.Web.Bench;

/// <summary>Words of a board's stages: the stage kind's own, written out for a phone.</summary>
public sealed class BenchWords(IStringLocalizer<NightTexts> texts)
{
    public string StageHeading(StageScreens stage) => $"{stage.Key} {Phrases.Say("title.short", KindOf(stage))}";

    public string Action(StageScreens stage) => Phrases.Word(stage.Action);

    public string State(StageScreens stage) => texts[stage.Look.Word];

    public string StepTitle(StageScreens stage, BenchStep step) => step switch
    {
        FitStep => texts["bench.parts.title", stage.Key],
        WindStep wind => texts["bench.wind.title", wind.Winding.Designator],
        PowerStep => texts["bench.power.title"],
        MeasureStep measure => texts["bench.measure.title", Point(stage, measure.Expected)],
        _ => texts["bench.done.title", stage.Key],
    };

    public string StepName(BenchStep step) => step switch
    {
        FitStep => texts["bench.parts.name"],
        WindStep wind => texts["bench.wind.name", wind.Winding.Designator],
        PowerStep => texts["bench.power.name"],
        MeasureStep => texts["bench.measure.name"],
        _ => texts["bench.done.name"],
    };

    /// <summary>What a point measures, in short: the part it belongs to, or the kind's own word.</summary>
    public string Point(StageScreens stage, ExpectedReading expected) => PointName.Short(expected.Point, KindOf(stage));

    public string SetUp(StageScreens stage, ExpectedReading expected) => expected.SetUp.Length == 0 ? "" : Sentence(Phrases.Say(expected.SetUp, KindOf(stage)));

    public string Line(StageScreens stage, Line line) => Sentence(Phrases.Say(line, KindOf(stage)));

    public string Part(StageScreens stage, Part part)
    {
        var @class = StageKindList.Find(KindOf(stage))?.Description.Role(part.Role)?.Class ?? PartClass.Other;
        var value = PartText.Short(part, @class, CultureInfo.CurrentCulture);
        return value.Contains(part.Type, StringComparison.Ordinal) ? value : $"{value} {part.Type}";
    }

    public string PartNotes(FittingRow row) => string.Join(", ", PartNotesOf(row));

    public IEnumerable<string> WindingLines(WindingRow winding)
    {
        yield return winding.Colour.Length > 0 ? texts["bench.wind.core-colour", winding.Core, winding.Colour] : texts["bench.wind.core", winding.Core];
        yield return texts["bench.wind.wire", QuantityText.Format(winding.WireDiameter), QuantityText.Format(winding.CutLength)];
        yield return texts["bench.wind.turns", winding.Turns];
        if (winding.LinkTurns is { } link) yield return texts["bench.wind.link-turns", link];
        if (winding.LinkCutLength is { } length) yield return texts["bench.wind.link", QuantityText.Format(length)];
        yield return texts["bench.wind.counted", winding.Turns];
    }

    /// <summary>Advice as heading and further steps: the first step is the heading, because that is what to do.</summary>
    public BenchAdvice Advice(Advice advice, string stageKind)
    {
        var steps = advice.Ladder.Select(s => Sentence(Phrases.Say(s, stageKind))).ToList();
        var goOn = advice.Verdict is ReadingVerdict.Good or ReadingVerdict.NearEdge or ReadingVerdict.Noted;
        return steps.Count == 0
            ? new BenchAdvice(advice.Verdict.ToString(), texts[$"verdict.{advice.Verdict}"], [], goOn)
            : new BenchAdvice(advice.Verdict.ToString(), steps[0], [.. steps.Skip(1)], goOn);
    }

    private IEnumerable<string> PartNotesOf(FittingRow row)
    {
        if (row.MarkingOnPart.Count > 0) yield return texts["bench.parts.marked", string.Join(" + ", row.MarkingOnPart)];
        if (row.PiecesPerPlace > 1) yield return texts["bench.parts.pieces", row.PiecesPerPlace];
        if (row.AsksForItsType) yield return texts["bench.parts.tuned"];
        yield return $"{texts["bench.parts.bag"]} {row.Pocket}";
    }

    private static string KindOf(StageScreens stage) => stage.Kind;

    private static string Sentence(string text) => text.Length == 0 ? text : char.ToUpper(text[0], CultureInfo.CurrentCulture) + text[1..];
}

/// <summary>Advice for the page and the script.</summary>
/// <param name="Verdict">The verdict's name.</param>
/// <param name="Heading">What to do.</param>
/// <param name="Steps">What else, cheapest first.</param>
/// <param name="GoOn">Whether the next step may follow.</param>
public sealed record BenchAdvice(string Verdict, string Heading, IReadOnlyList<string> Steps, bool GoOn);
