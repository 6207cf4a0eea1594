using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;

namespace ClubBench.Club.UseCases.Readings;

/// <summary>Several readings at once: a device that was away, or a paper sheet that is typed in.</summary>
public sealed record RecordManyInput(IReadOnlyList<RecordInput> Readings);

/// <summary>What became of one of several readings.</summary>
/// <param name="Id">Its device id.</param>
/// <param name="Recorded">As stored; null where it was refused.</param>
/// <param name="Messages">Why it was refused.</param>
public sealed record RecordedItem(Guid Id, RecordedReading? Recorded, IReadOnlyList<FieldMessage> Messages);

/// <summary>Stores readings one by one in the given order; a refused one does not hold up the others.</summary>
public sealed class RecordMany(ClubStore store, ReadingBook book) : Command<RecordManyInput, IReadOnlyList<RecordedItem>>(store)
{
    private const int MostAtOnce = 500;

    /// <inheritdoc/>
    public override Right Required => Right.Build;

    /// <inheritdoc/>
    protected override async Task<Outcome<IReadOnlyList<RecordedItem>>> Handle(Work work, RecordManyInput input, CancellationToken cancellation)
    {
        if (input.Readings.Count > MostAtOnce) return Failure("readings", "reading.too-many");
        var items = new List<RecordedItem>();
        foreach (var reading in input.Readings)
        {
            var outcome = await book.RecordAsync(work, reading, cancellation);
            await work.Db.SaveChangesAsync(cancellation);
            items.Add(new RecordedItem(reading.Id, outcome.Succeeded ? outcome.Value : null, outcome.Messages));
        }

        return Success(items);
    }
}
