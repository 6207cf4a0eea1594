using System.Globalization;
using System.Net;
using System.Text;
using ClubBench.Printing.Fonts;
using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Drawings;

/// <summary>Collects the shapes of a drawing and wraps them up as SVG.</summary>
internal sealed class SvgDocument
{
    private readonly StringBuilder _body = new();

    /// <summary>A stroked path.</summary>
    public void Stroke(string path, string colour, float width, string transform = "", string fill = Colour.None, string dash = "", string cssClass = "") =>
        Write($"""<path d="{path}" fill="{fill}" stroke="{colour}" stroke-width="{width}" """, Attribute("stroke-dasharray", dash), Attribute("class", cssClass), Attribute("transform", transform), "/>");

    /// <summary>A filled path.</summary>
    public void Fill(string path, string colour, string transform = "") =>
        Write($"""<path d="{path}" fill="{colour}" """, Attribute("transform", transform), "/>");

    /// <summary>A straight line.</summary>
    public void Line(float x1, float y1, float x2, float y2, string colour, float width, string dash = "", string cssClass = "") =>
        Stroke(Invariant($"M{x1} {y1}L{x2} {y2}"), colour, width, dash: dash, cssClass: cssClass);

    /// <summary>A circle.</summary>
    public void Circle(float x, float y, float radius, string fill, string stroke = Colour.None, float width = 0) =>
        Write($"""<circle cx="{x}" cy="{y}" r="{radius}" fill="{fill}" stroke="{stroke}" stroke-width="{width}"/>""");

    /// <summary>One line of text, never turned.</summary>
    public void Text(string text, float x, float baseline, float size, FontWeight weight, string colour, TextSide side = TextSide.Start) =>
        Write($"""<text x="{x}" y="{baseline}" font-size="{size}" font-weight="{CssWeight(weight)}" fill="{colour}" text-anchor="{Anchor(side)}">{WebUtility.HtmlEncode(text)}</text>""");

    /// <summary>Shapes that are SVG already.</summary>
    public void Raw(string shapes) => _body.Append(shapes);

    /// <summary>Closes the drawing.</summary>
    /// <param name="view">What is seen.</param>
    /// <param name="title">Its name.</param>
    /// <param name="description">One sentence that says what it shows.</param>
    public Drawing Finish(Area view, string title, string description)
    {
        var svg = Invariant($"""
            <svg xmlns="http://www.w3.org/2000/svg" role="img" aria-label="{WebUtility.HtmlEncode(title + ". " + description)}" width="{view.Width}" height="{view.Height}" viewBox="{view.X} {view.Y} {view.Width} {view.Height}" font-family="'{PlexSans.Family}',sans-serif" stroke-linecap="butt" stroke-linejoin="round"><title>{WebUtility.HtmlEncode(title)}</title><desc>{WebUtility.HtmlEncode(description)}</desc>{_body}</svg>
            """);
        return new Drawing(svg, view.Width, view.Height, description);
    }

    internal static string Invariant(FormattableString text) =>
        string.Format(CultureInfo.InvariantCulture, text.Format, [.. text.GetArguments().Select(Rounded)]);

    /// <summary>A hundredth of a pixel is more than anybody sees.</summary>
    private static object? Rounded(object? value) => value switch
    {
        float f => MathF.Round(f, 2) + 0f,
        double d => Math.Round(d, 2) + 0d,
        _ => value,
    };

    private static string Attribute(string name, string value) => value.Length == 0 ? "" : $"{name}=\"{value}\" ";

    private static string Anchor(TextSide side) => side switch { TextSide.End => "end", TextSide.Middle => "middle", _ => "start" };

    private static int CssWeight(FontWeight weight) => 400 + (100 * (int)weight);

    private void Write(FormattableString start, params ReadOnlySpan<string> rest)
    {
        _body.Append(Invariant(start));
        foreach (var part in rest) _body.Append(part);
    }
}
