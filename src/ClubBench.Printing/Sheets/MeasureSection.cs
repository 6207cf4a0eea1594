using System.Globalization;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Text;
using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Sheets;

/// <summary>The readings to take once the parts are in.</summary>
internal static class MeasureSection
{
    /// <summary>The section, its dangers first; where nothing is left to read only those, if there are any.</summary>
    public static IBlock? Of(PrintedCard card)
    {
        var caution = CardBody.CautionOf(card.Content, CardStep.Measure);
        var readings = CardText.ReadingsAfterFitting(card.Content).ToList();
        if (readings.Count == 0) return caution;
        var sameSetUp = readings.Select(r => r.SetUp).Distinct(StringComparer.Ordinal).Count() == 1;
        var note = card.Content.Notes.SetUpAll is { } all ? Phrases.Say(all, card.Content.Kind) : sameSetUp ? SetUp(card.Content, readings[0]) : "";
        var columns = new Column[]
        {
            new("", 16), new(Texts.Of("card.what"), 168), new(Texts.Of("card.expect"), 106),
            new(Texts.Of("card.window"), 116), new(Texts.Of("card.yours"), 78), new(Texts.Of("card.meter"), 44),
        };
        var rows = readings.Select((r, i) => Row(card, r, i + 1, note.Length == 0));
        return new Section(Texts.Of("card.measure"), note, new Stack([.. new IBlock?[] { caution, new Table(columns, [.. rows]) }.OfType<IBlock>()]));
    }

    private static string SetUp(CardContent content, ExpectedReading reading) =>
        reading.SetUp.Length == 0 ? "" : Phrases.Say(reading.SetUp, content.Kind);

    private static ICell[] Row(PrintedCard card, ExpectedReading reading, int number, bool withSetUp)
    {
        var what = CardText.PointOf(card.Content, reading);
        var setUp = withSetUp ? SetUp(card.Content, reading) : "";
        return
        [
            new TextCell(number.ToString(CultureInfo.CurrentCulture), TextStyle.Strong),
            setUp.Length == 0 ? new TextCell(what, TextStyle.Body) : new TextCell(Texts.Say("card.what-how", what, setUp), TextStyle.Body),
            new TextCell(ReadingText.Expected(reading), TextStyle.Key),
            new TextCell(CardText.WindowOf(reading), TextStyle.Body),
            new BlankCell(ReadingText.Unit(reading)),
            card.Context.Instruments.TryGetValue(reading.Instrument, out var name) ? new TextCell(name, TextStyle.Body) : new BlankCell(""),
        ];
    }
}
