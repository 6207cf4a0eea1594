using System.Numerics;

namespace ClubBench.Calculation.Sweeps;

/// <summary>A two by two matrix of complex numbers. Method: textbook.</summary>
internal readonly record struct Matrix2(Complex A11, Complex A12, Complex A21, Complex A22)
{
    public Complex Determinant => (A11 * A22) - (A12 * A21);

    public Matrix2 Times(Matrix2 b) => new(
        (A11 * b.A11) + (A12 * b.A21),
        (A11 * b.A12) + (A12 * b.A22),
        (A21 * b.A11) + (A22 * b.A21),
        (A21 * b.A12) + (A22 * b.A22));

    /// <summary>The inverse, or null where there is none.</summary>
    public Matrix2? Inverse()
    {
        var d = Determinant;
        return d == Complex.Zero ? null : new(A22 / d, -A12 / d, -A21 / d, A11 / d);
    }
}
