using System.Numerics;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using CsCheck;

namespace ClubBench.Calculation.Tests.Resonators;

public class ResonatorLoadingTests
{
    private static readonly Frequency F = Frequency.FromMegahertz(7.1);

    private static readonly Gen<ResonatorLoading> Loadings = Gen.Select(
        Gen.Double[50, 500], Gen.Double[30, 300], Gen.Double[500, 20_000], Gen.Double[500, 20_000],
        (x, q, source, load) => new ResonatorLoading(F, Resistance.FromOhm(x), q, Resistance.FromOhm(source), Resistance.FromOhm(load)));

    [Fact]
    [Evidence(typeof(ResonatorLoading), EvidenceKind.ClosedFormLimit)]
    public void Loading_LosslessCoilBetweenEqualEnds_LosesNothing()
    {
        var loading = new ResonatorLoading(F, Resistance.FromOhm(200), 1e12, Resistance.FromOhm(4000), Resistance.FromOhm(4000));

        Assert.Equal(10, loading.LoadedQ, 6);
        Assert.Equal(0, loading.InsertionLoss.Db, 6);
        Assert.True(ResonatorLoading.TryMatchedLoss(10, 1e12, out var matched) && matched.Db < 1e-6);
    }

    [Fact]
    [Evidence(typeof(ResonatorLoading), EvidenceKind.Identity)]
    public void Loading_SourceAndLoadExchanged_IsTheSame() =>
        Loadings.Sample(a =>
        {
            var b = a with { Source = a.Load, Load = a.Source };
            return Math.Abs((a.LoadedQ / b.LoadedQ) - 1) < 1e-12 && Math.Abs(a.InsertionLoss.Db - b.InsertionLoss.Db) < 1e-9 && a.LoadedQ < a.UnloadedQ && a.InsertionLoss.Db > 0;
        });

    [Fact]
    [Evidence(typeof(ResonatorLoading), EvidenceKind.IndependentRecomputation)]
    public void BandwidthAndLoss_ResponseSearchedForItsEdges_Agree() =>
        Loadings.Sample(
            a =>
            {
                var width = Edge(a, 1, 2) - Edge(a, 1, 0.5);
                var loss = -10 * Math.Log10(Passed(a, 1));
                return Math.Abs((a.Bandwidth3dB / F / width) - 1) < 1e-6 && Math.Abs(a.InsertionLoss.Db - loss) < 1e-9;
            },
            iter: 200);

    // Power in the load over what the source could give, at a multiple of the resonant frequency; coil and capacitor as admittances of their own.
    private static double Passed(ResonatorLoading a, double multiple)
    {
        var coil = 1 / new Complex(0, a.Reactance.Ohm * multiple);
        var capacitor = new Complex(0, multiple / a.Reactance.Ohm);
        var voltage = 1 / (coil + capacitor + (1 / (a.UnloadedQ * a.Reactance.Ohm)) + (1 / a.Source.Ohm) + (1 / a.Load.Ohm));
        return voltage.Magnitude * voltage.Magnitude / a.Load.Ohm / (a.Source.Ohm / 4);
    }

    private static double Edge(ResonatorLoading a, double inside, double outside)
    {
        var half = Passed(a, 1) / 2;
        for (var i = 0; i < 60; i++)
        {
            var middle = (inside + outside) / 2;
            (inside, outside) = Passed(a, middle) > half ? (middle, outside) : (inside, middle);
        }

        return inside;
    }
}
