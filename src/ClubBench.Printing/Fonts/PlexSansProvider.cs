using SkiaSharp;
using Svg.Skia.TypefaceProviders;

namespace ClubBench.Printing.Fonts;

/// <summary>Gives drawings the embedded typeface whatever family they ask for; without it their text would vanish without a word.</summary>
internal sealed class PlexSansProvider : ITypefaceProvider
{
    public SKTypeface? FromFamilyName(string fontFamily, SKFontStyleWeight fontWeight, SKFontStyleWidth fontWidth, SKFontStyleSlant fontStyle) =>
        PlexSans.Face(PlexSans.Nearest((int)fontWeight));
}
