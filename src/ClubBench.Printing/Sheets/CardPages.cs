using ClubBench.Printing.Layout;
using ClubBench.Printing.Schematics;

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

    /// <summary>Gaps between blocks from roomy to tight. The first that leaves the drawing enough room to be read is taken.</summary>
    private static readonly float[] s_gaps = [11, 8, 5, 3, 2];

    /// <summary>Share of the page a drawing may take.</summary>
    private const float DrawingShare = 1 / 3f;

    /// <summary>Least height of a drawing; below it only the fitting list can be read.</summary>
    private const float LeastDrawing = 70;

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

    /// <summary>The drawing takes the room the rest leaves it. Where no gap leaves enough, the tightest that still fits one page; else two pages, roomy.</summary>
    private static IReadOnlyList<Stack> Broken(ICardSurface surface, PrintedCard card, Area body)
    {
        var drawing = CardBody.Drawing(card.Content, body.Height * DrawingShare);
        var wanted = drawing is null ? 0 : Math.Min(drawing.Height(surface, body.Width), drawing.NaturalHeight * SchematicDrawing.LegibleScale);
        IReadOnlyList<Stack>? fitting = null;
        foreach (var gap in s_gaps)
        {
            var room = body.Height - gap - new Stack(CardBody.Of(card, null), gap).Height(surface, body.Width);
            var pages = PageBreaks.Of(surface, CardBody.Of(card, drawing?.NoHigherThan(Math.Max(room, LeastDrawing))), gap, body.Width, body.Height);
            if (pages.Count > 1) continue;
            fitting = pages;
            if (room >= wanted) break;
        }
        return fitting ?? PageBreaks.Of(surface, CardBody.Of(card, drawing), s_gaps[0], body.Width, body.Height);
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
