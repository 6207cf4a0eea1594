using System.Net.Http.Headers;
using System.Text.Json.Nodes;
using ClubBench.Club.Demo;
using ClubBench.Web.Tests.SignIn;
using Microsoft.Extensions.DependencyInjection;

namespace ClubBench.Web.Tests.Api;

/// <summary>The invented club behind a running server, spoken to as a program does: by bearer token.</summary>
public sealed class DemoInterface : IAsyncLifetime
{
    private readonly NewClub _club = new();

    public IServiceProvider Services => _club.Services;

    public HttpClient Program { get; private set; } = null!;

    /// <summary>Somebody without a token.</summary>
    public HttpClient Stranger { get; private set; } = null!;

    public async ValueTask InitializeAsync()
    {
        var entrances = await _club.Services.GetRequiredService<DemoClub>().OpenAsync(TestContext.Current.CancellationToken);
        (Program, Stranger) = (_club.Browser(), _club.Browser());
        Program.DefaultRequestHeaders.Authorization = new AuthenticationHeaderValue("Bearer", entrances.ApiToken);
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
