using System.Numerics;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using CsCheck;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Filters;

public class LowPassDesignTests
{
    [Fact]
    [Evidence(typeof(LowPassDesign), EvidenceKind.ClosedFormLimit)]
    public void HalfWave_AtItsDesignFrequency_RepeatsAnyLoadAtTheInput() =>
        Gen.Select(Gen.Double[1, 60], Gen.Double[5, 500], Gen.Double[-200, 200]).Sample((mhz, ohm, reactance) =>
        {
            var (f, load) = (Frequency.FromMegahertz(mhz), new Complex(ohm, reactance));
            return (LowPassDesign.HalfWave(f, FiftyOhm).ToLadder().At(f).InputImpedance(load) - load).Magnitude < 1e-9 * load.Magnitude;
        });

    [Fact]
    [Evidence(typeof(LowPassDesign), EvidenceKind.ClosedFormLimit)]
    public void HalfWave_AtItsCutOff_LosesWhatTheConstantKSectionsSay()
    {
        // At 1.414 times the design frequency each section has A = D = -1 and B = j R sqrt 2, so two of them have A = D = 1 and B = -2 j R sqrt 2.
        var f = Frequency.FromMegahertz(7.1);

        var loss = LowPassDesign.HalfWave(f, FiftyOhm).ToLadder().Loss(f * Math.Sqrt(2), FiftyOhm, FiftyOhm);

        Assert.Equal(10 * Math.Log10(3), loss.Db, 1e-9);
    }

    [Fact]
    [Evidence(typeof(LowPassDesign), EvidenceKind.Identity)]
    public void ToLadder_ResistancesAndPartsScaledTogether_KeepsTheLoss() =>
        Gen.Select(Gen.Double[0.1, 10], Gen.Double[1, 60]).Sample((k, mhz) =>
        {
            var scaled = new LowPassDesign(F14.Form, [.. F14.Capacitors.Select(c => c / k)], [.. F14.Coils.Select(l => l * k)], k * F14.Source, k * F14.Load);
            var f = Frequency.FromMegahertz(mhz);
            return Math.Abs(F14.ToLadder(150, 1000).Loss(f, F14.Source, F14.Load).Db - scaled.ToLadder(150, 1000).Loss(f, scaled.Source, scaled.Load).Db) < 1e-6;
        });

    [Theory]
    [InlineData(LowPassForm.ShuntCapacitorFirst, "CLCLC")]
    [InlineData(LowPassForm.SeriesInductorFirst, "LCLCL")]
    public void IsCapacitor_EveryPlace_AlternatesFromTheFirst(LowPassForm form, string parts)
    {
        var design = LowPassPrototype.Butterworth(5).Denormalise(Frequency.FromMegahertz(8), FiftyOhm, form);

        Assert.Equal(parts, string.Concat(Enumerable.Range(0, design.Order).Select(k => design.IsCapacitor(k) ? 'C' : 'L')));
    }
}
