using ClubBench.Planning.Drawings;
using ClubBench.Printing.Drawings;
using ClubBench.Printing.Fonts;
using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Plots;

/// <summary>A word in the plot: where it starts and how it looks.</summary>
internal readonly record struct PlotText(string Text, float X, float Middle, string Colour, FontWeight Weight);

/// <summary>Finds places for the words at curves, limits and marks, clear of the curves as far as there is room.</summary>
internal sealed class PlotLabels
{
    public const float Size = 13;
    private const float Height = 16;
    private const float Away = 7;

    /// <summary>Steps to the right and down from a mark, for words that find no place close to it.</summary>
    private static readonly float[] s_beside = [Away, 4 * Away, 6 * Away, 9 * Away];

    private static readonly float[] s_below = [2 * Away, 4 * Away, 6 * Away];

    private readonly PlotFrame _frame;
    private readonly LabelPlacer _placer = new();
    private readonly List<PlotText> _texts = [];

    public PlotLabels(Plot plot, PlotFrame frame, string? stageKind)
    {
        _frame = frame;
        foreach (var curve in plot.Curves) TakeCurve(curve);
        foreach (var limit in plot.Limits) TakeLimit(limit);
        foreach (var limit in plot.Limits) AddLimit(limit, PlotWords.Short(limit, stageKind));
        foreach (var mark in plot.Marks) AddMark(mark, PlotWords.Of(plot, mark, stageKind));
        foreach (var curve in plot.Curves) AddCurve(curve, PlotWords.Of(curve, stageKind));
    }

    /// <summary>The words with their places.</summary>
    public IReadOnlyList<PlotText> Texts => _texts;

    private void TakeCurve(Curve curve)
    {
        for (var i = 0; i < curve.X.Count; i++)
            if (curve.Y[i] >= _frame.YLow && curve.Y[i] <= _frame.YHigh) _placer.Take(new Area(_frame.PixelX(curve.X[i]) - 3, _frame.PixelY(curve.Y[i]) - 3, 6, 6));
    }

    private void TakeLimit(LimitLine limit)
    {
        var y = _frame.PixelY(limit.Y);
        var x = _frame.PixelX(limit.FromX);
        _placer.Take(new Area(x, limit.ForbiddenAbove ? y - PlotHatch.Depth : y - 1, _frame.PixelX(limit.ToX) - x, PlotHatch.Depth + 1));
    }

    private void AddMark(PlotMark mark, string text)
    {
        var (x, y) = (_frame.PixelX(mark.X), _frame.PixelY(mark.Y));
        var width = Width(text, FontWeight.SemiBold);
        _placer.Take(new Area(x - 5, y - 5, 10, 10));
        Add(text, Colour.Ink, FontWeight.SemiBold,
        [
            new Area(x + Away, y - Away - Height, width, Height),
            new Area(x - (width / 2), y - Away - Height, width, Height),
            new Area(x - Away - width, y - Away - Height, width, Height),
            new Area(x - Away - width, y + Away, width, Height),
            new Area(x + Away, y + Away, width, Height),
            new Area(x - Away - width, y - (Height / 2), width, Height),
            .. from below in s_below from beside in s_beside select new Area(x + beside, y + below, width, Height),
        ]);
    }

    private void AddLimit(LimitLine limit, string text)
    {
        var width = Width(text, FontWeight.SemiBold);
        var y = _frame.PixelY(limit.Y);
        var allowed = limit.ForbiddenAbove ? y + 4 : y - 4 - Height;
        var (start, end) = (_frame.PixelX(limit.FromX), _frame.PixelX(limit.ToX));
        Add(text, limit.IsWish ? Colour.Wish : Colour.Limit, FontWeight.SemiBold,
        [
            new Area(end - width, allowed, width, Height),
            new Area(((start + end) / 2) - (width / 2), allowed, width, Height),
            new Area(start, allowed, width, Height),
            new Area(end - width, limit.ForbiddenAbove ? y - PlotHatch.Depth - 2 - Height : y + PlotHatch.Depth + 2, width, Height),
        ]);
    }

    /// <summary>Tries places along the curve, the steep middle first, right of it and left of it.</summary>
    private void AddCurve(Curve curve, string text)
    {
        var weight = curve.Style == CurveStyle.Old ? FontWeight.Regular : FontWeight.SemiBold;
        var width = Width(text, weight);
        var places = new List<Area>();
        foreach (var share in new[] { 0.35, 0.5, 0.65, 0.2, 0.8 })
        {
            var wanted = _frame.YHigh + (share * (_frame.YLow - _frame.YHigh));
            var at = Enumerable.Range(0, curve.X.Count).MinBy(i => Math.Abs(curve.Y[i] - wanted));
            var (x, y) = (_frame.PixelX(curve.X[at]), _frame.PixelY(curve.Y[at]));
            places.Add(new Area(x + Away + 3, y - (Height / 2), width, Height));
            places.Add(new Area(x - Away - 3 - width, y - (Height / 2), width, Height));
            places.Add(new Area(x, y - Away - Height, width, Height));
        }
        if (curve.Style == CurveStyle.Old) places = [.. places.OrderBy(p => p.X)];
        Add(text, curve.Style == CurveStyle.Old ? Colour.Old : Colour.Change, weight, places);
    }

    private void Add(string text, string colour, FontWeight weight, IReadOnlyList<Area> places)
    {
        var place = _placer.Place([.. places.Select(Inside)]);
        _texts.Add(new PlotText(text, place.X, place.Middle, colour, weight));
    }

    /// <summary>Pushes a place back into the drawing.</summary>
    private Area Inside(Area place) => place with
    {
        X = Math.Clamp(place.X, _frame.Inner.X + 2, Math.Max(_frame.Inner.X + 2, _frame.Inner.Right - place.Width)),
        Y = Math.Clamp(place.Y, 0, _frame.Inner.Bottom - Height - 1),
    };

    private static float Width(string text, FontWeight weight) => PlexSans.Measure(text, Size, weight) + 2;
}
