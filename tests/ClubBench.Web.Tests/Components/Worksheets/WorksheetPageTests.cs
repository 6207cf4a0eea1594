using Bunit;
using ClubBench.Planning.Worksheets;
using ClubBench.Web.Components.Pages.Worksheets;
using Microsoft.AspNetCore.Components;
using Microsoft.Extensions.DependencyInjection;

namespace ClubBench.Web.Tests.Components.Worksheets;

public class WorksheetPageTests : PageContext
{
    public static TheoryData<string> Ids => [.. WorksheetList.All.Select(w => w.Id)];

    private NavigationManager Navigation => Services.GetRequiredService<NavigationManager>();

    [Theory]
    [MemberData(nameof(Ids))]
    public void Opened_EveryWorksheet_ShowsItsResultAtOnce(string id)
    {
        var page = Render<WorksheetPage>(p => p.Add(x => x.Method, id));

        Assert.NotEmpty(page.FindAll(".answer td"));
        Assert.Empty(page.FindAll(".error-text"));
    }

    [Fact]
    public void Typed_Value_ChangesTheResultWithoutAsking()
    {
        var page = Render<WorksheetPage>(p => p.Add(x => x.Method, "power-from-voltage"));

        page.Find("#peak-to-peak").Input("40");

        Assert.Contains("4\u00A0W", page.Find(".answer").TextContent.Replace(".00", "", StringComparison.Ordinal), StringComparison.Ordinal);
    }

    [Fact]
    public void Typed_UnfinishedNumber_IsNotScoldedUntilAsked()
    {
        var page = Render<WorksheetPage>(p => p.Add(x => x.Method, "power-from-voltage"));

        page.Find("#peak-to-peak").Input("abc");
        var scoldedWhileTyping = page.FindAll(".error-text").Count;
        page.Find("form").Submit();

        Assert.Equal(0, scoldedWhileTyping);
        Assert.NotEmpty(page.FindAll(".error-text"));
        Assert.Empty(page.FindAll(".answer td"));
    }

    [Fact]
    public void Typed_ValueOutOfReach_IsNamedAtItsFieldAndAnotherIsSilent()
    {
        var page = Render<WorksheetPage>(p => p.Add(x => x.Method, "power-from-voltage"));

        page.Find("#load").Input("-5");

        Assert.NotEmpty(page.FindAll("#load-note .error-text"));
        Assert.Empty(page.FindAll("#peak-to-peak-note .error-text"));
    }

    [Fact]
    public void Address_KeptValues_OpenAgain()
    {
        var first = Render<WorksheetPage>(p => p.Add(x => x.Method, "power-from-voltage"));
        first.Find("#peak-to-peak").Input("28,28");
        first.Find("form").Submit();

        var second = Render<WorksheetPage>(p => p.Add(x => x.Method, "power-from-voltage"));

        Assert.Contains("peak-to-peak=28", Navigation.Uri, StringComparison.Ordinal);
        Assert.Equal("28,28", second.Find("#peak-to-peak").GetAttribute("value"));
        Assert.Equal(first.Find(".answer").TextContent, second.Find(".answer").TextContent);
    }
}
