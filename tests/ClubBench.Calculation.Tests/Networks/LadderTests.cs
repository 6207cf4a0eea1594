using System.Globalization;
using System.Numerics;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tests.Filters;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Networks;

public class LadderTests
{
    public static TheoryData<ReferenceRow> Nodal => ReferenceTable.Theory("ladder_nodal");

    public static TheoryData<ReferenceRow> Chebyshev5 => ReferenceTable.Theory("ladder_chebyshev5");

    public static TheoryData<ReferenceRow> Reflection => ReferenceTable.Theory("ladder_reflection");

    public static TheoryData<ReferenceRow> Loads => ReferenceTable.Theory("ladder_input_impedance");

    public static TheoryData<ReferenceRow> UnequalEnds => ReferenceTable.Theory("ladder_unequal_ends");

    public static TheoryData<ReferenceRow> Leads => ReferenceTable.Theory("ladder_lead_inductance");

    public static TheoryData<ReferenceRow> KeptFilter => ReferenceTable.Theory("kept_filter");

    [Theory]
    [MemberData(nameof(Nodal))]
    [Evidence(typeof(Ladder), EvidenceKind.IndependentRecomputation)]
    [Evidence(typeof(LadderElement), EvidenceKind.IndependentRecomputation)]
    [Evidence(typeof(TwoPort), EvidenceKind.IndependentRecomputation)]
    public void At_SameNetworkByNodalAnalysis_AgreesToRounding(ReferenceRow row)
    {
        var ladder = new Ladder(row["elements"].Split(';').Select(Element));
        var (source, load) = (Resistance.FromOhm(row.Number("source_ohm")), Resistance.FromOhm(row.Number("load_ohm")));

        var chain = ladder.At(Frequency.FromMegahertz(row.Number("frequency_mhz")));

        Close(new(row.Number("s21_re"), row.Number("s21_im")), chain.S21(source, load), row.Number("tolerance"));
        Close(new(row.Number("s11_re"), row.Number("s11_im")), chain.S11(source, load), row.Number("tolerance"));
    }

    [Theory]
    [MemberData(nameof(Chebyshev5))]
    public void Loss_ChebyshevFive_MatchesTheRow(ReferenceRow row)
    {
        var f = Frequency.FromMegahertz(row.Number("frequency_mhz"));

        var chain = F7.ToLadder().At(f);

        Close(new(row.Number("s21_re"), row.Number("s21_im")), chain.S21(FiftyOhm, FiftyOhm), row.Number("tolerance"));
        Assert.Equal(row.Number("loss_db"), chain.Loss(FiftyOhm, FiftyOhm).Db, row.Number("db_tolerance"));
        Assert.Equal(row.Number("return_loss_db"), chain.ReturnLoss(FiftyOhm, FiftyOhm).Db, row.Number("db_tolerance"));
        Assert.Equal(row.Number("lossy_loss_db"), F7.ToLadder(150, 1000).Loss(f, FiftyOhm, FiftyOhm).Db, row.Number("db_tolerance"));
    }

    [Theory]
    [MemberData(nameof(KeptFilter))]
    public void Loss_OldFilterOnANewBand_MatchesTheRow(ReferenceRow row)
    {
        var ladder = (row["filter"] == "f7" ? F7 : F14).ToLadder();
        var f = Frequency.FromMegahertz(row.Number("frequency_mhz"));

        Assert.Equal(row.Number("loss_db"), ladder.Loss(f, FiftyOhm, FiftyOhm).Db, row.Number("tolerance"));
        Assert.Equal(row.Number("return_loss_db"), ladder.ReturnLoss(f, FiftyOhm, FiftyOhm).Db, row.Number("return_loss_tolerance"));
        foreach (var (column, n) in new[] { ("second_db", 2), ("third_db", 3), ("fourth_db", 4) })
            Assert.Equal(row.Number(column), ladder.Loss(f.Harmonic(n), FiftyOhm, FiftyOhm).Db, Math.Max(row.Number("tolerance"), PrintedHalfUnit(row[column])));
    }

