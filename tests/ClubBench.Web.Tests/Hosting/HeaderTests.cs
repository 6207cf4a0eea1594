using System.Text.RegularExpressions;
using Microsoft.AspNetCore.Mvc.Testing;

namespace ClubBench.Web.Tests.Hosting;

public sealed class HeaderTests(WebApplicationFactory<Program> factory) : IClassFixture<WebApplicationFactory<Program>>
{
    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory]
    [InlineData("/not-found")]
    [InlineData("/css/tokens.css")]
    [InlineData("/no/such/page")]
    public async Task Get_AnyAddress_CarriesTheContentPolicy(string address)
    {
        using var client = factory.CreateClient();

        using var answer = await client.GetAsync(address, Cancellation);

        var policy = Assert.Single(answer.Headers.GetValues("Content-Security-Policy"));
        Assert.Contains("script-src 'self';", policy, StringComparison.Ordinal);
        Assert.Contains("frame-ancestors 'none'", policy, StringComparison.Ordinal);
        Assert.DoesNotContain("unsafe-eval", policy, StringComparison.Ordinal);
        Assert.Equal(["nosniff"], answer.Headers.GetValues("X-Content-Type-Options"));
        Assert.Equal(["no-referrer"], answer.Headers.GetValues("Referrer-Policy"));
        Assert.False(answer.Headers.Contains("Server"));
    }

    [Fact]
    public async Task Get_Page_LinksNoOtherHostAndHasNoInlineScript()
    {
        using var client = factory.CreateClient();

        var page = await client.GetStringAsync("/not-found", Cancellation);

        Assert.DoesNotMatch(new Regex("(?:src|href|action)=[\"'](?:https?:)?//", RegexOptions.None, TimeSpan.FromSeconds(1)), page);
        Assert.All(Regex.Matches(page, "<script[^>]*>", RegexOptions.None, TimeSpan.FromSeconds(1)), m => Assert.Contains(" src=", m.Value, StringComparison.Ordinal));
    }

    [Fact]
    public async Task Get_LinkedAssets_AreAllServed()
    {
        using var client = factory.CreateClient();
        var page = await client.GetStringAsync("/not-found", Cancellation);
        var assets = Regex.Matches(page, "(href|src)=\"(?<file>[^\"#]+\\.(css|js|svg))\"", RegexOptions.ExplicitCapture, TimeSpan.FromSeconds(1)).Select(m => m.Groups["file"].Value).ToList();

        Assert.True(assets.Count >= 7);
        foreach (var asset in assets)
        {
            using var answer = await client.GetAsync("/" + asset, Cancellation);
            Assert.True(answer.IsSuccessStatusCode, asset);
        }
    }

    [Fact]
    public async Task Get_WithDarkCookie_DrawsTheDarkSheetAtOnce()
    {
        using var client = factory.CreateClient();
        client.DefaultRequestHeaders.Add("Cookie", "sheet=dark");

        Assert.Contains("<html lang=\"en\" data-sheet=\"dark\"", await client.GetStringAsync("/not-found", Cancellation), StringComparison.Ordinal);
    }
}
