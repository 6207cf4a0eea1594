using ClubBench.Calculation.Audio;
using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Audio;

public class AudioTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("audio");

    [Theory]
    [Evidence(typeof(MultipleFeedbackBandPass), EvidenceKind.ClosedFormLimit)]
    [Evidence(typeof(GainBudget), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Rows))]
    public void Audio_ReferenceRow_GivesThePrintedFigure(ReferenceRow row) =>
        Assert.Equal(row.Number("expected"), Figure(row), row.Number("tolerance"));

    [Fact]
    [Evidence(typeof(MultipleFeedbackBandPass), EvidenceKind.RoundTrip)]
    public void BandPassFor_AnyWish_ComesBackWithCentreQAndGain() =>
        Gen.Select(Gen.Double[300, 1500], Gen.Double[2, 10], Gen.Double[0.5, 4]).Sample((hz, q, gain) =>
        {
            var section = MultipleFeedbackBandPass.For(Frequency.FromHertz(hz), q, gain, Capacitance.FromNanofarad(10))!;
            Assert.Equal(hz, section.Centre.Hertz, hz * 1e-9);
            Assert.Equal(q, section.Q, q * 1e-9);
            Assert.Equal(gain, section.CentreGain, gain * 1e-9);
        });

    [Theory]
    [InlineData(8.0)]
    [InlineData(9.0)]
    public void BandPassFor_GainOfTwoQSquaredOrMore_HasNoSolution(double gain) =>
        Assert.Null(MultipleFeedbackBandPass.For(Frequency.FromHertz(700), 2, gain, Capacitance.FromNanofarad(10)));

    [Fact]
    public void TwoSections_Width_ShrinksBy0Point6436() => Assert.Equal(0.6436, MultipleFeedbackBandPass.TwoSectionShrink, 5e-5);

    [Fact]
    public void TimerHighShare_NoUpperResistor_IsOneHalf() =>
        Assert.Equal(0.5, new TimerAstable(default, Resistance.FromKiloohm(10), Capacitance.FromNanofarad(10)).HighShare, 1e-12);

    [Fact]
    [Evidence(typeof(PitchAgreement), EvidenceKind.ClosedFormLimit)]
    public void OddOneOut_SidetoneFarAway_IsNamed() =>
        Assert.Equal("sidetone", PitchAgreement.OddOneOut([Pitch("filter", 701), Pitch("sidetone", 820), Pitch("offset", 690)]));

    [Fact]
    [Evidence(typeof(PitchAgreement), EvidenceKind.ClosedFormLimit)]
    public void OddOneOut_AllWithin50Hertz_NamesNone() =>
        Assert.Null(PitchAgreement.OddOneOut([Pitch("filter", 701), Pitch("sidetone", 687), Pitch("offset", 663)]));

    [Fact]
    public void MarginAfter_OctavesUp_ShrinksByTheFallOfTheNoiseAndComesBack()
    {
        var (low, high) = (Frequency.FromMegahertz(7), Frequency.FromMegahertz(28));

        var after = GainBudget.MarginAfter(Decibels.FromDb(10), low, high);

        Assert.Equal(10 - (2 * 8.34), after.Db, 0.01);
        Assert.Equal(10, GainBudget.MarginAfter(after, high, low).Db, 1e-12);
    }

    [Fact]
    [Evidence(typeof(MultipleFeedbackBandPass), EvidenceKind.IndependentRecomputation)]
    public void BandPass_CircuitByItsNodes_HasThatCentreGainAndWidth()
    {
        var section = new MultipleFeedbackBandPass(Resistance.FromKiloohm(62), Resistance.FromKiloohm(3), Resistance.FromKiloohm(180), Capacitance.FromNanofarad(10));
        var upper = (section.Bandwidth3dBHertz / 2) + Math.Sqrt(Math.Pow(section.Centre.Hertz, 2) + Math.Pow(section.Bandwidth3dBHertz / 2, 2));

        Assert.Equal(-section.CentreGain, Response(section.Centre.Hertz).Real, 1e-6);
        Assert.Equal(0, Response(section.Centre.Hertz).Imaginary, 1e-6);
        foreach (var edge in new[] { upper, upper - section.Bandwidth3dBHertz })
            Assert.Equal(section.CentreGain / Math.Sqrt(2), Response(edge).Magnitude, 1e-6);
    }

    [Fact]
    [Evidence(typeof(GainBudget), EvidenceKind.ClosedFormLimit)]
    public void Required_VoltageAlreadyAtTheAntenna_IsNone() =>
        Assert.Equal(0, GainBudget.Required(PowerLevel.FromDbm(0), Resistance.FromOhm(50), Voltage.FromVolt(Math.Sqrt(0.05))).Db, 1e-9);

    [Fact]
    [Evidence(typeof(GainBudget), EvidenceKind.Identity)]
    public void ExtraFor_ByWayOfAThirdBand_IsTheSame() => Gen.Select(Gen.Double[1, 50], Gen.Double[1, 50], Gen.Double[1, 50]).Sample((a, b, c) =>
        Assert.Equal(Extra(a, c).Db, (Extra(a, b) + Extra(b, c)).Db, 1e-9));

    [Fact]
    [Evidence(typeof(GainBudget), EvidenceKind.IndependentRecomputation)]
    public void ExtraFor_NoiseOfBothBandsFromTheSiteModel_IsTheirDifference()
    {
        double Noise(double mhz) => ExternalNoise.ManMade(NoiseSite.Residential, Frequency.FromMegahertz(mhz)).Db;

        Assert.Equal(Noise(7.03) - Noise(21.06), Extra(7.03, 21.06).Db, 1e-9);
    }

    [Fact]
    [Evidence(typeof(PitchAgreement), EvidenceKind.IndependentRecomputation)]
    public void OddOneOut_OfThree_IsTheOneWithoutWhichTheOthersAgreeBest() =>
        Gen.Double[400, 900].Array[3].Where(p => p.Max() - p.Min() > 50).Sample(hertz =>
        {
            var odd = Enumerable.Range(0, 3).MinBy(i => Math.Abs(hertz[(i + 1) % 3] - hertz[(i + 2) % 3]));
            Assert.Equal($"{odd}", PitchAgreement.OddOneOut(Pitches(hertz)));
        });

    [Fact]
    [Evidence(typeof(PitchAgreement), EvidenceKind.Identity)]
    public void OddOneOut_AllMovedAlike_IsStillTheSame() => Gen.Select(Gen.Int[400, 900].Select(h => (double)h).Array[3, 6], Gen.Int[1, 200]).Sample((hertz, moved) =>
        Assert.Equal(PitchAgreement.OddOneOut(Pitches(hertz)), PitchAgreement.OddOneOut(Pitches([.. hertz.Select(h => h + moved)]))));

    // Node 1 joins R1, R2 and both capacitors, node 2 is the inverting input, node 3 the output of a practically ideal amplifier; one volt at R1.
    private static System.Numerics.Complex Response(double hertz)
    {
        var capacitor = NodalCircuit.Capacitor(2 * Math.PI * hertz, 10e-9);
        return new NodalCircuit(3)
            .Element(1, 0, 62e3).Element(1, 0, 3e3).Element(1, 3, capacitor).Element(1, 2, capacitor).Element(2, 3, 180e3)
            .Element(3, 0, 1).CurrentSource(3, 0, 2, 0, 1e9)
            .Voltages(1, 1 / 62e3)[3];
    }

    private static Decibels Extra(double fromMhz, double toMhz) => GainBudget.ExtraFor(Frequency.FromMegahertz(fromMhz), Frequency.FromMegahertz(toMhz));

    private static KeyValuePair<string, Frequency>[] Pitches(double[] hertz) => [.. hertz.Select((h, i) => Pitch($"{i}", h))];

    private static KeyValuePair<string, Frequency> Pitch(string name, double hertz) => new(name, Frequency.FromHertz(hertz));

    private static double Figure(ReferenceRow row) => row["quantity"] switch
    {
        "centre_hz" => Section(row).Centre.Hertz,
        "q" => Section(row).Q,
        "gain" => Section(row).CentreGain,
        "width_hz" => Section(row).Bandwidth3dBHertz,
        "two_sections_hz" => Section(row).TwoSectionBandwidth3dBHertz,
        "design_r1" => Designed(row).Input.Ohm,
        "design_r2" => Designed(row).ToGround.Ohm,
        "design_r3" => Designed(row).Feedback.Ohm,
        "timer_hz" => new TimerAstable(Ohm(row, "a"), Ohm(row, "b"), Nanofarad(row)).Frequency.Hertz,
        "required_gain_db" => GainBudget.Required(PowerLevel.FromDbm(row.Number("a")), Ohm(row, "b"), Voltage.FromMillivolt(row.Number("c"))).Db,
        "extra_db" => GainBudget.ExtraFor(Frequency.FromMegahertz(row.Number("a")), Frequency.FromMegahertz(row.Number("b"))).Db,
        var other => throw new InvalidOperationException(other),
    };

    private static MultipleFeedbackBandPass Section(ReferenceRow row) => new(Ohm(row, "a"), Ohm(row, "b"), Ohm(row, "c"), Nanofarad(row));

    private static MultipleFeedbackBandPass Designed(ReferenceRow row) =>
        MultipleFeedbackBandPass.For(Frequency.FromHertz(row.Number("a")), row.Number("b"), row.Number("c"), Nanofarad(row))!;

    private static Resistance Ohm(ReferenceRow row, string column) => Resistance.FromOhm(row.Number(column));

    private static Capacitance Nanofarad(ReferenceRow row) => Capacitance.FromNanofarad(row.Number("d_nf"));
}
