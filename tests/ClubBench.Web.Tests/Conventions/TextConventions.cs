using System.Resources;
using System.Runtime.CompilerServices;
using System.Text.RegularExpressions;
using ClubBench.Web.Texts;

namespace ClubBench.Web.Tests.Conventions;

public sealed class TextConventions
{
    private static readonly Regex Used = new(@"\bL\[([^\]""]*\? )?""(?<key>[a-z][A-Za-z0-9.-]+)""( : ""(?<key>[a-z][A-Za-z0-9.-]+)"")?", RegexOptions.ExplicitCapture, TimeSpan.FromSeconds(1));

    private static string SourceFolder([CallerFilePath] string here = "") => Path.GetFullPath(Path.Combine(Path.GetDirectoryName(here)!, "../../../src/ClubBench.Web"));

    public static TheoryData<string> KeysOfPages()
    {
        var files = Directory.EnumerateFiles(SourceFolder(), "*.razor", SearchOption.AllDirectories).Where(f => File.ReadAllText(f).Contains("IStringLocalizer<PageTexts> L", StringComparison.Ordinal));
        var keys = files.SelectMany(f => Used.Matches(File.ReadAllText(f))).SelectMany(m => m.Groups["key"].Captures).Select(c => c.Value);
        return [.. keys.Distinct(StringComparer.Ordinal).Order(StringComparer.Ordinal)];
    }

    [Theory]
    [MemberData(nameof(KeysOfPages))]
    public void Key_UsedByAPage_HasAText(string key)
    {
        Assert.NotNull(new ResourceManager(typeof(PageTexts).FullName!, typeof(PageTexts).Assembly).GetString(key, System.Globalization.CultureInfo.InvariantCulture));
    }

    [Fact]
    public void KeysOfPages_Scan_FindsKeys() => Assert.True(KeysOfPages().Count > 20);
}
