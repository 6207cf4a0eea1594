using ClubBench.Calculation.BandPass;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.BandPass;

public class LineTrapTests
{
    private static readonly Resistance Line = Resistance.FromOhm(50);

    public static TheoryData<ReferenceRow> Cases => ReferenceTable.Theory("line-trap");

    [Theory]
    [MemberData(nameof(Cases))]
    public void Loss_Case_IsThatOfTheTableAtTheNotchAndOnTheBand(ReferenceRow row)
    {
        var trap = new LineTrap(Enum.Parse<TrapPlace>(row["place"]), Frequency.FromMegahertz(9), Inductance.FromMicrohenry(row.Number("coil_uh")), 150);

        Assert.Equal(row.Number("depth_db"), trap.Loss(trap.Notch, Line, Line).Db, row.Number("tolerance"));
        Assert.Equal(row.Number("band_loss_db"), trap.Loss(Frequency.FromMegahertz(7.03), Line, Line).Db, row.Number("tolerance"));
    }

    [Fact]
    [Evidence(typeof(LineTrap), EvidenceKind.ClosedFormLimit)]
    public void Loss_AtTheNotch_FollowsFromTheQAlone() =>
        Gen.Select(Gen.Double[0.2, 20], Gen.Double[20, 400]).Sample((uh, q) =>
        {
            var shunt = new LineTrap(TrapPlace.Shunt, Frequency.FromMegahertz(9), Inductance.FromMicrohenry(uh), q);
            var x = 2 * Math.PI * 9e6 * uh * 1e-6;
            return Math.Abs(shunt.Loss(shunt.Notch, Line, Line).Db - (20 * Math.Log10(1 + (25 * q / x)))) < 1e-6
                && Math.Abs((shunt with { Place = TrapPlace.InLine }).Loss(shunt.Notch, Line, Line).Db - (20 * Math.Log10(1 + (q * x / 100)))) < 1e-6;
        });

    [Fact]
    [Evidence(typeof(LineTrap), EvidenceKind.IndependentRecomputation)]
    public void Loss_NearlyLosslessTrap_IsThatOfTheLadderArm()
    {
        var trap = new LineTrap(TrapPlace.InLine, Frequency.FromMegahertz(9), Inductance.FromMicrohenry(0.3), 1e6);
        var arm = LadderElement.SeriesTrap(trap.Coil, trap.Capacitor, 1e6);

        foreach (var mhz in new[] { 3.5, 7.03, 14.06, 28.0 })
            Assert.Equal(arm.At(Frequency.FromMegahertz(mhz)).Loss(Line, Line).Db, trap.Loss(Frequency.FromMegahertz(mhz), Line, Line).Db, 1e-3);
    }

    [Fact]
    [Evidence(typeof(LineTrap), EvidenceKind.Identity)]
    public void Loss_AsFarAboveAsBelow_IsTheSame() =>
        Gen.Select(Gen.Enum<TrapPlace>(), Gen.Double[0.2, 20], Gen.Double[1.01, 5]).Sample((place, uh, off) =>
        {
            var trap = new LineTrap(place, Frequency.FromMegahertz(9), Inductance.FromMicrohenry(uh), 150);
            return Math.Abs(trap.Loss(trap.Notch * off, Line, Line).Db - trap.Loss(trap.Notch / off, Line, Line).Db) < 1e-9;
        });

    [Theory]
    [InlineData(9.0, true)]
    [InlineData(7.5, false)]
    [InlineData(6.3, false)]
    [InlineData(5.9, true)]
    public void KeepsAwayFrom_TrapNearTheBand_DoesNot(double notchMhz, bool keepsAway) =>
        Assert.Equal(keepsAway, new LineTrap(TrapPlace.Shunt, Frequency.FromMegahertz(notchMhz), Inductance.FromMicrohenry(2.2), 150).KeepsAwayFrom(FrequencyRange.FromMegahertz(7.0, 7.2)));
}
