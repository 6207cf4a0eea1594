using System.Globalization;
using ClubBench.Calculation.Components;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Tests.Builders;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Tests.Cards;

public class LookAlikeTests
{
    [Theory]
    [InlineData("331 is 330\u00A0pF; 330 is 33\u00A0pF.", 330, 33)]
    [InlineData("331 is 330\u00A0pF; 330 is 33\u00A0pF.", 33, 330)]
    [InlineData("101 is 100\u00A0pF; 100 is 10\u00A0pF.", 100, 10)]
    [InlineData("473 is 47\u00A0nF; 472 is 4.7\u00A0nF.", 4700, 47000)]
    [InlineData("470 is 47\u00A0pF; 4p7 is 4.7\u00A0pF.", 47, 4.7)]
    public void Of_TwoPartsOfTheSameFigures_NamesBoth(string said, double one, double other) =>
        Assert.Equal([said], Said(CardWith([one], [other])));

    [Fact]
    public void Of_PairInOnePlace_NamesBoth() => Assert.Equal(["331 is 330\u00A0pF; 330 is 33\u00A0pF."], Said(CardWith([330, 33])));

    [Theory]
    [InlineData(56, "560 is 56\u00A0pF, not 560\u00A0pF.")]
    [InlineData(10, "100 is 10\u00A0pF, not 100\u00A0pF.")]
    public void Of_MarkingThatEndsInZero_SaysWhatItIsNot(double picofarad, string said) => Assert.Equal([said], Said(CardWith([picofarad])));

    [Fact]
    public void Of_SameValueInTwoRows_SaysItOnce() => Assert.Single(Said(CardWith([56], [56])));

    [Fact]
    public void Of_NothingLookAlike_IsQuiet() => Assert.Empty(Said(CardWith([390, 220], [180], [1000], [8.2])));

    [Fact]
    public void Of_OtherParts_AreLeftAlone()
    {
        var card = CardWith([390]);
        var core = new FittingRow(["L4"], Quern.Stage("A5").Part("L4"), ["560"], 1, true, "b");

        Assert.Empty(Said(card with { Fit = [.. card.Fit, core] }));
    }

    [Theory]
    [InlineData("20 m", "A7", 1)]
    [InlineData("20 m", "A5", 0)]
    [InlineData("40 m", "A5", 0)]
    public void Of_DemonstrationCards_WarnsWhereAMarkingIsEasilyMisread(string band, string stage, int warnings) =>
        Assert.Equal(warnings, LookAlike.Of((band == "20 m" ? Plans.DemoPlan.TwentyMetres : Plans.DemoPlan.FortyMetres).Stage(stage).Card).Count);

    private static List<string> Said(CardContent card) => [.. LookAlike.Of(card).Select(l => Phrases.Say(l, CultureInfo.InvariantCulture))];

    private static CardContent CardWith(params double[][] placesPicofarad)
    {
        var card = Plans.DemoPlan.TwentyMetres.Stage("A5").Card;
        return card with { Fit = [.. placesPicofarad.Select(RowOf)] };
    }

    private static FittingRow RowOf(double[] piecesPicofarad)
    {
        var pieces = piecesPicofarad.Select(Capacitance.FromPicofarad).ToList();
        var part = Planning.Parts.CapacitorPart.Holding(Quern.Stage("A5").Part("C15"), pieces[0], pieces.Count > 1 ? pieces[1] : null);
        return new FittingRow(["C15"], part, [.. pieces.Select(PartMarking.Of)], pieces.Count, true, "a");
    }
}
