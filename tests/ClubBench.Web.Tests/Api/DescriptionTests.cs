using System.Text.Json;
using ClubBench.Web.Tests.SignIn;

namespace ClubBench.Web.Tests.Api;

public sealed class DescriptionTests
{
    [Fact]
    public async Task Description_OfTheInterface_NamesEveryOperationWithSummaryAndExample()
    {
        await using var club = new NewClub();
        using var browser = club.Browser();
        await browser.GetAsync($"/setup?token={await club.SetUpTokenAsync()}");
        await browser.PostFormAsync("/setup", "/setup", ("club", "Marrowby"), ("name", "Ingrid"), ("password", "a long sentence for the club"), ("zone", "Europe/London"));

        var document = JsonDocument.Parse(await browser.GetStringAsync("/openapi/v1.json")).RootElement;

        Assert.StartsWith("3.1", document.GetProperty("openapi").GetString(), StringComparison.Ordinal);
        foreach (var path in document.GetProperty("paths").EnumerateObject())
            foreach (var operation in path.Value.EnumerateObject().Where(o => o.Name is "get" or "post"))
            {
                var text = operation.Value.GetRawText();
                Assert.True(operation.Value.TryGetProperty("summary", out _), $"{operation.Name} {path.Name} has no summary");
                Assert.True(text.Contains("\"example\"", StringComparison.Ordinal) || path.Name.EndsWith(".pdf", StringComparison.Ordinal) || path.Name.EndsWith(".csv", StringComparison.Ordinal) || path.Name.EndsWith(".xlsx", StringComparison.Ordinal), $"{operation.Name} {path.Name} has no example");
            }
    }
}
