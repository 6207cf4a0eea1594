using System.Globalization;
using Bunit;
using ClubBench.Planning.Orders;
using ClubBench.Web.Components.Pages.Orders;
using ClubBench.Web.Tests.Api;

namespace ClubBench.Web.Tests.Components.Pages.Orders;

[Collection(ClubPageCollection.Name)]
public sealed class OrderPageTests(DemoInterface demo) : ClubPageContext(demo)
{
    [Theory]
    [InlineData("csv")]
    [InlineData("xlsx")]
    public async Task Page_OfAnOrder_ShowsWhatItsFileHolds(string format)
    {
        var page = await OpenAsync("20 m");
        var address = page.FindAll("a[download]").Select(a => a.GetAttribute("href")!).Single(a => a.EndsWith(format, StringComparison.Ordinal));

        var file = OrderFile.Read(format, await Demo.Program.GetByteArrayAsync(address, Xunit.TestContext.Current.CancellationToken));

        Assert.True(file.Count > 30, $"{file.Count} lines");
        Assert.Equal(file, Shown(page));
    }

    [Fact]
    public async Task Page_OfTheDemonstration_HasSparesRatingsAndWhatToBuy()
    {
        var rows = Shown(await OpenAsync("20 m"));

        Assert.All(rows, r => Assert.True(r.Spare > 0 && r.Needed > 0));
        Assert.All(rows, r => Assert.Equal(r.Needed + r.Spare, r.InStock + r.ToBuy, 0.011));
        Assert.Contains(rows, r => r is { Part: "Capacitor", Type: "NP0", Rating: "100\u00A0V" });
        Assert.Contains(rows, r => r is { Part: "Capacitor", Type: "NP0", Rating: "" });
        Assert.Contains(rows, r => r is { Type: "Zener 0.5 W", Value: "6.2\u00A0V", Rating: "" });
        Assert.Contains(rows, r => r.InStock > 0);
        Assert.Contains(rows, r => r.ToBuy > 0);
    }

    [Fact]
    public void Page_OfNoPlan_SaysSoInWords()
    {
        var page = Render<OrderPage>(p => p.Add(o => o.Id, Guid.NewGuid()));

        Assert.Empty(page.FindAll("table"));
        Assert.NotEmpty(page.Find(".error-list li").TextContent.Trim());
    }

    private async Task<IRenderedComponent<OrderPage>> OpenAsync(string band)
    {
        var id = Guid.Parse(await Demo.PlanIdAsync(band));
        var page = Render<OrderPage>(p => p.Add(o => o.Id, id));
        page.WaitForElement("table");
        return page;
    }

    private static List<OrderRow> Shown(IRenderedComponent<OrderPage> page) =>
        [.. page.FindAll("tbody tr").Select(r => r.Children.Select(c => c.TextContent.Trim()).ToList())
            .Select(c => new OrderRow(c[0], c[1], c[2], c[3], Number(c[4]), Number(c[5]), Number(c[6]), Number(c[7])))];

    private static double Number(string text) => double.Parse(text, CultureInfo.CurrentCulture);
}
