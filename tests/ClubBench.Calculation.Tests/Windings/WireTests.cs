using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;

namespace ClubBench.Calculation.Tests.Windings;

public class WireTests
{
    public static TheoryData<ReferenceRow> Gauges => ReferenceTable.Theory("wire-gauges");

    public static TheoryData<ReferenceRow> SkinFactors => ReferenceTable.Theory("skin-factor");

    [Theory]
    [MemberData(nameof(Gauges))]
    public void Find_Gauge_HasThePrintedDiameter(ReferenceRow row) =>
        Assert.Equal(row.Number("bare_mm"), Wires.Find(Enum.Parse<WireSystem>(row["system"]), row["size"])!.Bare.Millimetre, 1e-9);

    [Fact]
    public void AwgBare_EveryListedGauge_MatchesTheTable()
    {
        var gauges = Wires.All.Where(w => w.System == WireSystem.Awg).ToList();

        Assert.NotEmpty(gauges);
        Assert.All(gauges, w =>
            Assert.Equal(w.Bare.Millimetre, Wire.AwgBare(int.Parse(w.Size, System.Globalization.CultureInfo.InvariantCulture)).Millimetre, 1e-4));
    }

    [Fact]
    public void AwgBare_SixGaugesThinner_IsAboutHalf() =>
        Assert.Equal(2, Wire.AwgBare(20) / Wire.AwgBare(26), 0.01);

    [Fact]
    public void Find_SameNumberInBothSystems_IsDifferentWire() =>
        Assert.NotEqual(Wires.Find(WireSystem.Awg, 24)!.Bare, Wires.Find(WireSystem.Swg, 24)!.Bare);

    [Fact]
    public void OverallOf_FitAgainstTheMetricList_AgreesWithin4Micrometre() =>
        Assert.All(Wires.Metric.Where(w => w.Bare.Millimetre is >= 0.1 and <= 1.0), w =>
        {
            var unlisted = w with { ListedGrade1 = null, ListedGrade2 = null };
            Assert.Equal(w.OverallOf(EnamelGrade.Grade1).Millimetre, unlisted.OverallOf(EnamelGrade.Grade1).Millimetre, 0.004);
            Assert.Equal(w.OverallOf(EnamelGrade.Grade2).Millimetre, unlisted.OverallOf(EnamelGrade.Grade2).Millimetre, 0.004);
        });

    [Fact]
    public void All_EverySize_IsThickerWithMoreEnamel() =>
        Assert.All(Wires.All, w => Assert.True(w.Bare < w.OverallOf(EnamelGrade.Grade1) && w.OverallOf(EnamelGrade.Grade1) < w.Overall));

    [Fact]
    public void Substitute_DrawerWithinOneStep_OffersTheNearest()
    {
        Wire[] drawer = [Wire.Millimetre(0.3), Wire.Millimetre(0.4)];

        Assert.Equal(drawer[1], Wires.Substitute(Wire.Millimetre(0.42), drawer));
        Assert.Null(Wires.Substitute(Wire.Millimetre(0.6), drawer));
    }

    [Theory]
    [MemberData(nameof(SkinFactors))]
    public void SkinFactor_RoundWire_AgreesWithTheBesselSolution(ReferenceRow row)
    {
        var (bare, f) = (Length.FromMillimetre(row.Number("bare_mm")), Frequency.FromMegahertz(row.Number("frequency_mhz")));

        Assert.Equal(1, Copper.SkinFactor(bare, f) / row.Number("factor"), 0.006);
    }

    [Fact]
    public void SkinDepth_OneMegahertz_Is66Micrometre() => Assert.Equal(0.0661, Copper.SkinDepth(Frequency.FromMegahertz(1)).Millimetre, 5e-5);

    [Fact]
    public void SkinFactor_LowFrequency_IsOne() => Assert.Equal(1, Copper.SkinFactor(Length.FromMillimetre(0.4), Frequency.FromHertz(50)), 6);

    [Fact]
    public void AlternatingCurrent_T50Winding_MatchesTheWorkedExample()
    {
        // 33 turns of 0.5 mm: 16.44 mm a turn without slack and tails, 0.252 ohm at 7.1 MHz.
        var turn = ToroidWinding.TurnLength(Cores.FindToroid("T50-2")!, Wire.Millimetre(0.5));

        Assert.Equal(0.252, Copper.AlternatingCurrent(33 * turn, Length.FromMillimetre(0.5), Frequency.FromMegahertz(7.1)).Ohm, 0.002);
    }

    [Fact]
    public void DirectCurrent_TenDegreesWarmer_Rises4Percent()
    {
        var (length, bare) = (Length.FromMetre(1), Length.FromMillimetre(0.4));

        Assert.Equal(1.0393, Copper.DirectCurrent(length, bare, 30) / Copper.DirectCurrent(length, bare), 1e-9);
        Assert.Equal(0.1372, Copper.DirectCurrent(length, bare).Ohm, 5e-5);
    }
}
