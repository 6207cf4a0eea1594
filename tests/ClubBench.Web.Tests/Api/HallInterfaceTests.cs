using System.Net;

namespace ClubBench.Web.Tests.Api;

/// <summary>Boards, nights, worksheets, and who may ask at all.</summary>
public sealed class HallInterfaceTests(DemoInterface api) : IClassFixture<DemoInterface>
{
    [Fact]
    public async Task Boards_List_NamesTheTwelveOfTheDemonstration() => Assert.Equal(12, (await api.ItemsAsync("boards")).Count);

    [Fact]
    public async Task Reading_Stored_ComesBackWithAdvice_AndSentAgainIsHarmless()
    {
        var board = (await api.ItemsAsync("boards"))[0]["id"]!.GetValue<string>();
        var reading = $$"""{ "items": [ { "id": "{{Guid.NewGuid()}}", "point": "A5.L4.L", "typed": "0,734 uH" } ] }""";

        using var first = await api.PostAsync($"boards/{board}/readings", reading);
        using var again = await api.PostAsync($"boards/{board}/readings", reading);

        var (stored, resent) = ((await DemoInterface.JsonOf(first))["items"]![0]!, (await DemoInterface.JsonOf(again))["items"]![0]!);
        Assert.True(stored["saved"]!.GetValue<bool>());
        Assert.NotNull(stored["verdict"]);
        Assert.Equal((true, stored["ordinal"]!.GetValue<long>()), (resent["isResend"]!.GetValue<bool>(), resent["ordinal"]!.GetValue<long>()));
    }

    [Fact]
    public async Task Reading_WithTwoDecimalMarks_IsRefusedByPathBesideASoundOne()
    {
        var board = (await api.ItemsAsync("boards"))[0]["id"]!.GetValue<string>();

        using var answer = await api.PostAsync($"boards/{board}/readings", $$"""
            { "items": [ { "id": "{{Guid.NewGuid()}}", "point": "A5.L4.L", "typed": "0,7.34 uH" }, { "id": "{{Guid.NewGuid()}}", "point": "A5.L4.L", "typed": "0.7 uH" } ] }
            """);

        var items = (await DemoInterface.JsonOf(answer))["items"]!;
        Assert.StartsWith("items[0].", items[0]!["errors"]![0]!["path"]!.GetValue<string>(), StringComparison.Ordinal);
        Assert.True(items[1]!["saved"]!.GetValue<bool>());
    }

    [Fact]
    public async Task Room_OfTheOpenNight_ShowsItsBoards()
    {
        var night = (await api.ItemsAsync("nights")).First(n => n["state"]!.GetValue<string>() == "open")["id"]!.GetValue<string>();

        Assert.NotNull(await api.GetAsync($"nights/{night}/room"));
    }

    [Fact]
    public async Task Room_OfANightNobodyKnows_IsNotFound()
    {
        using var answer = await api.Program.GetAsync($"/api/v1/nights/{Guid.NewGuid()}/room", TestContext.Current.CancellationToken);

        Assert.Single(await DemoInterface.ProblemsOf(answer, HttpStatusCode.NotFound));
    }

    [Fact]
    public async Task Worksheets_Listed_RunOnTheirOwnDefaults()
    {
        foreach (var method in await api.ItemsAsync("worksheets"))
        {
            using var answer = await api.PostAsync($"worksheets/{method["method"]}", "{}");
            Assert.NotEmpty((await DemoInterface.JsonOf(answer))["figures"]!.AsArray());
        }
    }

    [Fact]
    public async Task Worksheet_WithANegativeValue_NamesTheProperty()
    {
        using var answer = await api.PostAsync("worksheets/resonance", """{ "inductanceH": -1 }""");

        Assert.Equal("inductanceH", Assert.Single(await DemoInterface.ProblemsOf(answer, HttpStatusCode.BadRequest)).Path);
    }

    [Theory]
    [InlineData("kits")]
    [InlineData("kits/5f0f4b1e-2f5c-4f8e-9d0a-6f7c3c1e0a30/back-check")]
    [InlineData("kits/5f0f4b1e-2f5c-4f8e-9d0a-6f7c3c1e0a30/bands")]
    [InlineData("plans")]
    [InlineData("plans/5f0f4b1e-2f5c-4f8e-9d0a-6f7c3c1e0a30")]
    [InlineData("plans/5f0f4b1e-2f5c-4f8e-9d0a-6f7c3c1e0a30/cards.pdf")]
    [InlineData("plans/5f0f4b1e-2f5c-4f8e-9d0a-6f7c3c1e0a30/parts-order.csv")]
    [InlineData("plans/5f0f4b1e-2f5c-4f8e-9d0a-6f7c3c1e0a30/parts-order.xlsx")]
    [InlineData("group-builds/5f0f4b1e-2f5c-4f8e-9d0a-6f7c3c1e0a30/parts-order.csv")]
    [InlineData("group-builds/5f0f4b1e-2f5c-4f8e-9d0a-6f7c3c1e0a30/parts-order.xlsx")]
    [InlineData("boards")]
    [InlineData("nights")]
    [InlineData("nights/5f0f4b1e-2f5c-4f8e-9d0a-6f7c3c1e0a30/room")]
    [InlineData("worksheets")]
    public async Task Get_WithoutToken_IsRefused(string path)
    {
        using var answer = await api.Stranger.GetAsync("/api/v1/" + path, TestContext.Current.CancellationToken);

        Assert.Equal((HttpStatusCode.Unauthorized, "application/problem+json"), (answer.StatusCode, answer.Content.Headers.ContentType?.MediaType));
    }

    [Fact]
    public async Task Get_WithATokenNobodyMade_IsRefused()
    {
        using var request = new HttpRequestMessage(HttpMethod.Get, "/api/v1/kits") { Headers = { Authorization = new("Bearer", "guessed") } };

        using var answer = await api.Stranger.SendAsync(request, TestContext.Current.CancellationToken);

        Assert.Equal((HttpStatusCode.Unauthorized, "application/problem+json"), (answer.StatusCode, answer.Content.Headers.ContentType?.MediaType));
    }

    [Theory]
    [InlineData("kits")]
    [InlineData("plans")]
    [InlineData("boards/5f0f4b1e-2f5c-4f8e-9d0a-6f7c3c1e0a30/readings")]
    [InlineData("worksheets/resonance")]
    public async Task Post_WithoutToken_IsRefused(string path)
    {
        using var answer = await api.Stranger.PostAsync("/api/v1/" + path, new StringContent("{}", System.Text.Encoding.UTF8, "application/json"), TestContext.Current.CancellationToken);

        Assert.Equal((HttpStatusCode.Unauthorized, "application/problem+json"), (answer.StatusCode, answer.Content.Headers.ContentType?.MediaType));
    }
}
