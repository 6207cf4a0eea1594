using System.Net.Http.Headers;
using System.Text.Json.Nodes;
using ClubBench.Club.Access;
using ClubBench.Club.Demo;
using ClubBench.Club.UseCases.SignIn;
using ClubBench.Planning.Kits;
using ClubBench.Web.Tests.SignIn;
using Microsoft.Extensions.DependencyInjection;

namespace ClubBench.Web.Tests.Api;

/// <summary>The invented club behind a running server, spoken to as a program does: by bearer token.</summary>
public sealed class DemoInterface : IAsyncLifetime
{
    private readonly NewClub _club = new();

    public IServiceProvider Services => _club.Services;

    public HttpClient Program { get; private set; } = null!;

    /// <summary>Whose token it is.</summary>
    public Actor Coordinator { get; private set; } = Actor.Visitor;

    /// <summary>Somebody without a token.</summary>
    public HttpClient Stranger { get; private set; } = null!;

    public async ValueTask InitializeAsync()
    {
        var entrances = await _club.Services.GetRequiredService<DemoClub>().OpenAsync(TestContext.Current.CancellationToken);
        (Program, Stranger) = (_club.Browser(), _club.Browser());
        Program.DefaultRequestHeaders.Authorization = new AuthenticationHeaderValue("Bearer", entrances.ApiToken);
        Coordinator = (await _club.Services.GetRequiredService<FindByToken>().Run(Actor.Visitor, new FindByTokenInput(entrances.ApiToken), TestContext.Current.CancellationToken)).Value;
    }

    public async ValueTask DisposeAsync()
    {
        Program.Dispose();
        Stranger.Dispose();
        await _club.DisposeAsync();
    }

    /// <summary>Asks for JSON; fails the test on anything but a success.</summary>
    public async Task<JsonNode> GetAsync(string path)
    {
        using var answer = await Program.GetAsync("/api/v1/" + path, TestContext.Current.CancellationToken);
        return await JsonOf(answer);
    }

    public async Task<IReadOnlyList<JsonNode>> ItemsAsync(string path) => [.. (await GetAsync(path))["items"]!.AsArray().OfType<JsonNode>()];

    public Task<HttpResponseMessage> PostAsync(string path, string json) =>
        Program.PostAsync("/api/v1/" + path, new StringContent(json, System.Text.Encoding.UTF8, "application/json"), TestContext.Current.CancellationToken);

    /// <summary>A plan of the demonstration's kit that nobody else uses; its limits are confirmed by nobody yet.</summary>
    public async Task<Guid> NewPlanAsync(string band)
    {
        var kit = (await ItemsAsync("kits")).First(k => k["name"]!.GetValue<string>() == DemoKits.QuernThirty.Name)["id"]!.GetValue<string>();
        using var made = await PostAsync("plans", $$"""{ "kitId": "{{kit}}", "band": "{{band}}" }""");
        return (await JsonOf(made))["id"]!.GetValue<Guid>();
    }

    /// <summary>A kit like the demonstration's that nobody else uses.</summary>
    public async Task<Kit> NewKitAsync()
    {
        var kit = DemoKits.QuernThirty with { Id = Guid.NewGuid(), Name = "Quern-30 for a test" };
        using var file = new MemoryStream();
        KitFile.Write(kit, file);
        using var made = await PostAsync("kits", System.Text.Encoding.UTF8.GetString(file.ToArray()));
        return kit with { Id = (await JsonOf(made))["id"]!.GetValue<Guid>() };
    }

    /// <summary>Id of the demonstration's plan to a band.</summary>
    public async Task<string> PlanIdAsync(string band) => (await ItemsAsync("plans")).First(p => p["band"]!.GetValue<string>() == band)["id"]!.GetValue<string>();

    public static async Task<JsonNode> JsonOf(HttpResponseMessage answer)
    {
        var text = await answer.Content.ReadAsStringAsync(TestContext.Current.CancellationToken);
        Assert.True(answer.IsSuccessStatusCode, $"{(int)answer.StatusCode} {text}");
        return JsonNode.Parse(text)!;
    }

    /// <summary>Problem details: status, media type and the paths with their messages.</summary>
    public static async Task<IReadOnlyList<(string Path, string Message)>> ProblemsOf(HttpResponseMessage answer, System.Net.HttpStatusCode status)
    {
        var text = await answer.Content.ReadAsStringAsync(TestContext.Current.CancellationToken);
        Assert.True(answer.StatusCode == status, $"{(int)answer.StatusCode} {text}");
        Assert.Equal("application/problem+json", answer.Content.Headers.ContentType?.MediaType);
        return [.. JsonNode.Parse(text)!["errors"]!.AsArray().Select(e => (e!["path"]!.GetValue<string>(), e["message"]!.GetValue<string>()))];
    }
}
