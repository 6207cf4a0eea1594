using System.Globalization;
using ClubBench.Club.Persistence;
using ClubBench.Club.Persistence.Sqlite;
using ClubBench.Club.Tests.Support;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.Tests.Persistence;

public sealed class SqliteDatabaseTests
{
    [Theory]
    [InlineData("journal_mode", "wal")]
    [InlineData("synchronous", "2")]
    [InlineData("foreign_keys", "1")]
    public async Task Prepare_Settings_AreThoseThatKeepSavedWork(string setting, string wanted)
    {
        await using var club = await TestClub.EmptyAsync();
        await using var db = club.Open(Guid.NewGuid());

        await db.Database.OpenConnectionAsync(TestContext.Current.CancellationToken);
        await using var command = db.Database.GetDbConnection().CreateCommand();
        command.CommandText = "PRAGMA " + setting;
        var found = await command.ExecuteScalarAsync(TestContext.Current.CancellationToken);

        Assert.Equal(wanted, Convert.ToString(found, CultureInfo.InvariantCulture));
    }

    [Fact]
    public async Task Prepare_Twice_ChangesNothing()
    {
        await using var club = await TestClub.EmptyAsync();

        await club.Get<IClubDatabase>().PrepareAsync(TestContext.Current.CancellationToken);
    }

    [Fact]
    public async Task Prepare_ForeignKeysOff_IsRefused()
    {
        await using var club = await TestClub.EmptyAsync();
        var lax = new DbContextOptionsBuilder<SqliteClubContext>().UseSqlite($"Data Source={club.Path};Foreign Keys=False;Pooling=False").Options;

        var start = new SqliteDatabase(new OneContext(lax)).PrepareAsync(TestContext.Current.CancellationToken);

        Assert.Contains("foreign_keys", (await Assert.ThrowsAsync<InvalidOperationException>(() => start)).Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Model_MatchesTheMigrations()
    {
        await using var club = await TestClub.EmptyAsync();
        await using var db = club.Open(Guid.NewGuid());

        Assert.False(db.Database.HasPendingModelChanges());
    }

    private sealed class OneContext(DbContextOptions<SqliteClubContext> options) : IDbContextFactory<SqliteClubContext>
    {
        public SqliteClubContext CreateDbContext() => new(options);
    }
}
