using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Networks;

public class LadderStressTests
{
    [Fact]
    public void Of_FiveWattThroughALossyFilter_MatchesPublishedFigures()
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
    public void Of_HalfTheLoadResistance_RaisesTheMiddleCapacitor()
    {
        var middle = Stress(25, 150, 1000).Arms[2];

        Assert.Equal(35.76, middle.Voltage.Volt, 35.76 * 0.005);
        Assert.Equal(1.144, middle.Current.Ampere, 1.144 * 0.005);
    }

    [Fact]
    public void Of_LosslessFilter_DeliversWhatTheTransmissionSays()
    {
        var passed = F7.ToLadder().At(Frequency.FromMegahertz(7.1)).S21(FiftyOhm, FiftyOhm).Magnitude;

        Assert.Equal(5 * passed * passed, Stress(50, null, null).Delivered.Watt, 1e-9);
    }

    private static LadderStress Stress(double loadOhm, double? coilQ, double? capacitorQ) =>
        LadderStress.Of(F7.ToLadder(coilQ, capacitorQ), Frequency.FromMegahertz(7.1), Power.FromWatt(5), FiftyOhm, loadOhm);
}
