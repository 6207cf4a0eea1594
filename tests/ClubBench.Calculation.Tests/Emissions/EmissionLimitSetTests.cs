using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using CsCheck;

namespace ClubBench.Calculation.Tests.Emissions;

public class EmissionLimitSetTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("emission_limits");

    [Theory]
    [Evidence(typeof(EmissionLimitSet), EvidenceKind.PublishedValue)]
    [Evidence(typeof(EmissionLimitRule), EvidenceKind.PublishedValue)]
    [MemberData(nameof(Rows))]
    public void Required_PowerAndCarrier_MatchesTheRow(ReferenceRow row)
    {
        var answer = EmissionLimitSet.Find(row["set_id"])!.Required(Power.FromWatt(row.Number("power_w")), Frequency.FromMegahertz(row.Number("carrier_mhz")));

        Assert.Equal(EmissionLimitRefusal.None, answer.Refusal);
        Assert.Equal(row.Number("required_db"), answer.Attenuation!.Value.Db, row.Number("tolerance"));
    }

    [Fact]
    [Evidence(typeof(EmissionLimitSet), EvidenceKind.ClosedFormLimit)]
    public void Required_EmptyLicence_RefusesInsteadOfJudging()
    {
        var answer = EmissionLimitSet.NationalLicence.Required(Power.FromWatt(5), Frequency.FromMegahertz(7.03));

        Assert.Equal((EmissionLimitRefusal.SetIsEmpty, null), (answer.Refusal, answer.Attenuation));
    }

    [Theory]
    [InlineData("fcc-97307d-new", 8, 50.1, EmissionLimitRefusal.CarrierOutsideSet)]
    [InlineData("fcc-97307e", 8, 7.03, EmissionLimitRefusal.CarrierOutsideSet)]
    [InlineData("itu-a-amateur", 0, 7.03, EmissionLimitRefusal.PowerNotAboveZero)]
    public void Required_OutsideTheSet_RefusesWithTheReason(string set, double watt, double megahertz, EmissionLimitRefusal reason) =>
        Assert.Equal(reason, EmissionLimitSet.Find(set)!.Required(Power.FromWatt(watt), Frequency.FromMegahertz(megahertz)).Refusal);

    [Fact]
    public void Required_ItuRow_IsMarkedFromMemory() =>
        Assert.Equal(
            SourceStatus.FromMemory,
            EmissionLimitSet.Find("itu-a-amateur")!.Required(Power.FromWatt(5), Frequency.FromMegahertz(7.03)).Rule!.Source.Status);

    [Fact]
    [Evidence(typeof(EmissionLimitSet), EvidenceKind.ClosedFormLimit)]
    public void Required_FilledLicence_JudgesByTheEnteredFigure()
    {
        var rule = EmissionLimitSet.Find("fcc-97307d-new")!.Rules[0] with { Attenuation = Decibels.FromDb(47) };
        var licence = EmissionLimitSet.NationalLicence with { Rules = [rule] };

        Assert.Equal(47, licence.Required(Power.FromWatt(5), Frequency.FromMegahertz(7.03)).Attenuation!.Value.Db);
    }

    [Fact]
    public void All_Sets_HaveResolvableSourcesAndUniqueIds()
    {
        Assert.Equal(EmissionLimitSet.All.Length, EmissionLimitSet.All.Select(s => s.Id).Distinct(StringComparer.Ordinal).Count());
        Assert.All(EmissionLimitSet.All.SelectMany(s => s.Rules), r => Assert.NotNull(Sources.Find(r.Source.SourceId)));
    }

    [Theory]
    [Evidence(typeof(EmissionLimitSet), EvidenceKind.Identity)]
    [Evidence(typeof(EmissionLimitRule), EvidenceKind.Identity)]
    [InlineData("itu-a-amateur")]
    [InlineData("fcc-97307d-new")]
    public void Required_MorePower_NeverAsksForLess(string set)
    {
        var asked = Enumerable.Range(1, 60).Select(k => EmissionLimitSet.Find(set)!.Required(Power.FromWatt(0.2 * k), Frequency.FromMegahertz(7)).Attenuation!.Value.Db).ToList();

        Assert.Equal(asked.Order(), asked);
    }

    [Fact]
    [Evidence(typeof(EmissionLimitRule), EvidenceKind.ClosedFormLimit)]
    public void Required_OneFigureAlone_IsThatFigure()
    {
        var bare = EmissionLimitSet.Find("fcc-97307d-new")!.Rules[0] with { Attenuation = null };

        Assert.Equal(0, bare.Required(Power.FromWatt(5)).Db);
        Assert.Equal(43, (bare with { Attenuation = Decibels.FromDb(43) }).Required(Power.FromWatt(5)).Db);
        Assert.Equal(40, (bare with { EmissionMax = PowerLevel.FromDbm(-10) }).Required(Power.FromWatt(1)).Db, 1e-9);
        Assert.Equal(20, (bare with { Attenuation = Decibels.FromDb(43), AttenuationCap = Decibels.FromDb(20) }).Required(Power.FromWatt(1)).Db);
    }

    [Fact]
    [Evidence(typeof(EmissionLimitRule), EvidenceKind.IndependentRecomputation)]
    [Evidence(typeof(EmissionLimitSet), EvidenceKind.IndependentRecomputation)]
    public void Required_WordsOfTheRuleWorkedOutInWatts_Agree() => Gen.Double[0.02, 24.9].Sample(watt =>
    {
        // At most 25 microwatt and at least 40 dB down, but never required below 10 microwatt.
        var permitted = Math.Max(Math.Min(25e-6, watt / 10_000), 10e-6);

        var asked = EmissionLimitSet.Find("fcc-97307e")!.Required(Power.FromWatt(watt), Frequency.FromMegahertz(50.1)).Attenuation!.Value;

        Assert.Equal(10 * Math.Log10(watt / permitted), asked.Db, 1e-4);
    });
}
