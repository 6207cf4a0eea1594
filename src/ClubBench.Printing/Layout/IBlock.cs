namespace ClubBench.Printing.Layout;

/// <summary>A part of a card that knows its height and can draw itself.</summary>
public interface IBlock
{
    /// <summary>Height at a width.</summary>
    float Height(ICardSurface surface, float width);

    /// <summary>Draws into an area at least as high as <see cref="Height"/> says.</summary>
    void Draw(ICardSurface surface, Area area);

    /// <summary>Cuts the block so that the head is no higher than the room; null where it cannot be cut there.</summary>
    (IBlock Head, IBlock Tail)? CutAt(ICardSurface surface, float width, float room) => null;
}

/// <summary>Blocks below each other.</summary>
internal sealed record Stack(IReadOnlyList<IBlock> Blocks, float Gap = 0) : IBlock
{
    public float Height(ICardSurface surface, float width) =>
        Blocks.Sum(b => b.Height(surface, width)) + (Gap * Math.Max(0, Blocks.Count - 1));

    public void Draw(ICardSurface surface, Area area)
    {
        var y = area.Y;
        foreach (var block in Blocks)
        {
            var height = block.Height(surface, area.Width);
            block.Draw(surface, new Area(area.X, y, area.Width, height));
            y += height + Gap;
        }
    }

    public (IBlock Head, IBlock Tail)? CutAt(ICardSurface surface, float width, float room)
    {
        var used = 0f;
        for (var i = 0; i < Blocks.Count; i++)
        {
            var height = Blocks[i].Height(surface, width);
            if (used + height <= room)
            {
                used += height + Gap;
                continue;
            }
            if (Blocks[i].CutAt(surface, width, room - used) is { } cut)
                return (this with { Blocks = [.. Blocks.Take(i), cut.Head] }, this with { Blocks = [cut.Tail, .. Blocks.Skip(i + 1)] });
            return i == 0 ? null : (this with { Blocks = [.. Blocks.Take(i)] }, this with { Blocks = [.. Blocks.Skip(i)] });
        }
        return null;
    }
}
