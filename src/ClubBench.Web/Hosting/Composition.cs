namespace ClubBench.Web.Hosting;

/// <summary>What the application is made of: one line per feature, each in a file of its own.</summary>
public static class Composition
{
    public static WebApplicationBuilder AddClubBench(this WebApplicationBuilder builder)
    {
        builder.AddServer();
        builder.AddPages();
        return builder;
    }

    public static WebApplication MapClubBench(this WebApplication app)
    {
        app.UseSecurityHeaders();
        app.UseProblemPages();
        app.UseAntiforgery();
        app.MapStaticAssets();
        app.MapPages();
        return app;
    }
}
