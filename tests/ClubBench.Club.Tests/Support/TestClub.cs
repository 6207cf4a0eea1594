using ClubBench.Calculation.Bands;
using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Club.UseCases.Clubs;
using ClubBench.Club.UseCases.GroupBuilds;
using ClubBench.Club.UseCases.Kits;
using ClubBench.Club.UseCases.Nights;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Club.UseCases.SignIn;
using ClubBench.Planning;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;
using Microsoft.Data.Sqlite;
using Microsoft.Extensions.DependencyInjection;

namespace ClubBench.Club.Tests.Support;

/// <summary>What a filled test club holds.</summary>
public sealed record TestClubIds(Guid KitId, Guid PlanId, Guid BuildId, Guid NightId, string JoinCode, IReadOnlyList<Guid> Boards, Actor Coordinator, Actor Mentor, IReadOnlyList<Actor> Builders);

/// <summary>A club on a real SQLite file of its own. The filled one is made once and copied.</summary>
public sealed class TestClub : IAsyncDisposable
{
    public const string Meter = "M2";

    public const int Boards = 6;

    private static readonly Lazy<Task<(byte[] File, TestClubIds Ids)>> Template = new(MakeTemplateAsync);

    private readonly DirectoryInfo _folder = Directory.CreateTempSubdirectory("clubbench-test");
    private readonly ServiceProvider _services;

    private TestClub(byte[]? file)
    {
        if (file is not null) File.WriteAllBytes(Path, file);
        _services = new ServiceCollection().AddSingleton<TimeProvider>(Clock).AddClub(Path).BuildServiceProvider(validateScopes: true);
    }

    public string Path => System.IO.Path.Combine(_folder.FullName, "club.db");

    public ManualClock Clock { get; } = new();

    public TestClubIds Ids { get; private set; } = null!;

    public static async Task<TestClub> EmptyAsync()
    {
        var club = new TestClub(file: null);
        await club.Get<IClubDatabase>().PrepareAsync(TestContext.Current.CancellationToken);
        return club;
    }

    public static async Task<TestClub> FilledAsync()
    {
        var (file, ids) = await Template.Value;
        return new TestClub(file) { Ids = ids };
    }

    public T Get<T>()
        where T : notnull => _services.GetRequiredService<T>();

    public object Get(Type type) => _services.GetRequiredService(type);

    public ClubContext Open(Guid? clubId = null) => Get<ClubStore>().Open(clubId ?? Ids.Coordinator.ClubId);

    public Task<Outcome<TResult>> Run<TInput, TResult>(UseCase<TInput, TResult> useCase, Actor actor, TInput input)
        where TResult : notnull => useCase.Run(actor, input, TestContext.Current.CancellationToken);

    /// <summary>The first coil whose inductance a builder reads.</summary>
    public async Task<ExpectedReading> CoilAsync() =>
        (await Get<OpenBoard>().Run(Ids.Coordinator, new OpenBoardInput(Ids.Boards[0]))).Value.Stages.SelectMany(s => s.Expected).First(e => e.Winding is not null && e.Kind == QuantityKind.Inductance);

    public async ValueTask DisposeAsync()
    {
        await _services.DisposeAsync();
        SqliteConnection.ClearAllPools();
        _folder.Delete(recursive: true);
    }

    public static Target TwentyMetres() => TargetDefaults.On("20 m", TestKit.Transmitter, ItuRegion.Region1)! with { LimitsConfirmedBy = "Ingrid" };

    private static async Task<(byte[] File, TestClubIds Ids)> MakeTemplateAsync()
    {
        await using var club = await EmptyAsync();
        var ids = await FillAsync(club);
        await using (var db = club.Open(ids.Coordinator.ClubId))
        {
            await db.Database.OpenCheckpointAsync();
        }

        return (await File.ReadAllBytesAsync(club.Path), ids);
    }

    private static async Task<TestClubIds> FillAsync(TestClub club)
    {
        var token = (await club.Get<OfferSetUp>().Run(Actor.Host, new OfferSetUpInput())).Value.Token!;
        var coordinator = (await club.Get<FirstSetUp>().Run(Actor.Visitor, new FirstSetUpInput(token, "Test club", "Ingrid", "a long enough password"))).Value;
        var mentor = await AddAsync(club, coordinator, "Tomas", Role.Mentor);
        await club.Get<AddInstrument>().Run(coordinator, new AddInstrumentInput(Meter, InstrumentClass.LcMeter, 0.02));
        using var file = TestKit.File();
        var kit = (await club.Get<ImportKit>().Run(coordinator, new ImportKitInput(file))).Value;
        var plan = (await club.Get<CreatePlan>().Run(coordinator, new CreatePlanInput(kit.KitId, "Quern on 20 m", TwentyMetres()))).Value;
        var build = (await club.Get<CreateGroupBuild>().Run(coordinator, new CreateGroupBuildInput("Spring", kit.KitId))).Value;
        var boards = (await club.Get<AddBoards>().Run(coordinator, new AddBoardsInput(build, plan.PlanId, [.. Enumerable.Range(1, Boards).Select(i => $"Q0{i}")]))).Value;
        var builders = new List<Actor>();
        foreach (var (board, i) in boards.Select((b, i) => (b, i)))
        {
            builders.Add(await AddAsync(club, coordinator, $"Builder {i + 1}", Role.Builder) with { BoardTags = [$"Q0{i + 1}"] });
            await club.Get<AssignBoard>().Run(coordinator, new AssignBoardInput(board, builders[i].PersonId));
        }

        var night = (await club.Get<CreateNight>().Run(coordinator, new CreateNightInput(build, new DateOnly(2026, 3, 12), "Night 1"))).Value;
        var started = (await club.Get<StartNight>().Run(coordinator, new StartNightInput(night))).Value;
        return new TestClubIds(kit.KitId, plan.PlanId, build, night, started.JoinCode, boards, coordinator, mentor, builders);
    }

    private static async Task<Actor> AddAsync(TestClub club, Actor coordinator, string name, Role role) =>
        new((await club.Get<AddPerson>().Run(coordinator, new AddPersonInput(name, role))).Value, coordinator.ClubId, role, name, []);
}
