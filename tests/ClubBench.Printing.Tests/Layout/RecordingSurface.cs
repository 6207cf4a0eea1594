using System.Globalization;
using System.Xml.Linq;
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

    public void Svg(string svg, Area area) => Pages[^1].Drawings.Add(new Picture(svg, area));

    public void Qr(string text, Area area) => Pages[^1].Codes.Add((text, area));

    internal sealed record Written(string Text, float X, float Baseline, TextStyle Style);

    /// <summary>A drawing, placed as large as fits.</summary>
    internal sealed record Picture(string Svg, Area Area)
    {
        /// <summary>Its smallest letters in points; very large where it has none.</summary>
        public float LeastLetterPoints
        {
            get
            {
                var svg = XDocument.Parse(Svg).Root!;
                var view = svg.Attribute("viewBox")!.Value.Split(' ').Select(v => float.Parse(v, CultureInfo.InvariantCulture)).ToArray();
                var sizes = svg.Descendants().Where(e => e.Name.LocalName == "text").Select(e => float.Parse(e.Attribute("font-size")!.Value, CultureInfo.InvariantCulture));
                return Math.Min(Area.Width / view[2], Area.Height / view[3]) * sizes.DefaultIfEmpty(float.MaxValue).Min();
            }
        }
    }

    internal sealed record Page(PaperSize Paper, string? Bookmark)
    {
        public List<Written> Texts { get; } = [];

        public List<Area> Boxes { get; } = [];

        public List<Picture> Drawings { get; } = [];

        public List<(string Text, Area Area)> Codes { get; } = [];
    }
}
