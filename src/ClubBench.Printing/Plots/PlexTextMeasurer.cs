using ClubBench.Printing.Fonts;
using OxyPlot;

namespace ClubBench.Printing.Plots;

/// <summary>Tells the plotting library how wide a text is in the typeface of the drawing. It draws nothing.</summary>
internal sealed class PlexTextMeasurer : RenderContextBase
{
    public override int ClipCount => 0;

    public override void PushClip(OxyRect clippingRectangle)
    {
    }

    public override void PopClip()
    {
    }

    public override void DrawLine(IList<ScreenPoint> points, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode, double[] dashArray, LineJoin lineJoin)
    {
    }

    public override void DrawPolygon(IList<ScreenPoint> points, OxyColor fill, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode, double[] dashArray, LineJoin lineJoin)
    {
    }

    public override void DrawText(ScreenPoint p, string text, OxyColor fill, string fontFamily, double fontSize, double fontWeight, double rotation, HorizontalAlignment horizontalAlignment, VerticalAlignment verticalAlignment, OxySize? maxSize)
    {
    }

    public override OxySize MeasureText(string text, string fontFamily, double fontSize, double fontWeight) =>
        string.IsNullOrEmpty(text)
            ? OxySize.Empty
            : new OxySize(PlexSans.Measure(text, (float)fontSize, PlexSans.Nearest((int)fontWeight)), fontSize * 1.25);
}
