using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;

namespace ClubBench.Club.UseCases.Readings;

/// <summary>Stores a reading, with the advice that follows from it. Sending the same one again gives the first answer.</summary>
public sealed class Record(ClubStore store, ReadingBook book) : Command<RecordInput, RecordedReading>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.Build;

    /// <inheritdoc/>
    protected override Task<Outcome<RecordedReading>> Handle(Work work, RecordInput input, CancellationToken cancellation) => book.RecordAsync(work, input, cancellation);
}