    [Theory]
    [MemberData(nameof(Reflection))]
    [Evidence(typeof(TwoPort), EvidenceKind.IndependentRecomputation)]
    public void S11_ChebyshevFive_MatchesNodalAnalysis(ReferenceRow row) => Close(
        new Complex(row.Number("s11_re"), row.Number("s11_im")),
        F7.ToLadder().At(Frequency.FromMegahertz(row.Number("frequency_mhz"))).S11(FiftyOhm, FiftyOhm),
        row.Number("tolerance"));

    [Theory]
    [MemberData(nameof(Loads))]
    [Evidence(typeof(TwoPort), EvidenceKind.IndependentRecomputation)]
    public void InputImpedance_ChebyshevFive_MatchesNodalAnalysis(ReferenceRow row)
    {
        var z = F7.ToLadder().At(Frequency.FromMegahertz(7.1)).InputImpedance(new Complex(row.Number("load_ohm"), row.Number("load_reactance_ohm")));

        Close(new Complex(row.Number("input_ohm"), row.Number("input_reactance_ohm")), z, row.Number("tolerance"));
    }

    [Theory]
    [MemberData(nameof(UnequalEnds))]
    [Evidence(typeof(TwoPort), EvidenceKind.IndependentRecomputation)]
    public void Loss_UnequalEnds_MatchesNodalAnalysis(ReferenceRow row)
    {
        var chain = F7.ToLadder().At(Frequency.FromMegahertz(7.1));
        var (source, load) = (Resistance.FromOhm(row.Number("source_ohm")), Resistance.FromOhm(row.Number("load_ohm")));

        Assert.Equal(row.Number("loss_db"), chain.Loss(source, load).Db, row.Number("tolerance"));
        Assert.Equal(row.Number("return_loss_db"), chain.ReturnLoss(source, load).Db, row.Number("tolerance"));
    }

    [Theory]
    [MemberData(nameof(Leads))]
    [Evidence(typeof(Ladder), EvidenceKind.IndependentRecomputation)]
    public void WithLeads_SixNanohenryInEachCapacitor_MatchesNodalAnalysis(ReferenceRow row) => Assert.Equal(
        row.Number("loss_db"),
        F7.ToLadder().WithLeads(Inductance.FromNanohenry(6)).Loss(Frequency.FromMegahertz(row.Number("frequency_mhz")), FiftyOhm, FiftyOhm).Db,
        row.Number("tolerance"));

    [Theory]
    [InlineData(77, 1)]
    [InlineData(104, 1)]
    public void WithLeads_CapacitorResonates_BlocksNearby(double megahertz, double half)
    {
        var ladder = F7.ToLadder().WithLeads(Inductance.FromNanohenry(6));

        Assert.Contains(FrequencyRange.FromMegahertz(megahertz - half, megahertz + half).Points(2001), f => ladder.Loss(f, FiftyOhm, FiftyOhm).Db > 150);
    }

    [Fact]
    public void WithLeads_NoInductance_IsTheSameLadder() => Assert.Equal(F7.ToLadder(150, 1000).Elements, F7.ToLadder(150, 1000).WithLeads(default).Elements);

    [Fact]
    [Evidence(typeof(Ladder), EvidenceKind.Identity)]
    [Evidence(typeof(TwoPort), EvidenceKind.Identity)]
    public void At_AnyPassiveLadder_IsReciprocalAndLosslessOnesKeepTheEnergy()
    {
        foreach (var f in FrequencyRange.FromMegahertz(1, 60).Points(40))
        {
            var chain = Seven20.ToLadder().At(f);
            var (s21, s11) = (chain.S21(FiftyOhm, FiftyOhm).Magnitude, chain.S11(FiftyOhm, FiftyOhm).Magnitude);

            var lossy = Seven20.ToLadder(150, 1000).At(f);

            Close(Complex.One, lossy.Determinant, 1e-14 * (lossy.A * lossy.D).Magnitude);
            Assert.Equal(1, (s21 * s21) + (s11 * s11), 1e-12);
        }
    }

    [Fact]
    [Evidence(typeof(Ladder), EvidenceKind.Identity)]
    [Evidence(typeof(TwoPort), EvidenceKind.Identity)]
    public void S22_ReversedLadder_IsItsS11()
    {
        var ladder = new Ladder(F7.ToLadder(150).Elements.Take(4));
        var f = Frequency.FromMegahertz(9);
        var reversed = new Ladder(ladder.Elements.Reverse());

        Close(reversed.At(f).S11(FiftyOhm, FiftyOhm), ladder.At(f).S22(FiftyOhm, FiftyOhm), 1e-12);
        Close(reversed.At(f).InputImpedance(75), ladder.At(f).OutputImpedance(75), 1e-9);
    }

