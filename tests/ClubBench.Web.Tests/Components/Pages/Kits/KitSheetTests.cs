using AngleSharp.Dom;
using Bunit;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.Text;
using ClubBench.Web.Components.Pages.Kits;

namespace ClubBench.Web.Tests.Components.Pages.Kits;

public sealed class KitSheetTests : PageContext
{
    private static readonly BackCheck Sound = BackCheck.Of(DemoKits.QuernThirty, LearntValues.None);

    public static TheoryData<string> Stages => [.. Sound.Stages.Select(s => s.Stage)];

    [Fact]
    public void Rails_OfAKit_ShowEveryStageOnThePathsItIsTracedOn()
    {
        var blocks = Sheet(Sound).FindAll("li.rail-block");

        Assert.Equal(Sound.Kit.Stages.Select(s => s.Key).Order(StringComparer.Ordinal), blocks.Select(KeyOf).Order(StringComparer.Ordinal));
        Assert.Equal(Sorted(Sound.Paths.Transmit.Stages), Sorted(blocks.Where(b => b.QuerySelector("i.rail-mark.transmit") is not null).Select(KeyOf)));
        var heard = Sound.Paths.Receive.Stages.Concat(Sound.Paths.Oscillators.SelectMany(o => o.Path.Stages));
        Assert.Equal(Sorted(heard), Sorted(blocks.Where(b => b.QuerySelector("i.rail-mark.receive") is not null).Select(KeyOf)));
    }

    [Theory]
    [MemberData(nameof(Stages))]
    public void Rails_EveryBlock_LeadsToItsStageWithItsVerdict(string stage)
    {
        var block = Sheet(Sound).FindAll("li.rail-block").Single(b => KeyOf(b) == stage);

        Assert.Equal($"/kits/{Sound.Kit.Id}?stage={stage}#stage", block.QuerySelector("a")!.GetAttribute("href"));
        Assert.Equal(WordOf(Sound, stage), block.QuerySelector(".mark")!.TextContent);
    }

    [Theory]
    [MemberData(nameof(Stages))]
    public void Table_OfAStage_HoldsEveryRowOfTheBackCheckWithItsVerdict(string stage)
    {
        var check = Sound.Stages.Single(s => s.Stage == stage);

        var rows = Rows(Sheet(Sound, stage));

        Assert.Equal(check.Rows.Count, rows.Count);
        Assert.All(check.Rows.Zip(rows), pair =>
        {
            var (row, cells) = pair;
            Assert.Equal(row.Stated is null ? "not given" : QuantityText.Format(row.Stated), cells.Stated);
            Assert.StartsWith(QuantityText.Format(row.Computed), cells.Computed, StringComparison.Ordinal);
            Assert.Equal(Phrases.Word(row.Verdict), cells.Verdict);
        });
    }

    [Fact]
    public void Table_PapersThatAgree_AreOffByNothing()
    {
        var coil = Rows(Sheet(Sound, "A5")).Single(r => r.Name.StartsWith("L4", StringComparison.Ordinal));

        Assert.Equal(("0.9\u00A0µH", "0\u00A0nH", "Agrees"), (coil.Stated, coil.OffBy, coil.Verdict));
    }

    [Fact]
    public void Table_MisprintedCoil_DiffersAndTheSoundKitDoesNot()
    {
        var misprinted = BackCheck.Of(WithInductance("L4", 1.8e-6), LearntValues.None);

        var coil = Rows(Sheet(misprinted, "A5")).Single(r => r.Name.StartsWith("L4", StringComparison.Ordinal));

        Assert.Equal(("1.8\u00A0µH", "\u22120.90\u00A0µH", "Differs"), (coil.Stated, coil.OffBy, coil.Verdict));
        Assert.Equal("Differs", Verdict(Sheet(misprinted), "A5"));
        Assert.All(Sound.Stages, s => Assert.NotEqual("Differs", Verdict(Sheet(Sound), s.Stage)));
    }

