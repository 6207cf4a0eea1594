namespace ClubBench.Calculation.Filters;

/// <summary>Half a lossless low-pass ladder at all frequencies of a search, in units of the source resistance.</summary>
/// <remarks>
/// Without losses A and D are real and B and C imaginary, so four real numbers hold the chain matrix [a, j b; j c, d].
/// </remarks>
internal sealed class LosslessHalf
{
    private readonly double[] _chain;

    private LosslessHalf(int[] choice, double[] chain) => (Choice, _chain) = (choice, chain);

    /// <summary>Index of the candidate of each place of this half.</summary>
    public int[] Choice { get; }

    /// <summary>Every half over the places from one to another, the latter not included.</summary>
    public static List<LosslessHalf> All(CandidatePlaces places, LowPassDesign design, double[] omega, int from, int to)
    {
        var halves = new List<LosslessHalf> { Empty(omega.Length) };
        for (var k = from; k < to; k++)
        {
            var place = k;
            halves = [.. halves.SelectMany(h => Enumerable.Range(0, places.Values[place].Length).Select(i => h.With(places, design, omega, place, i)))];
        }

        return halves;
    }

    /// <summary>The one half with the given candidates.</summary>
    public static LosslessHalf Of(CandidatePlaces places, LowPassDesign design, double[] omega, int from, int[] choice)
    {
        var half = Empty(omega.Length);
        for (var k = 0; k < choice.Length; k++) half = half.With(places, design, omega, from + k, choice[k]);
        return half;
    }

    /// <summary>Share of the available power that reaches the load through this half and the next, at frequency i.</summary>
    public double Passed(LosslessHalf next, int i, double loadRatio)
    {
        var (a, b, c, d) = Product(next, i);
        return 4 * loadRatio / (Square((a * loadRatio) + d) + Square(b + (c * loadRatio)));
    }

    /// <summary>Share of the available power that is thrown back, at frequency i.</summary>
    public double Reflected(LosslessHalf next, int i, double loadRatio)
    {
        var (a, b, c, d) = Product(next, i);
        return (Square((a * loadRatio) - d) + Square(b - (c * loadRatio))) / (Square((a * loadRatio) + d) + Square(b + (c * loadRatio)));
    }

    private static LosslessHalf Empty(int frequencies)
    {
        var chain = new double[4 * frequencies];
        for (var i = 0; i < chain.Length; i += 4) chain[i] = chain[i + 3] = 1;
        return new LosslessHalf([], chain);
    }

    private LosslessHalf With(CandidatePlaces places, LowPassDesign design, double[] omega, int place, int candidate)
    {
        var (chain, value) = ((double[])_chain.Clone(), places.Values[place][candidate]);
        var capacitor = design.IsCapacitor(place);
        var perOmega = capacitor ? value * design.Source.Ohm : value / design.Source.Ohm;
        for (var i = 0; i < omega.Length; i++)
        {
            var (x, at) = (omega[i] * perOmega, 4 * i);
            if (capacitor)
            {
                chain[at] -= chain[at + 1] * x;
                chain[at + 2] += chain[at + 3] * x;
            }
            else
            {
                chain[at + 1] += chain[at] * x;
                chain[at + 3] -= chain[at + 2] * x;
            }
        }

        return new LosslessHalf([.. Choice, candidate], chain);
    }

    private (double A, double B, double C, double D) Product(LosslessHalf next, int i)
    {
        var p = _chain.AsSpan(4 * i, 4);
        var q = next._chain.AsSpan(4 * i, 4);
        return (
            (p[0] * q[0]) - (p[1] * q[2]),
            (p[0] * q[1]) + (p[1] * q[3]),
            (p[2] * q[0]) + (p[3] * q[2]),
            (p[3] * q[3]) - (p[2] * q[1]));
    }

    private static double Square(double x) => x * x;
}
