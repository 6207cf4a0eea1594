using System.Net;
using System.Net.Http.Headers;
using ClubBench.Browser.Tests.Site;

namespace ClubBench.Browser.Tests.Jobs;

/// <summary>A fresh machine after the first command: what was printed works, and nothing leaves the machine.</summary>
[Collection(HallCollection.Name)]
public sealed class FirstMinutesTests(Hall hall)
{
    [Theory]
    [InlineData("coordinator", "/kits")]
    [InlineData("mentor", "/boards")]
    [InlineData("builder", "/bench/")]
    public async Task PrintedLink_Followed_LeadsToTheWorkOfTheRoleWithoutTheTokenInTheAddress(string role, string place)
    {
        await using var visitor = await hall.FollowLinkAsync(role);

        Assert.StartsWith(place, new Uri(visitor.Page.Url).AbsolutePath, StringComparison.Ordinal);
        Assert.DoesNotContain(hall.Site.LinkOf(role).Segments[^1], visitor.Page.Url, StringComparison.Ordinal);
        Assert.NotEqual(0, await visitor.Page.Locator("h1").CountAsync());
    }

    [Fact]
    public async Task PrintedToken_AskedForKits_Answers()
    {
        using var client = new HttpClient { BaseAddress = hall.Site.Address };
        client.DefaultRequestHeaders.Authorization = new AuthenticationHeaderValue("Bearer", hall.Site.ApiToken);

        var answer = await client.GetStringAsync("api/v1/kits");

        Assert.Contains("\"items\"", answer, StringComparison.Ordinal);
        Assert.Contains("Quern-30", answer, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Stranger_AskingForAPage_IsLedToTheDoor()
    {
        await using var visitor = await hall.EnterAsync(role: null);

        await visitor.GoAsync("/kits");

        Assert.Equal("/sign-in", new Uri(visitor.Page.Url).AbsolutePath);
    }

    [Fact]
    public async Task SetUpPage_WithAClub_DoesNotExist()
    {
        using var client = new HttpClient(new HttpClientHandler { AllowAutoRedirect = false }) { BaseAddress = hall.Site.Address };

        var answer = await client.GetAsync("setup?token=anything");

        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
    }
}
