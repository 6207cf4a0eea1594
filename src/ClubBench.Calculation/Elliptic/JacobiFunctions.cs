using System.Collections.Immutable;
using System.Numerics;

namespace ClubBench.Calculation.Elliptic;

/// <summary>Jacobi elliptic functions of one modulus, their arguments counted in quarter periods. Immutable.</summary>
/// <remarks>
/// Method: descending Landen transformation down to a vanishing modulus, where the functions are cosine and sine.
/// Valid: modulus above 0 and below 1; double precision up to 0.999.
/// Source: orfanidis-elliptic.
/// </remarks>
internal sealed class JacobiFunctions
{
    private const double Vanishing = 1e-18;
    private const int MostSteps = 12;

    private readonly double _modulus;
    private readonly ImmutableArray<double> _descending;

    public JacobiFunctions(double modulus)
    {
        _modulus = modulus;
        var descending = ImmutableArray.CreateBuilder<double>();
        for (var k = modulus; k >= Vanishing && descending.Count < MostSteps; descending.Add(k)) k = Landen(k);
        _descending = descending.ToImmutable();
    }

    /// <summary>cd(u K).</summary>
    public Complex Cd(Complex u) => Ascend(Complex.Cos(u * (Math.PI / 2)));

    /// <summary>sn(u K).</summary>
    public Complex Sn(Complex u) => Ascend(Complex.Sin(u * (Math.PI / 2)));

    /// <summary>The v with sn(j v K) = j y, for any y above zero.</summary>
    public double InverseSnOfImaginary(double y)
    {
        var (z, k) = (y, _modulus);
        foreach (var next in _descending)
        {
            z *= 2 / ((1 + next) * (1 + Math.Sqrt(1 + Math.Pow(z * k, 2))));
            k = next;
        }

        return 2 / Math.PI * Math.Asinh(z);
    }

    private Complex Ascend(Complex y)
    {
        for (var m = _descending.Length - 1; m >= 0; m--) y = (1 + _descending[m]) * y / (1 + (_descending[m] * y * y));
        return y;
    }

    // (1 - k)(1 + k) keeps the digits that 1 - k^2 would lose near 1.
    private static double Landen(double k) => Math.Pow(k / (1 + Math.Sqrt((1 - k) * (1 + k))), 2);
}
