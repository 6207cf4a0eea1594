using ClubBench.Club.Demo;
using ClubBench.Web.SignIn;

namespace ClubBench.Web.Commands;

/// <summary>Fills the demo and prints how to come in.</summary>
internal static class DemoSeed
{
    public static async Task SeedDemoAsync(this WebApplication app)
    {
        if (!DemoFeature.IsDemo(app.Configuration)) return;
        var entrances = await app.Services.GetRequiredService<DemoClub>().OpenAsync();
        app.Lifetime.ApplicationStarted.Register(() => Print(entrances, Addresses.Of(app.Services)));
    }

    private static void Print(DemoEntrances entrances, string address)
    {
        Console.WriteLine("Demo of ClubBench, on this machine only. Come in as:");
        Console.WriteLine($"Coordinator: {address}/sign-in/{entrances.CoordinatorToken}");
        Console.WriteLine($"Mentor: {address}/sign-in/{entrances.MentorToken}");
        Console.WriteLine($"Builder: {address}/sign-in/{entrances.BuilderToken}");
        Console.WriteLine($"API token: {entrances.ApiToken}");
    }
}
