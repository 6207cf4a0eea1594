using System.Numerics;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using CsCheck;

namespace ClubBench.Calculation.Tests.Resonators;

public class ResonatorTests
{
    private static readonly Frequency F = Frequency.FromMegahertz(7.1);

    public static TheoryData<ReferenceRow> Moves => ReferenceTable.Theory("resonator-moves");

    public static TheoryData<ReferenceRow> Dividers => ReferenceTable.Theory("capacitive-divider");

    public static TheoryData<ReferenceRow> Loadings => ReferenceTable.Theory("resonator-loading");

    [Theory]
    [MemberData(nameof(Moves))]
    [Evidence(typeof(Resonator), EvidenceKind.ClosedFormLimit)]
    public void MovedTo_AnotherBand_KeepsWhatTheMoveSays(ReferenceRow row)
    {
        var start = new Resonator(Inductance.FromMicrohenry(row.Number("inductance_uh")), Capacitance.FromPicofarad(row.Number("capacitance_pf")));
        var moved = start.MovedTo(Frequency.FromMegahertz(row.Number("target_mhz")), Enum.Parse<ResonatorMove>(row["move"]));

        Assert.Equal(1, moved.Inductance.Microhenry / row.Number("moved_uh"), 1e-3);
        Assert.Equal(1, moved.Capacitance.Picofarad / row.Number("moved_pf"), 1e-3);
        Assert.Equal(1, moved.Reactance.Ohm / row.Number("reactance_ohm"), 1e-3);
    }

    [Fact]
    [Evidence(typeof(Resonator), EvidenceKind.Identity)]
    public void MovedTo_AnyMove_ResonatesAtTheTarget() =>
        Gen.Select(Gen.Double[0.1, 50], Gen.Double[5, 2000], Gen.Double[1, 60], Gen.Enum<ResonatorMove>()).Sample((uh, pf, mhz, move) =>
        {
            var target = Frequency.FromMegahertz(mhz);
            var moved = new Resonator(Inductance.FromMicrohenry(uh), Capacitance.FromPicofarad(pf)).MovedTo(target, move);
            return Math.Abs((moved.Resonance / target) - 1) < 1e-12;
        });

    [Fact]
    public void WithReactance_150Ohm_GivesThePair()
    {
        var resonator = Resonator.WithReactance(Resistance.FromOhm(150), Frequency.FromMegahertz(14.2));

        Assert.Equal(1.6812, resonator.Inductance.Microhenry, 1e-4);
        Assert.Equal(74.721, resonator.Capacitance.Picofarad, 1e-3);
    }

    [Fact]
    [Evidence(typeof(Resonator), EvidenceKind.ClosedFormLimit)]
    public void TryFixedCapacitor_StraysExceedTheTotal_SaysByHowMuch()
    {
        var resonator = new Resonator(Inductance.FromMicrohenry(5), Capacitance.FromPicofarad(25));

        Assert.True(resonator.TryFixedCapacitor(Capacitance.FromPicofarad(20), out var left, out _));
        Assert.Equal(5, left.Picofarad, 9);
        Assert.False(resonator.TryFixedCapacitor(Capacitance.FromPicofarad(30), out _, out var excess));
        Assert.Equal(5, excess.Picofarad, 9);
    }

    [Theory]
    [MemberData(nameof(Dividers))]
    [Evidence(typeof(CapacitiveDivider), EvidenceKind.IndependentRecomputation)]
    public void AtTop_Divider_MatchesComplexArithmetic(ReferenceRow row)
    {
        var divider = new CapacitiveDivider(Capacitance.FromPicofarad(row.Number("top_pf")), Capacitance.FromPicofarad(row.Number("bottom_pf")));
        var f = Frequency.FromMegahertz(row.Number("frequency_mhz"));

        var top = divider.AtTop(Resistance.FromOhm(row.Number("resistance_ohm")), f);

        Assert.Equal(1, top.Resistance.Ohm / row.Number("parallel_ohm"), 1e-4);
        Assert.Equal(1, top.Capacitance.Picofarad / row.Number("parallel_pf"), 1e-4);
    }

    [Fact]
    [Evidence(typeof(CapacitiveDivider), EvidenceKind.IndependentRecomputation)]
    public void AtTop_AnyDivider_EqualsTheNetworkComputedInComplexNumbers() =>
        Gen.Select(Gen.Double[1, 2000], Gen.Double[1, 5000], Gen.Double[5, 5000], Gen.Double[1, 60]).Sample((c1, c2, r, mhz) =>
        {
            var f = Frequency.FromMegahertz(mhz);
            var w = f.RadiansPerSecond;
            var tap = 1 / ((1 / r) + (Complex.ImaginaryOne * w * c2 * 1e-12));
            var y = 1 / (tap + (1 / (Complex.ImaginaryOne * w * c1 * 1e-12)));
            var top = new CapacitiveDivider(Capacitance.FromPicofarad(c1), Capacitance.FromPicofarad(c2)).AtTop(Resistance.FromOhm(r), f);
            return Math.Abs((top.Resistance.Ohm * y.Real) - 1) < 1e-9 && Math.Abs((top.Capacitance.Farad * w / y.Imaginary) - 1) < 1e-9;
        });

