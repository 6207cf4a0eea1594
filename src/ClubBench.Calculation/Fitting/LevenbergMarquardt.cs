using MathNet.Numerics.LinearAlgebra;

namespace ClubBench.Calculation.Fitting;

/// <summary>Where a fit came to rest.</summary>
/// <param name="Point">Deviations and delays.</param>
/// <param name="Cost">Sum of squares, each over its variance, deviations included.</param>
/// <param name="Deviations">Standard deviation of each parameter after the fit.</param>
/// <param name="Rms">Root mean square of the residuals, per real or imaginary part.</param>
internal sealed record FitRest(double[] Point, double Cost, double[] Deviations, double Rms);

/// <summary>Damped least squares with what is expected of every parameter as a further measurement.</summary>
/// <remarks>Method: Levenberg-Marquardt with exact slopes, damping by the diagonal. Source: levenberg-marquardt.</remarks>
internal sealed class LevenbergMarquardt(FitModel model, IReadOnlyList<double> spreads, double noise)
{
    private const int MostSteps = 60;
    private const double LeastCostChange = 1e-10;
    private const double LeastStep = 1e-8;
    private const double Farthest = 3;

    /// <summary>Starts where it is told, or at the nominal values. A step beyond twenty times a value, or 3 ns, is as bad as one that costs more.</summary>
    public FitRest Solve(double[]? start = null)
    {
        var (point, damping) = (start ?? new double[spreads.Count], 1e-2);
        var here = Normal(point);
        for (var step = 0; step < MostSteps; step++)
        {
            var move = (here.Matrix + Matrix<double>.Build.DenseOfDiagonalVector(here.Matrix.Diagonal() * damping)).Cholesky().Solve(-here.Gradient);
            double[] next = [.. point.Select((x, i) => x + move[i])];
            var there = next.All(x => Math.Abs(x) <= Farthest) ? Normal(next) : here with { Cost = double.PositiveInfinity };
            if (there.Cost > here.Cost)
            {
                damping *= 4;
                continue;
            }

            var settled = here.Cost - there.Cost <= LeastCostChange * here.Cost && move.AbsoluteMaximum() < LeastStep;
            (point, here, damping) = (next, there, damping / 5);
            if (settled) break;
        }

        return new(point, here.Cost, [.. here.Matrix.Inverse().Diagonal().Select(Math.Sqrt)], here.Rms);
    }

    private (double Cost, double Rms, Vector<double> Gradient, Matrix<double> Matrix) Normal(double[] p)
    {
        var n = spreads.Count;
        var (matrix, gradient) = (new double[n, n], new double[n]);
        var (squares, count, weight) = (0.0, 0, 1 / (noise * noise));
        foreach (var (residual, slopes) in model.Residuals(p))
        {
            (squares, count) = (squares + Inner(residual, residual), count + 2);
            for (var i = 0; i < n; i++)
            {
                gradient[i] += weight * Inner(slopes[i], residual);
                for (var k = 0; k <= i; k++) matrix[i, k] += weight * Inner(slopes[i], slopes[k]);
            }
        }

        var cost = weight * squares;
        for (var i = 0; i < n; i++)
        {
            var expected = 1 / (spreads[i] * spreads[i]);
            (cost, gradient[i], matrix[i, i]) = (cost + (p[i] * p[i] * expected), gradient[i] + (p[i] * expected), matrix[i, i] + expected);
            for (var k = 0; k < i; k++) matrix[k, i] = matrix[i, k];
        }

        return (cost, Math.Sqrt(squares / count), Vector<double>.Build.Dense(gradient), Matrix<double>.Build.DenseOfArray(matrix));
    }

    private static double Inner(System.Numerics.Complex a, System.Numerics.Complex b) => (a.Real * b.Real) + (a.Imaginary * b.Imaginary);
}
