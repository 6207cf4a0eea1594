using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Oscillators;

public class SquareWaveTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("square-wave");

    [Theory]
    [Evidence(typeof(SquareWave), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Rows))]
    public void Level_ReferenceRow_GivesItsFigure(ReferenceRow row)
    {
        var level = SquareWave.Level((int)row.Number("harmonic"), row.Number("duty_cycle"));

        Assert.Equal(row.Has("expected_db"), level is not null);
        if (level is { } db) Assert.Equal(row.Number("expected_db"), db.Db, row.Number("tolerance_db"));
    }

    [Fact]
    [Evidence(typeof(SquareWave), EvidenceKind.Identity)]
    public void Level_AnyDutyCycle_IsThatOfItsComplement() => Gen.Select(Gen.Int[1, 20], Gen.Double[0.02, 0.98]).Sample((n, d) =>
        Math.Abs((SquareWave.Level(n, d)?.AmplitudeRatio ?? 0) - (SquareWave.Level(n, 1 - d)?.AmplitudeRatio ?? 0)) < 1e-9);

    [Fact]
    public void Level_NarrowPulses_FallOnlyWithTheOrderOfTheirWidth() => Assert.Equal(0, SquareWave.Level(3, 0.01)!.Value.Db, 0.02);

    [Fact]
    [Evidence(typeof(SquareWave), EvidenceKind.IndependentRecomputation)]
    public void Level_SummedRectangle_IsThatOfTheSeries()
    {
        const int Samples = 100_000;
        double Line(int n)
        {
            var (re, im) = (0.0, 0.0);
            for (var i = 0; i < Samples * 0.45; i++) (re, im) = (re + Math.Cos(2 * Math.PI * n * i / Samples), im + Math.Sin(2 * Math.PI * n * i / Samples));
            return Math.Sqrt((re * re) + (im * im));
        }

        Assert.Equal(20 * Math.Log10(Line(3) / Line(1)), SquareWave.Level(3, 0.45)!.Value.Db, 1e-3);
    }

    [Fact]
    public void FrontEndNeeded_ThirdHarmonic_IsWhatTheClockDoesNotGive()
    {
        Assert.Equal(50 - 9.54, SquareWave.FrontEndNeeded(3, 0.5)!.Value.Db, 0.01);
        Assert.Null(SquareWave.FrontEndNeeded(2, 0.5));
    }

    [Fact]
    public void Clock_14Megahertz_IsFourTimesAndShiftsByItsReference()
    {
        var signal = Frequency.FromMegahertz(14.06);

        Assert.Equal(56.24, SquareWave.ClockForQuadrature(signal).Megahertz, 1e-9);
        Assert.Equal(-28.12, SquareWave.ShiftHertz(signal, -2), 1e-9);
    }
}
