namespace ClubBench.Printing.Layout;

/// <summary>Shares blocks out over pages.</summary>
internal static class PageBreaks
{
    /// <summary>
    /// One page if everything fits. Else the second page starts at the section that says so, if what stands before it fits;
    /// else page after page as full as it gets, cutting blocks that allow it.
    /// </summary>
    /// <param name="surface">Measures.</param>
    /// <param name="blocks">Blocks in order.</param>
    /// <param name="gap">Distance between blocks.</param>
    /// <param name="width">Width of a page's body.</param>
    /// <param name="room">Height of a page's body.</param>
    public static IReadOnlyList<Stack> Of(ICardSurface surface, IReadOnlyList<IBlock> blocks, float gap, float width, float room)
    {
        var all = new Stack(blocks, gap);
        if (all.Height(surface, width) <= room) return [all];
        var second = blocks.ToList().FindIndex(b => b is Section { StartsPage: true });
        if (second > 0 && new Stack([.. blocks.Take(second)], gap) is var first && first.Height(surface, width) <= room)
            return [first, .. Filled(surface, new Stack([.. blocks.Skip(second)], gap), width, room)];
        return [.. Filled(surface, all, width, room)];
    }

    private static IEnumerable<Stack> Filled(ICardSurface surface, Stack rest, float width, float room)
    {
        while (rest.Height(surface, width) > room && rest.CutAt(surface, width, room) is { } cut)
        {
            yield return (Stack)cut.Head;
            rest = (Stack)cut.Tail;
        }
        yield return rest;
    }
}
