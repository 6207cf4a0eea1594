using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Networks;

/// <summary>The figures of the lossy filter are those of <c>tests/Recomputed/ladder_stress_and_yield.py</c>.</summary>
public class LadderStressTests
{
    [Fact]
    [Evidence(typeof(LadderStress), EvidenceKind.IndependentRecomputation)]
    public void Of_FiveWattThroughALossyFilter_MatchesNodalAnalysis()
    {
        var stress = Stress(50, 150, 1000);

        Assert.Equal(4.824, stress.Delivered.Watt, 4.824 * 0.005);
        foreach (var (k, volt, ampere) in new[] { (0, 22.46, 0.388), (1, 33.38, 0.548), (2, 26.94, 0.862), (3, 35.36, 0.581), (4, 21.96, 0.379) })
        {
            Assert.Equal(volt, stress.Arms[k].Voltage.Volt, volt * 0.005);
            Assert.Equal(ampere, stress.Arms[k].Current.Ampere, ampere * 0.005);
        }
    }

    [Fact]
    [Evidence(typeof(LadderStress), EvidenceKind.IndependentRecomputation)]
    public void Of_HalfTheLoadResistance_RaisesTheMiddleCapacitor()
    {
        var middle = Stress(25, 150, 1000).Arms[2];

        Assert.Equal(35.76, middle.Voltage.Volt, 35.76 * 0.005);
        Assert.Equal(1.144, middle.Current.Ampere, 1.144 * 0.005);
    }

    [Fact]
    [Evidence(typeof(LadderStress), EvidenceKind.Identity)]
    public void Of_LosslessFilter_DeliversWhatTheTransmissionSays()
    {
        var passed = F7.ToLadder().At(Frequency.FromMegahertz(7.1)).S21(FiftyOhm, FiftyOhm).Magnitude;

        Assert.Equal(5 * passed * passed, Stress(50, null, null).Delivered.Watt, 1e-9);
    }

    [Fact]
    [Evidence(typeof(LadderStress), EvidenceKind.ClosedFormLimit)]
    public void Of_OneCoilInTheLine_CarriesTheLoopCurrent()
    {
        // 10 W from 50 ohm is an open voltage of 63.2 V peak; 100 ohm of coil and 100 ohm of ends share it at right angles.
        var f = Frequency.FromMegahertz(7);
        var coil = LadderElement.SeriesInductor(Inductance.FromHenry(100 / f.RadiansPerSecond));

        var stress = LadderStress.Of(new Ladder([coil]), f, Power.FromWatt(10), FiftyOhm, 50);

        var ampere = Math.Sqrt(8 * 50 * 10) / Math.Sqrt((100 * 100) + (100 * 100));
        Assert.Equal(ampere, stress.Arms[0].Current.Ampere, 1e-12);
        Assert.Equal(100 * ampere, stress.Arms[0].Voltage.Volt, 1e-9);
        Assert.Equal(5, stress.Delivered.Watt, 1e-9);
    }

    [Fact]
    [Evidence(typeof(LadderStress), EvidenceKind.Identity)]
    public void Of_LossyFilter_WhatGoesInIsDeliveredOrHeatsTheParts()
    {
        var (ladder, f) = (F7.ToLadder(80, 300), Frequency.FromMegahertz(7.1));
        var stress = LadderStress.Of(ladder, f, Power.FromWatt(5), FiftyOhm, 50);
        var reflected = ladder.At(f).S11(FiftyOhm, FiftyOhm).Magnitude;

        var heat = ladder.Elements.Zip(stress.Arms).Sum(x => 0.5 * x.Second.Current.Ampere * x.Second.Current.Ampere * x.First.Impedance(f).Real);

        Assert.True(heat > 0.3);
        Assert.Equal(5 * (1 - (reflected * reflected)), stress.Delivered.Watt + heat, 1e-9);
    }

    private static LadderStress Stress(double loadOhm, double? coilQ, double? capacitorQ) =>
        LadderStress.Of(F7.ToLadder(coilQ, capacitorQ), Frequency.FromMegahertz(7.1), Power.FromWatt(5), FiftyOhm, loadOhm);
}
