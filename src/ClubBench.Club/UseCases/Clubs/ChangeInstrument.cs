using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using ClubBench.Planning.Figures;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Clubs;

/// <summary>Something was learnt about an instrument.</summary>
/// <param name="InstrumentId">The instrument.</param>
/// <param name="SeenVersion">Version the person saw.</param>
/// <param name="UncertaintyRelative">Expanded (k = 2), relative.</param>
/// <param name="UncertaintySi">Expanded, absolute; added.</param>
/// <param name="OffsetSi">Known offset.</param>
/// <param name="OffsetKind">What offset and absolute uncertainty are measured in.</param>
/// <param name="Post">Where it stands.</param>
public sealed record ChangeInstrumentInput(Guid InstrumentId, Guid SeenVersion, double UncertaintyRelative, double UncertaintySi, double OffsetSi, QuantityKind OffsetKind, string Post);

/// <summary>Changes an instrument's record. Readings keep their raw value; what is judged from now on uses the new record.</summary>
public sealed class ChangeInstrument(ClubStore store) : Command<ChangeInstrumentInput, Done>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.KeepClub;

    /// <inheritdoc/>
    protected override async Task<Outcome<Done>> Handle(Work work, ChangeInstrumentInput input, CancellationToken cancellation)
    {
        var messages = InstrumentFields.Check(input.UncertaintyRelative, input.UncertaintySi, input.OffsetSi).ToList();
        if (messages.Count > 0) return Failure(messages);
        if (await work.Db.Instruments.FirstOrDefaultAsync(i => i.Id == input.InstrumentId, cancellation) is not { } instrument) return NotFound("instrumentId");
        work.Expect(instrument, input.SeenVersion);
        (instrument.UncertaintyRelative, instrument.UncertaintySi) = (input.UncertaintyRelative, input.UncertaintySi);
        (instrument.OffsetSi, instrument.OffsetKind, instrument.Post) = (input.OffsetSi, input.OffsetKind, input.Post);
        work.Announce(EventKind.StoresChanged, instrument.Id);
        return Success(default);
    }
}
