using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Sheets;

/// <summary>Lays a card out on its pages and draws them.</summary>
internal static class CardPages
{
    /// <summary>Free left edge for the thumb that holds the card.</summary>
    public static float LeftMargin { get; } = PaperSize.Millimetres(14);

    private static readonly float s_rightMargin = PaperSize.Millimetres(8);
    private static readonly float s_topMargin = PaperSize.Millimetres(7);
    private static readonly float s_bottomMargin = PaperSize.Millimetres(6);
    private const float FooterHeight = 15;
    private const float BelowHeader = 6;

    /// <summary>Spacings from roomy to tight: gap between blocks and most height of the drawing. The first that fits one page is taken.</summary>
    private static readonly (float Gap, float Drawing)[] s_spacings = [(11, 165), (8, 125), (5, 110), (3, 95), (3, 78)];

    /// <summary>Draws the card.</summary>
    public static void Draw(ICardSurface surface, PrintedCard card)
    {
        var paper = card.Context.Paper;
        var body = new Area(
            LeftMargin,
            s_topMargin + CardHeader.Height + BelowHeader,
            paper.Width - LeftMargin - s_rightMargin,
            paper.Height - s_topMargin - s_bottomMargin - CardHeader.Height - BelowHeader - FooterHeight);
        var pages = Broken(surface, card, body);
        for (var i = 0; i < pages.Count; i++)
        {
            surface.BeginPage(paper, i == 0 ? Texts.Say("card.bookmark", card.Content.Stage, CardText.TitleOf(card.Content)) : null);
            new CardHeader(card).Draw(surface, new Area(body.X, s_topMargin, body.Width, CardHeader.Height), i + 1, pages.Count);
            pages[i].Draw(surface, body);
            DrawFooter(surface, card, body, i + 1, pages.Count);
            surface.EndPage();
        }
    }

    private static IReadOnlyList<Stack> Broken(ICardSurface surface, PrintedCard card, Area body)
    {
        var tries = s_spacings.Select(s => PageBreaks.Of(surface, CardBody.Of(card, s.Drawing), s.Gap, body.Width, body.Height));
        IReadOnlyList<Stack>? roomy = null;
        foreach (var pages in tries)
        {
            if (pages.Count == 1) return pages;
            roomy ??= pages;
        }
        return roomy!;
    }

    private static void DrawFooter(ICardSurface surface, PrintedCard card, Area body, int page, int pages)
    {
        var context = card.Context;
        var baseline = context.Paper.Height - s_bottomMargin;
        var board = context.BoardNumber ?? Texts.Of("card.board-blank");
        var left = Texts.Say("card.footer", context.KitName, context.ToBand, board, card.Content.Stage, context.CardNumber, context.PlanNumber);
        surface.Text(left, body.X, baseline, TextStyle.Body);
        surface.Text(context.ClubName, (body.X + surface.Measure(left, TextStyle.Body) + body.Right - 60) / 2, baseline, TextStyle.Body with { Side = TextSide.Middle });
        surface.Text(Texts.Say("card.page", page, pages), body.Right, baseline, TextStyle.Body with { Side = TextSide.End });
    }
}
