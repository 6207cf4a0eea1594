using System.Globalization;
using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Sheets;

/// <summary>The strip at the head of every page of a card: black tag, what it is, whose, which print, and the way to its page.</summary>
internal sealed record CardHeader(PrintedCard Card)
{
    public const float Height = 66;
    private const float TagWidth = 74;
    private const float BoardWidth = 76;
    private const float PrintWidth = 96;
    private const float Padding = 6;

    private CardContext Context => Card.Context;

    public void Draw(ICardSurface surface, Area area, int page, int pages)
    {
        var tag = area with { Width = TagWidth };
        var code = new Area(area.Right - Height, area.Y, Height, Height);
        var print = new Area(code.X - PrintWidth, area.Y, PrintWidth, Height);
        var board = new Area(print.X - BoardWidth, area.Y, BoardWidth, Height);
        var title = new Area(tag.Right, area.Y, board.X - tag.Right, Height);
        surface.Box(area with { Height = Height }, 1.4f);
        surface.Box(tag, 0, Shade.Black);
        foreach (var x in new[] { board.X, print.X, code.X }) surface.Line(x, area.Y, x, area.Y + Height, 0.8f);
        DrawTag(surface, tag);
        DrawTitle(surface, title);
        DrawBoard(surface, board);
        DrawPrint(surface, print, page, pages);
        surface.Qr(Context.CardAddress, code.Inset(2));
    }

    private void DrawTag(ICardSurface surface, Area area)
    {
        var band = Context.BandColour.Length == 0 ? Context.ToBand : Texts.Say("card.band", Context.ToBand, Context.BandColour);
        surface.Text(band, area.X + Padding, area.Y + 18, new TextStyle(Fitting(surface, band, area.Width - (2 * Padding)), FontWeight.Regular, Shade.White));
        surface.Text(Card.Content.Stage, area.X + Padding, area.Y + 50, new TextStyle(28, FontWeight.Bold, Shade.White));
    }

    private void DrawTitle(ICardSurface surface, Area area)
    {
        var x = area.X + Padding + 2;
        surface.Text(CardText.TitleOf(Card.Content), x, area.Y + 23, new TextStyle(20, FontWeight.Bold));
        surface.Text(Texts.Say("card.kit", Context.KitName, Context.BoardIssue), x, area.Y + 42, TextStyle.Body);
        surface.Text(Texts.Say("card.move", Context.FromBand, Context.ToBand), x, area.Y + 58, TextStyle.Body);
    }

    private void DrawBoard(ICardSurface surface, Area area)
    {
        var x = area.X + Padding;
        surface.Text(Texts.Of("card.board"), x, area.Y + 16, TextStyle.Body);
        if (Context.BoardNumber is { } number) surface.Text(number, x, area.Y + 39, new TextStyle(20, FontWeight.Bold));
        else surface.Line(x, area.Y + 41, area.Right - Padding, area.Y + 41, 0.9f);
        surface.Text(Context.Tag is { } tag ? Texts.Say("card.tag", tag) : Texts.Of("card.tag-blank"), x, area.Y + 58, TextStyle.Body);
        if (Context.Tag is null) surface.Line(x + 26, area.Y + 61, area.Right - Padding, area.Y + 61, 0.9f);
    }

    private void DrawPrint(ICardSurface surface, Area area, int page, int pages)
    {
        var x = area.X + Padding;
        surface.Text(Texts.Say("card.number", Card.Content.Stage, Context.CardNumber), x, area.Y + 16, TextStyle.Strong);
        surface.Text(Texts.Say("card.plan", Context.PlanNumber), x, area.Y + 31, TextStyle.Strong);
        surface.Text(Context.Date.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture), x, area.Y + 46, TextStyle.Body);
        surface.Text(Texts.Say("card.page", page, pages), x, area.Y + 61, TextStyle.Body);
    }

    /// <summary>Shrinks a colour name that is too long rather than letting it run into the title; never below the body size.</summary>
    private static float Fitting(ICardSurface surface, string text, float room)
    {
        const float liked = 13;
        var width = surface.Measure(text, new TextStyle(liked));
        return Math.Max(TextStyle.BodySize, Math.Min(liked, liked * room / width));
    }
}
