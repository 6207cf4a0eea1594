using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Sweeps;
using MathNet.Numerics.LinearAlgebra;
using MathNet.Numerics.Optimization;
using Complex = System.Numerics.Complex;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Fitting;

/// <summary>The same least squares by a library's minimiser, slopes by differences.</summary>
internal static class SecondMinimiser
{
    private const double Noise = 0.002;
    private static readonly double[] Spreads = [0.05, 0.10, 0.05, 0.10, 0.05, 0.5, 1, 1];

    public static double[] Of(Sweep sweep)
    {
        var count = (4 * sweep.Points.Length) + Spreads.Length;
        var model = ObjectiveFunction.NonlinearModel((p, _) => Shown(sweep, p), Vector<double>.Build.Dense(count, i => i), Measured(sweep), accuracyOrder: 4);
        return [.. new LevenbergMarquardtMinimizer(gradientTolerance: 1e-13, stepTolerance: 1e-13, functionTolerance: 1e-13, maximumIterations: 500)
            .FindMinimum(model, Vector<double>.Build.Dense(Spreads.Length)).MinimizingPoint];
    }

    private static Vector<double> Measured(Sweep sweep) =>
        Vector<double>.Build.DenseOfEnumerable(sweep.Points.SelectMany(p => Parts(p.S11, p.S21!.Value)).Concat(new double[Spreads.Length]));

    private static Vector<double> Shown(Sweep sweep, Vector<double> p)
    {
        var ladder = new Ladder(F7.ToLadder().Elements.Select((e, k) => e.Scaled(Math.Exp(p[k]), Math.Exp(p[k])))).WithQ(150 * Math.Exp(p[5]), 1000);
        var parts = sweep.Points.SelectMany(point =>
        {
            var turn = new Complex(0, -point.Frequency.RadiansPerSecond * 1e-9);
            var chain = ladder.At(point.Frequency);
            return Parts(chain.S11(FiftyOhm, FiftyOhm) * Complex.Exp(2 * p[6] * turn), chain.S21(FiftyOhm, FiftyOhm) * Complex.Exp((p[6] + p[7]) * turn));
        });
        return Vector<double>.Build.DenseOfEnumerable(parts.Concat(p.Select((x, i) => x / Spreads[i])));
    }

    private static IEnumerable<double> Parts(Complex s11, Complex s21) => new[] { s11.Real, s11.Imaginary, s21.Real, s21.Imaginary }.Select(x => x / Noise);
}
