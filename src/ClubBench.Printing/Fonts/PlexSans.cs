using ClubBench.Printing.Layout;
using SkiaSharp;

namespace ClubBench.Printing.Fonts;

/// <summary>The typeface of cards, drawings and plots: IBM Plex Sans, embedded at build. No font of the machine is ever used.</summary>
public static class PlexSans
{
    /// <summary>Family name as drawings ask for it.</summary>
    public const string Family = "IBM Plex Sans";

    private static readonly string[] s_resources =
        ["IBMPlexSans_400Regular.ttf", "IBMPlexSans_500Medium.ttf", "IBMPlexSans_600SemiBold.ttf", "IBMPlexSans_700Bold.ttf"];

    private static readonly Lazy<SKTypeface[]> s_faces = new(() => [.. s_resources.Select(Load)]);

    /// <summary>Width of a text in the units of its size.</summary>
    public static float Measure(string text, float size, FontWeight weight)
    {
        using var font = Font(size, weight);
        return font.MeasureText(text);
    }

    /// <summary>Whether the typeface can show every character of a text, in every weight.</summary>
    public static bool CanShow(string text) =>
        Enum.GetValues<FontWeight>().All(w =>
        {
            using var font = Font(TextStyle.BodySize, w);
            return font.ContainsGlyphs(text);
        });

    internal static SKTypeface Face(FontWeight weight) => s_faces.Value[(int)weight];

    /// <summary>A font whose letters stand where the printer puts them: without linear metrics the spacing is that of a screen.</summary>
    internal static SKFont Font(float size, FontWeight weight) =>
        new(Face(weight), size) { Subpixel = true, LinearMetrics = true, Hinting = SKFontHinting.None };

    /// <summary>The nearest weight there is to a CSS weight.</summary>
    internal static FontWeight Nearest(int cssWeight) => cssWeight switch
    {
        < 450 => FontWeight.Regular,
        < 550 => FontWeight.Medium,
        < 650 => FontWeight.SemiBold,
        _ => FontWeight.Bold,
    };

    private static SKTypeface Load(string resource)
    {
        using var stream = typeof(PlexSans).Assembly.GetManifestResourceStream(resource)
            ?? throw new InvalidOperationException($"The typeface {resource} was not embedded: build the project once with its fonts fetched.");
        using var data = SKData.Create(stream);
        return SKTypeface.FromData(data) ?? throw new InvalidOperationException($"The typeface {resource} cannot be read.");
    }
}
