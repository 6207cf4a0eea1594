using System.Globalization;
using System.Resources;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Text;

/// <summary>
/// Turns codes and figures into words, for pages, paper and interface alike. A stage kind's own texts come first, the general ones after them.
/// Placeholders: <c>{name}</c> is the figure of that name with its unit, <c>{name:4}</c> the same with four digits.
/// </summary>
/// <remarks>A null culture is the current one. A code without text, or a placeholder without figure, is a broken contract and throws.</remarks>
public static class Phrases
{
    private static readonly ResourceManager General = new("ClubBench.Planning.Text.Texts", typeof(Phrases).Assembly);

    /// <summary>What the club has to say about inputs: refusals, conflicts, faulty fields.</summary>
    private static readonly ResourceManager Club = new("ClubBench.Planning.Text.ClubTexts", typeof(Phrases).Assembly);

    /// <summary>Whether a code has a text.</summary>
    public static bool Has(string code, string? stageKindId = null) => Find(code, stageKindId, CultureInfo.InvariantCulture) is not null;

    /// <summary>The text of a code with its figures filled in.</summary>
    public static string Say(string code, IReadOnlyList<Figure> figures, string? stageKindId = null, CultureInfo? culture = null) =>
        Filled(code, figures, [], stageKindId, culture);

    /// <summary>The text of a code without figures.</summary>
    public static string Say(string code, string? stageKindId = null, CultureInfo? culture = null) => Filled(code, [], [], stageKindId, culture);

    /// <summary>A finding in words; {stage} and {part} name where it stands.</summary>
    public static string Say(Finding finding, string? stageKindId = null, CultureInfo? culture = null) =>
        Filled(finding.Code, finding.Figures, new() { ["stage"] = finding.Stage, ["part"] = finding.Designator ?? finding.Stage }, stageKindId, culture);

    /// <summary>A line of a card in words.</summary>
    public static string Say(Line line, string? stageKindId = null, CultureInfo? culture = null) => Filled(line.Code, line.Figures, [], stageKindId, culture);

    /// <summary>A marking and what it is easily mistaken for, in words.</summary>
    public static string Say(LookAlike lookAlike, CultureInfo? culture = null)
    {
        var words = new Dictionary<string, string>(StringComparer.Ordinal)
        {
            ["marking"] = lookAlike.Marking,
            ["value"] = QuantityText.Format(QuantityKind.Capacitance, lookAlike.Value.Farad, null, culture),
            ["other"] = lookAlike.Other ?? "",
            ["other-value"] = QuantityText.Format(QuantityKind.Capacitance, lookAlike.OtherValue.Farad, null, culture),
        };
        return Filled(lookAlike.Other is null ? "look-alike.digits" : "look-alike.pair", [], words, null, culture);
    }

    /// <summary>What may go in instead and what it changes, in words.</summary>
    public static string Say(Substitute substitute, string stageKindId, CultureInfo? culture = null)
    {
        var sorts = Substitute.Sorts(substitute.Changes);
        var words = new Dictionary<string, string>(StringComparer.Ordinal)
        {
            ["figure"] = NameOf(substitute.Effect, stageKindId, culture),
            ["effect"] = QuantityText.Format(substitute.Effect, culture),
        };
        (words["places"], words["instead"]) = Words(sorts[0]);
        if (sorts.Count > 1) (words["other-places"], words["other-instead"]) = Words(sorts[1]);
        return Filled(sorts.Count == 1 ? "substitute.one" : "substitute.two", [], words, stageKindId, culture);

        (string, string) Words(IReadOnlyList<PartChange> sort) => (string.Join(", ", sort.Select(c => c.Designator)), Value(sort[0].After));

        string Value(Part? part) => part is null ? "" : PartText.Short(part, StageKindList.Get(stageKindId).Description.Role(part.Role)?.Class ?? PartClass.Other, culture ?? CultureInfo.CurrentCulture).Replace(' ', '\u00A0');
    }

