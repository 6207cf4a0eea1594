using ClubBench.Calculation.Oscillators;
using static ClubBench.Calculation.Tests.Oscillators.PulledCrystals;

namespace ClubBench.Calculation.Tests.Oscillators;

public class ReceiveOffsetTests
{
    private static readonly OffsetPlace KitAPlace = new OffsetPlace.AcrossEmitterCapacitor(KitAPair);

    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("receive-offset");

    public static TheoryData<ReferenceRow> Kept => ReferenceTable.Theory("offset-kept");

    [Theory]
    [MemberData(nameof(Rows))]
    public void Solve_700HertzAt30Picofarad_GivesCapacitorAndSpreadOverTheDial(ReferenceRow row)
    {
        OffsetPlace place = row["place"] == "series" ? new OffsetPlace.InSeries() : new OffsetPlace.AcrossVariable();
        var loop = Plain(row);

        var solution = ReceiveOffset.Solve(loop, place, 700, Pf(30));

        Assert.True(solution.IsFound);
        Assert.Equal(row.Number("expected_pf"), solution.Capacitor.Picofarad, row.Number("expected_pf") * 0.01);
        Assert.Equal(700 * place.Sign, solution.OffsetHertz, 1e-3);
        foreach (var pf in new[] { 10, 15, 30, 60, 90 })
        {
            var expectedHz = row.Number($"at_{pf}pf_hz");
            Assert.Equal(place.Sign * expectedHz, ReceiveOffset.At(loop, place, solution.Capacitor, Pf(pf)), expectedHz * 0.01);
        }
    }

    [Theory]
    [MemberData(nameof(Kept))]
    public void At_OldCapacitorKeptOnTwiceTheFrequency_IsFarOff(ReferenceRow row) => Assert.Equal(
        row.Number("expected_hz"),
        ReceiveOffset.At(Plain(row), new OffsetPlace.AcrossVariable(), Pf(row.Number("added_pf")), Pf(row.Number("variable_pf"))),
        row.Number("tolerance_hz"));

    [Theory]
    [InlineData(700, 37)]
    [InlineData(850, 48)]
    public void Solve_KitAOn20Metres_NeedsLessThanHalfTheOldCapacitor(double wantedHz, double expectedPf)
    {
        var solution = ReceiveOffset.Solve(KitA20, KitAPlace, wantedHz, Pf(50));

        Assert.True(solution.IsFound);
        Assert.Equal(expectedPf, solution.Capacitor.Picofarad, 1.0);
        Assert.Equal(-wantedHz, solution.OffsetHertz, 1e-3);
    }

    [Fact]
    [Evidence(typeof(ReceiveOffset), EvidenceKind.RoundTrip)]
    public void Solve_AcrossOscillator_ComesBackWithTheWantedOffset()
    {
        var solution = ReceiveOffset.Solve(KitA30, new OffsetPlace.AcrossOscillator(), 600, Pf(50));

        Assert.True(solution.IsFound);
        Assert.Equal(-600, ReceiveOffset.At(KitA30, new OffsetPlace.AcrossOscillator(), solution.Capacitor, Pf(50)), 1e-3);
    }

    [Fact]
    public void Solve_OffsetBeyondAShortCircuit_ReturnsTheNearest()
    {
        var solution = ReceiveOffset.Solve(Plain(3.56, 12, 3.5, 22), new OffsetPlace.AcrossVariable(), 700, Pf(90));

        Assert.False(solution.IsFound);
        Assert.InRange(solution.OffsetHertz, -700, 0);
    }

    [Fact]
    public void Solve_LoopThatFailsBeforeTheOffset_ReturnsTheNearestUsableCapacitor()
    {
        var loop = KitA30 with { NodeStray = Pf(24) };

        var solution = ReceiveOffset.Solve(loop, new OffsetPlace.AcrossVariable(), 2_000_000, Pf(12));

        Assert.False(solution.IsFound);
        Assert.Equal(LoopRefusal.NodeStrayResonance, new OffsetPlace.AcrossVariable().With(loop, Pf(1e6)).RefusalAt(Pf(12)));
        Assert.Equal(LoopRefusal.None, new OffsetPlace.AcrossVariable().With(loop, solution.Capacitor).RefusalAt(Pf(12)));
    }

    [Fact]
    [Evidence(typeof(ReceiveOffset), EvidenceKind.ClosedFormLimit)]
    public void At_NoCapacitor_IsNoOffset() => Assert.Equal(0, ReceiveOffset.At(KitA30, KitAPlace, default, Pf(50)));
}
