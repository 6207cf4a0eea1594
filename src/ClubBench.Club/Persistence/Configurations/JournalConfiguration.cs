using ClubBench.Club.Entities;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace ClubBench.Club.Persistence.Configurations;

internal sealed class FittedConfiguration : IEntityTypeConfiguration<FittedEntry>
{
    public void Configure(EntityTypeBuilder<FittedEntry> builder)
    {
        builder.ToTable("fitted").HasKey(f => f.Ordinal);
        builder.HasIndex(f => new { f.ClubId, f.BoardId, f.Id }).IsUnique();
        builder.HasOne<Board>().WithMany().HasForeignKey(f => f.BoardId);
    }
}

internal sealed class ReadingConfiguration : IEntityTypeConfiguration<StoredReading>
{
    public void Configure(EntityTypeBuilder<StoredReading> builder)
    {
        builder.ToTable("readings").HasKey(r => r.Ordinal);
        builder.HasIndex(r => new { r.ClubId, r.BoardId, r.Id }).IsUnique();
        builder.HasIndex(r => new { r.ClubId, r.Point });
        builder.Property(r => r.TypedText).HasMaxLength(100);
        builder.HasOne<Board>().WithMany().HasForeignKey(r => r.BoardId);
    }
}

internal sealed class AdviceGivenConfiguration : IEntityTypeConfiguration<AdviceGiven>
{
    public void Configure(EntityTypeBuilder<AdviceGiven> builder)
    {
        builder.ToTable("advice_given").HasKey(a => a.Ordinal);
        builder.HasIndex(a => a.ReadingOrdinal).IsUnique();
        builder.HasOne<StoredReading>().WithOne().HasForeignKey<AdviceGiven>(a => a.ReadingOrdinal);
        builder.HasOne<Board>().WithMany().HasForeignKey(a => a.BoardId);
    }
}

internal sealed class EventConfiguration : IEntityTypeConfiguration<EventRow>
{
    public void Configure(EntityTypeBuilder<EventRow> builder)
    {
        builder.ToTable("events").HasKey(e => e.Ordinal);
        builder.HasIndex(e => new { e.ClubId, e.Ordinal });
    }
}
