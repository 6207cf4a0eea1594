using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.BandPass;

/// <summary>Where a band-pass passes and what it costs.</summary>
/// <remarks>
/// Method: steps of a two-hundredth of the bandwidth, the peak refined by golden section, the outermost half-power points by bisection to 1e-9.
/// Valid: a single pass-band within the given half width of the centre.
/// Source: derived.
/// </remarks>
/// <param name="Peak">Frequency of least loss.</param>
/// <param name="PeakLoss">Least loss.</param>
/// <param name="Band">Outermost frequencies that pass half of what the peak passes.</param>
public sealed record BandPassResponse(Frequency Peak, Decibels PeakLoss, FrequencyRange Band)
{
    private const int StepsPerBandwidth = 200;
    private static readonly Decibels HalfPower = Decibels.FromPowerRatio(2);

    /// <summary>Geometric middle of the half-power points.</summary>
    public Frequency Center => Frequency.FromHertz(Math.Sqrt(Band.Low.Hertz * Band.High.Hertz));

    /// <summary>Finds the pass-band of a loss curve.</summary>
    /// <param name="loss">Loss at a frequency.</param>
    /// <param name="center">Where to look.</param>
    /// <param name="bandwidth">Expected bandwidth; twice it is searched on each side.</param>
    /// <returns>The response, or null where the half-power points lie outside what was searched.</returns>
    public static BandPassResponse? Of(Func<Frequency, Decibels> loss, Frequency center, Frequency bandwidth)
    {
        var step = bandwidth.Hertz / StepsPerBandwidth;
        var lowest = Math.Max(center.Hertz - (2 * bandwidth.Hertz), step);
        var grid = Enumerable.Range(0, (int)((center.Hertz + (2 * bandwidth.Hertz) - lowest) / step)).Select(i => Frequency.FromHertz(lowest + (i * step))).ToList();
        var losses = grid.ConvertAll(f => loss(f).Db);
        var best = losses.IndexOf(losses.Min());
        if (best == 0 || best == grid.Count - 1) return null;
        var peak = GoldenSection(f => loss(f).Db, grid[best - 1], grid[best + 1]);
        var limit = loss(peak).Db + HalfPower.Db;
        var (first, last) = (losses.FindIndex(d => d <= limit), losses.FindLastIndex(d => d <= limit));
        if (first == 0 || last == grid.Count - 1) return null;
        return new(peak, loss(peak), new(Edge(loss, limit, grid[first], grid[first - 1]), Edge(loss, limit, grid[last], grid[last + 1])));
    }

    private static Frequency Edge(Func<Frequency, Decibels> loss, double limit, Frequency inside, Frequency outside)
    {
        while (Math.Abs(outside / inside - 1) > 1e-9)
        {
            var middle = Frequency.FromHertz(0.5 * (inside.Hertz + outside.Hertz));
            (inside, outside) = loss(middle).Db <= limit ? (middle, outside) : (inside, middle);
        }

        return inside;
    }

    private static Frequency GoldenSection(Func<Frequency, double> loss, Frequency low, Frequency high)
    {
        var share = (Math.Sqrt(5) - 1) / 2;
        var (a, b) = (low.Hertz, high.Hertz);
        while (b - a > 1e-9 * b)
        {
            var (left, right) = (b - (share * (b - a)), a + (share * (b - a)));
            (a, b) = loss(Frequency.FromHertz(left)) < loss(Frequency.FromHertz(right)) ? (a, right) : (left, b);
        }

        return Frequency.FromHertz(0.5 * (a + b));
    }
}
