using System.Net;
using System.Net.Http.Headers;
using System.Text.Json;
using ClubBench.Browser.Tests.Site;

namespace ClubBench.Browser.Tests.Pages;

/// <summary>Every page of the demo, found through the programming interface.</summary>
internal static class PagesToSee
{
    /// <summary>Name, role that sees it (null for a stranger), address and the status it answers with.</summary>
    public sealed record Sight(string Name, string? Role, string Address, HttpStatusCode Status = HttpStatusCode.OK);

    public static async Task<IReadOnlyList<Sight>> AllAsync(DemoSite site)
    {
        using var client = new HttpClient { BaseAddress = site.Address };
        client.DefaultRequestHeaders.Authorization = new AuthenticationHeaderValue("Bearer", site.ApiToken);
        var night = await FirstAsync(client, "nights");
        var board = await FirstAsync(client, "boards");
        return
        [
            .. AtTheDoor,
            .. OfAKit(Id(await FirstAsync(client, "kits"))),
            .. OfAPlan(await FirstAsync(client, "plans")),
            .. OfANight(Id(night), night.GetProperty("groupBuildId").GetString()!),
            new("worksheets", "coordinator", "/worksheets"),
            new("worksheet", "coordinator", $"/worksheets/{(await FirstAsync(client, "worksheets")).GetProperty("method").GetString()}"),
            new("club", "coordinator", "/club"),
            new("boards", "mentor", "/boards"),
            new("board", "mentor", $"/boards/{board.GetProperty("tag").GetString()}"),
            new("bench", "builder", "/bench#all"),
        ];
    }

    private static IReadOnlyList<Sight> AtTheDoor { get; } =
    [
        new("sign-in", null, "/sign-in"),
        new("join", null, "/join"),
        new("set-up-closed", null, "/setup?token=anything", HttpStatusCode.NotFound),
        new("not-found", "coordinator", "/no-such-page", HttpStatusCode.NotFound),
    ];

    private static IReadOnlyList<Sight> OfAKit(string id) =>
    [
        new("kits", "coordinator", "/kits"),
        new("kit", "coordinator", $"/kits/{id}"),
        new("kit-import", "coordinator", "/kits/import"),
        new("stage-editor", "coordinator", $"/kits/{id}/stages/A5"),
        new("bands", "coordinator", $"/kits/{id}/bands"),
        new("plan-new", "coordinator", $"/plans/new?kit={id}&band=20%20m"),
    ];

    private static IReadOnlyList<Sight> OfAPlan(JsonElement plan) =>
    [
        new("plans", "coordinator", "/plans"),
        new("plan", "coordinator", $"/plans/{Id(plan)}"),
        new("plan-a5", "coordinator", $"/plans/{Id(plan)}?stage=A5"),
        new("target", "coordinator", $"/plans/{Id(plan)}/target"),
        new("cards-of-plans", "coordinator", "/cards"),
        new("cards", "coordinator", $"/plans/{Id(plan)}/cards"),
        new("parts-orders", "coordinator", "/parts-orders"),
        new("parts-order", "coordinator", $"/plans/{Id(plan)}/parts-order"),
    ];

    private static IReadOnlyList<Sight> OfANight(string id, string groupBuild) =>
    [
        new("group-builds", "coordinator", "/group-builds"),
        new("group-build", "coordinator", $"/group-builds/{groupBuild}"),
        new("build-order", "coordinator", $"/group-builds/{groupBuild}/parts-order"),
        new("nights", "coordinator", "/nights"),
        new("night", "coordinator", $"/nights/{id}"),
        new("room", "coordinator", "/room"),
    ];

    private static string Id(JsonElement row) => row.GetProperty("id").GetString()!;

    private static async Task<JsonElement> FirstAsync(HttpClient client, string list)
    {
        var answer = JsonDocument.Parse(await client.GetStringAsync($"api/v1/{list}")).RootElement;
        return answer.GetProperty("items")[0];
    }
}
