using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Nights;

/// <summary>A night is planned.</summary>
public sealed record CreateNightInput(Guid GroupBuildId, DateOnly Date, string Title, string Goals = "");

/// <summary>Plans a night of a group build.</summary>
public sealed class CreateNight(ClubStore store) : Command<CreateNightInput, Guid>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.RunNights;

    /// <inheritdoc/>
    protected override async Task<Outcome<Guid>> Handle(Work work, CreateNightInput input, CancellationToken cancellation)
    {
        if (string.IsNullOrWhiteSpace(input.Title)) return Failure("title", "field.needed");
        if (!await work.Db.GroupBuilds.AnyAsync(g => g.Id == input.GroupBuildId, cancellation)) return NotFound("groupBuildId");
        var night = new Night { GroupBuildId = input.GroupBuildId, Date = input.Date, Title = input.Title.Trim(), Goals = input.Goals };
        work.Db.Nights.Add(night);
        work.Announce(EventKind.NightChanged, night.Id);
        return Success(night.Id);
    }
}
