using ClubBench.Club.Entities;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace ClubBench.Club.Persistence.Configurations;

internal sealed class BoardConfiguration : IEntityTypeConfiguration<Board>
{
    public void Configure(EntityTypeBuilder<Board> builder)
    {
        builder.ToTable("boards").HasIndex(b => new { b.GroupBuildId, b.Tag }).IsUnique();
        builder.Property(b => b.Tag).HasMaxLength(20);
        builder.HasOne<GroupBuild>().WithMany().HasForeignKey(b => b.GroupBuildId);
        builder.HasOne<StoredPlan>().WithMany().HasForeignKey(b => b.PlanId);
        builder.HasOne<Person>().WithMany().HasForeignKey(b => b.BuilderId);
    }
}

internal sealed class BoardStageConfiguration : IEntityTypeConfiguration<BoardStage>
{
    public void Configure(EntityTypeBuilder<BoardStage> builder)
    {
        builder.ToTable("board_stages").HasIndex(s => new { s.BoardId, s.Stage }).IsUnique();
        builder.HasOne<Board>().WithMany().HasForeignKey(s => s.BoardId);
    }
}

internal sealed class StageEventConfiguration : IEntityTypeConfiguration<StageEvent>
{
    public void Configure(EntityTypeBuilder<StageEvent> builder)
    {
        builder.ToTable("stage_events").HasKey(e => e.Ordinal);
        builder.HasIndex(e => new { e.BoardId, e.Stage });
        builder.HasOne<Board>().WithMany().HasForeignKey(e => e.BoardId);
    }
}

internal sealed class SignOffConfiguration : IEntityTypeConfiguration<StageSignOff>
{
    public void Configure(EntityTypeBuilder<StageSignOff> builder)
    {
        builder.ToTable("sign_offs");
        builder.HasOne<Board>().WithMany().HasForeignKey(s => s.BoardId);
        builder.HasOne<Person>().WithMany().HasForeignKey(s => s.MentorId);
        builder.HasOne<Card>().WithMany().HasForeignKey(s => s.CardId);
    }
}

internal sealed class HelpCallConfiguration : IEntityTypeConfiguration<HelpCall>
{
    public void Configure(EntityTypeBuilder<HelpCall> builder)
    {
        builder.ToTable("help_calls");
        builder.HasOne<Board>().WithMany().HasForeignKey(c => c.BoardId);
    }
}
