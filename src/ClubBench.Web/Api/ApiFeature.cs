using System.Net;
using ClubBench.Web.Commands;
using Microsoft.AspNetCore.Diagnostics;
using Microsoft.OpenApi;

namespace ClubBench.Web.Api;

/// <summary>The programming interface under /api/v1 and its description.</summary>
public static class ApiFeature
{
    private const string Document = "v1";
    private const string Root = "/api/v1";

    public static void AddApi(this WebApplicationBuilder builder)
    {
        builder.Services.Configure<RouteHandlerOptions>(options => options.ThrowOnBadRequest = false);
        builder.Services.AddOpenApi(Document, options =>
        {
            options.OpenApiVersion = OpenApiSpecVersion.OpenApi3_1;
            options.ShouldInclude = d => d.RelativePath?.StartsWith("api/", StringComparison.Ordinal) == true;
            options.AddOperationTransformer(ApiExamples.Fill);
            options.AddDocumentTransformer((document, _, _) =>
            {
                document.Info = new OpenApiInfo { Title = "ClubBench", Version = Document, Description = "Quantities are SI numbers with the unit in the property's name; lists are { \"items\": [...] }; refusals are problem details (RFC 9457) with field paths. Send a bearer token from the Club page." };
                return Task.CompletedTask;
            });
        });
    }

    /// <summary>Whatever goes wrong before a use case is asked, such as a body that is no JSON, is said as problem details and never as a page.</summary>
    public static void UseApiProblems(this WebApplication app) => app.Use(async (http, next) =>
    {
        if (!http.Request.Path.StartsWithSegments(Root, StringComparison.OrdinalIgnoreCase))
        {
            await next(http);
            return;
        }

        if (http.Features.Get<IStatusCodePagesFeature>() is { } pages) pages.Enabled = false;
        await next(http);
        if (!http.Response.HasStarted && http.Response.StatusCode >= StatusCodes.Status400BadRequest) await Results.Problem(statusCode: http.Response.StatusCode).ExecuteAsync(http);
    });

    public static void MapApi(this WebApplication app)
    {
        var api = app.MapGroup(Root).DisableAntiforgery().ProducesProblem(StatusCodes.Status400BadRequest).ProducesProblem(StatusCodes.Status401Unauthorized).ProducesProblem(StatusCodes.Status403Forbidden);
        api.MapKits();
        api.MapPlans();
        api.MapBoards();
        api.MapNights();
        api.MapWorksheets();
        var description = app.MapOpenApi();
        if (DemoFeature.IsDemo(app.Configuration)) description.AllowAnonymous();
        else description.RequireAuthorization(policy => policy.RequireAssertion(c => c.User.Identity?.IsAuthenticated == true || IsOnThisMachine(c.Resource as HttpContext)));
    }

    /// <summary>The description is open to this machine, to others only after signing in.</summary>
    private static bool IsOnThisMachine(HttpContext? http) => http?.Connection.RemoteIpAddress is { } address && IPAddress.IsLoopback(address);
}
