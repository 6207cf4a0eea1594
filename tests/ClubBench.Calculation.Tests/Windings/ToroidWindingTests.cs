using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;
using CsCheck;

namespace ClubBench.Calculation.Tests.Windings;

public class ToroidWindingTests
{
    public static TheoryData<ReferenceRow> Turns => ReferenceTable.Theory("turns");

    public static TheoryData<ReferenceRow> Capacities => ReferenceTable.Theory("winding-capacity");

    public static TheoryData<ReferenceRow> Lengths => ReferenceTable.Theory("wire-length");

    [Theory]
    [MemberData(nameof(Turns))]
    public void TurnsChoiceFor_Inductance_MatchesTheTable(ReferenceRow row)
    {
        var (core, wanted) = (Cores.FindToroid(row["core"])!, Inductance.FromMicrohenry(row.Number("inductance_uh")));

        var choice = TurnsChoice.For(core.InductanceFactor, wanted);

        Assert.Equal(row.Number("exact_turns"), choice.ExactTurns, 0.0051);
        Assert.Equal(row.Number("turns"), choice.Best.Turns);
        Assert.Equal(1, choice.Best.Inductance.Microhenry / row.Number("wound_uh"), 5e-4);
        Assert.Equal(row.Number("error"), choice.Best.Error, 6e-5);
        Assert.Equal(row.Number("starting_long"), TurnsChoice.StartingLong(core.InductanceFactor, core.InductanceFactorTolerance, wanted));
    }

    [Fact]
    [Evidence(typeof(TurnsChoice), EvidenceKind.Identity)]
    public void TurnsChoiceFor_AnyInductance_BestIsNoWorseThanTheOther() =>
        Gen.Select(Gen.Double[1, 1000], Gen.Double[0.01, 500]).Sample((nh, uh) =>
        {
            var choice = TurnsChoice.For(InductanceFactor.FromNanohenryPerTurnSquared(nh), Inductance.FromMicrohenry(uh));
            return choice.Best.Turns >= 1 && (choice.Other is null || Math.Abs(choice.Best.Error) <= Math.Abs(choice.Other.Error));
        });

    [Fact]
    [Evidence(typeof(TurnsChoice), EvidenceKind.ClosedFormLimit)]
    public void TurnsChoiceFor_LessThanOneTurn_OffersOneTurnOnly()
    {
        var choice = TurnsChoice.For(InductanceFactor.FromNanohenryPerTurnSquared(350), Inductance.FromNanohenry(50));

        Assert.Equal(1, choice.Best.Turns);
        Assert.Null(choice.Other);
    }

    [Fact]
    public void StepUp_ThirteenTurns_Is16Percent() =>
        Assert.Equal(0.16, TurnsChoice.For(InductanceFactor.FromNanohenryPerTurnSquared(3), Inductance.FromMicrohenry(0.47)).Best.StepUp, 0.005);

    [Fact]
    [Evidence(typeof(TurnsChoice), EvidenceKind.RoundTrip)]
    public void MakesExact_CapacitorForRoundedTurns_KeepsTheResonance()
    {
        var (wanted, designed) = (Inductance.FromMicrohenry(5.2), Capacitance.FromPicofarad(96.632));
        var best = TurnsChoice.For(InductanceFactor.FromNanohenryPerTurnSquared(4.9), wanted).Best;

        var product = best.Inductance.Henry * TurnsChoice.MakesExact(designed, best).Farad;

        Assert.Equal(1, product / (wanted.Henry * designed.Farad), 12);
    }

    [Theory]
    [MemberData(nameof(Capacities))]
    [Evidence(typeof(ToroidWinding), EvidenceKind.IndependentRecomputation)]
    public void CapacityOf_HoleAndWire_MatchesPlacedCircles(ReferenceRow row) =>
        Assert.Equal(
            row.Number("turns"),
            ToroidWinding.CapacityOf(Length.FromMillimetre(row.Number("hole_mm")), Length.FromMillimetre(row.Number("overall_mm")), row.Number("gap_degrees")));

    [Fact]
    [Evidence(typeof(ToroidWinding), EvidenceKind.Identity)]
    public void CapacityOf_AnyWireWithoutGap_LeavesNeighboursApartAndNoRoomForOneMore() =>
        Gen.Select(Gen.Double[3, 20], Gen.Double[0.1, 1.2]).Sample((hole, wire) =>
        {
            var turns = ToroidWinding.CapacityOf(Length.FromMillimetre(hole), Length.FromMillimetre(wire), 0);
            double Chord(int n) => (hole - wire) * Math.Sin(Math.PI / n);
            return Chord(turns) >= wire - 1e-6 && Chord(turns + 1) <= wire + 1e-6;
        });

    [Fact]
    [Evidence(typeof(ToroidWinding), EvidenceKind.ClosedFormLimit)]
    public void CapacityOf_ThickWire_PassesOnceOrNotAtAll()
    {
        var hole = Length.FromMillimetre(2);

        Assert.Equal(1, ToroidWinding.CapacityOf(hole, Length.FromMillimetre(1.2)));
        Assert.Equal(0, ToroidWinding.CapacityOf(hole, Length.FromMillimetre(2.1)));
    }

    [Fact]
    public void CapacityOf_Bifilar_IsHalf() =>
        Assert.Equal(22, ToroidWinding.CapacityOf(Length.FromMillimetre(7.70), Length.FromMillimetre(0.459), strands: 2));

    [Theory]
    [MemberData(nameof(Lengths))]
    public void CutLength_Winding_FollowsTheCardRule(ReferenceRow row)
    {
        var winding = new ToroidWinding(Cores.FindToroid(row["core"])!, (int)row.Number("turns"), Wire.Millimetre(row.Number("bare_mm")));

        Assert.Equal(row.Number("length_mm"), winding.WireLength.Millimetre, 0.5);
        Assert.Equal(row.Number("cut_mm"), winding.CutLength.Millimetre, 6);
        Assert.Equal(row.Number("per_turn_mm"), winding.LengthPerTurn.Millimetre, 0.06);
    }

    [Fact]
    [Evidence(typeof(ToroidWinding), EvidenceKind.RoundTrip)]
    public void LargestWire_FittingTurns_IsTheLastThatFits()
    {
        var core = Cores.FindToroid("T50-2")!;
        var wire = ToroidWinding.LargestWire(core, 33)!;
        var next = Wires.Metric.First(w => w.Bare > wire.Bare);

        Assert.True(new ToroidWinding(core, 33, wire).Fits);
        Assert.False(new ToroidWinding(core, 33, next).Fits);
    }

    [Fact]
    public void LargestWire_TooManyTurns_IsNone() => Assert.Null(ToroidWinding.LargestWire(Cores.FindToroid("T25-2")!, 200));

    [Fact]
    public void Fill_WireThatDoesNotPass_IsNotStated() =>
        Assert.Null(new ToroidWinding(Cores.FindToroid("T25-2")!, 1, Wire.Millimetre(4)).Fill);
}
