using ClubBench.Printing.Fonts;
using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Tests.Layout;

/// <summary>Writes down what is drawn, page by page, and measures with the card's own typeface.</summary>
internal sealed class RecordingSurface : ICardSurface
{
    public List<Page> Pages { get; } = [];

    public IEnumerable<Written> Texts => Pages.SelectMany(p => p.Texts);

    public IEnumerable<Area> Boxes => Pages.SelectMany(p => p.Boxes);

    public float Measure(string text, TextStyle style) => PlexSans.Measure(text, style.Size, style.Weight);

    public void BeginPage(PaperSize paper, string? bookmark) => Pages.Add(new Page(paper, bookmark));

    public void EndPage()
    {
    }

    public void Text(string text, float x, float baseline, TextStyle style) => Pages[^1].Texts.Add(new Written(text, x, baseline, style));

    public void Box(Area area, float stroke, Shade? fill = null) => Pages[^1].Boxes.Add(area);

    public void Line(float x1, float y1, float x2, float y2, float stroke, Shade shade = Shade.Black)
    {
    }

    public void Svg(string svg, Area area) => Pages[^1].Drawings.Add(area);

    public void Qr(string text, Area area) => Pages[^1].Codes.Add((text, area));

    internal sealed record Written(string Text, float X, float Baseline, TextStyle Style);

    internal sealed record Page(PaperSize Paper, string? Bookmark)
    {
        public List<Written> Texts { get; } = [];

        public List<Area> Boxes { get; } = [];

        public List<Area> Drawings { get; } = [];

        public List<(string Text, Area Area)> Codes { get; } = [];
    }
}
