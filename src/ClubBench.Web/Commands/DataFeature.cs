using ClubBench.Club;
using ClubBench.Club.Persistence;

namespace ClubBench.Web.Commands;

/// <summary>The club's storage: an SQLite file in the data folder, or in a folder of its own for the demo.</summary>
public static class DataFeature
{
    private const string DatabaseFile = "clubbench.db";

    public static void AddData(this WebApplicationBuilder builder)
    {
        var settings = builder.Configuration.GetSection(ClubSettings.Section).Get<ClubSettings>() ?? new ClubSettings();
        builder.Services.AddOptions<ClubSettings>().BindConfiguration(ClubSettings.Section).ValidateDataAnnotations().ValidateOnStart();
        var folder = builder.IsDemo() ? builder.UseDemo() : Path.Combine(builder.Environment.ContentRootPath, settings.DataFolder);
        builder.Services.AddClub(Path.Combine(Writable(folder), DatabaseFile));
        builder.Services.AddScoped(p => p.GetRequiredService<ClubContexts>().Open(Guid.Empty));
        builder.Services.AddHealthChecks().AddCheck<DatabaseCheck>("database");
    }

    /// <summary>Brings the database up to date before anything is served; the demo is filled here as well.</summary>
    public static async Task PrepareDataAsync(this WebApplication app)
    {
        await app.Services.GetRequiredService<IClubDatabase>().PrepareAsync();
        await app.SeedDemoAsync();
    }

    private static string Writable(string folder)
    {
        try
        {
            return Directory.CreateDirectory(folder).FullName;
        }
        catch (Exception problem) when (problem is IOException or UnauthorizedAccessException)
        {
            throw new InvalidOperationException($"Setting ClubBench:DataFolder names {folder}, which cannot be written to: {problem.Message}", problem);
        }
    }
}
