using System.Text;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning.Kits;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Kits;

/// <summary>Kits in their stored form, which is the kit file.</summary>
internal static class KitArchive
{
    /// <summary>A kit in a revision, newest if none is named; null where there is none.</summary>
    public static async Task<Kit?> KitAsync(this ClubContext db, Guid kitId, int? revision, CancellationToken cancellation)
    {
        var document = await db.KitRevisions.Where(r => r.KitId == kitId && (revision == null || r.Revision == revision))
            .OrderByDescending(r => r.Revision).Select(r => r.Document).FirstOrDefaultAsync(cancellation);
        return document is null ? null : Read(document);
    }

    /// <summary>Stores a kit: a new kit as it is, a known one as its next revision, an unchanged one not at all.</summary>
    public static async Task<Kit> StoreAsync(this Work work, Kit kit, CancellationToken cancellation)
    {
        var row = await work.Db.Kits.FirstOrDefaultAsync(k => k.Id == kit.Id, cancellation);
        if (row is null) work.Db.Kits.Add(row = new StoredKit { Id = kit.Id, Name = kit.Name });
        else if (await work.Db.KitAsync(kit.Id, row.NewestRevision, cancellation) is { } newest && Write(newest) == Write(kit with { Revision = newest.Revision })) return newest;
        var stored = kit with { Revision = row.NewestRevision == 0 ? Math.Max(1, kit.Revision) : row.NewestRevision + 1 };
        (row.Name, row.NewestRevision) = (kit.Name, stored.Revision);
        work.Db.KitRevisions.Add(new KitRevision { KitId = kit.Id, Revision = stored.Revision, Document = Write(stored), AtUtc = work.NowUtc, By = work.Actor.PersonId });
        return stored;
    }

    private static Kit Read(string document)
    {
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(document));
        return KitFile.Read(stream).Value;
    }

    private static string Write(Kit kit)
    {
        using var stream = new MemoryStream();
        KitFile.Write(kit, stream);
        return Encoding.UTF8.GetString(stream.ToArray());
    }
}
