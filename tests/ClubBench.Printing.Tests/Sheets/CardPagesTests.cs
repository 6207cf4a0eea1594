using ClubBench.Planning.Cards;
using ClubBench.Planning.Plans;
using ClubBench.Printing.Layout;
using ClubBench.Printing.Sheets;
using ClubBench.Printing.Tests.Layout;
using ClubBench.Printing.Tests.Samples;

namespace ClubBench.Printing.Tests.Sheets;

public class CardPagesTests
{
    [Theory]
    [InlineData(1)]
    [InlineData(3)]
    [InlineData(4)]
    public void Draw_UpToFourCoils_FillsOneA4Page(int coils) => Assert.Single(Drawn(SampleCards.LowPassWith(coils)).Pages);

    [Fact]
    public void Draw_ManyCoils_GoesOnAtBeforePower()
    {
        var pages = Drawn(SampleCards.LowPassWith(8)).Pages;

        Assert.Equal(2, pages.Count);
        Assert.DoesNotContain(pages[0].Texts, t => t.Text == "Before power");
        Assert.Equal("Before power", pages[1].Texts.Where(t => t.Style == TextStyle.Heading).MinBy(t => t.Baseline)!.Text);
    }

    [Fact]
    public void Draw_EveryPage_NamesBoardPlanAndPageAndHoldsTheCode()
    {
        var pages = Drawn(SampleCards.LowPassWith(8)).Pages;

        for (var i = 0; i < pages.Count; i++)
        {
            var page = pages[i];
            Assert.Contains(page.Texts, t => t.Text == "Q05");
            Assert.Contains(page.Texts, t => t.Text == "plan 4");
            Assert.Contains(page.Texts, t => t.Text == $"page {i + 1} of {pages.Count}");
            Assert.Equal(SampleCards.Context.CardAddress, Assert.Single(page.Codes).Text);
        }
    }

    [Fact]
    public void Draw_Text_IsNeverSmallerThanTwelvePoints() =>
        Assert.All(Drawn(SampleCards.LowPass).Texts, t => Assert.True(t.Style.Size >= 12, t.Text));

    [Theory]
    [InlineData("180\u00A0+\u00A022\u00A0pF")]
    [InlineData("15\u00A0t")]
    [InlineData("290\u00A0mm")]
    [InlineData("26.3\u00A0dB")]
    public void Draw_KeyValue_IsAtLeastEighteenPoints(string value) =>
        Assert.All(Written(value), t => Assert.True(t.Style.Size >= 18, t.Text));

    [Fact]
    public void Draw_Boxes_AreAtLeastFiveMillimetresEachWay() =>
        Assert.All(Drawn(SampleCards.LowPass).Boxes, b => Assert.True(Math.Min(b.Width, b.Height) >= PaperSize.Millimetres(5) - 0.01f, b.ToString()));

    [Fact]
    public void Draw_Windings_GiveOneBoxPerPass()
    {
        var with = Drawn(SampleCards.LowPass).Boxes.Count(IsTick);
        var without = Drawn(SampleCards.LowPass with { Windings = [.. SampleCards.LowPass.Windings.Select(w => w with { Turns = w.Turns - 1 })] }).Boxes.Count(IsTick);

        Assert.Equal(3, with - without);
    }

    [Fact]
    public void Draw_ManyTurns_GiveOneBoxForEveryFivePassesWithItsCount()
    {
        var card = SampleCards.LowPass with { Windings = [.. SampleCards.LowPass.Windings.Select(w => w with { Turns = 22 })] };
        var surface = Drawn(card);

        Assert.Equal(3, surface.Texts.Count(t => t.Text == "22"));
        Assert.Equal(3, surface.Texts.Count(t => t.Text == "20"));
        Assert.Single(surface.Pages);
    }

    [Theory]
    [InlineData("A4")]
    [InlineData("Letter")]
    public void Draw_LeftEdge_StaysFreeForTheThumbAndNothingLeavesThePage(string name)
    {
        var paper = name == "A4" ? PaperSize.A4 : PaperSize.Letter;
        var surface = Drawn(SampleCards.LowPassWith(6), SampleCards.Context with { Paper = paper });

        Assert.All(surface.Texts, t => Assert.InRange(Left(surface, t), PaperSize.Millimetres(14) - 0.1f, paper.Width));
        Assert.All(surface.Texts, t => Assert.InRange(Left(surface, t) + surface.Measure(t.Text.TrimEnd(' '), t.Style), 0, paper.Width - PaperSize.Millimetres(5)));
        Assert.All(surface.Texts, t => Assert.InRange(t.Baseline, 0, paper.Height - PaperSize.Millimetres(5)));
        Assert.All(surface.Boxes, b => Assert.InRange(b.Bottom, 0, paper.Height - PaperSize.Millimetres(5)));
    }

    [Fact]
    public void Draw_LookAlikeMarkings_StandOutAtTheFittingList()
    {
        var warning = Drawn(SampleCards.LowPass).Texts.Single(t => t.Text.Contains("331 is 330\u00A0pF; 33 or 330 is 33\u00A0pF.", StringComparison.Ordinal));

        Assert.Equal(TextStyle.Strong, warning.Style);
        Assert.Equal(Drawn(SampleCards.LowPass).Texts.Single(t => t.Text == "Fit, in this order").Baseline, warning.Baseline, 0.5);
    }