    [Fact]
    [Evidence(typeof(LadderElement), EvidenceKind.ClosedFormLimit)]
    [Evidence(typeof(Ladder), EvidenceKind.ClosedFormLimit)]
    public void Loss_AtAnUnmovedNotchWithoutLosses_StaysFinite()
    {
        var (coil, capacitor) = (Inductance.FromMicrohenry(1), Capacitance.FromPicofarad(100));
        var notch = Frequency.FromHertz(1 / (2 * Math.PI * Math.Sqrt(coil.Henry * capacitor.Farad)));
        var ladder = new Ladder([LadderElement.ShuntTrap(coil, capacitor, 200, 1000)]);

        var loss = ladder.Loss(notch, FiftyOhm, FiftyOhm);

        // 100 ohm reactance: 0.5 ohm of the coil and 0.1 ohm of the capacitor are left across 25 ohm.
        Assert.Equal(20 * Math.Log10((25 + 0.6) / 0.6), loss.Db, 1e-6);
    }

    [Theory]
    [InlineData(LadderPosition.Series)]
    [InlineData(LadderPosition.Shunt)]
    public void Loss_LosslessTrapExactlyAtItsNotch_IsTheMostThatIsTold(LadderPosition position)
    {
        // 1 rad/s on 1 H and 1 F cancels to the last digit.
        var (coil, capacitor) = (Inductance.FromHenry(1), Capacitance.FromFarad(1));
        var trap = position == LadderPosition.Series ? LadderElement.SeriesTrap(coil, capacitor) : LadderElement.ShuntTrap(coil, capacitor);

        var loss = new Ladder([trap]).Loss(Frequency.FromHertz(1 / (2 * Math.PI)), FiftyOhm, FiftyOhm);

        Assert.Equal(300, loss.Db, 1e-9);
    }

    [Fact]
    [Evidence(typeof(Ladder), EvidenceKind.ClosedFormLimit)]
    public void CutOff3dB_Chebyshev_IsTheClosedForm()
    {
        var prototype = LowPassPrototype.Chebyshev(5, PassBandRipple.FromReflection(0.1));

        // Nothing is lost at a zero of the Chebyshev polynomial, so half the power there is half the power of the closed form.
        var found = F7.ToLadder().CutOff3dB(Frequency.FromMegahertz(8.0 * Math.Cos(0.3 * Math.PI)), FiftyOhm, FiftyOhm);

        Assert.Equal(8.0 * prototype.HalfPowerRatio, found!.Value.Megahertz, 1e-6);
    }

    [Fact]
    public void CutOff3dB_FrequencyAlreadyInTheStopBand_IsNull() =>
        Assert.Null(F7.ToLadder().CutOff3dB(Frequency.FromMegahertz(14), FiftyOhm, FiftyOhm));

    private static double PrintedHalfUnit(string text) => text.Contains('.', StringComparison.Ordinal) ? 0.5 * Math.Pow(10, -(text.Length - text.IndexOf('.', StringComparison.Ordinal) - 1)) : 0.5;

    private static LadderElement Element(string text)
    {
        var parts = text.Split(':');
        double At(int k) => double.Parse(parts[k], CultureInfo.InvariantCulture);
        double? Q(int k) => parts.Length > k ? At(k) : null;
        return parts[0] switch
        {
            "C" => LadderElement.ShuntCapacitor(Capacitance.FromFarad(At(1)), Q(2)),
            "L" => LadderElement.SeriesInductor(Inductance.FromHenry(At(1)), Q(2)),
            "LT" => LadderElement.SeriesTrap(Inductance.FromHenry(At(1)), Capacitance.FromFarad(At(2)), Q(3), Q(4)),
            _ => LadderElement.ShuntTrap(Inductance.FromHenry(At(1)), Capacitance.FromFarad(At(2)), Q(3), Q(4)),
        };
    }

    private static void Close(Complex expected, Complex actual, double tolerance)
    {
        Assert.Equal(expected.Real, actual.Real, tolerance);
        Assert.Equal(expected.Imaginary, actual.Imaginary, tolerance);
    }
}