    [Theory]
    [InlineData("A5", "L4", "L = AL N²")]
    [InlineData("A5", "3 dB cut-off", "Chain matrix")]
    [InlineData("A4", "", "Sine of full swing")]
    public void Row_ComputedFigure_OpensItsWorkingAndClosesIt(string stage, string row, string method)
    {
        var sheet = Sheet(Sound, stage);
        var line = sheet.FindAll("#stage tbody tr").First(r => r.QuerySelector("th")!.TextContent.StartsWith(row, StringComparison.Ordinal));
        var written = Plain(line.QuerySelector("button.figure-button")!.FirstChild!.TextContent);

        line.QuerySelector("button.figure-button")!.Click();

        var panel = sheet.Find("section.working");
        Assert.Contains(written, Plain(panel.QuerySelector("h2")!.TextContent), StringComparison.Ordinal);
        Assert.Contains(method, panel.TextContent, StringComparison.Ordinal);
        Assert.NotEmpty(panel.QuerySelectorAll(".input"));
        panel.QuerySelector("button.quiet")!.Click();
        Assert.Empty(sheet.FindAll("section.working"));
    }

    [Theory]
    [MemberData(nameof(Stages))]
    public void Row_EveryFigureWithAWorking_OpensIt(string stage)
    {
        var sheet = Sheet(Sound, stage);
        var figures = Sound.Stages.Single(s => s.Stage == stage).Rows.Count(r => r.Computed.Working is not null);

        Assert.Equal(figures, sheet.FindAll("#stage button.figure-button").Count);
        for (var i = 0; i < figures; i++)
        {
            sheet.FindAll("#stage button.figure-button")[i].Click();
            Assert.NotEmpty(sheet.Find("section.working h2").TextContent);
        }
    }

    [Fact]
    public void Actions_WithoutTheRightToEdit_HideTheEditorOnly()
    {
        var editor = $"/kits/{Sound.Kit.Id}/stages/A5";

        Assert.Contains(Links(Sheet(Sound, "A5", mayEdit: true)), a => a == editor);
        Assert.DoesNotContain(Links(Sheet(Sound, "A5", mayEdit: false)), a => a == editor);
        Assert.Contains(Links(Sheet(Sound, "A5", mayEdit: false)), a => a == $"/kits/{Sound.Kit.Id}/bands");
    }

    private IRenderedComponent<KitSheet> Sheet(BackCheck check, string? stage = null, bool mayEdit = true) =>
        Render<KitSheet>(p => p.Add(s => s.Check, check).Add(s => s.Stage, stage).Add(s => s.MayEdit, mayEdit));

    private static Kit WithInductance(string coil, double henry)
    {
        var stage = DemoKits.QuernThirty.Stages.Single(s => s.Parts.Any(p => p.Designator == coil));
        return DemoKits.QuernThirty.With(stage.With(stage.Part(coil).With((PartValue.Inductance, henry))));
    }

    private static List<(string Name, string Stated, string Computed, string OffBy, string Verdict)> Rows(IRenderedComponent<KitSheet> sheet) =>
        [.. sheet.FindAll("#stage tbody tr").Select(r => r.Children.Select(c => c.TextContent.Trim()).ToList()).Select(c => (c[0], c[1], c[2], c[3], c[4]))];

    private static string Verdict(IRenderedComponent<KitSheet> sheet, string stage) =>
        sheet.FindAll("li.rail-block").Single(b => KeyOf(b) == stage).QuerySelector(".mark")!.TextContent;

    private static IEnumerable<string?> Links(IRenderedComponent<KitSheet> sheet) => sheet.FindAll("#stage a").Select(a => a.GetAttribute("href"));

    private static string KeyOf(IElement block) => block.QuerySelector(".key")!.TextContent;

    private static string WordOf(BackCheck check, string stage) => Phrases.Word(check.Stages.Single(s => s.Stage == stage).Verdict);

    private static IEnumerable<string> Sorted(IEnumerable<string> stages) => stages.Distinct(StringComparer.Ordinal).Order(StringComparer.Ordinal);

    private static string Plain(string text) => text.Replace('\u00A0', ' ').Trim();
}
