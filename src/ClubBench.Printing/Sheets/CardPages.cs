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

    /// <summary>Gaps between blocks from roomy to tight.</summary>
    private static readonly float[] s_gaps = [11, 8, 5, 3, 2, 1];

    /// <summary>Sizes of a drawing's letters beside symbols of the same size: the larger, the less room the drawing needs until it can be read.</summary>
    private static readonly float[] s_letterSizes = [SchematicLabels.UsualSize, 14, 16, 18, 20];

    /// <summary>Smallest letter of a drawing that can be read at arm's length.</summary>
    public const float LeastLetterPoints = 9;

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

    /// <summary>
    /// The drawing takes the room the rest leaves it. The first letter size and gap that fit one page with legible letters are taken; where none are,
    /// those with the largest letters; where nothing fits one page, two pages, roomy.
    /// </summary>
    private static IReadOnlyList<Stack> Broken(ICardSurface surface, PrintedCard card, Area body)
    {
        (IReadOnlyList<Stack>? Pages, float Points) best = (null, -1);
        foreach (var letterSize in s_letterSizes)
        {
            var picture = CardBody.Picture(card.Content, letterSize, body.Height * DrawingShare);
            foreach (var gap in s_gaps)
            {
                var room = body.Height - gap - new Stack(CardBody.Of(card, null), gap).Height(surface, body.Width);
                var fitting = picture?.NoHigherThan(Math.Max(room, LeastDrawing));
                var pages = PageBreaks.Of(surface, CardBody.Of(card, fitting), gap, body.Width, body.Height);
                var points = fitting?.LetterPoints(body.Width) ?? LeastLetterPoints;
                if (pages.Count > 1) continue;
                if (points >= LeastLetterPoints) return pages;
                if (points > best.Points) best = (pages, points);
            }
        }

        return best.Pages ?? PageBreaks.Of(surface, CardBody.Of(card, CardBody.Picture(card.Content, SchematicLabels.UsualSize, body.Height * DrawingShare)), s_gaps[0], body.Width, body.Height);
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