    [Fact]
    public void Draw_NoLookAlikeMarkings_SaysNothingOfThem()
    {
        var card = SampleCards.LowPass with { Fit = [.. SampleCards.LowPass.Fit.Where(r => r.Designators[0] != "C16")] };

        Assert.DoesNotContain(Drawn(card).Texts, t => t.Text.Contains(" is 330", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("A4", "Measure", "Dummy load on before", "1.00 mA or less")]
    [InlineData("A12", "Before power", "Check the polarity", "Measure")]
    public void Draw_Caution_StandsBetweenItsHeadingAndWhatFollows(string stage, string heading, string caution, string follows)
    {
        var texts = Drawn(SamplePlans.QuernOn("20 m").Stage(stage).Card).Pages[0].Texts;

        Assert.InRange(BaselineOf(texts, caution), BaselineOf(texts, heading), BaselineOf(texts, follows));
    }

    [Fact]
    public void Draw_CautionOfNoStep_StandsAtTheEnd()
    {
        var notes = SampleCards.LowPass.Notes with { Cautions = [new Caution("caution.rf-burns", [], null)] };
        var texts = Drawn(SampleCards.LowPass with { Notes = notes }).Pages[0].Texts;

        Assert.InRange(BaselineOf(texts, "Then: dummy load on"), BaselineOf(texts, "If outside"), BaselineOf(texts, "builder"));
    }

    [Fact]
    public void Draw_NothingToMeasure_StillShowsItsCaution() =>
        Assert.Contains(Drawn(SampleCards.LowPass with { Measure = [] }).Texts, t => t.Text.StartsWith("No key-down", StringComparison.Ordinal));

    [Fact]
    public void Draw_KeptStage_SaysSoAndHasNothingToFit()
    {
        var texts = Drawn(SampleCards.Kept).Texts.Select(t => t.Text).ToList();

        Assert.Contains(texts, t => t.StartsWith("Keep this stage", StringComparison.Ordinal));
        Assert.Contains("Measure", texts);
        Assert.DoesNotContain("Fit, in this order", texts);
        Assert.DoesNotContain("Wind", texts);
    }

    [Fact]
    public void Draw_Rethink_SaysFitNothing()
    {
        var texts = Drawn(SampleCards.Kept with { Action = StageAction.Rethink }).Texts.Select(t => t.Text).ToList();

        Assert.Contains(texts, t => t.Contains("Fit nothing yet", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("20 m", "A4")]
    [InlineData("40 m", "A4")]
    [InlineData("20 m", "Letter")]
    [InlineData("40 m", "Letter")]
    public void Draw_EveryCardOfAPlan_FitsOnePageAndShowsItsFigures(string band, string name)
    {
        var paper = name == "A4" ? PaperSize.A4 : PaperSize.Letter;
        var cards = SamplePlans.QuernOn(band).Stages.Select(s => s.Card).ToList();

        Assert.Equal(12, cards.Count);
        foreach (var card in cards)
        {
            var surface = Drawn(card, SampleCards.Context with { Paper = paper });

            Assert.Single(surface.Pages);
            Assert.All(surface.Texts, t => Assert.InRange(t.Baseline, 0, paper.Height - PaperSize.Millimetres(5)));
            Assert.All(CardFigures.Of(card), f => Assert.Contains(f.Text.Replace('\u00A0', ' '), Joined(surface), StringComparison.Ordinal));
        }
    }

    [Fact]
    public void Draw_FewTicks_StandInTheLineOfTheirHeading()
    {
        var texts = Drawn(SampleCards.LowPass, SampleCards.Context with { Paper = PaperSize.Letter }).Pages[0].Texts;

        Assert.Equal(BaselineOf(texts, "Before power"), BaselineOf(texts, "looked at every joint"), 3f);
    }

    [Fact]
    public void Draw_NoBoardYet_LeavesLinesToWriteOn()
    {
        var texts = Drawn(SampleCards.LowPass, SampleCards.Context with { BoardNumber = null, Tag = null }).Texts.Select(t => t.Text).ToList();

        Assert.DoesNotContain("Q05", texts);
        Assert.Contains("tag:", texts);
    }

    private static string Joined(RecordingSurface surface) => string.Join(' ', surface.Texts.Select(t => t.Text.Trim(' '))).Replace('\u00A0', ' ');

    private static float BaselineOf(IEnumerable<RecordingSurface.Written> texts, string start) =>
        texts.First(t => t.Text.Replace('\u00A0', ' ').StartsWith(start, StringComparison.Ordinal)).Baseline;

    private static bool IsTick(Area box) => Math.Abs(box.Width - PaperSize.Millimetres(5)) < 0.01f && Math.Abs(box.Height - box.Width) < 0.01f;

    private static float Left(RecordingSurface surface, RecordingSurface.Written text) => text.Style.Side switch
    {
        TextSide.End => text.X - surface.Measure(text.Text, text.Style),
        TextSide.Middle => text.X - (surface.Measure(text.Text, text.Style) / 2),
        _ => text.X,
    };

    private static List<RecordingSurface.Written> Written(string value)
    {
        var found = Drawn(SampleCards.LowPass).Texts.Where(t => t.Text == value).ToList();
        Assert.NotEmpty(found);
        return found;
    }

    private static RecordingSurface Drawn(CardContent content, CardContext? context = null)
    {
        var surface = new RecordingSurface();
        CardPages.Draw(surface, new PrintedCard(content, context ?? SampleCards.Context));
        return surface;
    }
}
