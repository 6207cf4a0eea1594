using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Amplifiers;

public class OutputStageTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("output_stage");

    [Theory]
    [Evidence(typeof(OutputStage), EvidenceKind.RoundTrip)]
    [Evidence(typeof(OutputStage), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Rows))]
    public void LoadAndPower_Row_GoBothWays(ReferenceRow row)
    {
        var stage = new OutputStage(Voltage.FromVolt(row.Number("supply_v")), Voltage.FromVolt(row.Number("saturation_v")));
        var (watt, ohm) = (row.Number("power_w"), row.Number("load_ohm"));

        Assert.Equal(ohm, stage.Load(Power.FromWatt(watt)).Ohm, ohm * row.Number("relative_tolerance"));
        Assert.Equal(watt, stage.Power(Resistance.FromOhm(ohm)).Watt, watt * row.Number("relative_tolerance"));
        Assert.Equal(4 * stage.Load(Power.FromWatt(watt)).Ohm, stage.PushPullLoad(Power.FromWatt(watt)).Ohm, 1e-9);
    }

    [Fact]
    public void CurrentAndHeat_FiveWattAt60Percent_MatchWorkedFigures()
    {
        var stage = new OutputStage(Voltage.FromVolt(13.8), Voltage.FromVolt(1.5));

        Assert.Equal(0.604, stage.DirectCurrent(Power.FromWatt(5), 0.6).Ampere, 5e-4);
        Assert.Equal(3.333, OutputStage.Dissipation(Power.FromWatt(5), 0.6, Power.FromWatt(0)).Watt, 1e-3);
    }

    [Fact]
    public void DirectCurrent_KitFinal_MatchesTheKitSheet() =>
        Assert.Equal(0.164, new OutputStage(Voltage.FromVolt(12), Voltage.FromVolt(0.8)).DirectCurrent(Power.FromWatt(1.18), 0.6).Ampere, 5e-4);

    [Fact]
    [Evidence(typeof(OutputStage), EvidenceKind.ClosedFormLimit)]
    public void PeakVoltage_ClassE_IsAboveTheTunedStages()
    {
        var stage = new OutputStage(Voltage.FromVolt(12), Voltage.FromVolt(0.5));

        Assert.Equal(42.7, stage.PeakVoltage(StageClass.ClassE).Volt, 0.05);
        Assert.Equal(24, stage.PeakVoltage(StageClass.ClassCTuned).Volt, 1e-9);
    }

    [Fact]
    public void OutputStage_SaturationAboveTheSupply_Throws() =>
        Assert.Throws<ArgumentException>(() => new OutputStage(Voltage.FromVolt(1), Voltage.FromVolt(1)));

    [Fact]
    [Evidence(typeof(OutputStage), EvidenceKind.Identity)]
    public void DirectCurrent_TimesTheSupply_IsOutputAndHeat() => Gen.Select(Gen.Double[6, 30], Gen.Double[0.1, 50], Gen.Double[0.1, 1]).Sample((volt, watt, efficiency) =>
    {
        var (stage, output) = (new OutputStage(Voltage.FromVolt(volt), Voltage.FromVolt(0.5)), Power.FromWatt(watt));
        var heat = OutputStage.Dissipation(output, efficiency, Power.FromWatt(0));
        Assert.Equal(watt + heat.Watt, stage.DirectCurrent(output, efficiency).Ampere * volt, 1e-9 * (watt + heat.Watt));
    });
}
