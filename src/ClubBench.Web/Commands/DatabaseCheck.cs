using ClubBench.Club.Persistence;
using Microsoft.Extensions.Diagnostics.HealthChecks;

namespace ClubBench.Web.Commands;

/// <summary>Ready means: the database answers.</summary>
internal sealed class DatabaseCheck(ClubContexts contexts) : IHealthCheck
{
    public async Task<HealthCheckResult> CheckHealthAsync(HealthCheckContext context, CancellationToken cancellationToken = default)
    {
        await using var db = contexts.Open(Guid.Empty);
        return await db.Database.CanConnectAsync(cancellationToken) ? HealthCheckResult.Healthy() : HealthCheckResult.Unhealthy("The database does not answer.");
    }
}
