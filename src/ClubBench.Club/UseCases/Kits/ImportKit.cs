using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using ClubBench.Planning.Kits;

namespace ClubBench.Club.UseCases.Kits;

/// <summary>A kit file is taken in.</summary>
public sealed record ImportKitInput(Stream File);

/// <summary>Where the kit is now.</summary>
public sealed record ImportedKit(Guid KitId, int Revision, string Name);

/// <summary>Takes in a kit file. A faulty file changes nothing and gets a message for each fault; a file above the limit is not read to its end.</summary>
public sealed class ImportKit(ClubStore store) : Command<ImportKitInput, ImportedKit>(store)
{
    /// <summary>Largest kit file.</summary>
    public const int MostBytes = 10 * 1024 * 1024;

    /// <inheritdoc/>
    public override Right Required => Right.PlanKits;

    /// <inheritdoc/>
    protected override async Task<Outcome<ImportedKit>> Handle(Work work, ImportKitInput input, CancellationToken cancellation)
    {
        using var file = new MemoryStream();
        if (!await ReadAsync(input.File, file, cancellation)) return Failure("file", "kit.file-too-large", ("most", "10 MB"));
        var read = KitFile.Read(file);
        if (!read.Succeeded) return Failure(read.Messages);
        var kit = await work.StoreAsync(read.Value, cancellation);
        work.Announce(EventKind.KitsChanged, kit.Id);
        return Success(new ImportedKit(kit.Id, kit.Revision, kit.Name), read.Messages);
    }

    private static async Task<bool> ReadAsync(Stream from, MemoryStream into, CancellationToken cancellation)
    {
        var buffer = new byte[81920];
        while (await from.ReadAsync(buffer, cancellation) is > 0 and var count)
        {
            if (into.Length + count > MostBytes) return false;
            into.Write(buffer, 0, count);
        }

        into.Position = 0;
        return true;
    }
}
