using System.Globalization;
using ClubBench.Calculation.Sweeps;
using CsCheck;
using MathNet.Numerics.LinearAlgebra;
using Complex = System.Numerics.Complex;

namespace ClubBench.Calculation.Tests.Sweeps;

/// <summary>The same network in every dress a file may give it.</summary>
public class TouchstoneParametersTests
{
    private static readonly Gen<Complex> Any = Gen.Select(Gen.Double[0.05, 1.5], Gen.Double[-179, 179], (size, degrees) => Complex.FromPolarCoordinates(size, degrees * Math.PI / 180));

    [Fact]
    [Evidence(typeof(TouchstoneReader), EvidenceKind.Identity)]
    public void Read_SameValuesInEveryUnitAndFormat_AreTheSameSweep() => Gen.Select(Any, Any, Any, Any).Sample((s11, s21, s12, s22) =>
    {
        foreach (var (unit, hertz) in new[] { ("Hz", 1.0), ("kHz", 1e3), ("MHz", 1e6), ("GHz", 1e9) })
            foreach (var format in new[] { "RI", "MA", "DB" })
            {
                var point = Read($"# {unit} S {format} R 50", 7e6 / hertz, [s11, s21, s12, s22], s => Pair(format, s));
                Assert.Equal(1, point.Frequency.Megahertz / 7, 1e-12);
                Assert.All(Values(point).Zip([s11, s21, s12, s22]), x => Assert.Equal(0, (x.First - x.Second).Magnitude, 1e-12));
            }
    });

    [Theory]
    [InlineData("Z", "v1 v2", "i1 i2")]
    [InlineData("Y", "i1 i2", "v1 v2")]
    [InlineData("H", "v1 i2", "i1 v2")]
    [InlineData("G", "i1 v2", "v1 i2")]
    [Evidence(typeof(TouchstoneReader), EvidenceKind.IndependentRecomputation)]
    public void Read_AnyParameters_AreTheWavesThatSolveTheirEquations(string kind, string told, string given) => Gen.Select(Any, Any, Any, Any).Sample((m11, m21, m12, m22) =>
    {
        var (rowOf, columnOf) = (told.Split(' '), given.Split(' '));
        var (waves, echoes) = (Matrix<Complex>.Build.Dense(2, 2), Matrix<Complex>.Build.Dense(2, 2));
        for (var k = 0; k < 2; k++)
        {
            Add(k, rowOf[k], 1);
            Add(k, columnOf[0], k == 0 ? -m11 : -m21);
            Add(k, columnOf[1], k == 0 ? -m12 : -m22);
        }

        if (echoes.Determinant().Magnitude < 0.1) return;
        var s = -echoes.Solve(waves);
        var point = Read($"# MHz {kind} RI R 50", 7, [m11, m21, m12, m22], x => Pair("RI", x));
        Assert.All(Values(point).Zip([s[0, 0], s[1, 0], s[0, 1], s[1, 1]]), x => Assert.Equal(0, (x.First - x.Second).Magnitude, 1e-9));

        // v = a + b and i = a - b, a the wave that comes in and b the one that goes out.
        void Add(int row, string quantity, Complex factor)
        {
            var port = quantity[1] - '1';
            waves[row, port] += factor;
            echoes[row, port] += quantity[0] == 'v' ? factor : -factor;
        }
    });

    private static SweepPoint Read(string options, double frequency, Complex[] values, Func<Complex, (double First, double Second)> pair)
    {
        var numbers = values.Select(pair).SelectMany(p => new[] { p.First, p.Second }).Prepend(frequency).Select(n => n.ToString("R", CultureInfo.InvariantCulture));
        return Assert.Single(TouchstoneReader.Read(options + "\n" + string.Join(' ', numbers), "x.s2p").Sweep!.Points);
    }

    private static (double First, double Second) Pair(string format, Complex s) => format switch
    {
        "RI" => (s.Real, s.Imaginary),
        "MA" => (s.Magnitude, s.Phase * 180 / Math.PI),
        _ => (20 * Math.Log10(s.Magnitude), s.Phase * 180 / Math.PI),
    };

    private static IEnumerable<Complex> Values(SweepPoint p) => [p.S11, p.S21!.Value, p.S12!.Value, p.S22!.Value];
}
