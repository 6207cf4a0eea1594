using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Networks;

public class LadderStressTests
{
    public static TheoryData<ReferenceRow> Cases => ReferenceTable.Theory("ladder_stress");

    [Theory]
    [MemberData(nameof(Cases))]
    [Evidence(typeof(LadderStress), EvidenceKind.IndependentRecomputation)]
    public void Of_FiveWattThroughTheFilter_MatchesNodalAnalysis(ReferenceRow row)
    {
        var stress = Stress(row.Number("load_ohm"), row.Has("coil_q") ? row.Number("coil_q") : null, row.Has("capacitor_q") ? row.Number("capacitor_q") : null);

        if (row.Has("delivered_w")) Near(row.Number("delivered_w"), stress.Delivered.Watt);
        foreach (var (arm, volts, amperes) in stress.Arms.Zip(row["volts"].Split(';'), row["amperes"].Split(';')))
        {
            if (volts.Length > 0) Near(Number(volts), arm.Voltage.Volt);
            if (amperes.Length > 0) Near(Number(amperes), arm.Current.Ampere);
        }

        void Near(double expected, double actual) => Assert.Equal(expected, actual, expected * row.Number("relative_tolerance"));
        double Number(string text) => double.Parse(text, System.Globalization.CultureInfo.InvariantCulture);
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
