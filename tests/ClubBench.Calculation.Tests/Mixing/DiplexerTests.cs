using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Mixing;

public class DiplexerTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("diplexer");

    [Theory]
    [Evidence(typeof(BandPassDiplexer), EvidenceKind.ClosedFormLimit)]
    [Evidence(typeof(FirstOrderDiplexer), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Rows))]
    public void Diplexer_ReferenceRow_HasThePartsOfTheTable(ReferenceRow row)
    {
        var (f, r) = (Frequency.FromMegahertz(row.Number("f_mhz")), Resistance.FromOhm(row.Number("termination_ohm")));

        Assert.Equal(row.Number("expected"), row["kind"] == "first" ? First(row, FirstOrderDiplexer.For(f, r)) : Band(row, BandPassDiplexer.For(f, row.Number("q"), r)), row.Number("expected") * row.Number("relative_tolerance"));
    }

    [Fact]
    [Evidence(typeof(FirstOrderDiplexer), EvidenceKind.Identity)]
    public void Impedance_FirstOrder_IsTheTerminationEverywhere() => Gen.Select(Gen.Double[1e4, 1e7], Gen.Double[10, 1000], Gen.Double[1e3, 1e8]).Sample((crossover, ohm, hz) =>
        (FirstOrderDiplexer.For(Frequency.FromHertz(crossover), Resistance.FromOhm(ohm)).Impedance(Frequency.FromHertz(hz)) - ohm).Magnitude < 1e-9 * ohm);

    [Fact]
    [Evidence(typeof(BandPassDiplexer), EvidenceKind.Identity)]
    public void Impedance_BandPass_IsTheTerminationEverywhere() => Gen.Select(Gen.Double[1e6, 1e7], Gen.Double[1, 5], Gen.Double[0.01, 100]).Sample((mid, q, ratio) =>
        (BandPassDiplexer.For(Frequency.FromHertz(mid), q, Resistance.FromOhm(50)).Impedance(Frequency.FromHertz(mid * ratio)) - 50).Magnitude < 1e-6);

    [Fact]
    public void Impedance_BandPassAtItsCentre_IsFinite() =>
        Assert.Equal(50, BandPassDiplexer.For(Frequency.FromMegahertz(9), 3, Resistance.FromOhm(50)).Impedance(Frequency.FromMegahertz(9)).Real, 1e-6);

    [Fact]
    public void BandPass_BothCircuits_ResonateAtTheIntermediateFrequency()
    {
        var diplexer = BandPassDiplexer.For(Frequency.FromMegahertz(9), 2, Resistance.FromOhm(50));

        Assert.Equal(9e6, 1 / (2 * Math.PI * Math.Sqrt(diplexer.SeriesCoil.Henry * diplexer.SeriesCapacitor.Farad)), 1e-3);
        Assert.Equal(9e6, 1 / (2 * Math.PI * Math.Sqrt(diplexer.ShuntCoil.Henry * diplexer.ShuntCapacitor.Farad)), 1e-3);
    }

    [Fact]
    public void For_WithoutTermination_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => FirstOrderDiplexer.For(Frequency.FromMegahertz(0.1), default));

    private static double First(ReferenceRow row, FirstOrderDiplexer d) => row["quantity"] == "coil_uh" ? d.Coil.Microhenry : d.Capacitor.Picofarad;

    private static double Band(ReferenceRow row, BandPassDiplexer d) => row["quantity"] switch
    {
        "series_coil_uh" => d.SeriesCoil.Microhenry,
        "series_capacitor_pf" => d.SeriesCapacitor.Picofarad,
        "shunt_coil_uh" => d.ShuntCoil.Microhenry,
        _ => d.ShuntCapacitor.Picofarad,
    };
}
