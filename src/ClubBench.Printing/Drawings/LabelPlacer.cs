using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Drawings;

/// <summary>Finds room for labels: the first of the offered places that is free, else the one that hides least.</summary>
internal sealed class LabelPlacer
{
    private readonly List<Area> _taken = [];

    /// <summary>Everything taken so far.</summary>
    public IReadOnlyList<Area> Taken => _taken;

    /// <summary>Takes an area.</summary>
    public void Take(Area area) => _taken.Add(area);

    /// <summary>Picks a place and takes it. Places stand in order of liking.</summary>
    public Area Place(params IReadOnlyList<Area> places)
    {
        var best = places.MinBy(Hidden);
        _taken.Add(best);
        return best;
    }

    private float Hidden(Area place) => _taken.Sum(t => Overlap(t, place));

    private static float Overlap(Area a, Area b) =>
        Math.Max(0, Math.Min(a.Right, b.Right) - Math.Max(a.X, b.X)) * Math.Max(0, Math.Min(a.Bottom, b.Bottom) - Math.Max(a.Y, b.Y));
}
