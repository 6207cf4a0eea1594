using ClubBench.Calculation.BandPass;
using ClubBench.Calculation.Quantities;
using CsCheck;
using MathNet.Numerics.LinearAlgebra;
using Complex = System.Numerics.Complex;

namespace ClubBench.Calculation.Tests.BandPass;

public class TopCoupledTests
{
    private static readonly BandPassTask Forty = new(CouplingPrototype.Butterworth(2), Frequency.FromMegahertz(7.1), Frequency.FromKilohertz(300), Inductance.FromMicrohenry(2), 200);

    public static TheoryData<ReferenceRow> Cases => ReferenceTable.Theory("top-coupled");

    [Theory]
    [MemberData(nameof(Cases))]
    public void Design_Case_HasThePartsOfTheTable(ReferenceRow row)
    {
        var filter = Designed(row);
        var relative = row.Number("relative_tolerance");

        Assert.Equal(row.Number("coupling_pf"), filter.Coupling.Picofarad, row.Number("coupling_pf") * relative);
        Assert.Equal(row.Number("first_pf"), filter.NodeCapacitances[0].Picofarad, row.Number("first_pf") * relative);
        if (row.Has("second_pf")) Assert.Equal(row.Number("second_pf"), filter.NodeCapacitances[1].Picofarad, row.Number("second_pf") * relative);
        Assert.Equal(row.Number("end_ohm"), filter.End.Ohm, row.Number("end_ohm") * relative);
    }

    [Theory]
    [MemberData(nameof(Cases))]
    [Evidence(typeof(TopCoupledDesign), EvidenceKind.RoundTrip)]
    public void Response_Case_PassesAndRejectsLikeTheTable(ReferenceRow row)
    {
        var filter = Designed(row);
        var (center, width) = (Frequency.FromMegahertz(row.Number("center_mhz")), Frequency.FromKilohertz(row.Number("width_khz")));

        var response = BandPassResponse.Of(filter.Loss, center, width)!;

        Assert.Equal(row.Number("peak_db"), response.PeakLoss.Db, row.Number("peak_tolerance"));
        Assert.Equal(row.Number("width_true_khz"), response.Band.WidthHertz / 1e3, row.Number("width_true_khz") * row.Number("width_tolerance"));
        Assert.Equal(row.Number("second_harmonic_db"), filter.Loss(center * 2).Db, row.Number("far_tolerance"));
        Assert.Equal(row.Number("half_db"), filter.Loss(center * 0.5).Db, row.Number("far_tolerance"));
    }

    [Fact]
    [Evidence(typeof(TopCoupledFilter), EvidenceKind.IndependentRecomputation)]
    public void Loss_AnyFilter_IsThatOfTheNodalEquations() =>
        Gen.Select(Gen.Int[2, 3], Gen.Double[1.8, 28], Gen.Double[0.02, 0.12], Gen.Double[80, 400], Gen.Double[0.5, 2]).Sample((order, mhz, width, q, off) =>
        {
            var center = Frequency.FromMegahertz(mhz);
            var design = TopCoupledDesign.Of(new(CouplingPrototype.Butterworth(order), center, center * width, Inductance.FromMicrohenry(14 / mhz), q));
            if (design.Filter is not { } filter) return true;
            var f = center * off;
            return Math.Abs(filter.Loss(f).Db - Nodal(filter, f)) < 1e-6;
        });

    [Fact]
    [Evidence(typeof(TopCoupledFilter), EvidenceKind.Identity)]
    [Evidence(typeof(TopCoupledDesign), EvidenceKind.Identity)]
    public void NodeResonance_EveryNode_IsTheCentre()
    {
        var filter = TopCoupledDesign.Of(Forty with { Prototype = CouplingPrototype.Butterworth(3) }).Filter!;

        Assert.All(Enumerable.Range(0, 3), i => Assert.Equal(7.1, filter.NodeResonance(i).Megahertz, 1e-9));
    }

    [Fact]
    [Evidence(typeof(TopCoupledFilter), EvidenceKind.ClosedFormLimit)]
    [Evidence(typeof(TopCoupledDesign), EvidenceKind.ClosedFormLimit)]
    public void Loss_CoilsWithoutLoss_IsNothingAtThePeakAndHalfAtTheEdges()
    {
        var filter = TopCoupledDesign.Of(Forty with { UnloadedQ = 1e9 }).Filter!;

        var response = BandPassResponse.Of(filter.Loss, Forty.Center, Forty.Bandwidth3dB)!;

        Assert.Equal(0, response.PeakLoss.Db, 0.01);
        Assert.Equal(300, response.Band.WidthHertz / 1e3, 3.0);
    }

    [Fact]
    public void Loss_TopCoupling_IsWorseAboveThanBelow()
    {
        var filter = TopCoupledDesign.Of(new(CouplingPrototype.Butterworth(2), Frequency.FromMegahertz(3.65), Frequency.FromKilohertz(400), Inductance.FromMicrohenry(5), 180)).Filter!;

        Assert.True(filter.Loss(Frequency.FromMegahertz(4.45)) < filter.Loss(Frequency.FromMegahertz(2.85)));
    }

