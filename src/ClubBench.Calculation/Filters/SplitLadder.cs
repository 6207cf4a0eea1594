namespace ClubBench.Calculation.Filters;

/// <summary>All ladders of a search cut into two parts, so that a pair costs two products of four numbers per frequency.</summary>
/// <remarks>
/// Method: the characteristic function K, with 1/transmitted = 1 + |K|^2 and reflected/transmitted = |K|^2 (Feldtkeller).
/// K = ((A r - D) + j (B - C r)) / (2 sqrt r), r the load in source resistances, is linear in the chain matrix of either part.
/// A mirrored ladder is cut into its outer places, met again as their mirror image, and the core between them.
/// Valid: lossless ladders. Source: derived.
/// </remarks>
internal sealed class SplitLadder
{
    private readonly List<int[]> _left;
    private readonly List<int[]> _right;
    private readonly bool _mirrored;
    private readonly double[][] _real;
    private readonly double[][] _imaginary;
    private readonly double[][] _factors;

    private SplitLadder(List<LosslessHalf> left, List<LosslessHalf> right, int frequencies, bool mirrored, Row real, Row imaginary, Row factors)
    {
        (_left, _right, _mirrored) = ([.. left.Select(h => h.Choice)], [.. right.Select(h => h.Choice)], mirrored);
        (_real, _imaginary, _factors) = (Rows(left, frequencies, real), Rows(left, frequencies, imaginary), Rows(right, frequencies, factors));
    }

    private delegate (double First, double Second, double Third, double Fourth) Row(double a, double b, double c, double d);

    public int Lefts => _left.Count;

    public int Rights => _right.Count;

    /// <summary>Every ladder of the candidates, cut in the middle.</summary>
    public static SplitLadder Whole(CandidatePlaces places, LowPassDesign design, double[] omega)
    {
        var (order, r, s) = (places.Values.Length, LoadRatio(design), Scale(design));
        return new SplitLadder(
            LosslessHalf.All(places, design, omega, 0, order / 2),
            LosslessHalf.All(places, design, omega, order / 2, order),
            omega.Length,
            mirrored: false,
            (a, b, c, d) => (s * a, s * c, -s * b, -s * d),
            (a, b, c, d) => (-s * c, s * a, -s * d, s * b),
            (a, b, c, d) => (r * a, b, r * c, d));
    }

    /// <summary>Only the ladders of odd order whose halves mirror each other.</summary>
    public static SplitLadder Mirrored(CandidatePlaces places, LowPassDesign design, double[] omega)
    {
        var (middle, r, s) = (places.Values.Length / 2, LoadRatio(design), Scale(design));
        var outer = (middle + 1) / 2;
        var cores = LosslessHalf.All(places, design, omega, outer, middle + 1);
        return new SplitLadder(
            LosslessHalf.All(places, design, omega, 0, outer),
            [.. cores.Select(core => Enumerable.Range(1, middle - outer).Aggregate(core, (h, k) => h.With(places, design, omega, middle + k, core.Choice[^(k + 1)])))],
            omega.Length,
            mirrored: true,
            (a, b, c, d) => (s * (r - 1) * ((a * d) - (b * c)), s * (1 - r) * a * c, s * (1 - r) * b * d, 0),
            (a, b, c, d) => (2 * s * ((a * b) - (r * c * d)), s * ((a * a) + (r * c * c)), -s * ((b * b) + (r * d * d)), 0),
            (a, b, c, _) => (a, b, c, 0));
    }

    /// <summary>|K|^2 of a pair at frequency i.</summary>
    public double CharacteristicSquared(int i, int left, int right)
    {
        var u = _real[i].AsSpan(4 * left, 4);
        var v = _imaginary[i].AsSpan(4 * left, 4);
        var k = _factors[i].AsSpan(4 * right, 4);
        var re = (u[0] * k[0]) + (u[1] * k[1]) + (u[2] * k[2]) + (u[3] * k[3]);
        var im = (v[0] * k[0]) + (v[1] * k[1]) + (v[2] * k[2]) + (v[3] * k[3]);
        return (re * re) + (im * im);
    }

    /// <summary>Index of the candidate of every place of a pair.</summary>
    public int[] Choice(int left, int right) =>
        _mirrored ? [.. _left[left], .. _right[right], .. _left[left].Reverse()] : [.. _left[left], .. _right[right]];

    private static double[][] Rows(List<LosslessHalf> halves, int frequencies, Row row) =>
        [.. Enumerable.Range(0, frequencies).Select(i => RowsAt(i, halves, row))];

    private static double[] RowsAt(int i, List<LosslessHalf> halves, Row row)
    {
        var numbers = new double[4 * halves.Count];
        for (var h = 0; h < halves.Count; h++)
        {
            var (a, b, c, d) = halves[h].At(i);
            (numbers[4 * h], numbers[(4 * h) + 1], numbers[(4 * h) + 2], numbers[(4 * h) + 3]) = row(a, b, c, d);
        }

        return numbers;
    }

    private static double LoadRatio(LowPassDesign design) => design.Load / design.Source;

    private static double Scale(LowPassDesign design) => 0.5 / Math.Sqrt(LoadRatio(design));
}
