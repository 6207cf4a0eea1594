using System.Globalization;
using System.Xml.Linq;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Plans;
using ClubBench.Printing.Fonts;
using ClubBench.Printing.Layout;
using ClubBench.Printing.Schematics;
using ClubBench.Printing.Sheets;
using ClubBench.Printing.Tests.Layout;
using ClubBench.Printing.Tests.Samples;

namespace ClubBench.Printing.Tests.Sheets;

/// <summary>The drawings on the cards of the demonstration plans, as printed.</summary>
public class CardPictureTests
{
    [Theory]
    [InlineData("20 m", "A4")]
    [InlineData("40 m", "A4")]
    [InlineData("20 m", "Letter")]
    [InlineData("40 m", "Letter")]
    public void Draw_EveryCardOfAPlan_WritesItsDrawingsInNinePointsAtLeast(string band, string name)
    {
        var paper = name == "A4" ? PaperSize.A4 : PaperSize.Letter;
        var small = SamplePlans.QuernOn(band).Stages
            .SelectMany(s => Drawn(s.Card, SampleCards.Context with { Paper = paper }).Pages[0].Drawings.Select((d, i) => (Name: $"{s.Stage} drawing {i}", Points: d.LeastLetterPoints, d.Area.Height)))
            .Where(d => d.Points < 8.99f)
            .Select(d => $"{d.Name}: {d.Points:0.0} pt, {d.Height:0} high");

        Assert.Equal([], small);
    }

    [Fact]
    public void Draw_CardWithRoom_TakesAThirdOfThePageAtMost()
    {
        foreach (var card in SamplePlans.QuernOn("20 m").Stages.Where(s => s.Action == StageAction.Keep).Select(s => s.Card))
            Assert.InRange(Drawn(card).Pages[0].Drawings[0].Area.Height, 0, PaperSize.A4.Height / 3);
    }

    [Fact]
    public void Draw_LowPass_ShowsOldAndNewResponseAgainstTheLimit()
    {
        var plot = Drawn(SamplePlans.QuernOn("20 m").Stage("A5").Card).Pages[0].Drawings[1].Svg;

        Assert.All(new[] { ">old<", ">new<", ">limit<" }, word => Assert.Contains(word, plot, StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("20 m", "A4")]
    [InlineData("40 m", "A4")]
    [InlineData("20 m", "Letter")]
    [InlineData("40 m", "Letter")]
    public void Draw_EveryCardOfAPlan_LaysNoNameOverAPartOrAnotherName(string band, string name)
    {
        var paper = name == "A4" ? PaperSize.A4 : PaperSize.Letter;
        var covered =
            from card in SamplePlans.QuernOn(band).Stages.Select(s => s.Card)
            let words = WordsOf(Drawn(card, SampleCards.Context with { Paper = paper }).Pages[0].Drawings[0].Svg)
            let parts = card.Drawing.Symbols.Where(s => !SymbolShapes.IsNamedInside(s.Kind)).Select(s => (Name: s.Designator + s.Kind, Area: new PlacedSymbol(s).Body))
            from word in words
            from other in parts.Concat(words.Where(w => w != word))
            where Overlap(word.Area, other.Area) > 4
            select $"{card.Stage}: {word.Name} on {other.Name}";

        Assert.Equal([], covered);
    }

    /// <summary>The words of a drawing with the area their letters cover.</summary>
    private static List<(string Name, Area Area)> WordsOf(string svg) =>
    [
        .. XDocument.Parse(svg).Descendants().Where(e => e.Name.LocalName == "text").Select(e =>
        {
            float Number(string attribute) => float.Parse(e.Attribute(attribute)!.Value, CultureInfo.InvariantCulture);
            var (x, baseline, size) = (Number("x"), Number("y"), Number("font-size"));
            var width = PlexSans.Measure(e.Value, size, (FontWeight)((int)(Number("font-weight") - 400) / 100));
            var left = e.Attribute("text-anchor")!.Value switch { "end" => x - width, "middle" => x - (width / 2), _ => x };
            return (e.Value, new Area(left, baseline - (0.7f * size), width, 0.7f * size));
        }),
    ];

    private static float Overlap(Area a, Area b) =>
        Math.Max(0, Math.Min(a.Right, b.Right) - Math.Max(a.X, b.X)) * Math.Max(0, Math.Min(a.Bottom, b.Bottom) - Math.Max(a.Y, b.Y));

    private static RecordingSurface Drawn(CardContent content, CardContext? context = null)
    {
        var surface = new RecordingSurface();
        CardPages.Draw(surface, new PrintedCard(content, context ?? SampleCards.Context));
        return surface;
    }
}