    /// <summary>A step of advice in words.</summary>
    public static string Say(Step step, string? stageKindId = null, CultureInfo? culture = null) => Filled(step.Code, step.Figures, [], stageKindId, culture);

    /// <summary>A message about an input field in words.</summary>
    public static string Say(FieldMessage message, string? stageKindId = null, CultureInfo? culture = null) =>
        Filled(message.Code, [], new(message.Arguments, StringComparer.Ordinal), stageKindId, culture);

    /// <summary>What an open item is about.</summary>
    public static string Say(OpenItem item, string? stageKindId = null, CultureInfo? culture = null) =>
        Filled("open-item." + item.Code, [], new() { ["stage"] = item.Stage }, stageKindId, culture);

    /// <summary>An alternative in words, from its id: what stands behind the colon ("choke:6.8uH") is {what}.</summary>
    public static string SayAlternative(string id, string? stageKindId = null, CultureInfo? culture = null)
    {
        var parts = id.Split(':', 2);
        return Filled("alternative." + parts[0], [], new() { ["what"] = Detail(parts[^1], culture) }, stageKindId, culture);
    }

    /// <summary>Ids carry values in plain letters; people read them as values.</summary>
    private static string Detail(string detail, CultureInfo? culture) =>
        detail.EndsWith("uH", StringComparison.Ordinal) && QuantityText.Parse(detail, QuantityKind.Inductance) is { Succeeded: true } parsed
            ? QuantityText.Format(QuantityKind.Inductance, parsed.Value.Si, null, culture)
            : detail.Replace(':', ' ');

    /// <summary>The label of a figure.</summary>
    public static string NameOf(Figure figure, string? stageKindId = null, CultureInfo? culture = null) =>
        Say("figure." + figure.Name, stageKindId, culture);

    /// <summary>The word of an enumeration's member; its code is type and member in small letters ("stage-action.keep").</summary>
    public static string Word<T>(T value, CultureInfo? culture = null)
        where T : struct, Enum => Say(CodeOf(value), [], null, culture);

    /// <summary>The code of an enumeration's member.</summary>
    public static string CodeOf<T>(T value)
        where T : struct, Enum => $"{Placeholders.Dashed(typeof(T).Name)}.{Placeholders.Dashed(value.ToString())}";

    /// <summary>Where a figure or method comes from: publication, place in it, and the trust it deserves.</summary>
    public static string Source(SourceRef source, CultureInfo? culture = null)
    {
        var publication = Sources.Find(source.SourceId);
        var arguments = new Dictionary<string, string>(StringComparer.Ordinal)
        {
            ["title"] = publication is null ? source.SourceId : string.Join(", ", new[] { publication.Issuer, publication.Title, publication.Edition, publication.Year }.Where(t => t.Length > 0)),
            ["place"] = source.Locator,
        };
        return Filled(CodeOf(source.Status) + (source.Locator.Length > 0 ? ".at" : ""), [], arguments, null, culture);
    }

    private static string Filled(string code, IReadOnlyList<Figure> figures, Dictionary<string, string> words, string? stageKindId, CultureInfo? culture)
    {
        var to = culture ?? CultureInfo.CurrentCulture;
        var text = Find(code, stageKindId, to) ?? throw new KeyNotFoundException($"There is no text for '{code}'{(stageKindId is null ? "" : $" of {stageKindId}")}.");
        return Placeholders.Fill(text, (name, digits) => words.GetValueOrDefault(name) ?? Written(name, digits, figures, to)
            ?? throw new KeyNotFoundException($"The text '{code}' wants the figure '{name}'."));
    }

    private static string? Written(string name, int? digits, IReadOnlyList<Figure> figures, CultureInfo culture) =>
        figures.FirstOrDefault(f => f.Name == name) is { } figure ? QuantityText.Format(figure with { Digits = digits ?? figure.Digits }, culture) : null;

    private static string? Find(string code, string? stageKindId, CultureInfo culture) =>
        (stageKindId is null ? null : StageKindList.Find(stageKindId)?.Texts.GetString(code, culture)) ?? General.GetString(code, culture) ?? Club.GetString(code, culture);
}
