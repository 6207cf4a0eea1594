using ClubBench.Club.Entities;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace ClubBench.Club.Persistence.Configurations;

internal sealed class GroupBuildConfiguration : IEntityTypeConfiguration<GroupBuild>
{
    public void Configure(EntityTypeBuilder<GroupBuild> builder)
    {
        builder.ToTable("group_builds");
        builder.HasOne<StoredKit>().WithMany().HasForeignKey(g => new { g.ClubId, g.KitId });
    }
}

internal sealed class NightConfiguration : IEntityTypeConfiguration<Night>
{
    public void Configure(EntityTypeBuilder<Night> builder)
    {
        builder.ToTable("nights").HasIndex(n => n.JoinCode).IsUnique();
        builder.HasOne<GroupBuild>().WithMany().HasForeignKey(n => n.GroupBuildId);
    }
}

internal sealed class AttendanceConfiguration : IEntityTypeConfiguration<Attendance>
{
    public void Configure(EntityTypeBuilder<Attendance> builder)
    {
        builder.ToTable("attendance").HasIndex(a => new { a.NightId, a.PersonId }).IsUnique();
        builder.HasOne<Night>().WithMany().HasForeignKey(a => a.NightId);
        builder.HasOne<Person>().WithMany().HasForeignKey(a => a.PersonId);
    }
}

internal sealed class InstrumentConfiguration : IEntityTypeConfiguration<ClubInstrument>
{
    public void Configure(EntityTypeBuilder<ClubInstrument> builder) =>
        builder.ToTable("instruments").HasIndex(i => new { i.ClubId, i.Name }).IsUnique();
}

internal sealed class StockLotConfiguration : IEntityTypeConfiguration<StockLot>
{
    public void Configure(EntityTypeBuilder<StockLot> builder) => builder.ToTable("stock_lots").HasIndex(l => l.ClubId);
}
