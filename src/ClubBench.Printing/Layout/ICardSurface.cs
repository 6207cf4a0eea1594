namespace ClubBench.Printing.Layout;

/// <summary>What a card is drawn on. Blocks know only this, so that the layout can be tested without a PDF.</summary>
public interface ICardSurface
{
    /// <summary>Width of a text in points.</summary>
    float Measure(string text, TextStyle style);

    /// <summary>Starts a page.</summary>
    /// <param name="paper">Its size.</param>
    /// <param name="bookmark">Title of a bookmark that leads to it; null for none.</param>
    void BeginPage(PaperSize paper, string? bookmark);

    /// <summary>Ends the page.</summary>
    void EndPage();

    /// <summary>Writes one line of text, its baseline at <paramref name="baseline"/>.</summary>
    void Text(string text, float x, float baseline, TextStyle style);

    /// <summary>Draws a box; no outline for a stroke of zero, no filling for null.</summary>
    void Box(Area area, float stroke, Shade? fill = null);

    /// <summary>Draws a straight line.</summary>
    void Line(float x1, float y1, float x2, float y2, float stroke, Shade shade = Shade.Black);

    /// <summary>Places a drawing, as large as fits, in the middle of the area.</summary>
    void Svg(string svg, Area area);

    /// <summary>Draws a QR code of a text, filling the square.</summary>
    void Qr(string text, Area area);
}