    [Fact]
    [Evidence(typeof(CapacitiveDivider), EvidenceKind.RoundTrip)]
    public void Design_ThenAtTop_ComesBackToWhatWasWanted() =>
        Gen.Select(Gen.Double[20, 400], Gen.Double[1.2, 200], Gen.Double[1.05, 20]).Sample((r, step, excess) =>
        {
            var (resistance, wanted) = (Resistance.FromOhm(r), Resistance.FromOhm(r * step));
            var parallel = CapacitiveDivider.Design(resistance, wanted, default, F).SmallestCapacitance * excess;
            var top = CapacitiveDivider.Design(resistance, wanted, parallel, F).Divider!.AtTop(resistance, F);
            return Math.Abs((top.Resistance / wanted) - 1) < 1e-6 && Math.Abs((top.Capacitance / parallel) - 1) < 1e-6;
        });

    [Fact]
    public void Design_TooLittleCapacitance_NamesTheSmallest()
    {
        var f = Frequency.FromMegahertz(1.9);

        var refused = CapacitiveDivider.Design(Resistance.FromOhm(50), Resistance.FromOhm(3000), Capacitance.FromPicofarad(100), f);

        Assert.Equal(TransformRefusal.TooLittleCapacitance, refused.Refusal);
        Assert.Null(refused.Divider);
        Assert.Equal(214, refused.SmallestCapacitance.Picofarad, 0.5);
    }

    [Fact]
    public void Design_NotAStepUp_IsRefused()
    {
        var design = CapacitiveDivider.Design(Resistance.FromOhm(50), Resistance.FromOhm(50), Capacitance.FromPicofarad(100), F);

        Assert.Equal(TransformRefusal.NotAStepUp, design.Refusal);
        Assert.Null(CapacitiveDivider.SeriesCapacitor(Resistance.FromOhm(50), Resistance.FromOhm(50), F));
    }

    [Fact]
    public void SeriesCapacitor_50To3000Ohm_GivesBothCapacitances()
    {
        var (series, parallel) = CapacitiveDivider.SeriesCapacitor(Resistance.FromOhm(50), Resistance.FromOhm(3000), F)!.Value;

        Assert.Equal(58.367, series.Picofarad, 0.001);
        Assert.Equal(57.394, parallel.Picofarad, 0.001);
    }

    [Theory]
    [MemberData(nameof(Loadings))]
    public void Loading_OfAResonator_MatchesTheTable(ReferenceRow row)
    {
        var loading = new ResonatorLoading(
            F, Resistance.FromOhm(row.Number("reactance_ohm")), row.Number("unloaded_q"), Resistance.FromOhm(row.Number("source_ohm")), Resistance.FromOhm(row.Number("load_ohm")));

        Assert.Equal(row.Number("loaded_q"), loading.LoadedQ, 0.0005);
        Assert.Equal(row.Number("loss_db"), loading.InsertionLoss.Db, 0.0005);
        Assert.Equal(F.Hertz, loading.Bandwidth3dB.Hertz * loading.LoadedQ, 1e-3);
    }

    [Fact]
    public void TryMatchedLoss_LoadedQReachesTheCoils_IsRefused()
    {
        Assert.True(ResonatorLoading.TryMatchedLoss(10, 150, out var loss));
        Assert.Equal(0.599, loss.Db, 0.0005);
        Assert.True(ResonatorLoading.TryMatchedLoss(20, 120, out loss));
        Assert.Equal(1.584, loss.Db, 0.0005);
        Assert.False(ResonatorLoading.TryMatchedLoss(150, 150, out _));
    }

    [Fact]
    [Evidence(typeof(ResonatorLoading), EvidenceKind.RoundTrip)]
    public void UnloadedQFrom_LossOfAKnownCoil_ReturnsItsQ()
    {
        ResonatorLoading.TryMatchedLoss(20, 120, out var loss);

        Assert.Equal(120, ResonatorLoading.UnloadedQFrom(F, F / 20, loss), 6);
    }

    [Theory]
    [InlineData(7.1, 4.9, 3.382)]
    [InlineData(14.2, 4.9, 2.391)]
    [InlineData(14.2, 4.0, 2.647)]
    public void LinkTurns_50OhmAtQ20_MatchTheTable(double mhz, double nanohenry, double turns)
    {
        var index = InductanceFactor.FromNanohenryPerTurnSquared(nanohenry);

        Assert.Equal(turns, LinkWinding.ExactTurns(Resistance.FromOhm(50), 20, Frequency.FromMegahertz(mhz), index), 0.0005);
    }

    [Fact]
    public void LinkTurns_WholeNeighbours_GiveCoarseQ()
    {
        var links = LinkWinding.WholeTurns(Resistance.FromOhm(50), 20, Frequency.FromMegahertz(14.2), InductanceFactor.FromNanohenryPerTurnSquared(4.9));

        Assert.Equal([2, 3], links.Select(l => l.Turns).Order());
        Assert.Equal(28.6, links.Single(l => l.Turns == 2).ExternalQ, 0.05);
        Assert.Equal(12.7, links.Single(l => l.Turns == 3).ExternalQ, 0.05);
    }

    [Fact]
    [Evidence(typeof(Resonator), EvidenceKind.RoundTrip)]
    public void MovedTo_ThereAndBack_IsTheFirstCircuit() =>
        Gen.Select(Gen.Double[0.1, 50], Gen.Double[5, 2000], Gen.Double[1, 60], Gen.Enum<ResonatorMove>()).Sample((uh, pf, mhz, move) =>
        {
            var first = new Resonator(Inductance.FromMicrohenry(uh), Capacitance.FromPicofarad(pf));
            var back = first.MovedTo(Frequency.FromMegahertz(mhz), move).MovedTo(first.Resonance, move);
            return Math.Abs((back.Inductance / first.Inductance) - 1) < 1e-12 && Math.Abs((back.Capacitance / first.Capacitance) - 1) < 1e-12;
        });
}
