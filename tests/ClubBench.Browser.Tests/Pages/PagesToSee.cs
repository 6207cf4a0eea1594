using System.Net.Http.Headers;
using System.Text.Json;
using ClubBench.Browser.Tests.Site;

namespace ClubBench.Browser.Tests.Pages;

/// <summary>Every page of the demo, found through the programming interface.</summary>
internal static class PagesToSee
{
    /// <summary>Name, role that sees it (null for a stranger) and address.</summary>
    public sealed record Sight(string Name, string? Role, string Address);

    public static async Task<IReadOnlyList<Sight>> AllAsync(DemoSite site)
    {
        using var client = new HttpClient { BaseAddress = site.Address };
        client.DefaultRequestHeaders.Authorization = new AuthenticationHeaderValue("Bearer", site.ApiToken);
        var kit = await FirstAsync(client, "kits");
        var plan = await FirstAsync(client, "plans");
        var night = await FirstAsync(client, "nights");
        var board = await FirstAsync(client, "boards");
        string Id(JsonElement row) => row.GetProperty("id").GetString()!;
        return
        [
            new("sign-in", null, "/sign-in"),
            new("kits", "coordinator", "/kits"),
            new("kit", "coordinator", $"/kits/{Id(kit)}"),
            new("bands", "coordinator", $"/kits/{Id(kit)}/bands"),
            new("plans", "coordinator", "/plans"),
            new("plan", "coordinator", $"/plans/{Id(plan)}"),
            new("cards", "coordinator", $"/plans/{Id(plan)}/cards"),
            new("parts-order", "coordinator", $"/plans/{Id(plan)}/parts-order"),
            new("group-builds", "coordinator", "/group-builds"),
            new("group-build", "coordinator", $"/group-builds/{night.GetProperty("groupBuildId").GetString()}"),
            new("nights", "coordinator", "/nights"),
            new("night", "coordinator", $"/nights/{Id(night)}"),
            new("room", "coordinator", "/room"),
            new("worksheets", "coordinator", "/worksheets"),
            new("club", "coordinator", "/club"),
            new("boards", "mentor", "/boards"),
            new("board", "mentor", $"/boards/{board.GetProperty("tag").GetString()}"),
            new("bench", "builder", "/bench"),
        ];
    }

    private static async Task<JsonElement> FirstAsync(HttpClient client, string list)
    {
        var answer = JsonDocument.Parse(await client.GetStringAsync($"api/v1/{list}")).RootElement;
        return answer.GetProperty("items")[0];
    }
}
