using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Sheets;

/// <summary>Build cards as one PDF: the typeface is embedded once, one bookmark leads to each card.</summary>
public static class CardSet
{
    /// <summary>The PDF of one card.</summary>
    public static byte[] Pdf(PrintedCard card) =>
        Pdf([card], Texts.Say("card.title", card.Context.KitName, card.Content.Stage, CardText.TitleOf(card.Content)));

    /// <summary>The PDF of a set. Throws when there is no card.</summary>
    public static byte[] Pdf(IReadOnlyList<PrintedCard> cards)
    {
        if (cards.Count == 0) throw new ArgumentException("A set needs a card.", nameof(cards));
        return Pdf(cards, Texts.Say("card.set-title", cards[0].Context.KitName, cards[0].Context.ToBand));
    }

    private static byte[] Pdf(IReadOnlyList<PrintedCard> cards, string title)
    {
        var context = cards[0].Context;
        using var surface = new SkiaSurface(title, context.ClubName, context.Date.ToDateTime(TimeOnly.MinValue, DateTimeKind.Utc));
        foreach (var card in cards) CardPages.Draw(surface, card);
        return surface.Finish();
    }
}
