using System.Numerics;
using ClubBench.Calculation.Networks;
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
    [Evidence(typeof(SweepReference), EvidenceKind.IndependentRecomputation)]
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
    [Evidence(typeof(SweepReference), EvidenceKind.RoundTrip)]
    public void To_ThereAndBack_IsTheSameSweep() => Gen.Select(Gen.Select(AnyComplex, AnyComplex, AnyComplex, AnyComplex).Array[1, 5], Gen.Double[20, 200]).Sample((values, ohm) =>
    {
        var sweep = new Sweep([.. values.Select((v, i) => new SweepPoint(Frequency.FromMegahertz(i + 1), 0.4 * v.Item1, 0.4 * v.Item2, 0.4 * v.Item3, 0.4 * v.Item4))], FiftyOhm, FiftyOhm);

        var back = SweepReference.To(SweepReference.To(sweep, Resistance.FromOhm(ohm))!, FiftyOhm)!;

        Assert.All(sweep.Points.Zip(back.Points), p => Assert.All(Values(p.First).Zip(Values(p.Second)), s => Assert.Equal(0, (s.First - s.Second).Magnitude, 1e-12)));
    });

    [Fact]
    [Evidence(typeof(SweepReference), EvidenceKind.ClosedFormLimit)]
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
    [Evidence(typeof(Sweep), EvidenceKind.ClosedFormLimit)]
    public void Of_ReactanceOfHundredOhmInTheLine_ReflectsAndPassesHalfThePower()
    {
        var f = Frequency.FromMegahertz(7);
        var coil = LadderElement.SeriesInductor(Inductance.FromHenry(100 / f.RadiansPerSecond));

        var point = Assert.Single(Sweep.Of(new Ladder([coil]), [f], FiftyOhm, FiftyOhm).Points);

        // j 100 ohm before 50 ohm: S11 is j / (1 + j) and S21 is 1 / (1 + j), the same from both ends.
        Assert.All(Values(point).Zip([new(0.5, 0.5), new(0.5, -0.5), new(0.5, -0.5), new Complex(0.5, 0.5)]), s => Assert.Equal(0, (s.First - s.Second).Magnitude, 1e-12));
    }

    [Fact]
    [Evidence(typeof(Sweep), EvidenceKind.IndependentRecomputation)]
    public void Of_LossyLadder_PassesWhatTheNodalEquationsSay()
    {
        var ladder = Seven20.ToLadder(150, 1000);

        Assert.All(
            Sweep.Of(ladder, Frequencies, FiftyOhm, Resistance.FromOhm(75)).Points,
            p => Assert.Equal(0, (p.S21!.Value - NodalEquations.Transmission(ladder, p.Frequency, FiftyOhm, Resistance.FromOhm(75), 150, 1000)).Magnitude, 1e-12));
    }

    [Fact]
    [Evidence(typeof(Sweep), EvidenceKind.Identity)]
    public void Of_LadderTurnedRound_SwapsThePorts()
    {
        var ladder = new Ladder(Seven20.ToLadder(150, 1000).Elements.Take(5));
        var turned = new Ladder(ladder.Elements.Reverse());

        var sweeps = Sweep.Of(ladder, Frequencies, FiftyOhm, Resistance.FromOhm(75)).Points.Zip(Sweep.Of(turned, Frequencies, Resistance.FromOhm(75), FiftyOhm).Points);

        Assert.All(sweeps, p => Assert.All(Values(p.First).Zip(Values(p.Second).Reverse()), s => Assert.Equal(0, (s.First - s.Second).Magnitude, 1e-12)));
    }

    [Fact]
    [Evidence(typeof(Sweep), EvidenceKind.Identity)]
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

    private static Complex[] Values(SweepPoint p) => [p.S11, p.S21!.Value, p.S12!.Value, p.S22!.Value];
}
