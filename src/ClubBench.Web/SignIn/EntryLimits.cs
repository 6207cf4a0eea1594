using System.Globalization;
using System.Threading.RateLimiting;
using Microsoft.AspNetCore.RateLimiting;

namespace ClubBench.Web.SignIn;

/// <summary>Slows guessing of links and codes down: a few tries at once from one address, then 429 with Retry-After.</summary>
internal static class EntryLimits
{
    public const string Policy = "entry";

    /// <summary>A room behind one address comes in together; with the refill at most 60 tries fit into ten minutes.</summary>
    private const int Burst = 40;

    private static readonly TimeSpan Refill = TimeSpan.FromSeconds(30);

    public static void AddEntryLimits(this IServiceCollection services) => services.AddRateLimiter(limits =>
    {
        limits.RejectionStatusCode = StatusCodes.Status429TooManyRequests;
        limits.OnRejected = (context, _) =>
        {
            var wait = context.Lease.TryGetMetadata(MetadataName.RetryAfter, out var after) ? after : Refill;
            context.HttpContext.Response.Headers.RetryAfter = Math.Ceiling(wait.TotalSeconds).ToString(CultureInfo.InvariantCulture);
            return ValueTask.CompletedTask;
        };
        limits.AddPolicy(Policy, context => RateLimitPartition.GetTokenBucketLimiter(
            context.Connection.RemoteIpAddress?.ToString() ?? "",
            _ => new TokenBucketRateLimiterOptions { TokenLimit = Burst, TokensPerPeriod = 1, ReplenishmentPeriod = Refill, QueueLimit = 0 }));
    });

    public static TBuilder RequireEntryLimit<TBuilder>(this TBuilder builder)
        where TBuilder : IEndpointConventionBuilder => builder.RequireRateLimiting(Policy);
}
