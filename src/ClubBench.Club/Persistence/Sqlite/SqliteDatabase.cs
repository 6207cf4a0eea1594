using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.Persistence.Sqlite;

/// <summary>The SQLite file: brought up to date and checked before the first use.</summary>
public sealed class SqliteDatabase(IDbContextFactory<SqliteClubContext> contexts) : IClubDatabase
{
    private const string FullSynchronous = "2";

    /// <summary>Connection text for a file, with the settings everything relies on.</summary>
    public static string ConnectionFor(string path) =>
        new SqliteConnectionStringBuilder { DataSource = path, ForeignKeys = true, Cache = SqliteCacheMode.Private, Pooling = true }.ToString();

    /// <inheritdoc/>
    public async Task PrepareAsync(CancellationToken cancellation = default)
    {
        await using var db = await contexts.CreateDbContextAsync(cancellation);
        await db.Database.MigrateAsync(cancellation);
        await db.Database.OpenConnectionAsync(cancellation);
        await db.Database.ExecuteSqlRawAsync("PRAGMA journal_mode = wal", cancellation); // a copied or restored file comes without its log
        await RequireAsync(db, "journal_mode", "wal", cancellation);
        await RequireAsync(db, "synchronous", FullSynchronous, cancellation);
        await RequireAsync(db, "foreign_keys", "1", cancellation);
    }

    private static async Task RequireAsync(SqliteClubContext db, string setting, string wanted, CancellationToken cancellation)
    {
        await using var command = db.Database.GetDbConnection().CreateCommand();
        command.CommandText = $"PRAGMA {setting}";
        var found = Convert.ToString(await command.ExecuteScalarAsync(cancellation), System.Globalization.CultureInfo.InvariantCulture);
        if (!string.Equals(found, wanted, StringComparison.OrdinalIgnoreCase))
            throw new InvalidOperationException($"The database runs with {setting} = {found}; saved work is only safe with {wanted}. The start is refused.");
    }
}
