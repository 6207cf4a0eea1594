using System.Numerics;

namespace ClubBench.Calculation.Filters;

/// <summary>Response of a board whose parts are the nominal ones times factors.</summary>
internal sealed class BoardResponse(LadderYieldInput input, int passPoints)
{
    private readonly LowPassDesign _design = input.Design;
    private readonly Complex _coilPhase = new(input.CoilQ is { } q ? 1 / q : 0, 1);
    private readonly Complex _capacitorPhase = 1 / new Complex(input.CapacitorQ is { } q ? 1 / q : 0, -1);
    private readonly double[] _pass = [.. input.Requirement.Band.Points(passPoints).Select(f => f.RadiansPerSecond)];

    public double[][] Harmonics { get; } =
        [.. input.Requirement.Harmonics.Select(h => new[] { input.Requirement.Band.Low, input.Requirement.Band.High }.Select(f => f.Harmonic(h.Harmonic).RadiansPerSecond).ToArray())];

    /// <summary>Attenuation of each harmonic, then the worst return loss, in dB.</summary>
    public double[] Of(double[] factors)
    {
        var figures = new double[Harmonics.Length + 1];
        for (var k = 0; k < Harmonics.Length; k++) figures[k] = ToDb(Harmonics[k].Max(w => At(w, factors).Passed));
        figures[^1] = ToDb(_pass.Max(w => At(w, factors).Reflected));
        return figures;
    }

    private (double Passed, double Reflected) At(double w, double[] factors)
    {
        var (a, b, c, d) = (Complex.One, Complex.Zero, Complex.Zero, Complex.One);
        for (var k = 0; k < factors.Length; k++)
        {
            if (_design.IsCapacitor(k))
            {
                var y = w * _design.Capacitors[k / 2].Farad * factors[k] * _capacitorPhase;
                (a, c) = (a + (b * y), c + (d * y));
            }
            else
            {
                var z = w * _design.Coils[k / 2].Henry * factors[k] * _coilPhase;
                (b, d) = (b + (a * z), d + (c * z));
            }
        }

        return Powers(a * _design.Load.Ohm, b, c * _design.Source.Ohm * _design.Load.Ohm, d * _design.Source.Ohm);
    }

    private (double Passed, double Reflected) Powers(Complex a, Complex b, Complex c, Complex d)
    {
        var all = Square(a + b + c + d);
        return (4 * _design.Source.Ohm * _design.Load.Ohm / all, Square(a + b - c - d) / all);
    }

    private static double Square(Complex z) => (z.Real * z.Real) + (z.Imaginary * z.Imaginary);

    private static double ToDb(double share) => -10 * Math.Log10(Math.Max(share, 1e-30));
}
