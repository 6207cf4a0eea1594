using ClubBench.Calculation.Audio;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Audio;

public class AudioTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("audio");

    [Theory]
    [MemberData(nameof(Rows))]
    public void Audio_ReferenceRow_GivesThePrintedFigure(ReferenceRow row) =>
        Assert.Equal(row.Number("expected"), Figure(row), row.Number("tolerance"));

    [Fact]
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
    public void OddOneOut_SidetoneFarAway_IsNamed() =>
        Assert.Equal("sidetone", PitchAgreement.OddOneOut([Pitch("filter", 701), Pitch("sidetone", 820), Pitch("offset", 690)]));

    [Fact]
    public void OddOneOut_AllWithin50Hertz_NamesNone() =>
        Assert.Null(PitchAgreement.OddOneOut([Pitch("filter", 701), Pitch("sidetone", 687), Pitch("offset", 663)]));

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
