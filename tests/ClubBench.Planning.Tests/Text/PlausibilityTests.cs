using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Tests.Text;

public class PlausibilityTests
{
    [Theory]
    [InlineData(8.22e-6, 0.822e-6)]
    [InlineData(822e-6, 0.822e-6)]
    [InlineData(0.822e-9, 0.822e-6)]
    public void LikelySi_SlippedByAPowerOfTen_GivesWhatWasMeant(double typed, double meant) =>
        Assert.Equal(meant, Plausibility.LikelySi(typed, 0.5e-6, 1e-6)!.Value, 1e-12);

    [Theory]
    [InlineData(0.822e-6)]
    [InlineData(1.4e-6)]
    public void LikelySi_InsideOrMerelyOff_IsSilent(double typed) => Assert.Null(Plausibility.LikelySi(typed, 0.5e-6, 1e-6));

    [Fact]
    public void Check_Slip_IsAWarningThatCanBeConfirmed()
    {
        var message = Plausibility.Check("value", QuantityKind.Inductance, 8.22e-6, 0.5e-6, 1e-6);

        Assert.Equal(MessageSeverity.Warning, message!.Severity);
    }
}
