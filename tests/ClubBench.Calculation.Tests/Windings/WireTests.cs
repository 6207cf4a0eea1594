using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;
using CsCheck;

namespace ClubBench.Calculation.Tests.Windings;

public class WireTests
{
    public static TheoryData<ReferenceRow> Gauges => ReferenceTable.Theory("wire-gauges");

    public static TheoryData<ReferenceRow> SkinFactors => ReferenceTable.Theory("skin-factor");

    [Theory]
    [MemberData(nameof(Gauges))]
    [Evidence(typeof(Wires), EvidenceKind.PublishedValue)]
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
    [Evidence(typeof(Wire), EvidenceKind.Identity)]
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
    [Evidence(typeof(Wire), EvidenceKind.Identity)]
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
    [InlineData(0.1, 0.112)]
    [InlineData(0.5, 0.56)]
    [InlineData(1.0, 1.12)]
    public void Substitute_StepOfTwelvePercent_IsInsideTheWindow(double wanted, double drawer) =>
        Assert.NotNull(Wires.Substitute(Wire.Millimetre(wanted), [Wire.Millimetre(drawer)]));

    [Theory]
    [MemberData(nameof(SkinFactors))]
    [Evidence(typeof(Copper), EvidenceKind.IndependentRecomputation)]
    public void SkinFactor_RoundWire_AgreesWithTheBesselSolution(ReferenceRow row)
    {
        var (bare, f) = (Length.FromMillimetre(row.Number("bare_mm")), Frequency.FromMegahertz(row.Number("frequency_mhz")));

        Assert.Equal(1, Copper.SkinFactor(bare, f) / row.Number("factor"), 0.006);
    }

    [Fact]
    public void SkinDepth_OneMegahertz_Is66Micrometre() => Assert.Equal(0.0661, Copper.SkinDepth(Frequency.FromMegahertz(1)).Millimetre, 5e-5);

    [Fact]
    [Evidence(typeof(Copper), EvidenceKind.ClosedFormLimit)]
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

    [Fact]
    [Evidence(typeof(Wire), EvidenceKind.PublishedValue)]
    public void AwgBare_Gauges_MatchThePrintedDiameters() =>
        Assert.All(ReferenceTable.Read("wire-gauges").Where(r => r["system"] == nameof(WireSystem.Awg)), r =>
            Assert.Equal(r.Number("bare_mm"), Wire.AwgBare((int)r.Number("size")).Millimetre, 5.1e-5));

    [Fact]
    [Evidence(typeof(Wire), EvidenceKind.ClosedFormLimit)]
    public void AwgBare_ThirtyNineGaugesThinner_IsANinetySecond()
    {
        Assert.Equal(0.127, Wire.AwgBare(36).Millimetre, 12);
        Assert.Equal(92, Wire.AwgBare(0) / Wire.AwgBare(39), 9);
    }

    [Fact]
    [Evidence(typeof(Wires), EvidenceKind.Identity)]
    public void Substitute_AnyDrawer_HasNoNearerWireAndNoneOutsideTheWindow() =>
        Gen.Select(Gen.Int[0, Wires.Metric.Count - 1], Gen.Int[0, Wires.All.Count - 1].Array[0, 6]).Sample((wanted, indices) =>
        {
            var (wire, drawer) = (Wires.Metric[wanted], indices.Select(i => Wires.All[i]).ToList());
            double Off(Wire w) => Math.Abs(Math.Log(w.Bare / wire.Bare));
            bool Near(Wire w) => Math.Abs(w.Bare.Millimetre - wire.Bare.Millimetre) <= 0.12 * wire.Bare.Millimetre * (1 + 1e-9);
            return Wires.Substitute(wire, drawer) is { } found ? Near(found) && drawer.Where(Near).All(w => Off(found) <= Off(w)) : !drawer.Any(Near);
        });

    [Fact]
    [Evidence(typeof(Wires), EvidenceKind.ClosedFormLimit)]
    public void Substitute_WireInTheDrawer_IsItself() =>
        Assert.All(Wires.Metric, w => Assert.Equal(w.Bare, Wires.Substitute(w, Wires.Metric)!.Bare));

    [Fact]
    [Evidence(typeof(Copper), EvidenceKind.PublishedValue)]
    public void DirectCurrent_OneMetreOfOneSquareMillimetre_IsTheStandardResistance()
    {
        // iec-60028: annealed copper at 20 C has 1/58 ohm, printed 0.017241, and rises by 0.00393 of it a kelvin.
        var (length, bare) = (Length.FromMetre(1), Length.FromMillimetre(Math.Sqrt(4 / Math.PI)));

        Assert.Equal(0.017241, Copper.DirectCurrent(length, bare).Ohm, 5e-7);
        Assert.Equal(0.017241 * 1.00393, Copper.DirectCurrent(length, bare, 21).Ohm, 5e-7);
    }

    [Fact]
    [Evidence(typeof(Copper), EvidenceKind.Identity)]
    public void SkinFactor_TwiceTheWireAtAQuarterOfTheFrequency_IsTheSame() =>
        Gen.Select(Gen.Double[0.1, 1], Gen.Double[0.1, 50]).Sample((mm, mhz) =>
        {
            var (bare, f) = (Length.FromMillimetre(mm), Frequency.FromMegahertz(mhz));
            return Math.Abs((Copper.SkinFactor(2 * bare, f / 4) / Copper.SkinFactor(bare, f)) - 1) < 1e-9;
        });
}
