using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Sheets;

/// <summary>The drawing of a stage.</summary>
/// <param name="Drawing">The schematic.</param>
internal sealed record CardPicture(DrawingBlock Drawing) : IBlock
{
    /// <summary>The same picture in less height.</summary>
    public CardPicture NoHigherThan(float height) => this with { Drawing = Drawing.NoHigherThan(height) };

    /// <summary>Points of the schematic's letters at a width.</summary>
    public float LetterPoints(float width) => Drawing.LetterPoints(width);

    public float Height(ICardSurface surface, float width) => Drawing.Height(surface, width);

    public void Draw(ICardSurface surface, Area area) => Drawing.Draw(surface, area);
}
