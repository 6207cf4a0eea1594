using Microsoft.AspNetCore.Diagnostics.HealthChecks;

namespace ClubBench.Web.Commands;

/// <summary>Health for whoever watches the process: alive without asking anything, ready when the database answers.</summary>
public static class HealthFeature
{
    public static void MapHealth(this WebApplication app)
    {
        app.MapHealthChecks("/health/live", new HealthCheckOptions { Predicate = _ => false }).AllowAnonymous();
        app.MapHealthChecks("/health/ready").AllowAnonymous();
    }
}
