using ClubBench.Calculation.Elliptic;
using ClubBench.Calculation.Filters;
using CsCheck;

namespace ClubBench.Calculation.Tests.Elliptic;

public class NotchPlacementTests
{
    public static TheoryData<ReferenceRow> Recomputed => ReferenceTable.Theory("elliptic-recomputed");

    [Theory]
    [InlineData(5, 2.0)]
    [InlineData(7, 1.6)]
    [InlineData(3, 2.5)]
    [Evidence(typeof(NotchPlacement), EvidenceKind.RoundTrip)]
    public void AngleDegreesFor_LowestNotch_PutsItThere(int order, double multiple)
    {
        var angle = NotchPlacement.AngleDegreesFor(order, multiple)!.Value;

        Assert.Equal(multiple, EllipticApproximation.Of(order, PassBandRipple.FromReflection(0.1), angle).Notches[0], 1e-12);
    }

    [Fact]
    [Evidence(typeof(NotchPlacement), EvidenceKind.Identity)]
    public void LowestNotch_GrowingAngle_FallsAllTheWay() => Gen.Select(Ellipses.Order, Gen.Double[1, 79.9]).Sample((order, angle) =>
        NotchPlacement.LowestNotch(order, angle + 0.1) < NotchPlacement.LowestNotch(order, angle));

    [Theory]
    [MemberData(nameof(Recomputed))]
    [Evidence(typeof(NotchPlacement), EvidenceKind.IndependentRecomputation)]
    public void LowestNotch_RandomCase_AgreesWithThetaFunctions(ReferenceRow row)
    {
        var notch = row.Numbers("notches")[0];

        Assert.Equal(notch, NotchPlacement.LowestNotch((int)row.Number("order"), row.Number("angle_degrees")), notch * row.Number("relative_tolerance"));
    }

    [Theory]
    [InlineData(3)]
    [InlineData(5)]
    [InlineData(7)]
    [Evidence(typeof(NotchPlacement), EvidenceKind.ClosedFormLimit)]
    public void LowestNotch_SmallestAngle_IsNearlyOneOverTheModulusAndTheCosine(int order)
    {
        var k = Math.Sin(Math.PI / 180);

        Assert.Equal(1, NotchPlacement.LowestNotch(order, 1) * k * Math.Cos(Math.PI / (2 * order)), k * k);
    }
}
