using System.IO.Compression;
using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Club.Persistence.Sqlite;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Club.UseCases.Kits;
using ClubBench.Club.UseCases.Plans;
using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace ClubBench.Club.Tests.StoredDatabases;

/// <summary>A database file of an earlier version opens, migrates and reads with today's program.</summary>
public sealed class StoredDatabaseTests
{
    [Theory]
    [InlineData("first-season")]
    public async Task Prepare_StoredFile_MigratesAndReadsEveryKitPlanAndBoard(string name)
    {
        var folder = Directory.CreateTempSubdirectory("clubbench-stored");
        try
        {
            var path = Path.Combine(folder.FullName, "club.db");
            Unpack(name, path);
            await using var services = new ServiceCollection().AddClub(path).BuildServiceProvider();
            await services.GetRequiredService<IClubDatabase>().PrepareAsync(TestContext.Current.CancellationToken);

            var coordinator = await CoordinatorOfAsync(services);
            var kits = (await services.GetRequiredService<ListKits>().Run(coordinator, new ListKitsInput())).Value;
            var plans = (await services.GetRequiredService<ListPlans>().Run(coordinator, new ListPlansInput())).Value;
            var boards = (await services.GetRequiredService<ListBoards>().Run(coordinator, new ListBoardsInput())).Value;

            Assert.NotEmpty(kits);
            Assert.Equal(2, plans.Count);
            Assert.Equal(12, boards.Count);
            foreach (var kit in kits) Assert.True((await services.GetRequiredService<OpenKit>().Run(coordinator, new OpenKitInput(kit.Id))).Succeeded);
            foreach (var plan in plans) Assert.True((await services.GetRequiredService<OpenPlan>().Run(coordinator, new OpenPlanInput(plan.Id))).Succeeded);
            foreach (var board in boards) Assert.True((await services.GetRequiredService<OpenBoard>().Run(coordinator, new OpenBoardInput(board.Id))).Succeeded);
        }
        finally
        {
            SqliteConnection.ClearAllPools();
            folder.Delete(recursive: true);
        }
    }

    private static async Task<Actor> CoordinatorOfAsync(ServiceProvider services)
    {
        await using var db = await services.GetRequiredService<IDbContextFactory<SqliteClubContext>>().CreateDbContextAsync(TestContext.Current.CancellationToken);
        var membership = await db.Memberships.IgnoreQueryFilters().FirstAsync(m => m.Role == Role.Coordinator, TestContext.Current.CancellationToken);
        return new Actor(membership.PersonId, membership.ClubId, Role.Coordinator, "", []);
    }

    private static void Unpack(string name, string path)
    {
        using var packed = new GZipStream(File.OpenRead(Path.Combine(AppContext.BaseDirectory, "StoredDatabases", name + ".db.gz")), CompressionMode.Decompress);
        using var file = File.Create(path);
        packed.CopyTo(file);
    }
}
