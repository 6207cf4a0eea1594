using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Amplifiers;

public class BaseReturnGainTests
{
    private static readonly Frequency Design = Frequency.FromMegahertz(10.12);
    private static readonly Power Drive = Power.FromMilliwatt(80);
    private static readonly Resistance Fitted = Resistance.FromOhm(33);

    [Fact]
    [Evidence(typeof(BaseReturnGain), EvidenceKind.RoundTrip)]
    public void DriveNeeded_AtTheKnownPoint_IsTheKnownDrive() =>
        Assert.Equal(80, Model().DriveNeeded(Design, Fitted).Milliwatt, 1e-9);

    [Fact]
    [Evidence(typeof(BaseReturnGain), EvidenceKind.ClosedFormLimit)]
    public void LostByMoving_FarAboveTheGainsCorner_MatchesTheKitSheetAndTheLimit()
    {
        var lost = Model(currentGain: 10_000).LostByMoving(Design, Frequency.FromMegahertz(14.06)).Db;

        Assert.Equal(2.9, lost, 0.05);
        Assert.Equal(20 * Math.Log10(14.06 / 10.12), lost, 1e-4);
    }

    [Fact]
    public void LostByMoving_NearTheGainsCorner_IsLess() =>
        Assert.True(Model(63).LostByMoving(Design, Frequency.FromMegahertz(14.06)) < Model(10_000).LostByMoving(Design, Frequency.FromMegahertz(14.06)));

    [Fact]
    [Evidence(typeof(BaseReturnGain), EvidenceKind.Identity)]
    public void DriveNeeded_LargerResistor_AlwaysNeedsLess()
    {
        var needed = Enumerable.Range(1, 50).Select(k => Model().DriveNeeded(Frequency.FromMegahertz(14), Resistance.FromOhm(10 * k)).Watt).ToList();

        Assert.Equal(needed.OrderDescending(), needed);
    }

    [Fact]
    [Evidence(typeof(BaseReturnGain), EvidenceKind.ClosedFormLimit)]
    public void DriveNeeded_VeryLargeResistor_LeavesTheTransistorsShare()
    {
        var lost = 1.6 * 1.6 / (2 * 33) * 1000;

        Assert.Equal(80 - lost, Model().DriveNeeded(Design, Resistance.FromOhm(1e9)).Milliwatt, 1e-5);
    }

    [Fact]
    [Evidence(typeof(BaseReturnGain), EvidenceKind.Identity)]
    public void Bought_AndMissing_AddUp()
    {
        var (f, larger) = (Frequency.FromMegahertz(14.06), Resistance.FromOhm(68));

        var missing = Model().Missing(Drive, f, larger);

        Assert.Equal((Model().LostByMoving(Design, f) - Model().Bought(Fitted, larger)).Db, missing.Db, 1e-9);
    }

    [Fact]
    [Evidence(typeof(BaseReturnGain), EvidenceKind.RoundTrip)]
    public void ReturnFor_EnoughDrive_RoundTrips()
    {
        var f = Frequency.FromMegahertz(14.06);

        var resistor = Model().ReturnFor(Power.FromMilliwatt(94), f);

        Assert.Equal(94, Model().DriveNeeded(f, resistor!.Value).Milliwatt, 1e-9);
    }

    [Fact]
    public void ReturnFor_TooLittleDrive_IsNull() => Assert.Null(Model().ReturnFor(Power.FromMilliwatt(40), Frequency.FromMegahertz(14.06)));

    [Fact]
    public void TryCreate_ResistorEatsMoreThanTheDrive_IsRefused() =>
        Assert.False(BaseReturnGain.TryCreate(Design, Power.FromMilliwatt(30), Fitted, Voltage.FromVolt(1.6), new(63, Frequency.FromMegahertz(190)), out _));

    private static BaseReturnGain Model(double currentGain = 63) =>
        BaseReturnGain.TryCreate(Design, Drive, Fitted, Voltage.FromVolt(1.6), new CurrentGain(currentGain, Frequency.FromMegahertz(190)), out var model)
            ? model!
            : throw new InvalidOperationException();
}
