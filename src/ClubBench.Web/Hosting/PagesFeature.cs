using ClubBench.Web.Components;
using ClubBench.Web.State;
using Microsoft.AspNetCore.Authorization;
using MudBlazor.Services;

namespace ClubBench.Web.Hosting;

/// <summary>The pages: Blazor circuits for planning, static islands where a page says so.</summary>
internal static class PagesFeature
{
    public static void AddPages(this WebApplicationBuilder builder)
    {
        var services = builder.Services;
        services.AddLocalization();
        services.AddMudServices();
        services.AddCascadingAuthenticationState();
        services.AddScoped<OpenPlace>();
        services.AddScoped<ClubTimes>();
        services.AddRazorComponents().AddInteractiveServerComponents(options => options.DetailedErrors = builder.Environment.IsDevelopment());
    }

    public static void MapPages(this WebApplication app) =>
        app.MapRazorComponents<App>().AddInteractiveServerRenderMode(options => options.ContentSecurityFrameAncestorsPolicy = null).Add(OpenCircuits);

    /// <summary>The page of a missing address is interactive too; a circuit starts only from what the server drew, and use cases ask every right.</summary>
    private static void OpenCircuits(EndpointBuilder endpoint)
    {
        if (endpoint is RouteEndpointBuilder { RoutePattern.RawText: { } path } && path.TrimStart('/').StartsWith("_blazor", StringComparison.Ordinal)) endpoint.Metadata.Add(new AllowAnonymousAttribute());
    }
}
