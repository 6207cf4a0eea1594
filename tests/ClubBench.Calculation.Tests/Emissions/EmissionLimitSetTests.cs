using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Tests.Emissions;

public class EmissionLimitSetTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("emission_limits");

    [Theory]
    [MemberData(nameof(Rows))]
    public void Required_PowerAndCarrier_MatchesTheRow(ReferenceRow row)
    {
        var answer = EmissionLimitSet.Find(row["set_id"])!.Required(Power.FromWatt(row.Number("power_w")), Frequency.FromMegahertz(row.Number("carrier_mhz")));

        Assert.Equal(EmissionLimitRefusal.None, answer.Refusal);
        Assert.Equal(row.Number("required_db"), answer.Attenuation!.Value.Db, row.Number("tolerance"));
    }

    [Fact]
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
    [InlineData("itu-a-amateur")]
    [InlineData("fcc-97307d-new")]
    public void Required_MorePower_NeverAsksForLess(string set)
    {
        var asked = Enumerable.Range(1, 60).Select(k => EmissionLimitSet.Find(set)!.Required(Power.FromWatt(0.2 * k), Frequency.FromMegahertz(7)).Attenuation!.Value.Db).ToList();

        Assert.Equal(asked.Order(), asked);
    }
}
