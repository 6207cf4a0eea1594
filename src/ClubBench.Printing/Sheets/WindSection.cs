using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Text;
using ClubBench.Printing.Layout;
using ClubBench.Printing.Windings;

namespace ClubBench.Printing.Sheets;

/// <summary>The windings to make: how many turns, how much wire, a box for each pass, what the meter should show.</summary>
internal static class WindSection
{
    private const float SketchSize = 50;

    /// <summary>The section; null where nothing is wound.</summary>
    public static Section? Of(PrintedCard card)
    {
        var windings = card.Content.Windings;
        if (windings.Count == 0) return null;
        var wires = string.Join(", ", windings.Select(w => QuantityText.Format(w.WireDiameter.Kind, w.WireDiameter.Si)).Distinct(StringComparer.Ordinal));
        var sketch = WindingSketch.Of(windings[0].Turns, windings[0].Core, windings[0].Colour).Svg;
        var help = new Stack([new Paragraph(Help(windings), TextStyle.Body), Counted(windings)], 2);
        return new Section(
            Texts.Of("card.wind"),
            Texts.Say("card.wind-note", wires),
            new Stack([Rows(card), new TextWithDrawing(help, sketch, SketchSize)], 2));
    }

    private static Table Rows(PrintedCard card)
    {
        var shows = card.Context.Instruments.TryGetValue(InstrumentClass.LcMeter, out var meter) ? Texts.Say("card.shows", meter) : Texts.Of("card.meter-shows");
        var columns = new Column[]
        {
            new(Texts.Of("card.coil"), 34), new(Texts.Of("card.turns"), 46), new(Texts.Of("card.cut"), 80),
            new(Texts.Of("card.passes"), 246), new(shows, 80, TextSide.End), new(Texts.Of("card.yours"), 47, TextSide.End),
        };
        return new Table(columns, [.. card.Content.Windings.SelectMany(RowsOf)]);
    }

    private static IEnumerable<IReadOnlyList<ICell>> RowsOf(WindingRow winding)
    {
        yield return
        [
            new TextCell(winding.Designator, TextStyle.Strong),
            new TextCell(CardText.TurnsOf(winding.Turns).Replace(' ', '\u00A0'), TextStyle.Key),
            new TextCell(QuantityText.Format(winding.CutLength), TextStyle.Key),
            new PassCell(winding.Turns),
            new TextCell(CardText.WindowOf(winding), TextStyle.Body),
            new BlankCell(CardText.UnitOf(winding)),
        ];
        if (winding.LinkTurns is not { } link) yield break;
        yield return
        [
            new TextCell(Texts.Say("card.link", winding.Designator), TextStyle.Strong),
            new TextCell(CardText.TurnsOf(link).Replace(' ', '\u00A0'), TextStyle.Key),
            new TextCell(winding.LinkCutLength is { } cut ? QuantityText.Format(cut) : "", TextStyle.Key),
            new PassCell(link),
            new TextCell("", TextStyle.Body),
            new TextCell("", TextStyle.Body),
        ];
    }

    private static string Help(IReadOnlyList<WindingRow> windings)
    {
        var cores = windings.Where(w => w.Colour.Length > 0).Select(w => Texts.Say("card.core-of", w.Core, w.Colour)).Distinct(StringComparer.Ordinal).ToList();
        var colours = windings.Where(w => w.Colour.Length > 0).Select(w => w.Colour).Distinct(StringComparer.Ordinal).ToList();
        var stop = colours.Count switch
        {
            0 => "",
            1 => " " + Texts.Say("card.core-colour", colours[0]),
            _ => " " + Texts.Say("card.core-colours", string.Join(", ", cores)),
        };
        return Texts.Of("card.spread") + stop;
    }

    private static LeadingTicks Counted(IReadOnlyList<WindingRow> windings) =>
        new(Texts.Of("card.counted"), [.. windings.Select(w => w.Designator)]);
}
