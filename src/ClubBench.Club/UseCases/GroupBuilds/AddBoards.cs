using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.GroupBuilds;

/// <summary>Boards join a group build.</summary>
/// <param name="GroupBuildId">The group build.</param>
/// <param name="PlanId">Plan they are built by.</param>
/// <param name="Tags">Numbers on the boards.</param>
public sealed record AddBoardsInput(Guid GroupBuildId, Guid PlanId, IReadOnlyList<string> Tags);

/// <summary>Adds boards, every stage not started. Boards keep their number for good.</summary>
public sealed class AddBoards(ClubStore store, PlanArchive archive) : Command<AddBoardsInput, IReadOnlyList<Guid>>(store)
{
    private const int MostAtOnce = 100;
    private const int LongestTag = 20;

    /// <inheritdoc/>
    public override Right Required => Right.RunNights;

    /// <inheritdoc/>
    protected override async Task<Outcome<IReadOnlyList<Guid>>> Handle(Work work, AddBoardsInput input, CancellationToken cancellation)
    {
        if (await work.Db.GroupBuilds.FirstOrDefaultAsync(g => g.Id == input.GroupBuildId, cancellation) is not { } build) return NotFound("groupBuildId");
        if (await archive.OpenAsync(work.Db, input.PlanId, revision: null, cancellation) is not { } plan) return NotFound("planId");
        if (plan.Row.KitId != build.KitId) return Failure("planId", "board.plan-of-another-kit");
        var tags = input.Tags.Select(t => t.Trim().ToUpperInvariant()).ToList();
        var taken = await work.Db.Boards.Where(b => b.GroupBuildId == build.Id && tags.Contains(b.Tag)).Select(b => b.Tag).ToListAsync(cancellation);
        var messages = Check(tags, taken).ToList();
        if (messages.Count > 0) return Failure(messages);
        var boards = tags.Select(t => new Board { GroupBuildId = build.Id, PlanId = input.PlanId, Tag = t }).ToList();
        work.Db.Boards.AddRange(boards);
        work.Db.BoardStages.AddRange(boards.SelectMany(b => plan.Plan.Stages.Select(s => new BoardStage { BoardId = b.Id, Stage = s.Stage })));
        work.Announce(EventKind.BoardsChanged, build.Id);
        return Success([.. boards.Select(b => b.Id)]);
    }

    private static IEnumerable<FieldMessage> Check(List<string> tags, List<string> taken)
    {
        if (tags.Count is 0 or > MostAtOnce) yield return FieldMessage.Error("tags", "board.count-range");
        foreach (var tag in tags.Where(t => t.Length is 0 or > LongestTag)) yield return FieldMessage.Error("tags", "board.tag-length", ("tag", tag));
        foreach (var tag in taken.Concat(tags.GroupBy(t => t, StringComparer.Ordinal).Where(g => g.Count() > 1).Select(g => g.Key)).Distinct(StringComparer.Ordinal))
            yield return FieldMessage.Error("tags", "board.tag-taken", ("tag", tag));
    }
}
