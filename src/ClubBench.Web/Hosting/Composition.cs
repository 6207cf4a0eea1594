using ClubBench.Web.Api;
using ClubBench.Web.Bench;
using ClubBench.Web.Commands;
using ClubBench.Web.SignIn;

namespace ClubBench.Web.Hosting;

/// <summary>What the application is made of: one line per feature, each in a file of its own.</summary>
public static class Composition
{
    public static WebApplicationBuilder AddClubBench(this WebApplicationBuilder builder)
    {
        builder.AddServer();
        builder.AddData();
        builder.AddSignIn();
        builder.AddBench();
        builder.AddApi();
        builder.AddPages();
        return builder;
    }

    public static WebApplication MapClubBench(this WebApplication app)
    {
        app.UseSecurityHeaders();
        app.UseProblemPages();
        app.UseApiProblems();
        app.UseRouting();
        app.UseRateLimiter();
        app.UseAuthentication();
        app.UseAuthorization();
        app.UseAntiforgery();
        app.MapStaticAssets().AllowAnonymous();
        app.MapHealth();
        app.MapSignIn();
        app.MapBench();
        app.MapApi();
        app.MapPages();
        return app;
    }
}
