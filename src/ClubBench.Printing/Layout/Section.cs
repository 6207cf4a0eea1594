namespace ClubBench.Printing.Layout;

/// <summary>A heading with a note at the right end, a heavy rule, and what stands below it.</summary>
/// <param name="Title">Heading.</param>
/// <param name="Note">Note; empty for none.</param>
/// <param name="Body">What stands below.</param>
/// <param name="StartsPage">Whether a card that needs two pages goes on to the second one here.</param>
internal sealed record Section(string Title, IReadOnlyList<Run> Note, Stack Body, bool StartsPage = false) : IBlock
{
    public Section(string title, string note, Stack body, bool startsPage = false)
        : this(title, note.Length == 0 ? [] : [new Run(note, TextStyle.Body)], body, startsPage)
    {
    }

    private const float RuleGap = 2;
    private const float BelowRule = 1.5f;
    private const float NoteGap = 14;

    private Paragraph NoteBlock => new(Note);

    /// <summary>Nothing but ticks, and so few that they stand in the line of the heading.</summary>
    private TickRow? Inline(ICardSurface surface, float width) =>
        Note.Count == 0 && Body.Blocks is [TickRow row] && surface.Measure(Title, TextStyle.Heading) + NoteGap + row.WidthOf(surface) <= width ? row : null;

    public float Height(ICardSurface surface, float width) =>
        HeadHeight(surface, width) + (Inline(surface, width) is null ? Body.Height(surface, width) : 0);

    public void Draw(ICardSurface surface, Area area)
    {
        var head = HeadHeight(surface, area.Width);
        surface.Text(Title, area.X, area.Y + TextStyle.Heading.Ascent, TextStyle.Heading);
        var beside = TextStyle.Heading.Ascent - TextStyle.Body.Ascent;
        if (Inline(surface, area.Width) is { } row) row.Draw(surface, area with { X = area.Right - row.WidthOf(surface), Width = row.WidthOf(surface) + 1 });
        else if (FitsBeside(surface, area.Width)) NoteBlock.Draw(surface, new Area(area.Right - NoteBlock.WidthOf(surface), area.Y + beside, area.Width, 0));
        else NoteBlock.Draw(surface, new Area(area.X, area.Y + TextStyle.Heading.LineHeight, area.Width, 0));
        var rule = area.Y + head - BelowRule;
        surface.Line(area.X, rule, area.Right, rule, 1.4f);
        if (Inline(surface, area.Width) is null) Body.Draw(surface, new Area(area.X, area.Y + head, area.Width, area.Height - head));
    }

    /// <summary>A caution is never parted from what it warns of.</summary>
    public (IBlock Head, IBlock Tail)? CutAt(ICardSurface surface, float width, float room) =>
        Inline(surface, width) is null && Body.CutAt(surface, width, room - HeadHeight(surface, width)) is { Head: not Stack { Blocks: [CautionBox] } } cut
            ? (this with { Body = (Stack)cut.Head }, this with { Body = (Stack)cut.Tail })
            : null;

    private bool FitsBeside(ICardSurface surface, float width) =>
        surface.Measure(Title, TextStyle.Heading) + NoteGap + NoteBlock.WidthOf(surface) <= width;

    private float HeadHeight(ICardSurface surface, float width)
    {
        if (Inline(surface, width) is { } row) return row.Height(surface, row.WidthOf(surface) + 1) + RuleGap + BelowRule;
        var note = Note.Count == 0 || FitsBeside(surface, width) ? 0 : NoteBlock.Height(surface, width);
        return TextStyle.Heading.LineHeight + note + RuleGap + BelowRule;
    }
}
