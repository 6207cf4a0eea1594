using System.Net;

namespace ClubBench.Web.Tests.SignIn;

public sealed class DoorTests
{
    private static readonly (string, string)[] Founding = [("club", "Marrowby"), ("name", "Ingrid"), ("password", "a long sentence for the club"), ("zone", "Europe/London")];

    [Fact]
    public async Task SetUp_WithTheTokenOfTheFirstStart_FoundsTheClubAndThenDoesNotExist()
    {
        await using var club = new NewClub();
        using var browser = club.Browser();
        var token = await club.SetUpTokenAsync();

        var moved = await browser.GetAsync($"/setup?token={token}");
        var founded = await browser.PostFormAsync("/setup", "/setup", Founding);
        var afterwards = await browser.GetAsync($"/setup?token={token}");

        Assert.Equal("/setup", moved.Headers.Location?.OriginalString.Replace("http://localhost", "", StringComparison.Ordinal));
        Assert.Equal("/kits", founded.Headers.Location?.OriginalString);
        Assert.Equal(HttpStatusCode.NotFound, afterwards.StatusCode);
    }

    [Fact]
    public async Task SetUp_WithAnotherToken_FoundsNothing()
    {
        await using var club = new NewClub();
        using var browser = club.Browser();
        await club.SetUpTokenAsync();

        await browser.GetAsync("/setup?token=guessed");
        var answer = await browser.PostFormAsync("/setup", "/setup", Founding);

        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
    }

    [Fact]
    public async Task Cookie_OfASignIn_IsOutOfReachForScriptsAndForeignSites()
    {
        await using var club = new NewClub();
        using var browser = club.Browser();
        await browser.GetAsync($"/setup?token={await club.SetUpTokenAsync()}");

        var founded = await browser.PostFormAsync("/setup", "/setup", Founding);

        var cookie = Assert.Single(founded.Headers.GetValues("Set-Cookie"), c => c.StartsWith("clubbench=", StringComparison.Ordinal));
        Assert.Contains("httponly", cookie, StringComparison.OrdinalIgnoreCase);
        Assert.Contains("samesite=lax", cookie, StringComparison.OrdinalIgnoreCase);
    }

    [Fact]
    public async Task Form_WithoutAntiforgeryToken_IsRefused()
    {
        await using var club = new NewClub();
        using var browser = club.Browser();

        var answer = await browser.PostAsync("/join", new FormUrlEncodedContent([KeyValuePair.Create("code", "ABC234"), KeyValuePair.Create("name", "Priya")]));

        Assert.Equal(HttpStatusCode.BadRequest, answer.StatusCode);
    }

    [Fact]
    public async Task Guessing_FollowedLinksInABurst_IsToldToWait()
    {
        await using var club = new NewClub();
        using var browser = club.Browser();
        var answers = new List<HttpResponseMessage>();

        for (var i = 0; i < 60; i++) answers.Add(await browser.GetAsync($"/sign-in/guess{i}"));

        var refused = answers.First(a => a.StatusCode == HttpStatusCode.TooManyRequests);
        Assert.True(refused.Headers.RetryAfter?.Delta > TimeSpan.Zero);
        Assert.Equal(HttpStatusCode.Found, answers[0].StatusCode);
    }

    [Fact]
    public async Task Page_AskedForByAStranger_LeadsToTheDoorAndTheInterfaceSaysNo()
    {
        await using var club = new NewClub();
        using var browser = club.Browser();
        using var page = new HttpRequestMessage(HttpMethod.Get, "/kits");
        page.Headers.Accept.ParseAdd("text/html");

        var shown = await browser.SendAsync(page);
        var called = await browser.GetAsync("/api/v1/kits");

        Assert.Equal("/sign-in", new Uri(new Uri("http://localhost"), shown.Headers.Location!).AbsolutePath);
        Assert.Equal(HttpStatusCode.Unauthorized, called.StatusCode);
    }

    [Theory]
    [InlineData("/health/live")]
    [InlineData("/health/ready")]
    public async Task Health_AskedByAnybody_Answers(string address)
    {
        await using var club = new NewClub();
        using var browser = club.Browser();

        Assert.Equal(HttpStatusCode.OK, (await browser.GetAsync(address)).StatusCode);
    }
}
