using System.Globalization;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Orders;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Tests.Plans;

namespace ClubBench.Planning.Tests.Orders;

public class PartsOrderTests
{
    private static readonly Plan Twenty = DemoPlan.TwentyMetres;
    private static readonly Plan Forty = DemoPlan.FortyMetres;

    [Fact]
    public void Of_TwoPlans_NeedsTheSumOverTheirBoards()
    {
        var both = Needed(PartsOrder.Of([(Twenty, 7), (Forty, 5)], Shelf.EverythingCanBeBought));
        var (seven, five) = (Needed(PartsOrder.Of([(Twenty, 7)], Shelf.EverythingCanBeBought)), Needed(PartsOrder.Of([(Forty, 5)], Shelf.EverythingCanBeBought)));

        Assert.NotEmpty(both);
        Assert.All(both, line => Assert.Equal(seven.GetValueOrDefault(line.Key) + five.GetValueOrDefault(line.Key), line.Value, 1e-9));
        Assert.Equal(seven.Keys.Union(five.Keys).Count(), both.Count);
    }

    [Fact]
    public void Of_SevenBoards_NeedsSevenTimesOne()
    {
        var (one, seven) = (Needed(PartsOrder.Of([(Twenty, 1)], Shelf.EverythingCanBeBought)), Needed(PartsOrder.Of([(Twenty, 7)], Shelf.EverythingCanBeBought)));

        Assert.All(seven, line => Assert.Equal(7 * one[line.Key], line.Value, 1e-9));
    }

    [Fact]
    public void Of_Drawers_AreSubtractedAndNeverBelowZero()
    {
        var order = PartsOrder.Of([(Twenty, 7), (Forty, 5)], DemoKits.DrawerStock);

        Assert.All(order.Lines, l => Assert.True(l is { ToBuy: >= 0, InStock: >= 0 }));
        Assert.All(order.Lines, l => Assert.Equal(l.Needed + l.Spare, l.InStock + l.ToBuy, 1e-9));
        Assert.All(order.Lines.GroupBy(l => (l.Class, l.Type, l.ValueSi)), g => Assert.True(g.Sum(l => l.InStock) <= DemoKits.DrawerStock.Quantity(g.Key.Class, g.Key.Type, g.Key.ValueSi)));
        Assert.Contains(order.Lines, l => l.InStock > 0);
    }

    [Fact]
    public void Of_FiveFortyMetreBoards_AreOneCrystalShortAndASpareGroup()
    {
        var crystals = PartsOrder.Of([(Forty, 5)], DemoKits.DrawerStock).Lines.Single(l => l.Class == PartClass.Crystal);

        Assert.Equal((10, 2, 9, 3), (crystals.Needed, crystals.Spare, crystals.InStock, crystals.ToBuy));
    }

    [Fact]
    public void Of_EveryLine_HasAtLeastOneSpareAndWireAFifth()
    {
        var lines = PartsOrder.Of([(Twenty, 7)], Shelf.EverythingCanBeBought).Lines;

        Assert.All(lines.Where(l => l.Type != PartsOrder.Wire), l => Assert.True(l.Spare >= 1));
        Assert.All(lines.Where(l => l.Type == PartsOrder.Wire), l => Assert.Equal(0.2 * l.Needed, l.Spare, 1e-9));
        Assert.Contains(lines, l => l.Type == PartsOrder.Wire);
    }

    [Theory]
    [InlineData(20, 3)]
    [InlineData(7, 2)]
    public void Of_Transistors_GetMoreSparesThanTheFinal(int boards, int finalSpares)
    {
        var lines = PartsOrder.Of([(Twenty, boards)], Shelf.EverythingCanBeBought).Lines;

        Assert.Equal(finalSpares, lines.Single(l => l.Type == "BD139-16").Spare);
        Assert.Equal(Math.Ceiling(0.2 * boards), lines.Single(l => l.Type == "2N2222A").Spare);
    }

    [Fact]
    public void Of_ParallelPair_IsTwoLines()
    {
        var stage = Twenty.Stages.First(s => s.After.Parts.Any(p => p.Value(PartValue.Capacitance) is not null));
        var part = stage.After.Parts.First(p => p.Value(PartValue.Capacitance) is not null);
        var paired = stage with { After = stage.After with { Parts = [part.With((PartValue.Capacitance, 680e-12), (PartValue.ParallelCapacitance, 68e-12))] } };

        var lines = PartsOrder.Of([(Twenty with { Stages = [paired] }, 3)], Shelf.EverythingCanBeBought).Lines;

        Assert.Equal((3, 3), (lines.Single(l => l.ValueSi == 680e-12).Needed, lines.Single(l => l.ValueSi == 68e-12).Needed));
    }

    [Fact]
    public void Of_ChangesOnly_NeedsNoMoreThanEverything()
    {
        var (all, changed) = (Needed(PartsOrder.Of([(Twenty, 7)], Shelf.EverythingCanBeBought)), Needed(PartsOrder.Of([(Twenty, 7)], Shelf.EverythingCanBeBought, changesOnly: true)));

        Assert.All(changed, line => Assert.True(line.Value <= all[line.Key] + 1e-9));
        Assert.True(changed.Count < all.Count);
    }

