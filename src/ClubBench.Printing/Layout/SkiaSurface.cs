using ClubBench.Printing.Fonts;
using QRCoder;
using SkiaSharp;
using Svg.Skia;

namespace ClubBench.Printing.Layout;

/// <summary>Draws a card set into a PDF. The only place that knows how a PDF is made.</summary>
internal sealed class SkiaSurface : ICardSurface, IDisposable
{
    private readonly MemoryStream _stream = new();
    private readonly SKDocument _document;
    private readonly Dictionary<TextStyle, SKFont> _fonts = [];
    private readonly List<(string Title, int Page)> _bookmarks = [];
    private SKCanvas? _canvas;
    private int _pages;

    /// <param name="title">Document title.</param>
    /// <param name="author">Who hands it out.</param>
    /// <param name="made">Date written into the file; the same date gives the same bytes.</param>
    public SkiaSurface(string title, string author, DateTime made) =>
        _document = SKDocument.CreatePdf(_stream, new SKDocumentPdfMetadata
        {
            Title = title,
            Author = author,
            Creator = "ClubBench",
            Producer = "ClubBench",
            Creation = made,
            Modified = made,
            RasterDpi = 300,
            EncodingQuality = 101,
        });

    private SKCanvas Canvas => _canvas ?? throw new InvalidOperationException("No page has been started.");

    public float Measure(string text, TextStyle style) => Font(style).MeasureText(text);

    public void BeginPage(PaperSize paper, string? bookmark)
    {
        _canvas = _document.BeginPage(paper.Width, paper.Height);
        if (bookmark is not null) _bookmarks.Add((bookmark, _pages));
        _pages++;
    }

    public void EndPage()
    {
        _document.EndPage();
        _canvas = null;
    }

    public void Text(string text, float x, float baseline, TextStyle style)
    {
        using var paint = Fill(style.Shade);
        Canvas.DrawText(text, x, baseline, Side(style.Side), Font(style), paint);
    }

    public void Box(Area area, float stroke, Shade? fill = null)
    {
        var rectangle = new SKRect(area.X, area.Y, area.Right, area.Bottom);
        if (fill is { } shade)
        {
            using var paint = Fill(shade);
            Canvas.DrawRect(rectangle, paint);
        }
        if (stroke <= 0) return;
        using var outline = Stroke(stroke, Shade.Black);
        Canvas.DrawRect(rectangle, outline);
    }

    public void Line(float x1, float y1, float x2, float y2, float stroke, Shade shade = Shade.Black)
    {
        using var paint = Stroke(stroke, shade);
        Canvas.DrawLine(x1, y1, x2, y2, paint);
    }

    public void Svg(string svg, Area area)
    {
        using var drawing = new SKSvg();
        drawing.Settings.TypefaceProviders = [new PlexSansProvider()];
        var picture = drawing.FromSvg(PaperColours.Apply(svg)) ?? throw new ArgumentException("This is no drawing.", nameof(svg));
        var bounds = picture.CullRect;
        var scale = Math.Min(area.Width / bounds.Width, area.Height / bounds.Height);
        Canvas.Save();
        Canvas.Translate(area.X + ((area.Width - (bounds.Width * scale)) / 2), area.Y + ((area.Height - (bounds.Height * scale)) / 2));
        Canvas.Scale(scale);
        Canvas.Translate(-bounds.Left, -bounds.Top);
        Canvas.DrawPicture(picture);
        Canvas.Restore();
    }

    public void Qr(string text, Area area)
    {
        using var code = QRCodeGenerator.GenerateQrCode(text, QRCodeGenerator.ECCLevel.M);
        var rows = code.ModuleMatrix;
        using var path = new SKPathBuilder();
        var module = area.Width / rows.Count;
        for (var row = 0; row < rows.Count; row++)
            for (var column = 0; column < rows.Count; column++)
                if (rows[row][column]) path.AddRect(SKRect.Create(area.X + (column * module), area.Y + (row * module), module, module));
        using var paint = Fill(Shade.Black);
        using var shape = path.Detach();
        Canvas.DrawPath(shape, paint);
    }

    /// <summary>Closes the document and gives its bytes, with one bookmark per card.</summary>
    public byte[] Finish()
    {
        _document.Close();
        return PdfBookmarks.Append(_stream.ToArray(), _bookmarks);
    }

    public void Dispose()
    {
        foreach (var font in _fonts.Values) font.Dispose();
        _document.Dispose();
        _stream.Dispose();
    }

    private static SKPaint Fill(Shade shade) => new() { Color = Colour(shade), Style = SKPaintStyle.Fill, IsAntialias = true };

    private static SKPaint Stroke(float width, Shade shade) =>
        new() { Color = Colour(shade), Style = SKPaintStyle.Stroke, StrokeWidth = width, IsAntialias = true };

    private static SKTextAlign Side(TextSide side) =>
        side switch { TextSide.End => SKTextAlign.Right, TextSide.Middle => SKTextAlign.Center, _ => SKTextAlign.Left };

    private static SKColor Colour(Shade shade) => shade switch
    {
        Shade.White => SKColors.White,
        Shade.Grey => new SKColor(0x55, 0x55, 0x55),
        Shade.Light => new SKColor(0xBB, 0xBB, 0xBB),
        _ => SKColors.Black,
    };

    private SKFont Font(TextStyle style)
    {
        var key = style with { Shade = Shade.Black, Side = TextSide.Start };
        if (!_fonts.TryGetValue(key, out var font)) _fonts[key] = font = PlexSans.Font(style.Size, style.Weight);
        return font;
    }
}
