using System.Collections;
using System.Globalization;
using System.Resources;
using System.Text.RegularExpressions;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Tests.Conventions;

/// <summary>Every code written in the sources has a text, and every text asks only for figures the sources know.</summary>
public partial class TextConventions
{
    private static readonly ResourceManager General = new("ClubBench.Planning.Text.Texts", typeof(Phrases).Assembly);

    [Fact]
    public void Codes_InTheSources_HaveTexts()
    {
        var without =
            from file in PlanningSources.All
            from Match code in Code().Matches(file.Text)
            where !Phrases.Has(code.Groups["code"].Value, KindOf(file))
            select $"{file.Path}: {code.Groups["code"].Value}";

        NoneAreLeft(without);
    }

    [Fact]
    public void Codes_TheScan_FindsThem() =>
        Assert.Contains(PlanningSources.All.SelectMany(f => Code().Matches(f.Text)), m => m.Groups["code"].Value == "advice.read-again");

    [Fact]
    public void Texts_General_AskOnlyForNamesTheSourcesKnow()
    {
        var unknown =
            from text in TextsOf(General)
            from name in Placeholders.In(text.Value)
            where !PlanningSources.Know(name)
            select $"{text.Key}: {name}";

        NoneAreLeft(unknown);
    }

    [Fact]
    public void Texts_OfStageKinds_AskOnlyForNamesTheSourcesKnow()
    {
        var unknown =
            from kind in StageKindList.All
            from text in TextsOf(kind.Texts)
            from name in Placeholders.In(text.Value)
            where !PlanningSources.Know(name)
            select $"{kind.Description.Id} {text.Key}: {name}";

        NoneAreLeft(unknown);
    }

    [Fact]
    public void Texts_All_AreCalmAndCarryNoUnits()
    {
        var loud = TextsOf(General).Where(t => t.Value.Contains('!', StringComparison.Ordinal) || HandWrittenUnit().IsMatch(t.Value)).Select(t => t.Key);

        NoneAreLeft(loud);
    }

    private static void NoneAreLeft(IEnumerable<string> faults)
    {
        var all = string.Join("\n", faults.Distinct(StringComparer.Ordinal));
        Assert.True(all.Length == 0, all);
    }

    /// <summary>The stage kind a source file belongs to: kinds live in folders of their own.</summary>
    private static string? KindOf(PlanningSources.Source file) =>
        StageKindList.All.FirstOrDefault(k => file.Path.StartsWith($"StageKinds/{k.GetType().Namespace!.Split('.')[^1]}/", StringComparison.Ordinal))?.Description.Id;

    private static IEnumerable<(string Key, string Value)> TextsOf(ResourceManager texts) =>
        from DictionaryEntry entry in texts.GetResourceSet(CultureInfo.InvariantCulture, true, true)! select ((string)entry.Key, (string)entry.Value!);

    [GeneratedRegex("\"(?<code>(kit|quantity|budget|judgement|advice|closed-by|plot|set-up|caution|line|worksheet|order|shelf)\\.[a-z0-9][a-z0-9.-]*)\"", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex Code();

    [GeneratedRegex("[0-9}] ?(MHz|kHz|Hz|pF|nF|µF|µH|uH|Ω|ohm|dB|dBm|dBc|mW|W)\\b", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex HandWrittenUnit();
}
