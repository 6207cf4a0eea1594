using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Crystals;

public class CrystalPoolTests
{
    private static readonly CrystalParameters[] Eleven = [.. Enumerable.Range(0, 11).Select(i => Board(7_030_000 + (10 * i), 15 + i))];

    [Fact]
    [Evidence(typeof(CrystalPool), EvidenceKind.ClosedFormLimit)]
    public void Pool_ElevenBoards_HasTheirMedianAndOuterTenths()
    {
        var pool = CrystalPool.Of(Eleven);

        Assert.Equal(7_030_050, pool.Middle.SeriesResonance.Hertz, 1e-6);
        Assert.Equal(20, pool.Middle.MotionalCapacitance.Farad * 1e15, 1e-9);
        Assert.Equal(15 + (7.0 / 15), pool.WeakPulling.MotionalCapacitance.Farad * 1e15, 1e-6);
        Assert.Equal(25 - (7.0 / 15), pool.StrongPulling.MotionalCapacitance.Farad * 1e15, 1e-6);
        Assert.Equal(30 * 1.4826, pool.SeriesDeviationHertz, 1e-6);
    }

    [Fact]
    public void Pool_OneWrongBoard_HardlyMovesTheMiddle()
    {
        var pool = CrystalPool.Of([.. Eleven.Skip(1), Board(7_080_000, 90)]);

        Assert.Equal(7_030_060, pool.Middle.SeriesResonance.Hertz, 1e-6);
        Assert.Equal(21, pool.Middle.MotionalCapacitance.Farad * 1e15, 1e-9);
    }

    [Fact]
    [Evidence(typeof(CrystalPool), EvidenceKind.ClosedFormLimit)]
    public void Pool_EqualBoards_IsThatCrystal()
    {
        var pool = CrystalPool.Of([Eleven[3], Eleven[3], Eleven[3]]);

        Assert.Equal((Eleven[3], Eleven[3], Eleven[3], 0.0), (pool.Middle, pool.WeakPulling, pool.StrongPulling, pool.SeriesDeviationHertz));
    }

    [Fact]
    public void Pool_NoBoard_Throws() => Assert.Throws<ArgumentOutOfRangeException>(() => CrystalPool.Of([]));

    private static CrystalParameters Board(double hertz, double cmFf) =>
        new(Frequency.FromHertz(hertz), Capacitance.FromFarad(cmFf * 1e-15), Capacitance.FromPicofarad(4.5), Resistance.FromOhm(20));
}
