using System.Numerics;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Sweeps;
using CsCheck;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Sweeps;

public class SweepTests
{
    private static readonly IReadOnlyList<Frequency> Frequencies = FrequencyRange.FromMegahertz(1, 30).Points(60);

    private static readonly Gen<Complex> AnyComplex = Gen.Select(Gen.Double[-1, 1], Gen.Double[-1, 1], (a, b) => new Complex(a, b));

    [Theory]
    [InlineData(75, 75)]
    [InlineData(50, 200)]
    [InlineData(12.5, 50)]
    public void To_AnotherReference_IsTheSweepMadeThere(double first, double second)
    {
        var ladder = Seven20.ToLadder(150, 1000);
        var made = Sweep.Of(ladder, Frequencies, Resistance.FromOhm(first), Resistance.FromOhm(second));

        var moved = SweepReference.To(made, FiftyOhm)!;

        foreach (var (m, d) in moved.Points.Zip(Sweep.Of(ladder, Frequencies, FiftyOhm, FiftyOhm).Points))
        {
            Assert.Equal(0, (m.S11 - d.S11).Magnitude, 1e-10);
            Assert.Equal(0, (m.S21!.Value - d.S21!.Value).Magnitude, 1e-10);
            Assert.Equal(0, (m.S12!.Value - d.S12!.Value).Magnitude, 1e-10);
            Assert.Equal(0, (m.S22!.Value - d.S22!.Value).Magnitude, 1e-10);
        }
    }

    [Fact]
    public void To_OnePort_IsTheReflectionOfTheSameImpedance()
    {
        var hundred = new Sweep([new(Frequency.FromMegahertz(7), (Complex)(25.0 / 175))], Resistance.FromOhm(75), Resistance.FromOhm(75));

        Assert.Equal(50.0 / 150, SweepReference.To(hundred, FiftyOhm)!.Points[0].S11.Real, 1e-12);
    }

    [Fact]
    public void To_HalfMeasuredTwoPort_IsNullOnlyWhereTheReferenceChanges()
    {
        var half = new Sweep([new(Frequency.FromMegahertz(7), 0.1, 0.9)], Resistance.FromOhm(75), Resistance.FromOhm(75));

        Assert.Null(SweepReference.To(half, FiftyOhm));
        Assert.NotNull(SweepReference.To(half, Resistance.FromOhm(75)));
    }

    [Fact]
    public void To_ActiveNetworkWithoutACounterpart_IsNull() =>
        Assert.Null(SweepReference.To(new([new(Frequency.FromMegahertz(7), -5)], Resistance.FromOhm(75), Resistance.FromOhm(75)), FiftyOhm));

    [Fact]
    public void Write_AnySweep_IsReadBackTheSame() =>
        Gen.Select(Gen.Select(AnyComplex, AnyComplex, AnyComplex, AnyComplex).Array[1, 20], Gen.Bool, Gen.Double[1, 500], Gen.Double[1, 500]).Sample((values, isOnePort, first, second) =>
        {
            var points = values.Select((v, i) => isOnePort
                ? new SweepPoint(Frequency.FromHertz(1234.5 * (i + 1)), v.Item1)
                : new SweepPoint(Frequency.FromHertz(1234.5 * (i + 1)), v.Item1, v.Item2, v.Item3, v.Item4));
            var sweep = new Sweep([.. points], Resistance.FromOhm(first), Resistance.FromOhm(isOnePort ? first : second));

            var back = TouchstoneReader.Read(TouchstoneWriter.Write(sweep, "made\nby hand"), "x" + TouchstoneWriter.ExtensionOf(sweep)).Sweep!;

            Assert.Equal((sweep.Reference1, sweep.Reference2), (back.Reference1, back.Reference2));
            Assert.Equal(sweep.Points.Select(p => p with { Frequency = default }), back.Points.Select(p => p with { Frequency = default }));
            Assert.All(sweep.Points.Zip(back.Points), p => Assert.Equal(1, p.First.Frequency / p.Second.Frequency, 1e-14));
        });

    [Fact]
    public void Write_NotMeasured_IsReadBackAsNotMeasured()
    {
        var half = new Sweep([new(Frequency.FromMegahertz(7), 0.1, 0.9)], FiftyOhm, FiftyOhm);

        Assert.Equal(half.Points[0], TouchstoneReader.Read(TouchstoneWriter.Write(half), "x.s2p").Sweep!.Points[0]);
    }

    [Fact]
    public void Write_Sweep_HasTheOptionLineThatWasPromised() =>
        Assert.StartsWith("! F7\n# MHz S RI R 50\n1 ", TouchstoneWriter.Write(Sweep.Of(F7.ToLadder(), Frequencies, FiftyOhm, FiftyOhm), "F7"), StringComparison.Ordinal);

    [Fact]
    public void LargestPowerOut_LosslessLadder_IsOneAtBothPorts() =>
        Assert.All(Sweep.Of(F7.ToLadder(), Frequencies, FiftyOhm, FiftyOhm).Points, p => Assert.Equal(1, p.LargestPowerOut, 1e-12));

    [Fact]
    public void Points_NoneNotRisingOrNotFinite_Throw()
    {
        var (one, two) = (new SweepPoint(Frequency.FromMegahertz(1), 0.1), new SweepPoint(Frequency.FromMegahertz(2), 0.1));
        var sound = new Sweep([one, two], FiftyOhm, FiftyOhm);

        Assert.ThrowsAny<ArgumentException>(() => new Sweep([], FiftyOhm, FiftyOhm));
        Assert.ThrowsAny<ArgumentException>(() => sound with { Points = [two, one] });
        Assert.ThrowsAny<ArgumentException>(() => sound with { Points = [one, one] });
        Assert.ThrowsAny<ArgumentException>(() => sound with { Points = [one with { S11 = double.NaN }] });
    }
}
