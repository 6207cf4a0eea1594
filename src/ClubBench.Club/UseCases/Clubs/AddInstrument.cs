using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Clubs;

/// <summary>An instrument comes into the club.</summary>
/// <param name="Name">Name on its label.</param>
/// <param name="Class">Sort.</param>
/// <param name="UncertaintyRelative">Expanded (k = 2), relative.</param>
/// <param name="UncertaintySi">Expanded, absolute; added.</param>
/// <param name="OffsetSi">Known offset; subtracted from readings.</param>
/// <param name="OffsetKind">What offset and absolute uncertainty are measured in.</param>
/// <param name="Post">Where it stands.</param>
public sealed record AddInstrumentInput(
    string Name,
    InstrumentClass Class,
    double UncertaintyRelative,
    double UncertaintySi = 0,
    double OffsetSi = 0,
    QuantityKind OffsetKind = QuantityKind.Inductance,
    string Post = "");

/// <summary>Adds an instrument.</summary>
public sealed class AddInstrument(ClubStore store) : Command<AddInstrumentInput, Guid>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.KeepClub;

    /// <inheritdoc/>
    protected override async Task<Outcome<Guid>> Handle(Work work, AddInstrumentInput input, CancellationToken cancellation)
    {
        var messages = InstrumentFields.Check(input.UncertaintyRelative, input.UncertaintySi, input.OffsetSi).ToList();
        if (string.IsNullOrWhiteSpace(input.Name)) messages.Add(FieldMessage.Error("name", "field.needed"));
        var name = input.Name.Trim();
        if (await work.Db.Instruments.AnyAsync(i => i.Name == name, cancellation)) messages.Add(FieldMessage.Error("name", "instrument.name-taken", ("name", name)));
        if (messages.Count > 0) return Failure(messages);
        var instrument = new ClubInstrument
        {
            Name = name,
            Class = input.Class,
            UncertaintyRelative = input.UncertaintyRelative,
            UncertaintySi = input.UncertaintySi,
            OffsetSi = input.OffsetSi,
            OffsetKind = input.OffsetKind,
            Post = input.Post,
        };
        work.Db.Instruments.Add(instrument);
        work.Announce(EventKind.StoresChanged, instrument.Id);
        return Success(instrument.Id);
    }
}
