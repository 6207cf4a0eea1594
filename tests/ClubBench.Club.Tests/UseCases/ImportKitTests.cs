using System.Text;
using ClubBench.Club.Tests.Support;
using ClubBench.Club.UseCases.Kits;
using ClubBench.Planning;

namespace ClubBench.Club.Tests.UseCases;

public sealed class ImportKitTests
{
    public static TheoryData<string> Faulty { get; } = new()
    {
        "not a kit",
        "{}",
        new string('[', 1000),
        TestKit.Json().Replace("\"capacitanceF\":", "\"capacitanceF\":-", StringComparison.Ordinal),
        TestKit.Json() + new string(' ', ImportKit.MostBytes),
    };

    [Theory]
    [MemberData(nameof(Faulty), DisableDiscoveryEnumeration = true)]
    public async Task ImportKit_FaultyFile_GetsMessagesAndChangesNothing(string file)
    {
        await using var club = await TestClub.FilledAsync();
        var before = (await club.Run(club.Get<ListKits>(), club.Ids.Coordinator, new ListKitsInput())).Value;

        var outcome = await ImportAsync(club, file);

        Assert.False(outcome.Succeeded);
        Assert.NotEmpty(outcome.Messages);
        Assert.Equal(before, (await club.Run(club.Get<ListKits>(), club.Ids.Coordinator, new ListKitsInput())).Value);
    }

    [Fact]
    public async Task ImportKit_TheSameFileAgain_KeepsItsRevision()
    {
        await using var club = await TestClub.FilledAsync();

        Assert.Equal(1, (await ImportAsync(club, TestKit.Json())).Value.Revision);
    }

    [Fact]
    public async Task ImportKit_AChangedFile_IsTheNextRevisionAndTheFirstStays()
    {
        await using var club = await TestClub.FilledAsync();

        var imported = (await ImportAsync(club, TestKit.Json().Replace("Quern-30", "Quern-30 b", StringComparison.Ordinal))).Value;

        Assert.Equal((2, "Quern-30 b"), (imported.Revision, imported.Name));
        Assert.Equal("Quern-30", (await club.Run(club.Get<OpenKit>(), club.Ids.Coordinator, new OpenKitInput(imported.KitId, 1))).Value.Kit.Name);
    }

    private static async Task<Outcome<ImportedKit>> ImportAsync(TestClub club, string file)
    {
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(file));
        return await club.Run(club.Get<ImportKit>(), club.Ids.Coordinator, new ImportKitInput(stream));
    }
}
