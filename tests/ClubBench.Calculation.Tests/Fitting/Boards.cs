using System.Numerics;
using ClubBench.Calculation.Fitting;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Statistics;
using ClubBench.Calculation.Sweeps;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Fitting;

/// <summary>Boards of one filter with parts of their own, as an analyser would show them.</summary>
internal static class Boards
{
    public static readonly double[] Example = [1.01, 19.0 * 19 / (18 * 18), 0.985, 1.012, 1.00];

    private static readonly IReadOnlyList<Frequency> Frequencies = FrequencyRange.FromMegahertz(1, 30).Points(201);

    public static Ladder Built(double[] scales, double coilQ = 130) =>
        new(F7.ToLadder(coilQ, 1000).Elements.Select((e, k) => e.Scaled(scales[k], scales[k])));

    public static Sweep Shown(Ladder ladder, double noise = 0, ulong seed = 1, double delay1Ns = 0, double delay2Ns = 0, IReadOnlyList<Frequency>? at = null)
    {
        var random = new SeededRandom(seed);
        var clean = Sweep.Of(ladder, at ?? Frequencies, FiftyOhm, FiftyOhm);
        return clean with
        {
            Points = [.. clean.Points.Select(p => p with
            {
                S11 = Late(p.S11, p.Frequency, 2 * delay1Ns) + Noise(),
                S21 = Late(p.S21!.Value, p.Frequency, delay1Ns + delay2Ns) + Noise(),
            })],
        };

        Complex Noise() => new(random.Normal(0, noise), random.Normal(0, noise));
    }

    public static SweepFitInput Question(Sweep sweep) => new(F7.ToLadder(), 150, 1000, sweep) { Noise = 0.002 };

    private static Complex Late(Complex s, Frequency f, double ns) => s * Complex.Exp(new Complex(0, -f.RadiansPerSecond * ns * 1e-9));
}
