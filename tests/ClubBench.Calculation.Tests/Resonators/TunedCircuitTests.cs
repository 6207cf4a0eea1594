using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using CsCheck;

namespace ClubBench.Calculation.Tests.Resonators;

public class TunedCircuitTests
{
    public static TheoryData<ReferenceRow> Resonances => ReferenceTable.Theory("resonance");

    public static TheoryData<ReferenceRow> Rejections => ReferenceTable.Theory("rejection");

    [Theory]
    [MemberData(nameof(Resonances))]
    [Evidence(typeof(TunedCircuit), EvidenceKind.RoundTrip)]
    public void Resonance_EachOfThree_FollowsFromTheOtherTwo(ReferenceRow row)
    {
        var (l, c) = (Inductance.FromMicrohenry(row.Number("inductance_uh")), Capacitance.FromPicofarad(row.Number("capacitance_pf")));
        var f = Frequency.FromMegahertz(row.Number("frequency_mhz"));
        var tolerance = row.Number("tolerance_relative");

        Assert.Equal(1, TunedCircuit.ResonantFrequency(l, c) / f, tolerance);
        Assert.Equal(1, TunedCircuit.CapacitanceFor(l, f) / c, tolerance);
        Assert.Equal(1, TunedCircuit.InductanceFor(c, f) / l, tolerance);
    }

    [Fact]
    [Evidence(typeof(TunedCircuit), EvidenceKind.Identity)]
    public void Reactances_AtResonance_AreEqual() =>
        Gen.Select(Gen.Double[0.01, 100], Gen.Double[1, 10_000]).Sample((uh, pf) =>
        {
            var (l, c) = (Inductance.FromMicrohenry(uh), Capacitance.FromPicofarad(pf));
            var f = TunedCircuit.ResonantFrequency(l, c);
            return Math.Abs((TunedCircuit.Reactance(l, f) / TunedCircuit.Reactance(c, f)) - 1) < 1e-12;
        });

    [Fact]
    [Evidence(typeof(TunedCircuit), EvidenceKind.RoundTrip)]
    public void Reactance_ThereAndBack_ReturnsThePart()
    {
        var f = Frequency.FromMegahertz(10.12);

        Assert.Equal(2.304, TunedCircuit.InductanceOf(TunedCircuit.Reactance(Inductance.FromMicrohenry(2.304), f), f).Microhenry, 12);
        Assert.Equal(107.3, TunedCircuit.CapacitanceOf(TunedCircuit.Reactance(Capacitance.FromPicofarad(107.3), f), f).Picofarad, 9);
    }

    [Theory]
    [MemberData(nameof(Rejections))]
    public void Rejection_AtAnOffset_MatchesTheTable(ReferenceRow row)
    {
        var (at, resonance) = (Frequency.FromMegahertz(row.Number("at_mhz")), Frequency.FromMegahertz(row.Number("resonance_mhz")));

        Assert.Equal(row.Number("rejection_db"), TunedCircuit.Rejection(at, resonance, row.Number("loaded_q")).Db, 0.0005);
    }

    [Fact]
    [Evidence(typeof(TunedCircuit), EvidenceKind.ClosedFormLimit)]
    public void Rejection_HalfABandwidthOff_Is3Decibel()
    {
        // Exact 3 dB edges lie where QL (f/f0 - f0/f) = 1.
        var (q, f0) = (25.0, Frequency.FromMegahertz(7.1));
        var edge = f0 * ((1 / (2 * q)) + Math.Sqrt(1 + (1 / (4 * q * q))));

        Assert.Equal(10 * Math.Log10(2), TunedCircuit.Rejection(edge, f0, q).Db, 9);
        Assert.Equal(0, TunedCircuit.Rejection(f0, f0, q).Db, 12);
    }

    [Fact]
    [Evidence(typeof(TunedCircuit), EvidenceKind.IndependentRecomputation)]
    public void FrequencyShift_SmallChange_MatchesTheDifferenceOfResonances()
    {
        var (l, c) = (Inductance.FromMicrohenry(2), Capacitance.FromPicofarad(100));
        var moved = TunedCircuit.ResonantFrequency(l, c + Capacitance.FromPicofarad(0.01)) / TunedCircuit.ResonantFrequency(l, c);

        Assert.Equal(moved - 1, TunedCircuit.FrequencyShift(0.01, c), 1e-8);
    }

    [Fact]
    public void ResonantFrequency_WithoutCapacitance_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => TunedCircuit.ResonantFrequency(Inductance.FromMicrohenry(1), default));
}
