namespace ClubBench.Calculation.Filters;

/// <summary>Part of a lossless low-pass ladder at all frequencies of a search, in units of the source resistance.</summary>
/// <remarks>
/// Without losses A and D are real and B and C imaginary, so four real numbers hold the chain matrix [a, j b; j c, d].
/// </remarks>
internal sealed class LosslessHalf
{
    private readonly double[] _chain;

    private LosslessHalf(int[] choice, double[] chain) => (Choice, _chain) = (choice, chain);

    /// <summary>Index of the candidate of each place of this part.</summary>
    public int[] Choice { get; }

    /// <summary>Every part over the places from one to another, the latter not included.</summary>
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

    /// <summary>The same with one place more at its end.</summary>
    public LosslessHalf With(CandidatePlaces places, LowPassDesign design, double[] omega, int place, int candidate)
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

    /// <summary>The chain matrix at frequency i.</summary>
    public (double A, double B, double C, double D) At(int i) => (_chain[4 * i], _chain[(4 * i) + 1], _chain[(4 * i) + 2], _chain[(4 * i) + 3]);

    private static LosslessHalf Empty(int frequencies)
    {
        var chain = new double[4 * frequencies];
        for (var i = 0; i < chain.Length; i += 4) chain[i] = chain[i + 3] = 1;
        return new LosslessHalf([], chain);
    }
}
