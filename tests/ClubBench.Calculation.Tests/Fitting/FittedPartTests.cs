using ClubBench.Calculation.Fitting;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Fitting;

public class FittedPartTests
{
    private static readonly Gen<FittedPart> Any = Gen.Select(Gen.Bool, Gen.Double[0.3, 3], Gen.Double[0.001, 0.2], Gen.Double[0.01, 1]).Select(
        (isCoil, scale, deviation, ratio) => new FittedPart(0, isCoil, scale, deviation, ratio));

    [Fact]
    [Evidence(typeof(FittedPart), EvidenceKind.ClosedFormLimit)]
    public void SurplusTurns_NineteenForEighteen_IsOne() =>
        Assert.Equal(1, new FittedPart(1, true, 19.0 * 19 / (18 * 18), 0.001, 0.01).SurplusTurns(18), 1e-12);

    [Fact]
    [Evidence(typeof(FittedPart), EvidenceKind.RoundTrip)]
    public void SurplusTurns_AnyTurnsWound_ComeBackFromTheInductanceTheyMake() => Gen.Select(Gen.Int[5, 60], Gen.Int[5, 60]).Sample((planned, wound) =>
        Math.Abs(new FittedPart(0, true, (double)wound * wound / (planned * planned), 0.001, 0.01).SurplusTurns(planned) - (wound - planned)) < 1e-9);

    [Fact]
    [Evidence(typeof(FittedPart), EvidenceKind.RoundTrip)]
    public void LooksLike_CapacitorFarOut_IsTheWrongPart()
    {
        var scales = new double[] { 1, 1, 1, 1, 270.0 / 330 };

        var parts = SweepDiagnosis.Of(Boards.Question(Boards.Shown(Boards.Built(scales), 0.002)) with { CapacitorSpread = 0.2 }).Parts;

        Assert.Equal(270, parts[4].LooksLike(Capacitance.FromPicofarad(330), 0.05)!.Value.Picofarad, 1e-9);
        Assert.Null(parts[4].LooksLike(Capacitance.FromPicofarad(330), 0.25));
        Assert.Null(parts[0].LooksLike(Capacitance.FromPicofarad(390), 0.05));
    }

    [Fact]
    [Evidence(typeof(FittedPart), EvidenceKind.Identity)]
    public void IsBeyond_WiderTolerance_NeverHoldsWhereTheNarrowerDoesNot() => Gen.Select(Any, Gen.Double[0, 0.4], Gen.Double[0, 0.4]).Sample((part, tolerance, more) =>
        (!part.IsBeyond(tolerance + more) || part.IsBeyond(tolerance)) && (!part.IsBeyond(tolerance) || part.Deviates)
        && part.LooksLike(Capacitance.FromPicofarad(330), tolerance) is null == (part.IsCoil || !part.IsBeyond(tolerance)));

    [Fact]
    [Evidence(typeof(FittedPart), EvidenceKind.Identity)]
    public void Deviates_TooLargeOrTooSmallByTheSameFactor_IsTheSame() =>
        Any.Sample(part => (part with { Scale = 1 / part.Scale }).Deviates == part.Deviates);
}
