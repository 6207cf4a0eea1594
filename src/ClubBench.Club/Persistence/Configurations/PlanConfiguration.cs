using ClubBench.Club.Entities;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace ClubBench.Club.Persistence.Configurations;

internal sealed class StoredKitConfiguration : IEntityTypeConfiguration<StoredKit>
{
    public void Configure(EntityTypeBuilder<StoredKit> builder)
    {
        // A kit keeps its identity wherever it goes, so two clubs may hold the same one.
        builder.ToTable("kits").HasKey(k => new { k.ClubId, k.Id });
        builder.Property(k => k.Name).HasMaxLength(200);
    }
}

internal sealed class KitRevisionConfiguration : IEntityTypeConfiguration<KitRevision>
{
    public void Configure(EntityTypeBuilder<KitRevision> builder)
    {
        builder.ToTable("kit_revisions").HasIndex(r => new { r.ClubId, r.KitId, r.Revision }).IsUnique();
        builder.HasOne<StoredKit>().WithMany().HasForeignKey(r => new { r.ClubId, r.KitId });
    }
}

internal sealed class StoredPlanConfiguration : IEntityTypeConfiguration<StoredPlan>
{
    public void Configure(EntityTypeBuilder<StoredPlan> builder)
    {
        builder.ToTable("plans").Ignore(p => p.RevisionInForce);
        builder.HasOne<StoredKit>().WithMany().HasForeignKey(p => new { p.ClubId, p.KitId });
    }
}

internal sealed class PlanRevisionConfiguration : IEntityTypeConfiguration<PlanRevision>
{
    public void Configure(EntityTypeBuilder<PlanRevision> builder)
    {
        builder.ToTable("plan_revisions").HasIndex(r => new { r.PlanId, r.Revision }).IsUnique();
        builder.HasOne<StoredPlan>().WithMany().HasForeignKey(r => r.PlanId);
    }
}

internal sealed class CardConfiguration : IEntityTypeConfiguration<Card>
{
    public void Configure(EntityTypeBuilder<Card> builder)
    {
        builder.ToTable("cards").HasIndex(c => new { c.PlanId, c.Stage, c.Number }).IsUnique();
        builder.HasOne<StoredPlan>().WithMany().HasForeignKey(c => c.PlanId);
    }
}

internal sealed class ExpectedReadingConfiguration : IEntityTypeConfiguration<ExpectedReadingRow>
{
    public void Configure(EntityTypeBuilder<ExpectedReadingRow> builder)
    {
        builder.ToTable("expected_readings").HasIndex(e => new { e.PlanId, e.PlanRevision, e.Point }).IsUnique();
        builder.HasOne<StoredPlan>().WithMany().HasForeignKey(e => e.PlanId);
    }
}

internal sealed class PrintLogConfiguration : IEntityTypeConfiguration<PrintLogEntry>
{
    public void Configure(EntityTypeBuilder<PrintLogEntry> builder)
    {
        builder.ToTable("print_log");
        builder.HasOne<Card>().WithMany().HasForeignKey(p => p.CardId);
        builder.HasOne<Board>().WithMany().HasForeignKey(p => p.BoardId);
    }
}
