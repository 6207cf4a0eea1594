using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Mixing;

public class FrequencyMultiplierTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("multiplier");

    public static TheoryData<ReferenceRow> Losses => ReferenceTable.Theory("ring-mixer-loss");

    [Theory]
    [Evidence(typeof(FrequencyMultiplier), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Rows))]
    public void Multiplier_ReferenceRow_GivesItsFigure(ReferenceRow row)
    {
        var multiplier = new FrequencyMultiplier((int)row.Number("multiple"), ConductionAngle.FromDegrees(row.Number("degrees")), row.Number("loaded_q"));

        var figure = row["quantity"] switch
        {
            "output_current" => multiplier.OutputCurrent,
            "below_fundamental_db" => multiplier.BelowFundamental!.Value.Db,
            var neighbour => multiplier.Neighbour(neighbour[9] - '0')!.Value.Db,
        };

        Assert.Equal(row.Number("expected"), figure, row.Number("tolerance"));
    }

    [Theory]
    [Evidence(typeof(FrequencyMultiplier), EvidenceKind.IndependentRecomputation)]
    [InlineData(2, 120)]
    [InlineData(3, 80)]
    [InlineData(4, 60)]
    public void BestAngle_Multiple_GivesMoreThanAnyOther(int multiple, double degrees)
    {
        var best = FrequencyMultiplier.BestAngle(multiple);

        Assert.Equal(degrees, best.Degrees, 1e-9);
        Assert.All(Enumerable.Range(4, 86).Where(i => Math.Abs((2 * i) - degrees) > 4), i =>
            Assert.True(Math.Abs(ConductionAngle.FromDegrees(Math.Max(10, 2 * i)).Amplitude(multiple)) < Math.Abs(best.Amplitude(multiple)) + 1e-3));
    }

    [Fact]
    [Evidence(typeof(FrequencyMultiplier), EvidenceKind.IndependentRecomputation)]
    public void OutputCurrent_Pulses_IsTheFourierIntegral()
    {
        // Sampled top of a sine, summed: no closed form.
        var (half, samples, sum) = (Math.PI / 3, 200_000, 0.0);
        for (var i = 0; i < samples; i++)
        {
            var angle = ((i + 0.5) / samples * 2 * half) - half;
            sum += (Math.Cos(angle) - Math.Cos(half)) / (1 - Math.Cos(half)) * Math.Cos(2 * angle);
        }

        var integral = sum * 2 * half / samples / Math.PI;
        Assert.Equal(integral, new FrequencyMultiplier(2, ConductionAngle.FromDegrees(120), 10).OutputCurrent, 1e-6);
    }

    [Fact]
    public void Neighbour_TwiceTheLoadedQ_IsNearlySixDecibelsFurtherDown() => Assert.Equal(
        6.02,
        new FrequencyMultiplier(2, FrequencyMultiplier.BestAngle(2), 20).Neighbour(1)!.Value.Db - new FrequencyMultiplier(2, FrequencyMultiplier.BestAngle(2), 40).Neighbour(1)!.Value.Db,
        0.03);

    [Fact]
    public void Neighbour_TheWantedMultiple_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => new FrequencyMultiplier(2, FrequencyMultiplier.BestAngle(2), 20).Neighbour(2));

    [Theory]
    [InlineData(1)]
    [InlineData(6)]
    public void Multiplier_MultipleOutsideTwoToFive_Throws(int multiple) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => new FrequencyMultiplier(multiple, ConductionAngle.FromDegrees(120), 10));

    [Theory]
    [Evidence(typeof(RingMixerLoss), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Losses))]
    public void RingLoss_ReferenceRow_IsThatOfTheTable(ReferenceRow row) =>
        Assert.Equal(row.Number("expected_db"), RingMixerLoss.At(PowerLevel.FromDbm(row.Number("drive_dbm")))!.Value.Db, row.Number("tolerance_db"));

    [Fact]
    [Evidence(typeof(RingMixerLoss), EvidenceKind.Identity)]
    public void RingLoss_MoreDrive_NeverLosesMore()
    {
        var losses = Enumerable.Range(0, 121).Select(i => RingMixerLoss.At(PowerLevel.FromDbm(-2 + (0.1 * i)))!.Value.Db).ToList();

        Assert.Equal(losses.OrderDescending(), losses);
        Assert.True(losses[^1] > MixerFigures.IdealSwitchingLoss.Db);
    }

    [Theory]
    [InlineData(-2.1)]
    [InlineData(10.1)]
    public void RingLoss_OutsideTheTable_IsNotGiven(double dbm) => Assert.Null(RingMixerLoss.At(PowerLevel.FromDbm(dbm)));

    [Fact]
    public void MixerFigures_RingWithPlus7_LeaksLessThanMinus28ToTheAntenna() => Assert.Equal(
        -28,
        OscillatorLevel.AtAntenna(PowerLevel.FromDbm(7), MixerFigures.All[MixerKind.DiodeRingLevel7].LeastIsolation, Decibels.Zero).Dbm,
        1e-9);
}
