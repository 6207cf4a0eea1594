using ClubBench.Planning.Cards;
using ClubBench.Printing.Schematics;
using ClubBench.Printing.Windings;
using Microsoft.AspNetCore.Components;

namespace ClubBench.Web.Bench;

/// <summary>Drawings of the builder's page, the same as on paper.</summary>
internal static class BenchDrawings
{
    public static MarkupString? Schematic(CardContent card, string title) =>
        card.Drawing.Symbols.Count == 0 ? null : new MarkupString(SchematicDrawing.Of(card.Drawing, title, card.Kind).Svg);

    public static MarkupString? Winding(WindingRow winding) => new MarkupString(WindingSketch.Of(winding.Turns, winding.Core, winding.Colour).Svg);
}
