using System.Globalization;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Text;

namespace ClubBench.Printing.Sheets;

/// <summary>How the figures of a card are written. Every one is written here, so that a test can list them.</summary>
internal static class CardText
{
    /// <summary>Title of the stage.</summary>
    public static string TitleOf(CardContent content) => Phrases.Say("title.short", content.Kind);

    /// <summary>Value of a part.</summary>
    public static string ValueOf(CardContent content, Part part) =>
        PartText.Short(part, StageKindList.Find(content.Kind)?.Description.Role(part.Role)?.Class ?? PartClass.Other, CultureInfo.CurrentCulture).Replace(' ', '\u00A0');

    /// <summary>Turns of a winding.</summary>
    public static string TurnsOf(int turns) => Texts.Say("card.turns-of", turns);

    /// <summary>Inductance window of a winding without its unit; empty where there is none.</summary>
    public static string WindowOf(WindingRow winding) =>
        winding is { Low: { } low, High: { } high } ? QuantityText.FormatSpan(QuantityKind.Inductance, low.Si, high.Si, 3).Split('\u00A0')[0] : "";

    /// <summary>Unit of a winding's window; empty where there is none.</summary>
    public static string UnitOf(WindingRow winding) =>
        winding.High is { } high ? QuantityText.Split(QuantityKind.Inductance, high.Si).Unit : "";

    /// <summary>What to read at a point.</summary>
    public static string PointOf(CardContent content, ExpectedReading reading) => reading.Winding is { } winding
        ? Texts.Say("card.inductance-of", winding.Designator)
        : Phrases.Say("point." + reading.Point[(reading.Point.IndexOf('.', StringComparison.Ordinal) + 1)..], content.Kind);

    /// <summary>The window, by the ends that count.</summary>
    public static string WindowOf(ExpectedReading reading) => reading.Sides switch
    {
        WindowSides.AtMost => Texts.Say("card.at-most", ReadingText.Window(reading)),
        WindowSides.AtLeast => Texts.Say("card.at-least", ReadingText.Window(reading)),
        _ => ReadingText.Window(reading),
    };

    /// <summary>Readings that are not already taken in the winding table.</summary>
    public static IEnumerable<ExpectedReading> ReadingsAfterFitting(CardContent content) =>
        content.Measure.Where(m => m.Winding is not { } w || content.Windings.All(row => row.Designator != w.Designator || row.Low is null));
}
