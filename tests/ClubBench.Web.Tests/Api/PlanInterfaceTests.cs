using System.Net;
using System.Text;
using System.Text.Json.Nodes;

namespace ClubBench.Web.Tests.Api;

public sealed class PlanInterfaceTests(DemoInterface api) : IClassFixture<DemoInterface>
{
    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Fact]
    public async Task Plan_MadeByAProgram_IsStoredAndCanBeOpened()
    {
        var kit = (await api.ItemsAsync("kits"))[0]["id"]!.GetValue<string>();

        using var answer = await api.PostAsync("plans", $$"""{ "kitId": "{{kit}}", "band": "40 m", "name": "Test move", "outputPowerW": 1.0 }""");

        Assert.Equal(HttpStatusCode.Created, answer.StatusCode);
        var made = await DemoInterface.JsonOf(answer);
        Assert.EndsWith($"/api/v1/plans/{made["id"]}", answer.Headers.Location?.OriginalString, StringComparison.Ordinal);
        var plan = await api.GetAsync($"plans/{made["id"]}");
        Assert.Equal(("Test move", "draft", 12), (plan["name"]!.GetValue<string>(), plan["state"]!.GetValue<string>(), plan["stages"]!.AsArray().Count));
    }

    [Theory]
    [InlineData("\"band\": \"9 m\"", "band")]
    [InlineData("\"band\": \"40 m\", \"outputPowerW\": -1", "outputPowerW")]
    public async Task Plan_WithAFault_NamesTheField(string fields, string path)
    {
        var kit = (await api.ItemsAsync("kits"))[0]["id"]!.GetValue<string>();

        using var answer = await api.PostAsync("plans", $$"""{ "kitId": "{{kit}}", {{fields}} }""");

        Assert.Equal(path, Assert.Single(await DemoInterface.ProblemsOf(answer, HttpStatusCode.BadRequest)).Path);
    }

    [Fact]
    public async Task Plan_OfABodyThatIsNoJson_IsRefusedAsProblemDetails()
    {
        using var answer = await api.PostAsync("plans", "{ band:");

        Assert.Equal((HttpStatusCode.BadRequest, "application/problem+json"), (answer.StatusCode, answer.Content.Headers.ContentType?.MediaType));
    }

    [Fact]
    public async Task Plan_OfAKitNobodyKnows_IsNotFound()
    {
        using var answer = await api.PostAsync("plans", $$"""{ "kitId": "{{Guid.NewGuid()}}", "band": "40 m" }""");

        Assert.Equal("kitId", Assert.Single(await DemoInterface.ProblemsOf(answer, HttpStatusCode.NotFound)).Path);
    }

    [Theory]
    [InlineData("")]
    [InlineData("/cards.pdf")]
    [InlineData("/parts-order.csv")]
    [InlineData("/parts-order.xlsx")]
    public async Task Plan_NobodyKnows_IsNotFoundByPath(string leaf)
    {
        using var answer = await api.Program.GetAsync($"/api/v1/plans/{Guid.NewGuid()}{leaf}", Cancellation);

        Assert.Equal("planId", Assert.Single(await DemoInterface.ProblemsOf(answer, HttpStatusCode.NotFound)).Path);
    }

    [Fact]
    public async Task Cards_AsPdf_ArePrintedForOneStageOrAll()
    {
        var plan = await api.PlanIdAsync("20 m");

        var all = await api.Program.GetByteArrayAsync($"/api/v1/plans/{plan}/cards.pdf", Cancellation);
        var one = await api.Program.GetByteArrayAsync($"/api/v1/plans/{plan}/cards.pdf?stage=A5", Cancellation);
        using var none = await api.Program.GetAsync($"/api/v1/plans/{plan}/cards.pdf?stage=A99", Cancellation);

        Assert.Equal("%PDF-", Encoding.ASCII.GetString(one, 0, 5));
        Assert.True(all.Length > one.Length);
        Assert.Equal("stage", Assert.Single(await DemoInterface.ProblemsOf(none, HttpStatusCode.NotFound)).Path);
    }

    [Fact]
    public async Task PartsOrder_AsCsv_GrowsWithTheBoards()
    {
        var plan = await api.PlanIdAsync("20 m");

        var one = await api.Program.GetStringAsync($"/api/v1/plans/{plan}/parts-order.csv?boards=1", Cancellation);
        var ten = await api.Program.GetStringAsync($"/api/v1/plans/{plan}/parts-order.csv?boards=10", Cancellation);

        Assert.StartsWith("part,type,value,rated_voltage,needed,spare,in_stock,to_buy\r\n", one.TrimStart('\uFEFF'), StringComparison.Ordinal);
        Assert.Equal(one.Split("\r\n").Length, ten.Split("\r\n").Length);
        Assert.NotEqual(one, ten);
    }

    [Fact]
    public async Task PartsOrder_ExampleOfTheDescription_HasTheColumnsOfTheFile()
    {
        var file = await api.Program.GetStringAsync($"/api/v1/plans/{await api.PlanIdAsync("20 m")}/parts-order.csv", Cancellation);

        var description = JsonNode.Parse(await api.Program.GetStringAsync("/openapi/v1.json", Cancellation))!;

        var answer = description["paths"]!["/api/v1/plans/{id}/parts-order.csv"]!["get"]!["responses"]!["200"]!["content"]!["text/csv"]!;
        var example = answer["example"]!.GetValue<string>();
        Assert.Equal(file.TrimStart('\uFEFF').Split("\r\n")[0], example.Split("\r\n")[0]);
        Assert.Equal(example.Split("\r\n")[0].Split(',').Length, example.Split("\r\n")[1].Split(',').Length);
    }

    [Fact]
    public async Task PartsOrder_AsSpreadsheet_IsAZippedWorkbook()
    {
        using var answer = await api.Program.GetAsync($"/api/v1/plans/{await api.PlanIdAsync("20 m")}/parts-order.xlsx", Cancellation);

        Assert.Equal("application/vnd.openxmlformats-officedocument.spreadsheetml.sheet", answer.Content.Headers.ContentType?.MediaType);
        Assert.Equal("PK", Encoding.ASCII.GetString(await answer.Content.ReadAsByteArrayAsync(Cancellation), 0, 2));
    }

    [Fact]
    public async Task PartsOrder_OfAGroupBuild_HoldsThePartsOfBothPlans()
    {
        var build = (await api.ItemsAsync("nights"))[0]["groupBuildId"]!.GetValue<string>();

        var both = await api.Program.GetStringAsync($"/api/v1/group-builds/{build}/parts-order.csv", Cancellation);
        using var none = await api.Program.GetAsync($"/api/v1/group-builds/{Guid.NewGuid()}/parts-order.csv", Cancellation);

        Assert.Contains("\"14.060\u00A0MHz\"", both, StringComparison.Ordinal);
        Assert.Contains("\"7.030\u00A0MHz\"", both, StringComparison.Ordinal);
        Assert.Equal("groupBuildId", Assert.Single(await DemoInterface.ProblemsOf(none, HttpStatusCode.NotFound)).Path);
    }

    [Fact]
    public async Task PartsOrder_ForNoBoards_NamesTheField()
    {
        using var answer = await api.Program.GetAsync($"/api/v1/plans/{await api.PlanIdAsync("20 m")}/parts-order.csv?boards=0", Cancellation);

        Assert.Equal("boards", Assert.Single(await DemoInterface.ProblemsOf(answer, HttpStatusCode.BadRequest)).Path);
    }
}
