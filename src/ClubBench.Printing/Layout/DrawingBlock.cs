namespace ClubBench.Printing.Layout;

/// <summary>A drawing, scaled to the width but no higher than allowed and no larger than its own scale times a factor.</summary>
/// <param name="Svg">The drawing.</param>
/// <param name="NaturalWidth">Its own width.</param>
/// <param name="NaturalHeight">Its own height.</param>
/// <param name="LetterSize">Size of its letters, in its own units.</param>
/// <param name="MostHeight">Most height it may take.</param>
/// <param name="MostScale">Most points per unit of the drawing.</param>
internal sealed record DrawingBlock(string Svg, float NaturalWidth, float NaturalHeight, float LetterSize, float MostHeight, float MostScale) : IBlock
{
    /// <summary>The same drawing in less height.</summary>
    public DrawingBlock NoHigherThan(float height) => this with { MostHeight = Math.Min(MostHeight, height) };

    /// <summary>Points of its letters at a width.</summary>
    public float LetterPoints(float width) => Scale(width) * LetterSize;

    public float Height(ICardSurface surface, float width) => NaturalHeight * Scale(width);

    /// <summary>Width it really takes.</summary>
    public float WidthTaken(float width) => NaturalWidth * Scale(width);

    public void Draw(ICardSurface surface, Area area) => surface.Svg(Svg, area with { Height = Height(surface, area.Width) });

    private float Scale(float width) => Math.Min(MostScale, Math.Min(width / NaturalWidth, MostHeight / NaturalHeight));
}

/// <summary>Text with a drawing at its right.</summary>
/// <param name="Text">Left part.</param>
/// <param name="Svg">Drawing.</param>
/// <param name="Size">Edge of the square the drawing stands in.</param>
internal sealed record TextWithDrawing(IBlock Text, string Svg, float Size) : IBlock
{
    private const float Gap = 10;

    public float Height(ICardSurface surface, float width) => Math.Max(Size, Text.Height(surface, width - Size - Gap));

    public void Draw(ICardSurface surface, Area area)
    {
        var height = Height(surface, area.Width);
        var text = Text.Height(surface, area.Width - Size - Gap);
        Text.Draw(surface, new Area(area.X, area.Y + ((height - text) / 2), area.Width - Size - Gap, text));
        surface.Svg(Svg, new Area(area.Right - Size, area.Y + ((height - Size) / 2), Size, Size));
    }
}
