using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.GroupBuilds;

/// <summary>A season's undertaking begins.</summary>
public sealed record CreateGroupBuildInput(string Name, Guid KitId);

/// <summary>Starts a group build of a kit.</summary>
public sealed class CreateGroupBuild(ClubStore store) : Command<CreateGroupBuildInput, Guid>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.RunNights;

    /// <inheritdoc/>
    protected override async Task<Outcome<Guid>> Handle(Work work, CreateGroupBuildInput input, CancellationToken cancellation)
    {
        if (string.IsNullOrWhiteSpace(input.Name)) return Failure("name", "field.needed");
        if (!await work.Db.Kits.AnyAsync(k => k.Id == input.KitId, cancellation)) return NotFound("kitId");
        var build = new GroupBuild { Name = input.Name.Trim(), KitId = input.KitId, StartedUtc = work.NowUtc };
        work.Db.GroupBuilds.Add(build);
        work.Announce(EventKind.BoardsChanged, build.Id);
        return Success(build.Id);
    }
}
