namespace ClubBench.Web.Hosting;

/// <summary>Headers of every answer. No page needs a script of its own, so the policy knows no exception for one.</summary>
internal static class SecurityHeaders
{
    /// <summary>Inline styles are needed by the component library; there is no import map, hence no script hash.</summary>
    public const string ContentPolicy =
        "default-src 'self'; script-src 'self'; style-src 'self' 'unsafe-inline'; img-src 'self' data:; object-src 'none'; " +
        "base-uri 'self'; form-action 'self'; frame-ancestors 'none'";

    public static void UseSecurityHeaders(this WebApplication app) => app.Use(async (context, next) =>
    {
        context.Response.OnStarting(() =>
        {
            var headers = context.Response.Headers;
            headers.ContentSecurityPolicy = ContentPolicy;
            headers.XContentTypeOptions = "nosniff";
            headers.XFrameOptions = "DENY";
            headers["Referrer-Policy"] = "no-referrer";
            return Task.CompletedTask;
        });
        await next(context);
    });
}
