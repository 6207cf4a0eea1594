using System.Globalization;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Text;
using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Sheets;

/// <summary>What leaves the board and what goes in.</summary>
internal static class FitSection
{
    /// <summary>Parts that leave, one box for each sort; their old values stand struck in the drawing. Null where none leaves.</summary>
    public static LeadingTicks? Remove(CardContent content)
    {
        if (content.Remove.Count == 0) return null;
        var items = content.Remove.Select(p => p.Designator).GroupBy(Places.Letters, StringComparer.Ordinal).Select(g => Places.Text([.. g]));
        return new LeadingTicks(Texts.Of("card.remove"), [.. items]);
    }

    /// <summary>The fitting list; null where nothing goes in.</summary>
    public static Section? Of(PrintedCard card)
    {
        var content = card.Content;
        if (content.Fit.Count == 0) return null;
        var columns = new Column[]
        {
            new(Texts.Of("card.place"), 82), new(Texts.Of("card.value"), 164), new(Texts.Of("card.marking"), 142),
            new(Texts.Of("card.pieces"), 52), new(Texts.Of("card.pocket"), 50), new(Texts.Of("card.done"), 36),
        };
        var table = new Table(columns, [.. content.Fit.Select(r => Row(content, r))]);
        return new Section(Texts.Of("card.fit"), Note(card), new Stack(content.Substitute is { } substitute ? [table, new Paragraph(Phrases.Say(substitute, content.Kind), TextStyle.Body)] : [table]));
    }

    private static ICell[] Row(CardContent content, FittingRow row) =>
    [
        new TextCell(Places.Text(row.Designators), TextStyle.Strong),
        new TextCell(CardText.ValueOf(content, row.Part), TextStyle.Key),
        new TextCell(string.Join(" + ", row.MarkingOnPart), TextStyle.Body),
        new TextCell(PiecesOf(row), TextStyle.Body),
        new TextCell(row.Pocket, TextStyle.Body),
        new TickCell(),
    ];

    private static string PiecesOf(FittingRow row) => row.PiecesPerPlace == 1
        ? row.Designators.Count.ToString(CultureInfo.CurrentCulture)
        : Texts.Say("card.piece-each", row.Designators.Count, row.PiecesPerPlace).Replace(' ', '\u00A0');

    /// <summary>Markings that are easily misread stand out before all else.</summary>
    private static Run[] Note(PrintedCard card)
    {
        var notes = new Run(string.Join(' ', Notes(card)), TextStyle.Body);
        var misread = string.Join(' ', LookAlike.Of(card.Content).Select(l => Phrases.Say(l)));
        return misread.Length == 0 ? [notes] : [new Run(misread + " ", TextStyle.Strong), notes];
    }

    /// <summary>Where the parts lie, and the places where another type of part would drift or heat up.</summary>
    private static IEnumerable<string> Notes(PrintedCard card)
    {
        var label = card.Context.BandColour.Length > 0 ? card.Context.BandColour : card.Context.ToBand;
        var tuned = card.Content.Fit.Where(r => r.AsksForItsType).GroupBy(r => r.Part.Type, StringComparer.Ordinal);
        return [.. tuned.Select(g => Texts.Say("card.tuned", Places.Text([.. g.SelectMany(r => r.Designators)]), g.Key)), Texts.Say("card.fit-note", card.Content.Stage, label)];
    }
}
