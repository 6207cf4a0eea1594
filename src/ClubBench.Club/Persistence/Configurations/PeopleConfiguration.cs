using ClubBench.Club.Entities;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;

namespace ClubBench.Club.Persistence.Configurations;

internal sealed class RadioClubConfiguration : IEntityTypeConfiguration<RadioClub>
{
    public void Configure(EntityTypeBuilder<RadioClub> builder) => builder.ToTable("clubs").Property(c => c.Name).HasMaxLength(200);
}

internal sealed class PersonConfiguration : IEntityTypeConfiguration<Person>
{
    public void Configure(EntityTypeBuilder<Person> builder)
    {
        builder.ToTable("people").Property(p => p.DisplayName).HasMaxLength(100);
        builder.HasOne<RadioClub>().WithMany().HasForeignKey(p => p.ClubId);
    }
}

internal sealed class MembershipConfiguration : IEntityTypeConfiguration<Membership>
{
    public void Configure(EntityTypeBuilder<Membership> builder)
    {
        builder.ToTable("memberships").HasIndex(m => new { m.ClubId, m.PersonId }).IsUnique();
        builder.HasOne<Person>().WithMany().HasForeignKey(m => m.PersonId);
    }
}

internal sealed class SignInLinkConfiguration : IEntityTypeConfiguration<SignInLink>
{
    public void Configure(EntityTypeBuilder<SignInLink> builder)
    {
        builder.ToTable("sign_in_links").HasIndex(l => l.TokenHash).IsUnique();
        builder.HasOne<Person>().WithMany().HasForeignKey(l => l.PersonId);
        builder.HasOne<Night>().WithMany().HasForeignKey(l => l.NightId);
    }
}

internal sealed class ApiTokenConfiguration : IEntityTypeConfiguration<ApiToken>
{
    public void Configure(EntityTypeBuilder<ApiToken> builder)
    {
        builder.ToTable("api_tokens").HasIndex(t => t.TokenHash).IsUnique();
        builder.HasOne<Person>().WithMany().HasForeignKey(t => t.PersonId);
    }
}

internal sealed class SetUpTokenConfiguration : IEntityTypeConfiguration<SetUpToken>
{
    public void Configure(EntityTypeBuilder<SetUpToken> builder) => builder.ToTable("set_up_tokens").HasIndex(t => t.TokenHash).IsUnique();
}
