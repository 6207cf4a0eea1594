using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using CsCheck;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Networks;

public class ResistivePadTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("resistive_pad");

    [Theory]
    [MemberData(nameof(Rows))]
    public void For_Attenuation_MatchesTheRow(ReferenceRow row)
    {
        var pad = ResistivePad.For(Enum.Parse<PadForm>(row["form"]), Decibels.FromDb(row.Number("attenuation_db")), FiftyOhm);

        Assert.Equal(row.Number("outer_ohm"), pad.Outer.Ohm, row.Number("outer_ohm") * row.Number("tolerance"));
        Assert.Equal(row.Number("inner_ohm"), pad.Inner.Ohm, row.Number("inner_ohm") * row.Number("tolerance"));
    }

    [Theory]
    [InlineData(PadForm.Pi, 3)]
    [InlineData(PadForm.Tee, 10)]
    [Evidence(typeof(ResistivePad), EvidenceKind.RoundTrip)]
    public void Attenuation_OfTheDesignedPad_ComesBack(PadForm form, double db)
    {
        var pad = ResistivePad.For(form, Decibels.FromDb(db), FiftyOhm);

        Assert.Equal(db, pad.Attenuation.Db, 1e-9);
        Assert.True(pad.ReturnLoss.Db > 100);
    }

    // As tests/Recomputed/ladder_stress_and_yield.py finds them.
    [Theory]
    [InlineData(300, 18, 2.995, 44.6)]
    [InlineData(62, 240, 19.68, 49.4)]
    [Evidence(typeof(ResistivePad), EvidenceKind.IndependentRecomputation)]
    public void Attenuation_StandardValues_MatchesNodalAnalysis(double outer, double inner, double lossDb, double returnLossDb)
    {
        var pad = new ResistivePad(PadForm.Pi, Resistance.FromOhm(outer), Resistance.FromOhm(inner), FiftyOhm);

        Assert.Equal(lossDb, pad.Attenuation.Db, 0.01);
        Assert.Equal(returnLossDb, pad.ReturnLoss.Db, 0.05);
    }

    [Theory]
    [InlineData(6, 0.33)]
    [InlineData(10, 0.52)]
    [InlineData(20, 0.82)]
    public void InputResistorShare_Pi_GrowsWithTheAttenuation(double db, double share) =>
        Assert.Equal(share, ResistivePad.For(PadForm.Pi, Decibels.FromDb(db), FiftyOhm).InputResistorShare, 0.005);

    [Theory]
    [InlineData(0.1)]
    [InlineData(3)]
    [InlineData(10)]
    [InlineData(60)]
    [Evidence(typeof(ResistivePad), EvidenceKind.ClosedFormLimit)]
    public void InputResistorShare_MatchedPi_IsTheRatioOfDifferenceAndSum(double db)
    {
        var k = Math.Pow(10, db / 20);

        Assert.Equal((k - 1) / (k + 1), ResistivePad.For(PadForm.Pi, Decibels.FromDb(db), FiftyOhm).InputResistorShare, 1e-9);
    }

    [Fact]
    [Evidence(typeof(ResistivePad), EvidenceKind.Identity)]
    public void For_PiAndTee_AreStarAndDeltaOfEachOther() =>
        Gen.Select(Gen.Double[0.1, 60], Gen.Double[10, 600]).Sample((db, ohm) =>
        {
            var pi = ResistivePad.For(PadForm.Pi, Decibels.FromDb(db), Resistance.FromOhm(ohm));
            var tee = ResistivePad.For(PadForm.Tee, Decibels.FromDb(db), Resistance.FromOhm(ohm));
            var sum = (2 * pi.Outer.Ohm) + pi.Inner.Ohm;
            return Math.Abs((tee.Outer.Ohm * sum / (pi.Outer.Ohm * pi.Inner.Ohm)) - 1) < 1e-9 && Math.Abs((tee.Inner.Ohm * sum / (pi.Outer.Ohm * pi.Outer.Ohm)) - 1) < 1e-9;
        });
}
