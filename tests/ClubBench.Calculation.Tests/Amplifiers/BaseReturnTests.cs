using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Amplifiers;

public class BaseReturnTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("base_return");

    [Theory]
    [Evidence(typeof(BaseReturn), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Rows))]
    public void Of_Resistor_MatchesTheRow(ReferenceRow row)
    {
        var result = At(row.Number("resistor_ohm"));

        Assert.Equal(row.Number("bias_v"), result.Bias.Volt, row.Number("bias_v") * row.Number("relative_tolerance"));
        Assert.Equal(row.Number("angle_deg"), result.Conduction!.Value.Degrees, row.Number("angle_deg") * row.Number("relative_tolerance"));
        Assert.Equal(row.Number("drive_lost_mw"), result.DriveLost.Milliwatt, row.Number("drive_lost_mw") * row.Number("relative_tolerance"));
    }

    [Fact]
    public void Of_33Ohm_ReversePeakIsDriveAndBias() => Assert.Equal(1.686, At(33).ReversePeak.Volt, 5e-4);

    [Fact]
    [Evidence(typeof(BaseReturn), EvidenceKind.ClosedFormLimit)]
    public void Of_DriveTooSmallToConduct_HasNoAngle() =>
        Assert.Null(BaseReturn.Of(Resistance.FromOhm(33), Current.FromAmpere(0.164), 63, Voltage.FromVolt(0.7), Voltage.FromVolt(0.7)).Conduction);

    [Fact]
    [Evidence(typeof(BaseReturn), EvidenceKind.IndependentRecomputation)]
    public void Of_DriveSampledOverACycle_AgreesWithAngleAndLoss()
    {
        const int samples = 1_000_000;
        var (conducting, lostWatt) = (0, 0.0);
        for (var k = 0; k < samples; k++)
        {
            var drive = 1.6 * Math.Cos(2 * Math.PI * (k + 0.5) / samples);
            if (drive - (0.164 / 63 * 47) > 0.7) conducting++;
            lostWatt += drive * drive / 47 / samples;
        }

        Assert.Equal(360.0 * conducting / samples, At(47).Conduction!.Value.Degrees, 1e-3);
        Assert.Equal(lostWatt, At(47).DriveLost.Watt, 1e-9);
    }

    [Fact]
    [Evidence(typeof(BaseReturn), EvidenceKind.Identity)]
    public void Of_TwiceTheResistor_DoublesTheBiasHalvesTheLossAndNarrowsTheAngle() => Gen.Double[5, 100].Sample(ohm =>
    {
        var (one, two) = (At(ohm), At(2 * ohm));
        Assert.Equal(2 * one.Bias.Volt, two.Bias.Volt, 1e-12);
        Assert.Equal(one.DriveLost.Watt / 2, two.DriveLost.Watt, 1e-12);
        Assert.True(two.Conduction!.Value.Degrees < one.Conduction!.Value.Degrees);
    });

    private static BaseReturn At(double ohm) =>
        BaseReturn.Of(Resistance.FromOhm(ohm), Current.FromAmpere(0.164), 63, Voltage.FromVolt(1.6), Voltage.FromVolt(0.7));
}