    [Fact]
    public void Of_NoBoards_IsEmpty() => Assert.Empty(PartsOrder.Of([(Twenty, 0)], Shelf.EverythingCanBeBought).Lines);

    [Fact]
    public void Rows_OfAnOrder_CarryWordsUnitsAndNumbers()
    {
        var row = OrderTable.Rows(PartsOrder.Of([(Forty, 5)], DemoKits.DrawerStock), CultureInfo.InvariantCulture).Single(r => r.Part == "Crystal");

        Assert.Equal(("HC-49/U", "7.030\u00A0MHz", 3.0), (row.Type, row.Value, row.ToBuy));
    }

    [Theory]
    [InlineData("Zener 1 W", "36\u00A0V")]
    [InlineData("Zener 0.5 W", "6.2\u00A0V")]
    [InlineData("fuse, fast, 5 x 20 mm", "1\u00A0A")]
    [InlineData("1N4148", "")]
    [InlineData("heat sink, clip-on, 20 K/W", "")]
    public void Rows_OfAnOrder_TellWhatMustBeAskedForInTheShop(string type, string value) =>
        Assert.Equal(value, OrderTable.Rows(PartsOrder.Of([(Forty, 5)], DemoKits.DrawerStock), CultureInfo.InvariantCulture).Single(r => r.Type == type).Value);

    [Fact]
    public void Rows_OfAnOrder_TellBothEndsOfWhatCanBeTurned()
    {
        var rows = OrderTable.Rows(PartsOrder.Of([(Forty, 5)], DemoKits.DrawerStock), CultureInfo.InvariantCulture);

        Assert.Equal(["5\u201330\u00A0pF", "8\u201340\u00A0pF", "10\u201360\u00A0pF"], rows.Where(r => r.Part == "Trimmer").Select(r => r.Value));
        Assert.Equal("5\u2013140\u00A0pF", rows.Single(r => r.Part == "Variable capacitor").Value);
    }

    [Fact]
    public void Of_TrimmersOfOneHighestValue_AreTwoLinesOutOfOneDrawer()
    {
        var trimmer = Forty.Stages.SelectMany(s => s.After.Parts).First(p => p.Designator.StartsWith("TC", StringComparison.Ordinal));
        var stage = Forty.Stages.First(s => s.After.Parts.Contains(trimmer));
        var other = trimmer.With((PartValue.MinimumCapacitance, 1e-12)) with { Designator = "TC9" };
        var both = stage with { After = stage.After with { Parts = [trimmer, other] } };
        var shelf = new Shelf([new StockLine(PartClass.Trimmer, trimmer.Type, trimmer.Value(PartValue.MaximumCapacitance), 3, "", true)]);

        var lines = PartsOrder.Of([(Forty with { Stages = [both] }, 1)], shelf).Lines;

        Assert.Equal([1e-12, trimmer.Value(PartValue.MinimumCapacitance)], lines.Select(l => l.LowestSi));
        Assert.Equal(3, lines.Sum(l => l.InStock));
        Assert.Equal(1, lines.Sum(l => l.ToBuy));
    }

    [Fact]
    public void Rows_OfAnOrder_NameCoreAndWireAndPutTheRestLast()
    {
        var rows = OrderTable.Rows(PartsOrder.Of([(Forty, 5)], DemoKits.DrawerStock), CultureInfo.InvariantCulture);

        Assert.Equal("Core", rows.First(r => r.Type == "T37-6").Part);
        Assert.Equal("0.4\u00A0mm", rows.Single(r => r.Part == "Wire").Value);
        Assert.Equal("Other part", rows[^1].Part);
    }

    [Fact]
    public void Rows_OfAnOrder_TellTheRatingThatPartsTwoLines()
    {
        var order = new PartsOrder([new(PartClass.Capacitor, "NP0", 100e-12, null, 50, 5, 1, 0, 6), new(PartClass.Capacitor, "NP0", 100e-12, null, 100, 5, 1, 0, 6), new(PartClass.Diode, "zener", 36, null, null, 5, 1, 0, 6)]);

        var rows = OrderTable.Rows(order, CultureInfo.InvariantCulture);

        Assert.Equal(["50\u00A0V", "100\u00A0V", ""], rows.Select(r => r.Rating));
        Assert.Equal(["100\u00A0pF", "100\u00A0pF", "36\u00A0V"], rows.Select(r => r.Value));
    }

    [Theory]
    [InlineData("=1+1", "'=1+1")]
    [InlineData("+49 pF", "'+49 pF")]
    [InlineData("-cmd", "'-cmd")]
    [InlineData("@SUM(A1)", "'@SUM(A1)")]
    [InlineData("\tx", "'\tx")]
    [InlineData("\rx", "'\rx")]
    [InlineData("\0x", "'\0x")]
    [InlineData("-3.2", "-3.2")]
    [InlineData("NP0", "NP0")]
    [InlineData("", "")]
    public void Safe_Text_CannotBecomeAFormula(string text, string cell) => Assert.Equal(cell, CellText.Safe(text));

    private static Dictionary<(PartClass, string, double?, double?, double?), double> Needed(PartsOrder order) =>
        order.Lines.ToDictionary(l => (l.Class, l.Type, l.ValueSi, l.LowestSi, l.RatedVoltageV), l => l.Needed);
}
