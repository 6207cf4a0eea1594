using ClubBench.Planning.Cards;
using ClubBench.Planning.Plans;
using ClubBench.Planning.Text;
using ClubBench.Printing.Layout;
using ClubBench.Printing.Schematics;

namespace ClubBench.Printing.Sheets;

/// <summary>The blocks of a card, from why it changed to the signatures. What a stage does not have takes no room.</summary>
internal static class CardBody
{
    /// <summary>With letters larger than this a small drawing only looks clumsy.</summary>
    private const float MostLetterPoints = 16;

    /// <summary>Blocks in order.</summary>
    /// <param name="card">The card.</param>
    /// <param name="picture">Its drawing; null leaves it out.</param>
    public static IReadOnlyList<IBlock> Of(PrintedCard card, CardPicture? picture)
    {
        var content = card.Content;
        var blocks = new List<IBlock?>
        {
            Why(content),
            picture,
            FitSection.Remove(content),
            FitSection.Of(card),
            WindSection.Of(card),
            BeforePower(content),
            MeasureSection.Of(card),
            IfOutside(content),
            CautionOf(content, null),
            SignOff(),
        };
        return [.. blocks.OfType<IBlock>()];
    }

    private static Paragraph? Why(CardContent content)
    {
        var (lead, rest) = content.Action switch
        {
            StageAction.Keep => (Texts.Of("card.keep"), ""),
            StageAction.Check => (Texts.Of("card.why-check"), ""),
            StageAction.Rethink => (Texts.Of("card.why-rethink"), Texts.Of("card.rethink")),
            _ => (Texts.Of("card.why-change"), ""),
        };
        var why = content.Why is null ? "" : Phrases.Say(content.Why, content.Kind);
        if (content.Action != StageAction.Keep && why.Length == 0 && rest.Length == 0) return null;
        var runs = new[] { new Run(lead, TextStyle.Strong), new Run(Spaced(why), TextStyle.Body), new Run(Spaced(rest), TextStyle.Strong) };
        return new Paragraph([.. runs.Where(r => r.Text.Length > 0)]);
    }

    private static string Spaced(string sentence) => sentence.Length == 0 ? "" : " " + sentence;

    /// <summary>The drawing of the stage, no higher than allowed; null where there is nothing to draw.</summary>
    /// <param name="content">The card.</param>
    /// <param name="letterSize">Size of its letters, in drawing units.</param>
    /// <param name="mostHeight">Most height it may take.</param>
    public static CardPicture? Picture(CardContent content, float letterSize, float mostHeight)
    {
        if (content.Drawing.Symbols.Count == 0) return null;
        var drawing = SchematicDrawing.Of(content.Drawing, CardText.TitleOf(content), content.Kind, letterSize);
        var mostScale = MostLetterPoints / letterSize;
        return new CardPicture(new DrawingBlock(drawing.Svg, drawing.Width, drawing.Height, letterSize, mostHeight, mostScale), content.Response, content.Kind);
    }

    private static Section? BeforePower(CardContent content)
    {
        var items = content.Notes.BeforePower.Select(l => Phrases.Say(l, content.Kind)).ToList();
        if (content.Notes.SupplyLimit is { } limit) items.Add(Texts.Say("card.supply-limit", QuantityText.Format(limit)));
        var blocks = new IBlock?[] { CautionOf(content, CardStep.BeforePower), items.Count == 0 ? null : new TickRow(items) }.OfType<IBlock>().ToList();
        return blocks.Count == 0 ? null : new Section(Texts.Of("card.power"), "", new Stack(blocks), startsPage: true);
    }

    private static Section? IfOutside(CardContent content)
    {
        if (content.Notes.IfOutside.Count == 0) return null;
        var steps = content.Notes.IfOutside.Select((l, i) => (IBlock)new NumberedLine(i + 1, Phrases.Say(l, content.Kind)));
        return new Section(Texts.Of("card.outside"), "", new Stack([.. steps]));
    }

    /// <summary>The dangers of a step in one frame, the first one strong; null where it has none.</summary>
    public static CautionBox? CautionOf(CardContent content, CardStep? step)
    {
        var texts = content.Notes.CautionsAt(step).Select(l => Phrases.Say(l, content.Kind)).ToList();
        return texts.Count == 0 ? null : new CautionBox([new Run(texts[0], TextStyle.Strong), .. texts.Skip(1).Select(t => new Run(" " + t, TextStyle.Body))]);
    }

    private static SignOffBoxes SignOff() =>
        new([(Texts.Of("card.signed-by"), 10), (Texts.Of("card.signed-mentor"), 10), (Texts.Of("card.signed-time"), 6)]);
}
