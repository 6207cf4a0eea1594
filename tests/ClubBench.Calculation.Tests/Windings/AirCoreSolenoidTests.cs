using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;

namespace ClubBench.Calculation.Tests.Windings;

public class AirCoreSolenoidTests
{
    public static TheoryData<ReferenceRow> Coils => ReferenceTable.Theory("air-core-solenoid");

    public static TheoryData<ReferenceRow> Coefficients => ReferenceTable.Theory("nagaoka");

    [Theory]
    [MemberData(nameof(Coils))]
    [Evidence(typeof(AirCoreSolenoid), EvidenceKind.IndependentRecomputation)]
    public void Inductance_Coil_MatchesTableAndLoops(ReferenceRow row)
    {
        var coil = Coil(row);

        Assert.Equal(row.Number("coefficient"), AirCoreSolenoid.NagaokaCoefficient(coil.Diameter / coil.CoilLength), 6e-6);
        Assert.Equal(row.Number("sheet_uh"), coil.CurrentSheet.Microhenry, 6e-5);
        Assert.Equal(row.Number("corrected_uh"), coil.Inductance.Microhenry, 6e-5);
        Assert.Equal(row.Number("wheeler_uh"), coil.Wheeler.Microhenry, 6e-5);
        Assert.Equal(1, coil.Inductance.Microhenry / row.Number("loops_uh"), 0.0045);
        Assert.Equal(row.Number("self_capacitance_pf"), SelfResonance.OfSolenoid(coil.Diameter, coil.CoilLength).Picofarad, 6e-4);
    }

    [Theory]
    [MemberData(nameof(Coefficients))]
    [Evidence(typeof(AirCoreSolenoid), EvidenceKind.PublishedValue)]
    public void NagaokaCoefficient_PublishedRatios_MatchThePrintedDigits(ReferenceRow row) =>
        Assert.Equal(row.Number("coefficient"), AirCoreSolenoid.NagaokaCoefficient(row.Number("diameter_over_length")), 6e-7);

    [Fact]
    [Evidence(typeof(AirCoreSolenoid), EvidenceKind.ClosedFormLimit)]
    public void NagaokaCoefficient_VeryLongCoil_IsNearlyOne() => Assert.Equal(1, AirCoreSolenoid.NagaokaCoefficient(0.001), 0.0005);

    [Fact]
    public void Wheeler_LongEnoughCoil_IsWithinOnePercentOfTheSheet()
    {
        foreach (var turns in new[] { 5, 10, 20, 40 })
        {
            var coil = new AirCoreSolenoid(Length.FromMillimetre(10), turns, Length.FromMillimetre(1), Length.FromMillimetre(0.8));
            Assert.Equal(1, coil.Wheeler / coil.CurrentSheet, 0.01);
        }
    }

    [Fact]
    [Evidence(typeof(AirCoreSolenoid), EvidenceKind.Identity)]
    public void Inductance_StretchedCoil_Falls()
    {
        var coil = new AirCoreSolenoid(Length.FromMillimetre(10), 10, Length.FromMillimetre(1), Length.FromMillimetre(0.8));

        Assert.True((coil with { Pitch = Length.FromMillimetre(1.5) }).Inductance < coil.Inductance);
    }

    [Fact]
    public void Inductance_PitchBelowTheWire_Throws()
    {
        var coil = new AirCoreSolenoid(Length.FromMillimetre(10), 10, Length.FromMillimetre(0.5), Length.FromMillimetre(0.8));

        Assert.Throws<ArgumentOutOfRangeException>(() => coil.Inductance);
    }

    private static AirCoreSolenoid Coil(ReferenceRow r) => new(
        Length.FromMillimetre(r.Number("diameter_mm")), (int)r.Number("turns"), Length.FromMillimetre(r.Number("pitch_mm")), Length.FromMillimetre(r.Number("wire_mm")));
}
