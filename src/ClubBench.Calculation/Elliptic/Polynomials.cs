using System.Numerics;

namespace ClubBench.Calculation.Elliptic;

/// <summary>Real polynomials as coefficients of rising powers.</summary>
/// <remarks>Method: textbook arithmetic of polynomials. Source: derived.</remarks>
internal static class Polynomials
{
    public static double[] Product(double[] a, double[] b)
    {
        var product = new double[a.Length + b.Length - 1];
        for (var i = 0; i < a.Length; i++)
            for (var k = 0; k < b.Length; k++) product[i + k] += a[i] * b[k];
        return product;
    }

    /// <summary>a + factor b.</summary>
    public static double[] Sum(double[] a, double[] b, double factor) =>
        [.. Enumerable.Range(0, Math.Max(a.Length, b.Length)).Select(i => a.ElementAtOrDefault(i) + (factor * b.ElementAtOrDefault(i)))];

    /// <summary>s a.</summary>
    public static double[] Shifted(double[] a) => [0, .. a];

    public static Complex At(double[] a, Complex s) => a.Reverse().Aggregate(Complex.Zero, (sum, coefficient) => (sum * s) + coefficient);

    /// <summary>a / (s^2 + w^2), the remainder dropped; from the constant upwards, so that rounding shrinks for w above 1.</summary>
    public static double[] DividedBySquare(double[] a, double w)
    {
        var quotient = new double[a.Length - 2];
        for (var i = 0; i < quotient.Length; i++) quotient[i] = (a[i] - (i >= 2 ? quotient[i - 2] : 0)) / (w * w);
        return quotient;
    }
}
