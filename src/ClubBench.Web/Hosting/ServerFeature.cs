namespace ClubBench.Web.Hosting;

/// <summary>The web server itself: what it says of itself, and what a person sees when something breaks outside a page.</summary>
internal static class ServerFeature
{
    public static void AddServer(this WebApplicationBuilder builder)
    {
        builder.WebHost.ConfigureKestrel(options => options.AddServerHeader = false);
        builder.Services.AddSingleton(TimeProvider.System);
        builder.Services.AddProblemDetails();
    }

    public static void UseProblemPages(this WebApplication app)
    {
        if (!app.Environment.IsDevelopment()) app.UseExceptionHandler("/problem", createScopeForErrors: true);
        // Only what a person asked to see is answered by a page: a refused form would run the page as that form again.
        app.UseWhen(http => HttpMethods.IsGet(http.Request.Method), pages => pages.UseStatusCodePagesWithReExecute("/not-found", createScopeForStatusCodePages: true));
    }
}
