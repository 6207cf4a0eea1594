using System.Reflection;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Club.Tests.Support;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.Tests.Persistence;

public sealed class TenantTests
{
    [Fact]
    public async Task Model_EveryRowButTheFirstStarts_BelongsToAClub()
    {
        await using var club = await TestClub.FilledAsync();
        await using var db = club.Open();

        var free = db.Model.GetEntityTypes().Select(t => t.ClrType).Where(t => !t.IsAssignableTo(typeof(IClubRow))).Select(t => t.Name).Order(StringComparer.Ordinal);

        Assert.Equal(["DataProtectionKey", "SetUpToken"], free);
    }

    [Fact]
    public async Task Open_ForAnotherClub_SeesNoRowOfAnyTable()
    {
        await using var club = await TestClub.FilledAsync();
        await using var own = club.Open();
        await using var other = club.Open(Guid.NewGuid());
        var count = typeof(TenantTests).GetMethod(nameof(CountAsync), BindingFlags.NonPublic | BindingFlags.Static)!;

        var filled = 0;
        foreach (var type in own.Model.GetEntityTypes().Select(t => t.ClrType).Where(t => t.IsAssignableTo(typeof(IClubRow))))
        {
            if (await (Task<int>)count.MakeGenericMethod(type).Invoke(null, [own])! > 0) filled++;
            Assert.True(await (Task<int>)count.MakeGenericMethod(type).Invoke(null, [other])! == 0, type.Name);
        }

        Assert.True(filled >= 14, $"Only {filled} tables hold rows: the test says little.");
    }

    [Fact]
    public async Task SaveChanges_RowOfAnotherClub_Throws()
    {
        await using var club = await TestClub.FilledAsync();
        await using var db = club.Open();
        db.Add(new Person { DisplayName = "Stray", ClubId = Guid.NewGuid() });

        await Assert.ThrowsAsync<InvalidOperationException>(() => db.SaveChangesAsync(TestContext.Current.CancellationToken));
    }

    private static Task<int> CountAsync<T>(ClubContext db)
        where T : class => db.Set<T>().CountAsync();
}