    [Fact]
    public void MidbandLoss_OfThePrototype_IsNearTheNetworks()
    {
        foreach (var row in ReferenceTable.Read("top-coupled"))
        {
            var cohn = Prototypes.Of(row).MidbandLoss(Frequency.FromMegahertz(row.Number("center_mhz")), Frequency.FromKilohertz(row.Number("width_khz")), row.Number("unloaded_q"));
            Assert.Equal(row.Number("peak_db"), cohn.Db, 0.25);
        }
    }

    [Theory]
    [InlineData(2, 3000, 200, 0, BandPassRefusal.TooWide)]
    [InlineData(2, 40, 200, 0, BandPassRefusal.CoilsTooLossy)]
    [InlineData(3, 100, 200, 0, BandPassRefusal.ThreeTooLossy)]
    [InlineData(2, 300, 200, 244, BandPassRefusal.NodeOvercommitted)]
    [InlineData(2, 300, 200, 243, BandPassRefusal.None)]
    public void Design_WhatCannotBe_IsRefusedAndTheNextThingIsNot(int order, double khz, double q, double unavoidablePf, BandPassRefusal refusal)
    {
        var design = TopCoupledDesign.Of(Forty with { Prototype = CouplingPrototype.Butterworth(order), Bandwidth3dB = Frequency.FromKilohertz(khz), UnloadedQ = q, Unavoidable = Capacitance.FromPicofarad(unavoidablePf) });

        Assert.Equal(refusal, design.Refusal);
        Assert.Equal(refusal == BandPassRefusal.None, design.Filter is not null);
    }

    [Fact]
    public void LeastBandwidth_LittleMore_IsNoLongerTooLossy()
    {
        var design = TopCoupledDesign.Of(Forty with { Bandwidth3dB = Frequency.FromKilohertz(40) });

        Assert.Equal(BandPassRefusal.CoilsTooLossy, TopCoupledDesign.Of(Forty with { Bandwidth3dB = design.LeastBandwidth * 0.999 }).Refusal);
        Assert.Equal(BandPassRefusal.None, TopCoupledDesign.Of(Forty with { Bandwidth3dB = design.LeastBandwidth * 1.001 }).Refusal);
    }

    [Fact]
    public void LargestCoil_LittleLess_LeavesTheNodesACapacitor()
    {
        var crowded = Forty with { Unavoidable = Capacitance.FromPicofarad(60) };
        var largest = TopCoupledDesign.Of(crowded).LargestCoil!.Value;

        Assert.Equal(BandPassRefusal.NodeOvercommitted, TopCoupledDesign.Of(crowded with { Coil = largest * 1.001 }).Refusal);
        Assert.Equal(BandPassRefusal.None, TopCoupledDesign.Of(crowded with { Coil = largest * 0.999 }).Refusal);
    }

    [Theory]
    [InlineData(2.0, 300, new BandPassRemark[0])]
    [InlineData(8.0, 300, new[] { BandPassRemark.CouplingSmall })]
    [InlineData(20.0, 300, new[] { BandPassRemark.CouplingTooSmall })]
    [InlineData(2.0, 800, new[] { BandPassRemark.Skewed })]
    public void Design_UnusualParts_AreRemarkedOn(double coilUh, double khz, BandPassRemark[] remarks) =>
        Assert.Equal(remarks, TopCoupledDesign.Of(Forty with { Coil = Inductance.FromMicrohenry(coilUh), Bandwidth3dB = Frequency.FromKilohertz(khz) }).Remarks);

    private static TopCoupledFilter Designed(ReferenceRow row) => TopCoupledDesign.Of(new(
        Prototypes.Of(row), Frequency.FromMegahertz(row.Number("center_mhz")), Frequency.FromKilohertz(row.Number("width_khz")), Inductance.FromMicrohenry(row.Number("coil_uh")), row.Number("unloaded_q"))).Filter!;

    // Node voltages by solving the admittance matrix: no chain of two-ports.
    private static double Nodal(TopCoupledFilter filter, Frequency f)
    {
        var (n, w) = (filter.NodeCapacitances.Length, f.RadiansPerSecond);
        var y = Matrix<Complex>.Build.Dense(n, n);
        for (var i = 0; i < n; i++)
        {
            y[i, i] += new Complex(0, w * filter.NodeCapacitances[i].Farad) + (1 / new Complex(filter.Center.RadiansPerSecond * filter.Coil.Henry / filter.UnloadedQ, w * filter.Coil.Henry));
            if (i == 0) continue;
            var c = new Complex(0, w * filter.Coupling.Farad);
            (y[i, i], y[i - 1, i - 1], y[i, i - 1], y[i - 1, i]) = (y[i, i] + c, y[i - 1, i - 1] + c, -c, -c);
        }

        y[0, 0] += 1 / filter.End.Ohm;
        y[n - 1, n - 1] += 1 / filter.End.Ohm;
        var current = Vector<Complex>.Build.Dense(n, i => i == 0 ? 1 / filter.End.Ohm : Complex.Zero);
        return -20 * Math.Log10(2 * y.Solve(current)[n - 1].Magnitude);
    }
}
