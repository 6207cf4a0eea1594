using System.Globalization;
using System.Text.RegularExpressions;

namespace ClubBench.Planning.Text;

/// <summary>Placeholders of texts: <c>{name}</c> or <c>{name:digits}</c>, names in small letters, digits, points and dashes.</summary>
internal static partial class Placeholders
{
    /// <summary>The text with every placeholder replaced.</summary>
    public static string Fill(string text, Func<string, int?, string> value) =>
        Pattern().Replace(text, m => value(m.Groups["name"].Value, m.Groups["digits"].Success ? int.Parse(m.Groups["digits"].Value, CultureInfo.InvariantCulture) : null));

    /// <summary>Names a text asks for.</summary>
    public static IEnumerable<string> In(string text) => Pattern().Matches(text).Select(m => m.Groups["name"].Value);

    /// <summary>A name of code in small letters with dashes: LcMeter is lc-meter.</summary>
    public static string Dashed(string name) => WordStart().Replace(name, "-").ToLowerInvariant();

    [GeneratedRegex(@"\{(?<name>[a-z0-9][a-z0-9.\-]*)(:(?<digits>[1-9]))?\}", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex Pattern();

    [GeneratedRegex("(?<=[a-z0-9])(?=[A-Z])", RegexOptions.None, 1000)]
    private static partial Regex WordStart();
}
