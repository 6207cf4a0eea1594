using System.Collections;
using System.Globalization;
using System.Resources;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Text;
using ClubBench.Printing.Fonts;
using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Tests.Fonts;

public class PlexSansTests
{
    [Fact]
    public void CanShow_EveryTextOfCardsPlansAndStageKinds_HasItsGlyphs()
    {
        var planning = new ResourceManager("ClubBench.Planning.Text.Texts", typeof(Phrases).Assembly);
        var texts = new[] { Texts.Resource, planning }.Concat(StageKindList.All.Select(k => k.Texts)).SelectMany(TextsOf).ToList();

        Assert.True(texts.Count > 100);
        Assert.All(texts, t => Assert.True(PlexSans.CanShow(t), t));
    }

    [Theory]
    [InlineData("Ω µ ° → − – · ± × ≤ ≥ ² Ł ß é", true)]
    [InlineData("\u26A0", false)]
    public void CanShow_Characters_TellsWhatIsMissing(string text, bool expected) => Assert.Equal(expected, PlexSans.CanShow(text));

    [Fact]
    public void Measure_Bold_IsWiderThanRegular() =>
        Assert.True(PlexSans.Measure("180 + 22 pF", 18, FontWeight.Bold) > PlexSans.Measure("180 + 22 pF", 18, FontWeight.Regular));

    private static IEnumerable<string> TextsOf(ResourceManager resource) =>
        resource.GetResourceSet(CultureInfo.InvariantCulture, true, true)!.Cast<DictionaryEntry>().Select(e => (string)e.Value!);
}
