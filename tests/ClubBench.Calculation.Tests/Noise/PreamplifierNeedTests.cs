using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Noise;

public class PreamplifierNeedTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("preamplifier-need");

    public static TheoryData<ReferenceRow> GainRows => ReferenceTable.Theory("preamplifier-gain");

    [Theory]
    [MemberData(nameof(Rows))]
    public void Need_ReferenceRow_GivesThePrintedFigure(ReferenceRow row)
    {
        var site = Enum.Parse<NoiseSite>(row["site"]);
        var frequency = Frequency.FromMegahertz(row.Number("f_mhz"));
        var own = Decibels.FromDb(row.Has("noise_figure_and_loss_db") ? row.Number("noise_figure_and_loss_db") : 15);

        var judgement = PreamplifierNeed.Judge(own, site, frequency);

        var figure = row["quantity"] == "limit_db" ? judgement.LargestNoiseFigureAndLoss : judgement.AtQuietHour;
        Assert.Equal(row.Number("expected"), figure.Db, row.Number("tolerance"));
    }

    [Theory]
    [InlineData(7.03, 29, PreamplifierVerdict.NotNeeded)]
    [InlineData(14.06, 29, PreamplifierVerdict.Marginal)]
    [InlineData(28.06, 29, PreamplifierVerdict.Needed)]
    public void Judge_RuralSiteLossyDirectConversionSet_FollowsTheTradesExpectation(double mhz, double ownDb, PreamplifierVerdict expected) =>
        Assert.Equal(expected, PreamplifierNeed.Judge(Decibels.FromDb(ownDb), NoiseSite.Rural, Frequency.FromMegahertz(mhz)).Verdict);

    [Fact]
    public void Judge_SameSetWithTheDirectConversionCredit_IsAdequateAt14Megahertz()
    {
        var own = Decibels.FromDb(29) - PreamplifierNeed.DirectConversionCredit;

        var judgement = PreamplifierNeed.Judge(own, NoiseSite.Rural, Frequency.FromMegahertz(14.06));

        Assert.Equal(PreamplifierVerdict.Adequate, judgement.Verdict);
        Assert.Equal(0.98, judgement.AtQuietHour.Db, 0.01);
    }

    [Fact]
    [Evidence(typeof(PreamplifierNeed), EvidenceKind.ClosedFormLimit)]
    public void Degradation_NoiselessReceiver_IsNone() =>
        Assert.Equal(0, PreamplifierNeed.Degradation(Decibels.Zero, Decibels.FromDb(20)).Db, 1e-12);

    [Fact]
    [Evidence(typeof(PreamplifierNeed), EvidenceKind.RoundTrip)]
    public void LargestFor_GoesBackToTheSameDegradation()
    {
        var own = PreamplifierNeed.LargestFor(Decibels.FromDb(0.7), Decibels.FromDb(22));

        Assert.Equal(0.7, PreamplifierNeed.Degradation(own, Decibels.FromDb(22)).Db, 1e-12);
    }

    [Theory]
    [MemberData(nameof(GainRows))]
    public void Preamplifier_ReferenceRow_GivesItsFigure(ReferenceRow row)
    {
        var figure = Figure(row)?.Db;

        Assert.Equal(row.Has("expected"), figure is not null);
        if (figure is { } db) Assert.Equal(row.Number("expected"), db, row.Number("tolerance"));
    }

    [Fact]
    [Evidence(typeof(PreamplifierNeed), EvidenceKind.IndependentRecomputation)]
    public void RequiredGain_Applied_LeavesTheWantedDegradation()
    {
        var gain = Gain(15, 4, 1, 19.02)!.Value;
        var chain = new[]
        {
            ReceiverStage.Loss(Decibels.FromDb(1), Temperature.FromCelsius(16.85)),
            new ReceiverStage(gain, Decibels.FromDb(4)),
            new ReceiverStage(Decibels.Zero, Decibels.FromDb(15)),
        };

        Assert.Equal(0.5, PreamplifierNeed.Degradation(Cascade.NoiseFigure(chain), Decibels.FromDb(19.02)).Db, 1e-9);
    }

    [Fact]
    [Evidence(typeof(PreamplifierNeed), EvidenceKind.ClosedFormLimit)]
    public void RequiredGain_NoneNeeded_IsZero() => Assert.Equal(Decibels.Zero, Gain(15, 4, 0, 40));

    private static Decibels? Figure(ReferenceRow row)
    {
        var receiver = Decibels.FromDb(row.Number("receiver_db"));
        return row["quantity"] switch
        {
            "degradation_db" => PreamplifierNeed.Degradation(receiver, Db(row, "external_db")),
            "degradation_direct_db" => PreamplifierNeed.Degradation(receiver - PreamplifierNeed.DirectConversionCredit, Db(row, "external_db")),
            "gain_db" => PreamplifierNeed.RequiredGain(receiver, Db(row, "preamplifier_db"), Db(row, "loss_db"), Db(row, "external_db"), Db(row, "degradation_db")),
            "external_db" => ExternalNoise.FromMeasuredRise(receiver, Db(row, "degradation_db")),
            "rise_degradation_db" => PreamplifierNeed.Degradation(receiver, ExternalNoise.FromMeasuredRise(receiver, Db(row, "degradation_db"))),
            "pad_db" => ReceiverStage.Loss(receiver, Temperature.FromCelsius(400 - 273.15)).NoiseFigure,
            var other => throw new InvalidOperationException(other),
        };
    }

    private static Decibels Db(ReferenceRow row, string column) => Decibels.FromDb(row.Number(column));

    private static Decibels? Gain(double receiverDb, double preamplifierDb, double lossDb, double externalDb) => PreamplifierNeed.RequiredGain(
        Decibels.FromDb(receiverDb), Decibels.FromDb(preamplifierDb), Decibels.FromDb(lossDb), Decibels.FromDb(externalDb), Decibels.FromDb(0.5));
}
