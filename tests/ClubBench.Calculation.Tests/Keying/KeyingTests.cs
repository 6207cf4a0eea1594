using ClubBench.Calculation.Keying;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Keying;

public class KeyingTests
{
    private static readonly Duration FiveMilliseconds = Duration.FromMillisecond(5);

    public static TheoryData<ReferenceRow> Spectrum => ReferenceTable.Theory("keying_spectrum");

    [Theory]
    [MemberData(nameof(Spectrum))]
    public void DotLevel_Offset_MatchesTheRow(ReferenceRow row)
    {
        var offset = Frequency.FromHertz(row.Number("offset_hz"));
        var dot = TelegraphySpeed.FromWordsPerMinute(20).Dot;
        double Level(EdgeShape shape, bool crest = false) => new KeyingEnvelope(shape, FiveMilliseconds).DotLevel(offset, dot, crest).Db;

        Assert.Equal(row.Number("hard_dbc"), Level(EdgeShape.Hard), row.Number("tolerance"));
        Assert.Equal(row.Number("rc_dbc"), Level(EdgeShape.ResistorCapacitor), row.Number("tolerance"));
        if (row.Has("raised_cosine_dbc")) Assert.Equal(row.Number("raised_cosine_dbc"), Level(EdgeShape.RaisedCosine), row.Number("tolerance"));
        if (row.Has("crest_dbc")) Assert.Equal(row.Number("crest_dbc"), Level(EdgeShape.RaisedCosine, crest: true), row.Number("tolerance"));
    }

    [Theory]
    [Evidence(typeof(KeyingEnvelope), EvidenceKind.Identity)]
    [InlineData(EdgeShape.Linear)]
    [InlineData(EdgeShape.RaisedCosine)]
    [InlineData(EdgeShape.ResistorCapacitor)]
    public void EdgeCrest_AnyOffset_NeverBelowTheEdgeItself(EdgeShape shape)
    {
        var envelope = new KeyingEnvelope(shape, FiveMilliseconds);

        for (var hz = 5; hz < 3000; hz += 5)
            Assert.True(envelope.EdgeCrest(Frequency.FromHertz(hz)).Db >= envelope.EdgeLevel(Frequency.FromHertz(hz)).Db - 1e-9);
    }

    [Theory]
    [Evidence(typeof(KeyingEnvelope), EvidenceKind.IndependentRecomputation)]
    [InlineData(EdgeShape.Linear)]
    [InlineData(EdgeShape.RaisedCosine)]
    public void EdgeLevel_NumericalTransformOfTheEdge_Agrees(EdgeShape shape)
    {
        const int steps = 20_000;
        var (t, w) = (FiveMilliseconds.Second, 2 * Math.PI * 258.0);
        var sum = System.Numerics.Complex.Zero;
        for (var k = 0; k < steps; k++)
        {
            var x = (k + 0.5) / steps;
            var slope = shape == EdgeShape.Linear ? 1 / t : Math.PI / (2 * t) * Math.Sin(Math.PI * x);
            sum += slope * System.Numerics.Complex.Exp(new(0, -w * x * t)) * (t / steps);
        }

        var level = new KeyingEnvelope(shape, FiveMilliseconds).EdgeLevel(Frequency.FromHertz(258));

        Assert.Equal(20 * Math.Log10(sum.Magnitude), level.Db, 1e-4);
    }

    [Fact]
    public void EdgeLevel_RaisedCosineAtItsRemovableGap_IsSmooth()
    {
        var envelope = new KeyingEnvelope(EdgeShape.RaisedCosine, FiveMilliseconds);

        Assert.Equal(envelope.EdgeLevel(Frequency.FromHertz(100.01)).Db, envelope.EdgeLevel(Frequency.FromHertz(100)).Db, 0.01);
    }

    [Fact]
    [Evidence(typeof(KeyingEnvelope), EvidenceKind.ClosedFormLimit)]
    public void EdgeLevel_NearTheCarrier_IsAHardEdge() =>
        Assert.All(Enum.GetValues<EdgeShape>(), s => Assert.Equal(0, new KeyingEnvelope(s, FiveMilliseconds).EdgeLevel(Frequency.FromHertz(0.1)).Db, 1e-4));

    [Theory]
    [InlineData(25, true, 100)]
    [InlineData(25, false, 60)]
    [InlineData(12, true, 48)]
    [InlineData(20, true, 80)]
    public void NecessaryBandwidth_Speed_MatchesWorkedFigures(double words, bool fading, double hertz) =>
        Assert.Equal(hertz, TelegraphySpeed.FromWordsPerMinute(words).NecessaryBandwidthHertz(fading), 1e-9);

    [Fact]
    public void RiseOf_TwentyOhmAnd100Microfarad_Is4Point4Milliseconds() =>
        Assert.Equal(4.4, KeyingEnvelope.RiseOf(Resistance.FromOhm(20), Capacitance.FromMicrofarad(100)).Millisecond, 0.05);

    [Theory]
    [InlineData(0.5)]
    [InlineData(101)]
    public void FromWordsPerMinute_OutsideItsRange_Throws(double words) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => TelegraphySpeed.FromWordsPerMinute(words));

    // The example printed for telegraphy in itu-r-sm1138 (and cfr-47-2): 25 words a minute, B = 20 baud, K = 5.
    [Fact]
    [Evidence(typeof(TelegraphySpeed), EvidenceKind.PublishedValue)]
    public void NecessaryBandwidth_WorkedExampleOfTheRecommendation_Is20BaudAnd100Hertz()
    {
        var speed = TelegraphySpeed.FromWordsPerMinute(25);

        Assert.Equal(20, speed.DesignatorBaud, 1e-9);
        Assert.Equal(100, speed.NecessaryBandwidthHertz(), 1e-9);
    }

    [Theory]
    [Evidence(typeof(TelegraphySpeed), EvidenceKind.ClosedFormLimit)]
    [InlineData(1, 1200)]
    [InlineData(12, 100)]
    [InlineData(20, 60)]
    public void Dot_WordOfFiftyElements_FillsTheMinute(double words, double milliseconds)
    {
        var dot = TelegraphySpeed.FromWordsPerMinute(words).Dot;

        Assert.Equal(milliseconds, dot.Millisecond, 1e-9);
        Assert.Equal(60, words * 50 * dot.Second, 1e-9);
    }

    [Fact]
    [Evidence(typeof(TelegraphySpeed), EvidenceKind.Identity)]
    public void NecessaryBandwidth_AnySpeed_GrowsInProportionAndByFiveThirdsWithFading() => Gen.Select(Gen.Double[1, 50], Gen.Double[1, 2]).Sample((words, faster) =>
    {
        var (slow, fast) = (TelegraphySpeed.FromWordsPerMinute(words), TelegraphySpeed.FromWordsPerMinute(words * faster));
        Assert.Equal(faster, fast.NecessaryBandwidthHertz() / slow.NecessaryBandwidthHertz(), 1e-9);
        Assert.Equal(5.0 / 3, slow.NecessaryBandwidthHertz() / slow.NecessaryBandwidthHertz(fading: false), 1e-9);
        Assert.Equal(slow.Dot.Second * slow.DesignatorBaud, fast.Dot.Second * fast.DesignatorBaud, 1e-9);
    });
}
