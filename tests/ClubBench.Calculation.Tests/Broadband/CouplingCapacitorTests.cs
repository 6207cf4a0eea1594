using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Broadband;

public class CouplingCapacitorTests
{
    [Theory]
    [InlineData(10, 1.9, 100, 0.0304, Verdict.Leave)]
    [InlineData(1, 1.9, 250, 0.462, Verdict.Change)]
    [InlineData(2.2, 1.9, 250, 0.0996, Verdict.Check)]
    public void Loss_CouplingCapacitor_MatchesTheWorkedExamples(double nanofarad, double mhz, double ohm, double db, Verdict verdict)
    {
        var (c, f, r) = (Capacitance.FromNanofarad(nanofarad), Frequency.FromMegahertz(mhz), Resistance.FromOhm(ohm));

        Assert.Equal(db, CouplingCapacitor.Loss(c, f, r).Db, 0.0006);
        Assert.Equal(verdict, CouplingCapacitor.Judge(c, f, r));
    }

    [Theory]
    [InlineData(1.9, 1.590, Verdict.Change)]
    [InlineData(7.1, 0.135, Verdict.Leave)]
    public void Loss_EmitterBypass_MatchesTheWorkedExamples(double mhz, double db, Verdict verdict)
    {
        var node = CouplingCapacitor.EmitterResistance(Current.FromMilliampere(10)) + Resistance.FromOhm(10);
        var loss = CouplingCapacitor.Loss(Capacitance.FromNanofarad(10), Frequency.FromMegahertz(mhz), node);

        Assert.Equal(db, loss.Db, 0.0006);
        Assert.Equal(verdict, CouplingCapacitor.JudgeBypass(loss));
    }

    [Fact]
    [Evidence(typeof(CouplingCapacitor), EvidenceKind.RoundTrip)]
    public void Wanted_ReplacementCapacitor_IsLeftByTheSameTest() =>
        Gen.Select(Gen.Double[0.5, 60], Gen.Double[5, 5000]).Sample((mhz, ohm) =>
        {
            var (f, r) = (Frequency.FromMegahertz(mhz), Resistance.FromOhm(ohm));
            return CouplingCapacitor.Judge(CouplingCapacitor.Wanted(f, r), f, r) == Verdict.Leave;
        });

    [Fact]
    [Evidence(typeof(CouplingCapacitor), EvidenceKind.ClosedFormLimit)]
    public void WithLeads_HundredNanofaradWithTenNanohenry_VanishesAt5Megahertz() =>
        Assert.Equal(0, CouplingCapacitor.WithLeads(Capacitance.FromNanofarad(100), Inductance.FromNanohenry(10), Frequency.FromMegahertz(5.0329)).Ohm, 1e-4);

    [Fact]
    [Evidence(typeof(CouplingCapacitor), EvidenceKind.IndependentRecomputation)]
    public void Loss_CapacitorBetweenAnyEnds_IsWhatTheChainMatrixAddsToAStraightLine() =>
        Gen.Select(Gen.Double[0.1, 100], Gen.Double[1, 60], Gen.Double[10, 2000], Gen.Double[10, 2000]).Sample((nf, mhz, from, to) =>
        {
            var (c, f) = (Capacitance.FromNanofarad(nf), Frequency.FromMegahertz(mhz));
            var (source, load) = (Resistance.FromOhm(from), Resistance.FromOhm(to));
            var added = LadderElement.SeriesCapacitor(c).At(f).Loss(source, load) - TwoPort.Through.Loss(source, load);
            return Math.Abs(CouplingCapacitor.Loss(c, f, source + load).Db - added.Db) < 1e-9;
        });
}
