using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases.Kits;
using ClubBench.Planning;
using ClubBench.Planning.Plans;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>A kit shall move to another band.</summary>
/// <param name="KitId">The kit, in its newest revision.</param>
/// <param name="Name">Name of the plan.</param>
/// <param name="Target">Where it goes.</param>
/// <param name="Choices">What people already chose; null for nothing.</param>
public sealed record CreatePlanInput(Guid KitId, string Name, Target Target, IReadOnlyList<Choice>? Choices = null);

/// <summary>Plans a move and stores it as a draft.</summary>
public sealed class CreatePlan(ClubStore store) : Command<CreatePlanInput, PlanReference>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.PlanKits;

    /// <inheritdoc/>
    protected override async Task<Outcome<PlanReference>> Handle(Work work, CreatePlanInput input, CancellationToken cancellation)
    {
        if (string.IsNullOrWhiteSpace(input.Name)) return Failure("name", "field.needed");
        if (await work.Db.KitAsync(input.KitId, revision: null, cancellation) is not { } kit) return NotFound("kitId");
        var choices = input.Choices ?? [];
        var messages = PlanRevisions.Check(input.Target, choices, kit).ToList();
        if (messages.Count > 0) return Failure(messages);
        var row = new StoredPlan { KitId = kit.Id, Name = input.Name.Trim(), BandName = input.Target.BandName };
        work.Db.Plans.Add(row);
        await work.StoreRevisionAsync(row, Planner.Plan(await work.InputsAsync(kit, input.Target, choices, cancellation)), cancellation);
        await work.Db.SaveChangesAsync(cancellation);
        return Success(new PlanReference(row.Id, row.NewestRevision, row.Version));
    }
}
