using System.Linq.Expressions;
using ClubBench.Club.Entities;
using Microsoft.AspNetCore.DataProtection.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.Persistence;

/// <summary>
/// What a club keeps, whatever the provider. A context is opened for one club and one operation; a filter keeps every query inside that club,
/// and saving refuses a row of another.
/// </summary>
public abstract class ClubContext(DbContextOptions options) : DbContext(options), IDataProtectionKeyContext
{
    /// <summary>The club this context is open for.</summary>
    public Guid ClubId { get; internal set; }

    public DbSet<RadioClub> Clubs => Set<RadioClub>();

    public DbSet<Person> People => Set<Person>();

    public DbSet<Membership> Memberships => Set<Membership>();

    public DbSet<StoredKit> Kits => Set<StoredKit>();

    public DbSet<KitRevision> KitRevisions => Set<KitRevision>();

    public DbSet<StoredPlan> Plans => Set<StoredPlan>();

    public DbSet<PlanRevision> PlanRevisions => Set<PlanRevision>();

    public DbSet<Card> Cards => Set<Card>();

    public DbSet<ExpectedReadingRow> ExpectedReadings => Set<ExpectedReadingRow>();

    public DbSet<PrintLogEntry> PrintLog => Set<PrintLogEntry>();

    public DbSet<GroupBuild> GroupBuilds => Set<GroupBuild>();

    public DbSet<Night> Nights => Set<Night>();

    public DbSet<Attendance> Attendances => Set<Attendance>();

    public DbSet<Board> Boards => Set<Board>();

    public DbSet<BoardStage> BoardStages => Set<BoardStage>();

    public DbSet<StageEvent> StageEvents => Set<StageEvent>();

    public DbSet<StageSignOff> SignOffs => Set<StageSignOff>();

    public DbSet<HelpCall> HelpCalls => Set<HelpCall>();

    public DbSet<FittedEntry> Fitted => Set<FittedEntry>();

    public DbSet<StoredReading> Readings => Set<StoredReading>();

    public DbSet<AdviceGiven> AdviceGiven => Set<AdviceGiven>();

    public DbSet<ClubInstrument> Instruments => Set<ClubInstrument>();

    public DbSet<StockLot> StockLots => Set<StockLot>();

    public DbSet<EventRow> Events => Set<EventRow>();

    public DbSet<SignInLink> SignInLinks => Set<SignInLink>();

    public DbSet<ApiToken> ApiTokens => Set<ApiToken>();

    public DbSet<SetUpToken> SetUpTokens => Set<SetUpToken>();

    public DbSet<DataProtectionKey> DataProtectionKeys => Set<DataProtectionKey>();

    /// <inheritdoc/>
    public override int SaveChanges(bool acceptAllChangesOnSuccess)
    {
        Stamp();
        return base.SaveChanges(acceptAllChangesOnSuccess);
    }

    /// <inheritdoc/>
    public override Task<int> SaveChangesAsync(bool acceptAllChangesOnSuccess, CancellationToken cancellationToken = default)
    {
        Stamp();
        return base.SaveChangesAsync(acceptAllChangesOnSuccess, cancellationToken);
    }

    /// <inheritdoc/>
    protected override void OnModelCreating(ModelBuilder modelBuilder)
    {
        modelBuilder.ApplyConfigurationsFromAssembly(typeof(ClubContext).Assembly);
        foreach (var type in modelBuilder.Model.GetEntityTypes().Select(t => t.ClrType).Where(t => t.IsAssignableTo(typeof(IClubRow))).ToList())
        {
            modelBuilder.Entity(type).HasQueryFilter(InsideTheClub(type));
            if (type.IsAssignableTo(typeof(EditableRow))) modelBuilder.Entity(type).Property(nameof(EditableRow.Version)).IsConcurrencyToken();
        }
    }

    /// <inheritdoc/>
    protected override void ConfigureConventions(ModelConfigurationBuilder configurationBuilder)
    {
        configurationBuilder.Properties<Enum>().HaveConversion<string>().HaveMaxLength(40);
        configurationBuilder.Properties<DateTime>().HaveConversion<UtcConverter>();
    }

    /// <summary>row => row.ClubId == this.ClubId, for a row type known only at run time.</summary>
    private LambdaExpression InsideTheClub(Type type)
    {
        var row = Expression.Parameter(type, "row");
        var own = Expression.Property(Expression.Constant(this), nameof(ClubId));
        return Expression.Lambda(Expression.Equal(Expression.Property(row, nameof(IClubRow.ClubId)), own), row);
    }

    private void Stamp()
    {
        foreach (var entry in ChangeTracker.Entries<IClubRow>().Where(e => e.State is EntityState.Added or EntityState.Modified or EntityState.Deleted))
        {
            if (entry.State is EntityState.Added && entry.Entity.ClubId == Guid.Empty) entry.Entity.ClubId = ClubId;
            if (entry.Entity.ClubId != ClubId) throw new InvalidOperationException($"A {entry.Metadata.ClrType.Name} of another club must not be saved here.");
            if (entry.Entity is EditableRow row && entry.State is not EntityState.Deleted) row.Version = Guid.NewGuid();
        }
    }
}
