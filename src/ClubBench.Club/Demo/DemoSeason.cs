using ClubBench.Calculation.Bands;
using ClubBench.Club.Access;
using ClubBench.Club.UseCases;
using ClubBench.Club.UseCases.Clubs;
using ClubBench.Club.UseCases.GroupBuilds;
using ClubBench.Club.UseCases.Kits;
using ClubBench.Club.UseCases.Nights;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Club.Demo;

/// <summary>The season of the demonstration up to its first night.</summary>
internal sealed class DemoSeason(DemoClub demo, Actor coordinator)
{
    /// <summary>People, drawers, kit, two plans, twelve boards, a night with its first readings.</summary>
    public async Task PlayAsync(CancellationToken cancellation)
    {
        var people = await PeopleAsync(cancellation);
        await StoresAsync(cancellation);
        using var file = DemoKits.OpenQuernThirty();
        var kit = await demo.RunAsync<ImportKit, ImportKitInput, ImportedKit>(coordinator, new ImportKitInput(file), cancellation);
        var twenty = await PlanAsync(kit, "20 m", cancellation);
        var forty = await PlanAsync(kit, "40 m", cancellation);
        await IssueAsync(twenty, cancellation);
        var build = await demo.RunAsync<CreateGroupBuild, CreateGroupBuildInput, Guid>(coordinator, new CreateGroupBuildInput("Quern on 20 and 40 metres", kit.KitId), cancellation);
        var boards = await BoardsAsync(build, twenty.PlanId, DemoTables.TwentyMetres, people, cancellation);
        await BoardsAsync(build, forty.PlanId, DemoTables.FortyMetres, people, cancellation);
        await NightAsync(build, people, cancellation);
        await new DemoNight(demo, coordinator, people, boards).PlayAsync(cancellation);
    }

    private async Task<Dictionary<string, Guid>> PeopleAsync(CancellationToken cancellation)
    {
        var juniors = DemoTables.TwentyMetres.Where(b => b.IsJunior).Select(b => b.Builder).ToHashSet(StringComparer.Ordinal);
        var builders = DemoTables.TwentyMetres.Concat(DemoTables.FortyMetres).Select(b => b.Builder).Concat(DemoTables.Others);
        var people = new Dictionary<string, Guid>(StringComparer.Ordinal) { [coordinator.DisplayName] = coordinator.PersonId };
        foreach (var (name, role) in DemoTables.Mentors.Select(m => (m, Role.Mentor)).Concat(builders.Select(b => (b, Role.Builder))))
            people[name] = await demo.RunAsync<AddPerson, AddPersonInput, Guid>(coordinator, new AddPersonInput(name, role, juniors.Contains(name)), cancellation);
        return people;
    }

    private async Task StoresAsync(CancellationToken cancellation)
    {
        foreach (var i in DemoTables.Instruments)
            await demo.RunAsync<AddInstrument, AddInstrumentInput, Guid>(coordinator, new AddInstrumentInput(i.Name, i.Class, i.UncertaintyRelative, OffsetKind: i.OffsetKind, Post: i.Post), cancellation);
        foreach (var line in DemoKits.DrawerStock.Lines)
            await demo.RunAsync<StockIn, StockInInput, Guid>(coordinator, new StockInInput(line.Class, line.Type, line.ValueSi, line.Quantity, line.Lot, line.MayBeTuned, MeasuredSi: line.MeasuredSi), cancellation);
    }

    private async Task<PlanReference> PlanAsync(ImportedKit kit, string band, CancellationToken cancellation)
    {
        var target = TargetDefaults.On(band, DemoKits.QuernThirty, ItuRegion.Region1) ?? throw new InvalidOperationException($"The band table has no {band}.");
        var confirmed = target with { LimitsConfirmedBy = coordinator.DisplayName };
        return await demo.RunAsync<CreatePlan, CreatePlanInput, PlanReference>(coordinator, new CreatePlanInput(kit.KitId, $"{kit.Name} on {band}", confirmed), cancellation);
    }

    /// <summary>The 20 m plan is issued; the 40 m plan stays a draft.</summary>
    private async Task IssueAsync(PlanReference plan, CancellationToken cancellation) =>
        await demo.RunAsync<IssuePlan, IssuePlanInput, PlanReference>(coordinator, new IssuePlanInput(plan.PlanId, plan.Version), cancellation);

    private async Task<Dictionary<string, Guid>> BoardsAsync(Guid build, Guid plan, IReadOnlyList<DemoBoard> boards, Dictionary<string, Guid> people, CancellationToken cancellation)
    {
        var ids = await demo.RunAsync<AddBoards, AddBoardsInput, IReadOnlyList<Guid>>(coordinator, new AddBoardsInput(build, plan, [.. boards.Select(b => b.Tag)]), cancellation);
        foreach (var (board, id) in boards.Zip(ids))
            await demo.RunAsync<AssignBoard, AssignBoardInput, Done>(coordinator, new AssignBoardInput(id, people[board.Builder]), cancellation);
        return boards.Zip(ids).ToDictionary(b => b.First.Tag, b => b.Second, StringComparer.Ordinal);
    }

    private async Task NightAsync(Guid build, Dictionary<string, Guid> people, CancellationToken cancellation)
    {
        var night = await demo.RunAsync<CreateNight, CreateNightInput, Guid>(
            coordinator, new CreateNightInput(build, demo.Today, "Night 1", "Windings and oscillators"), cancellation);
        await demo.RunAsync<StartNight, StartNightInput, StartedNight>(coordinator, new StartNightInput(night), cancellation);
        foreach (var (_, person) in people.Where(p => p.Key != DemoTables.Absent))
            await demo.RunAsync<CheckIn, CheckInInput, Done>(coordinator, new CheckInInput(night, person), cancellation);
    }
}
