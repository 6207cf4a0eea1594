using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Filters;

/// <summary>The inner loop of the search: lossless halves, one product per pair, the best kept.</summary>
internal sealed class LosslessRanking
{
    private readonly CandidatePlaces _places;
    private readonly LowPassDesign _design;
    private readonly bool _symmetric;
    private readonly int _keep;
    private readonly double[] _omega;
    private readonly double[] _mostPassed;
    private readonly int _stops;
    private readonly double _loadRatio;
    private readonly PriorityQueue<int[], double> _best = new();
    private double _bound = double.PositiveInfinity;

    public LosslessRanking(LowPassSearchInput input, CandidatePlaces places)
    {
        (_places, _design, _symmetric, _keep) = (places, input.Exact, input.Symmetric, input.Keep);
        _loadRatio = _design.Load / _design.Source;
        var band = input.Requirement.Band;
        var stops = input.Requirement.Harmonics
            .SelectMany(h => new[] { band.Low, band.High }.Distinct().Select(f => (Frequency: f.Harmonic(h.Harmonic), Limit: 1 / h.Attenuation.PowerRatio))).ToList();
        var reflected = 1 / input.Requirement.ReturnLoss.PowerRatio;

        // Harmonics stand first: they sort out most pairs after one or two products.
        _stops = stops.Count;
        _omega = [.. stops.Select(s => s.Frequency.RadiansPerSecond), .. band.Points(input.PassPoints).Select(f => f.RadiansPerSecond)];
        _mostPassed = [.. stops.Select(s => s.Limit), .. Enumerable.Repeat(reflected, _omega.Length - _stops)];
    }

    /// <summary>The best choices with their margins, in no order.</summary>
    public IReadOnlyList<(int[] Choice, double MarginDb)> Best()
    {
        if (_symmetric) Symmetric();
        else Pairs();
        return [.. _best.UnorderedItems.Select(x => (x.Element, -10 * Math.Log10(-x.Priority)))];
    }

    private void Pairs()
    {
        var middle = _places.Values.Length / 2;
        var left = LosslessHalf.All(_places, _design, _omega, 0, middle);
        var right = LosslessHalf.All(_places, _design, _omega, middle, _places.Values.Length);
        foreach (var a in left)
            foreach (var b in right)
                Consider(a, b);
    }

    private void Symmetric()
    {
        var middle = _places.Values.Length / 2;
        foreach (var a in LosslessHalf.All(_places, _design, _omega, 0, middle + 1))
            Consider(a, LosslessHalf.Of(_places, _design, _omega, middle + 1, a.Choice.Take(middle).Reverse().ToArray()));
    }

    // Every figure is a ratio of powers over its permitted size: the largest of them decides, the margin is its inverse in dB.
    private void Consider(LosslessHalf left, LosslessHalf right)
    {
        var worst = 1e-30;
        for (var i = 0; i < _omega.Length; i++)
        {
            worst = Math.Max(worst, (i < _stops ? left.Passed(right, i, _loadRatio) : left.Reflected(right, i, _loadRatio)) / _mostPassed[i]);
            if (worst >= _bound) return;
        }

        if (_best.Count == _keep) _best.Dequeue();
        _best.Enqueue([.. left.Choice, .. right.Choice], -worst);
        if (_best.Count == _keep && _best.TryPeek(out _, out var last)) _bound = -last;
    }
}
