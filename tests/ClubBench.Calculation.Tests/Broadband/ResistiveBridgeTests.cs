using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Broadband;

public class ResistiveBridgeTests
{
    [Theory]
    [InlineData(75.0, 0.1, 1.111)]
    [InlineData(25.0, 0.1667, 1.167)]
    [InlineData(null, 0.5, 2.0)]
    [InlineData(0.0, 0.5, 1.5)]
    [InlineData(50.0, 0.0, 1.0)]
    [Evidence(typeof(ResistiveBridge), EvidenceKind.ClosedFormLimit)]
    public void ResistiveBridge_Load_MatchesTheWorkedExamples(double? load, double detector, double standingWaveRatio)
    {
        var bridge = new ResistiveBridge(Resistance.FromOhm(50));
        Resistance? resistance = load is { } ohm ? Resistance.FromOhm(ohm) : null;

        Assert.Equal(detector, bridge.DetectorShare(resistance), 0.00005);
        Assert.Equal(standingWaveRatio, bridge.SourceStandingWaveRatio(resistance), 0.0005);
        Assert.Equal(6.02, ResistiveBridge.MatchedLoss.Db, 0.005);
    }

    [Fact]
    [Evidence(typeof(ResistiveBridge), EvidenceKind.IndependentRecomputation)]
    public void DetectorAndSource_BridgeByNodalAnalysis_Agree() =>
        Gen.Double[1, 2000].Sample(ohm =>
        {
            // One volt on top. Both halves: an arm down to its corner, an arm or the load from there to ground; the detector between the corners draws nothing.
            var (known, unknown) = (Corner(1 / 50.0), Corner(1 / ohm));
            var current = ((1 - known) / 50) + ((1 - unknown) / 50);
            var input = 1 / current;
            var bridge = new ResistiveBridge(Resistance.FromOhm(50));
            return Math.Abs(bridge.DetectorShare(Resistance.FromOhm(ohm)) - Math.Abs(unknown - known)) < 1e-12
                && Math.Abs(bridge.SourceStandingWaveRatio(Resistance.FromOhm(ohm)) - Math.Max(input / 50, 50 / input)) < 1e-9;

            static double Corner(double lowerSiemens) => (1 / 50.0) / ((1 / 50.0) + lowerSiemens);
        });

    [Fact]
    [Evidence(typeof(ResistiveBridge), EvidenceKind.Identity)]
    public void DetectorShare_LoadsEitherSideOfTheLine_AreAlikeAndNeverAboveAHalf() =>
        Gen.Double[1, 2500].Sample(ohm =>
        {
            var bridge = new ResistiveBridge(Resistance.FromOhm(50));
            var share = bridge.DetectorShare(Resistance.FromOhm(ohm));
            return Math.Abs(share - bridge.DetectorShare(Resistance.FromOhm(2500 / ohm))) < 1e-12 && share < 0.5
                && bridge.SourceStandingWaveRatio(Resistance.FromOhm(ohm)) is >= 1 - 1e-12 and <= 2;
        });
}
