using ClubBench.Planning.Cards;
using ClubBench.Planning.Text;

namespace ClubBench.Printing.Sheets;

/// <summary>A figure as it stands on a card.</summary>
/// <param name="Of">What it belongs to: a place, a coil, a point id.</param>
/// <param name="Text">As written, without a line break; U+00A0 where a space must not break.</param>
public readonly record struct CardFigure(string Of, string Text);

/// <summary>Lists every figure a card shows, so that paper, page and interface can be held against each other.</summary>
public static class CardFigures
{
    /// <summary>The figures in the order of the card.</summary>
    public static IReadOnlyList<CardFigure> Of(CardContent content) =>
    [
        .. content.Fit.SelectMany(row => row.Designators.Select(d => new CardFigure(d, CardText.ValueOf(content, row.Part)))),
        .. content.Substitute is { } substitute ? new[] { new CardFigure(substitute.Effect.Name, QuantityText.Format(substitute.Effect)) } : [],
        .. content.Windings.SelectMany(OfWinding),
        .. content.Notes.SupplyLimit is { } limit ? new[] { new CardFigure("supply", QuantityText.Format(limit)) } : [],
        .. CardText.ReadingsAfterFitting(content).SelectMany(r => new[] { new CardFigure(r.Point, ReadingText.Expected(r)), new CardFigure(r.Point, CardText.WindowOf(r)) }),
    ];

    private static IEnumerable<CardFigure> OfWinding(WindingRow winding)
    {
        yield return new CardFigure(winding.Designator, CardText.TurnsOf(winding.Turns));
        yield return new CardFigure(winding.Designator, QuantityText.Format(winding.CutLength));
        if (winding.LinkTurns is { } link) yield return new CardFigure(winding.Designator, CardText.TurnsOf(link));
        if (winding.LinkCutLength is { } cut) yield return new CardFigure(winding.Designator, QuantityText.Format(cut));
        if (winding.Low is not null) yield return new CardFigure(winding.Designator, CardText.WindowOf(winding));
    }
}
