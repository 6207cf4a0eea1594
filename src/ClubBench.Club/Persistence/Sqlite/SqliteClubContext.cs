using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Design;

namespace ClubBench.Club.Persistence.Sqlite;

/// <summary>The club in one SQLite file.</summary>
public sealed class SqliteClubContext(DbContextOptions<SqliteClubContext> options) : ClubContext(options);

/// <summary>For the migration tool.</summary>
public sealed class SqliteClubContextFactory : IDesignTimeDbContextFactory<SqliteClubContext>
{
    /// <inheritdoc/>
    public SqliteClubContext CreateDbContext(string[] args) =>
        new(new DbContextOptionsBuilder<SqliteClubContext>().UseSqlite("Data Source=design-time.db").Options);
}
