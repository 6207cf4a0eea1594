using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Filters;

/// <summary>The inner loop of the search: every pair of parts of the ladder against the limits of the best so far.</summary>
internal sealed class LosslessRanking
{
    private readonly SplitLadder _ladders;
    private readonly int _keep;
    private readonly int _stops;
    private readonly double[] _permitted;
    private readonly double[] _limits;
    private readonly PriorityQueue<(int Left, int Right), double> _best = new();
    private double _bound = double.PositiveInfinity;
    private int _hardest;

    public LosslessRanking(LowPassSearchInput input, CandidatePlaces places)
    {
        var band = input.Requirement.Band;
        var stops = input.Requirement.Harmonics
            .SelectMany(h => new[] { band.Low, band.High }.Distinct().Select(f => (Frequency: f.Harmonic(h.Harmonic), Limit: 1 / h.Attenuation.PowerRatio))).ToList();
        double[] omega = [.. stops.Select(s => s.Frequency.RadiansPerSecond), .. band.Points(input.PassPoints).Select(f => f.RadiansPerSecond)];
        (_keep, _stops) = (input.Keep, stops.Count);
        _permitted = [.. stops.Select(s => s.Limit), .. Enumerable.Repeat(1 / input.Requirement.ReturnLoss.PowerRatio, omega.Length - _stops)];
        _limits = new double[omega.Length];
        _ladders = input.Symmetric ? SplitLadder.Mirrored(places, input.Exact, omega) : SplitLadder.Whole(places, input.Exact, omega);
        Tighten(_bound);
    }

    /// <summary>The best choices with their margins, in no order.</summary>
    public IReadOnlyList<(int[] Choice, double MarginDb)> Best(IProgress<double>? progress, CancellationToken cancellation)
    {
        for (var left = 0; left < _ladders.Lefts; left++)
        {
            cancellation.ThrowIfCancellationRequested();
            progress?.Report((double)left / _ladders.Lefts);
            for (var right = 0; right < _ladders.Rights; right++)
                if (IsWithin(left, right)) Consider(left, right);
        }

        return [.. _best.UnorderedItems.Select(x => (_ladders.Choice(x.Element.Left, x.Element.Right), -10 * Math.Log10(-x.Priority)))];
    }

    // What sorted out the last pair mostly sorts out the next: neighbours differ by one part.
    private bool IsWithin(int left, int right)
    {
        if (IsBeyond(_hardest, left, right)) return false;
        for (var i = 0; i < _limits.Length; i++)
        {
            if (!IsBeyond(i, left, right)) continue;
            _hardest = i;
            return false;
        }

        return true;
    }

    private bool IsBeyond(int i, int left, int right)
    {
        var k = _ladders.CharacteristicSquared(i, left, right);
        return i < _stops ? k < _limits[i] : k > _limits[i];
    }

    // Every figure is a share of power over its permitted size: the largest of them decides, the margin is its inverse in dB.
    private void Consider(int left, int right)
    {
        var worst = 1e-30;
        for (var i = 0; i < _limits.Length; i++)
        {
            var k = _ladders.CharacteristicSquared(i, left, right);
            worst = Math.Max(worst, (i < _stops ? 1 : k) / (1 + k) / _permitted[i]);
        }

        if (worst >= _bound) return;
        if (_best.Count == _keep) _best.Dequeue();
        _best.Enqueue((left, right), -worst);
        if (_best.Count == _keep && _best.TryPeek(out _, out var last)) Tighten(-last);
    }

    // The bound as limits of |K|^2, a rounding error wide, so that sorting out needs no division.
    private void Tighten(double bound)
    {
        const double Rounding = 1e-9;
        _bound = bound;
        for (var i = 0; i < _limits.Length; i++)
        {
            var share = bound * _permitted[i];
            if (i < _stops) _limits[i] = ((1 / share) - 1) * (1 - Rounding);
            else _limits[i] = share < 1 ? share / (1 - share) * (1 + Rounding) : double.PositiveInfinity;
        }
    }
}
