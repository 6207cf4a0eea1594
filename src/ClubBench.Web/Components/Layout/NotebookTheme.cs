using MudBlazor;

namespace ClubBench.Web.Components.Layout;

/// <summary>The component library in the notebook's clothes. Colours come from css/tokens.css; here stand letters, corners and the missing shadows.</summary>
internal static class NotebookTheme
{
    private static readonly string[] Face = ["IBM Plex Sans", "system-ui", "sans-serif"];

    public static MudTheme Sheet { get; } = new()
    {
        LayoutProperties = new LayoutProperties { DefaultBorderRadius = "3px" },
        Shadows = new Shadow { Elevation = [.. Enumerable.Repeat("none", new Shadow().Elevation.Length)] },
        Typography = new Typography
        {
            Default = new DefaultTypography { FontFamily = Face, FontSize = "15px", LineHeight = "1.4", LetterSpacing = "normal" },
            Body1 = new Body1Typography { FontFamily = Face, FontSize = "15px", LineHeight = "1.4", LetterSpacing = "normal" },
            Body2 = new Body2Typography { FontFamily = Face, FontSize = "13px", LineHeight = "1.4", LetterSpacing = "normal" },
            Button = new ButtonTypography { FontFamily = Face, FontSize = "15px", FontWeight = "600", TextTransform = "none", LetterSpacing = "normal" },
            Caption = new CaptionTypography { FontFamily = Face, FontSize = "13px", LetterSpacing = "normal" },
        },
    };
}
