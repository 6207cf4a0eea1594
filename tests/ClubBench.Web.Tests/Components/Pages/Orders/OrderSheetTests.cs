using ClubBench.Planning.Orders;
using ClubBench.Planning.StageKinds;
using ClubBench.Web.Components.Pages.Orders;

namespace ClubBench.Web.Tests.Components.Pages.Orders;

public sealed class OrderSheetTests
{
    private static readonly PartsOrder Order = new(
    [
        new(PartClass.Capacitor, "NP0", 180e-12, null, 100, 14, 2, 6, 10),
        new(PartClass.Winding, "T37-6", null, null, null, 21, 3, 24, 0),
        new(PartClass.Winding, PartsOrder.Wire, 0.4e-3, null, null, 6.1, 1.22, 0, 7.32),
        new(PartClass.Diode, "Zener 0.5 W", 6.2, null, null, 7, 1, 0, 8),
    ]);

    [Theory]
    [InlineData("csv")]
    [InlineData("xlsx")]
    public void File_OfAnOrder_HoldsEveryLineWithSparesAndRating(string format)
    {
        var file = OrderFile.Read(format, format == "csv" ? OrderSheet.Csv(Order) : OrderSheet.Xlsx(Order));

        Assert.Equal(
            [
                new OrderRow("Capacitor", "NP0", "180\u00A0pF", "100\u00A0V", 14, 2, 6, 10),
                new OrderRow("Core", "T37-6", "", "", 21, 3, 24, 0),
                new OrderRow("Wire", "enamelled copper, in metres", "0.4\u00A0mm", "", 6.1, 1.22, 0, 7.32),
                new OrderRow("Diode", "Zener 0.5 W", "6.2\u00A0V", "", 7, 1, 0, 8),
            ],
            file);
    }

    [Theory]
    [InlineData("=HYPERLINK(\"x\")")]
    [InlineData("+49 pF")]
    [InlineData("-bd139")]
    [InlineData("@cmd")]
    [InlineData("\tcmd")]
    public void File_TypeThatLooksLikeAFormula_IsMadeText(string type)
    {
        var order = new PartsOrder([Order.Lines[0] with { Type = type }]);

        Assert.Equal("'" + type, Assert.Single(OrderFile.Read("csv", OrderSheet.Csv(order))).Type);
        Assert.Equal("'" + type, Assert.Single(OrderFile.Read("xlsx", OrderSheet.Xlsx(order))).Type);
    }

    [Theory]
    [InlineData("2N3904")]
    [InlineData("film, 5 x 20 mm \"fast\"")]
    [InlineData("a=b")]
    [InlineData("a,b\nc")]
    public void File_OrdinaryType_StandsAsItIs(string type)
    {
        var order = new PartsOrder([Order.Lines[0] with { Type = type }]);

        Assert.Equal(type, Assert.Single(OrderFile.Read("csv", OrderSheet.Csv(order))).Type);
        Assert.Equal(type, Assert.Single(OrderFile.Read("xlsx", OrderSheet.Xlsx(order))).Type);
    }

    [Fact]
    public void File_InAnotherCulture_KeepsItsNumbersReadable()
    {
        var before = System.Globalization.CultureInfo.CurrentCulture;
        try
        {
            System.Globalization.CultureInfo.CurrentCulture = System.Globalization.CultureInfo.GetCultureInfo("de-DE");

            Assert.Equal(7.32, OrderFile.Read("csv", OrderSheet.Csv(Order))[2].ToBuy);
            Assert.Equal(7.32, OrderFile.Read("xlsx", OrderSheet.Xlsx(Order))[2].ToBuy);
        }
        finally
        {
            System.Globalization.CultureInfo.CurrentCulture = before;
        }
    }
}
