using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Demo;
using ClubBench.Club.Persistence;
using ClubBench.Club.Persistence.Sqlite;
using ClubBench.Club.UseCases;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Club.UseCases.Readings;
using ClubBench.Club.UseCases.SignIn;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.DependencyInjection.Extensions;

namespace ClubBench.Club;

/// <summary>Registers the club: storage, change feed and every use case.</summary>
public static class ClubServices
{
    /// <summary>All use cases of this assembly.</summary>
    public static IReadOnlyList<Type> UseCases { get; } =
        [.. typeof(ClubServices).Assembly.GetTypes().Where(t => t is { IsAbstract: false, IsClass: true } && t.IsAssignableTo(typeof(IUseCase))).OrderBy(t => t.FullName, StringComparer.Ordinal)];

    /// <summary>Adds the club on an SQLite file. Call <see cref="IClubDatabase.PrepareAsync"/> once before the first use.</summary>
    /// <param name="services">The services.</param>
    /// <param name="databasePath">Path of the SQLite file.</param>
    public static IServiceCollection AddClub(this IServiceCollection services, string databasePath)
    {
        services.AddDbContextFactory<SqliteClubContext>(o => o.UseSqlite(SqliteDatabase.ConnectionFor(databasePath)));
        services.TryAddSingleton(TimeProvider.System);
        services.AddSingleton(p => new ClubContexts(p.GetRequiredService<IDbContextFactory<SqliteClubContext>>().CreateDbContext));
        services.AddSingleton<IClubDatabase, SqliteDatabase>();
        services.AddSingleton<IChangeFeed, ChangeFeed>();
        services.AddSingleton<ClubStore>();
        services.AddSingleton<FailureWindows>();
        services.AddSingleton<WrongCodes>();
        services.AddSingleton<PlanArchive>();
        services.AddSingleton<SearchJobs>();
        services.AddSingleton<ReadingBook>();
        services.AddSingleton<DemoClub>();
        foreach (var useCase in UseCases) services.AddSingleton(useCase);
        return services;
    }
}
