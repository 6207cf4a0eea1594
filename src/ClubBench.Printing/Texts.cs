using System.Globalization;
using System.Resources;

namespace ClubBench.Printing;

/// <summary>Words of cards and drawings that do not come from a plan. Whole sentences with numbered gaps, in the reader's language.</summary>
internal static class Texts
{
    /// <summary>The resource that holds them.</summary>
    public static ResourceManager Resource { get; } = new("ClubBench.Printing.Texts", typeof(Texts).Assembly);

    /// <summary>The text of a key. Throws when there is none.</summary>
    public static string Of(string key) =>
        Resource.GetString(key, CultureInfo.CurrentUICulture) ?? throw new KeyNotFoundException($"There is no text \"{key}\".");

    /// <summary>The text of a key with its gaps filled.</summary>
    public static string Say(string key, params object[] gaps) => string.Format(CultureInfo.CurrentCulture, Of(key), gaps);
}
