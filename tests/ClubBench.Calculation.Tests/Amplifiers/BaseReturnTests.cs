using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Amplifiers;

public class BaseReturnTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("base_return");

    [Theory]
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
    public void Of_DriveTooSmallToConduct_HasNoAngle() =>
        Assert.Null(BaseReturn.Of(Resistance.FromOhm(33), Current.FromAmpere(0.164), 63, Voltage.FromVolt(0.7), Voltage.FromVolt(0.7)).Conduction);

    private static BaseReturn At(double ohm) =>
        BaseReturn.Of(Resistance.FromOhm(ohm), Current.FromAmpere(0.164), 63, Voltage.FromVolt(1.6), Voltage.FromVolt(0.7));
}
