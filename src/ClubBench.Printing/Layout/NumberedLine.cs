using System.Globalization;

namespace ClubBench.Printing.Layout;

/// <summary>A step with its number in front.</summary>
internal sealed record NumberedLine(int Number, string Text) : IBlock
{
    private const float Indent = 14;

    private Paragraph Words => new(Text, TextStyle.Body);

    public float Height(ICardSurface surface, float width) => Words.Height(surface, width - Indent);

    public void Draw(ICardSurface surface, Area area)
    {
        surface.Text(Number.ToString(CultureInfo.InvariantCulture), area.X, area.Y + TextStyle.Strong.Ascent, TextStyle.Strong);
        Words.Draw(surface, area with { X = area.X + Indent, Width = area.Width - Indent });
    }
}
