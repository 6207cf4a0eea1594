using Bunit;
using ClubBench.Calculation.Bands;
using ClubBench.Calculation.Noise;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Web.Components.Pages.Bands;
using ClubBench.Web.Components.Pages.Plans;

namespace ClubBench.Web.Tests.Components;

public sealed class PlanSheetTests : PageContext
{
    private static readonly Kit Kit = DemoKits.QuernThirty;

    private static readonly Lazy<Plan> Twenty = new(() => Planner.Plan(new PlanInputs(
        Kit, TargetDefaults.On("20 m", Kit, ItuRegion.Region1)!, [], DemoKits.DrawerStock, LearntValues.None, SearchEffort.Quick, 1, Planner.CalculationVersion)));

    [Fact]
    public void Choice_OfAnotherAlternative_IsToldByItsId()
    {
        var stage = Twenty.Value.Stages.First(s => s.Alternatives.Count > 1);
        var chosen = "";
        var sheet = Sheet(stage.Stage, p => p.Add(s => s.OnChoose, id => chosen = id));
        var other = stage.Alternatives.ToList().FindIndex(a => a.Id != stage.AlternativeId);

        sheet.FindAll("fieldset input[type=radio]")[other + 1].Change(true);

        Assert.Equal(stage.Alternatives[other].Id, chosen);
    }

    [Fact]
    public void Choices_FoundBesides_StandBelowThePlannersOwn()
    {
        var stage = Twenty.Value.Stages.First(s => s.Alternatives.Count > 1);
        var rows = Sheet(stage.Stage).FindAll("fieldset tbody tr").Count;

        var offered = Sheet(stage.Stage, p => p.Add(s => s.Offered, [stage.Alternatives[0] with { Id = stage.Alternatives[0].Id + "x" }, stage.Alternatives[0]]));

        Assert.Equal(rows + 1, offered.FindAll("fieldset tbody tr").Count);
    }

    [Fact]
    public void Choices_Sentences_StandApart()
    {
        foreach (var stage in Twenty.Value.Stages.Where(s => s.Alternatives.Count > 0))
            Assert.DoesNotMatch(@"\.[A-Z]", Sheet(stage.Stage).Find("fieldset").TextContent);
    }

    [Fact]
    public void Stage_OfEveryKind_IsDrawnWithItsTitleAndWords()
    {
        foreach (var stage in Twenty.Value.Stages)
            Assert.NotEmpty(Sheet(stage.Stage).Find("h1").TextContent);
    }

    [Fact]
    public void Expected_NarrowWindow_IsToldApart()
    {
        var stage = Twenty.Value.Stages.First(s => s.Expected.Any(e => e.Digits > 4));

        var windows = Sheet(stage.Stage).FindAll(".nowrap").Select(w => w.TextContent.Split('–')).Where(w => w.Length == 2).ToList();

        Assert.NotEmpty(windows);
        Assert.All(windows, w => Assert.NotEqual(w[0], w[1].Split('\u00A0')[0]));
    }

    [Theory]
    [InlineData("A4", "Dummy load on before any key-down")]
    [InlineData("A11", "Dummy load first")]
    public void Expected_CautionOfMeasuring_StandsAtTheReadingsAndNowhereElse(string stage, string caution)
    {
        var sheet = Sheet(stage);

        Assert.Single(sheet.FindAll(".caution"), c => c.TextContent.Contains(caution, StringComparison.Ordinal));
        Assert.Contains(caution, sheet.FindAll("section").Single(s => s.QuerySelector("table.names-above") is not null).TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Expected_CautionBeforePower_StandsElsewhere()
    {
        var sheet = Sheet("A12");

        Assert.Contains("polarity", sheet.Markup, StringComparison.Ordinal);
        Assert.DoesNotContain("polarity", sheet.FindAll("section").Single(s => s.QuerySelector("table.names-above") is not null).TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Bands_ChosenBand_SpellsOutItsJudgementAndLeadsToAPlan()
    {
        var survey = BandSurvey.Of(Kit, DemoKits.DrawerStock, LearntValues.None, ItuRegion.Region1, NoiseSite.Residential);

        var sheet = Render<BandSheet>(p => p.Add(s => s.Survey, survey).Add(s => s.Band, "40 m").Add(s => s.MayPlan, true));

        Assert.Contains("band=40%20m", sheet.Find(".foot a.button.heavy").GetAttribute("href"), StringComparison.Ordinal);
        Assert.NotEmpty(sheet.FindAll(".foot ol li"));
    }

    private IRenderedComponent<PlanSheet> Sheet(string stage, Action<ComponentParameterCollectionBuilder<PlanSheet>>? more = null) => Render<PlanSheet>(p =>
    {
        p.Add(s => s.Plan, Twenty.Value).Add(s => s.AddressOf, s => "?stage=" + s).Add(s => s.Stage, stage);
        more?.Invoke(p);
    });
}
