using System.Text.RegularExpressions;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Tests.Conventions;

/// <summary>What may not be written in the sources, or only in one place.</summary>
public partial class SourceConventions
{
    private const string Worksheets = "src/ClubBench.Planning/Worksheets/";

    /// <summary>Ids that are also the name of something else, and the files that speak of that: the supply terminal of a kit, the supply set for a
    /// first try, the supply voltage entered in a worksheet, and worksheets of the same subject.</summary>
    private static readonly Dictionary<string, string[]> AlsoOtherNames = new(StringComparer.Ordinal)
    {
        ["supply"] = ["src/ClubBench.Planning/Kits/Connection.cs", "src/ClubBench.Printing/Sheets/CardFigures.cs", Worksheets + "TransmitterWorksheets.cs"],
        ["series-tuned-tap"] = [Worksheets + "ReceiverWorksheets.cs"],
        ["audio-band-pass"] = [Worksheets + "ReceiverWorksheets.cs"],
    };

    [Fact]
    public void StageKindIds_OutsideTheirFolders_AreNotWritten()
    {
        var strays =
            from kind in StageKindList.All
            let id = kind.Description.Id
            let home = $"src/ClubBench.Planning/StageKinds/{kind.GetType().Namespace!.Split('.')[^1]}/"
            from file in Repository.Sources
            where !file.Path.StartsWith(home, StringComparison.Ordinal) && Names(file.Text, id) && !AlsoOtherNames.GetValueOrDefault(id, []).Contains(file.Path)
            select $"{file.Path}: {id}";

        Assert.Empty(strays);
    }

    [Fact]
    public void StageKindIds_TheScan_FindsThemAtHome() =>
        Assert.All(StageKindList.All, k => Assert.Contains(Repository.Sources, f => Names(f.Text, k.Description.Id)));

    [Fact]
    public void Web_OutsideItsComposition_ReachesStorageThroughUseCasesOnly()
    {
        var around =
            from file in Repository.Sources
            where file.Path.StartsWith("src/ClubBench.Web/", StringComparison.Ordinal) && !IsComposition(file.Path) && Storage().IsMatch(file.Text)
            select file.Path;

        Assert.Empty(around);
    }

    [Fact]
    public void Web_TheScan_FindsStorageInTheClub() =>
        Assert.Contains(Repository.Sources, f => f.Path.StartsWith("src/ClubBench.Club/", StringComparison.Ordinal) && Storage().IsMatch(f.Text));

    [Fact]
    public void TrackedFiles_All_NameNoPlaceOfOneMachine()
    {
        var places = from file in Repository.Files from Match m in MachinePath().Matches(file.Text) select $"{file.Path}: {m.Value}";

        Assert.Empty(places);
    }

    [Fact]
    public void TrackedFiles_All_NameNoPackageSource()
    {
        var hosts =
            from file in Repository.Files
            from Match m in PackageHost().Matches(file.Text)
            select $"{file.Path}: {m.Value}";

        Assert.Empty(hosts);
        Assert.DoesNotContain(Repository.Files, f => f.Name.Equals("NuGet.config", StringComparison.OrdinalIgnoreCase) || f.Name == ".npmrc");
    }

    [Theory]
    [InlineData("see /wo" + "rk/notes", true)]
    [InlineData("cd /tm" + "p/x", true)]
    [InlineData("href=\"/boards/wo" + "rk/3\"", false)]
    public void MachinePath_Examples_AreToldApart(string text, bool found) => Assert.Equal(found, MachinePath().IsMatch(text));

    [Theory]
    [InlineData("https://api.nu" + "get.org/v3", true)]
    [InlineData("https://registry.npm" + "js.org/x", true)]
    [InlineData("http://www.w3.org/2000/svg", false)]
    public void PackageHost_Examples_AreToldApart(string text, bool found) => Assert.Equal(found, PackageHost().IsMatch(text));

    private static bool Names(string text, string id) =>
        text.Contains($"\"{id}\"", StringComparison.Ordinal) || text.Contains($"'{id}'", StringComparison.Ordinal);

    // Where the parts are put together: hosting, the features that register services, and the commands of the program.
    private static bool IsComposition(string path) =>
        path.StartsWith("src/ClubBench.Web/Hosting/", StringComparison.Ordinal)
        || path.StartsWith("src/ClubBench.Web/Commands/", StringComparison.Ordinal)
        || path.EndsWith("Feature.cs", StringComparison.Ordinal)
        || path == "src/ClubBench.Web/Program.cs";

    [GeneratedRegex(@"\b(DbContext|ClubContexts?|ClubStore|EntityFrameworkCore|Club\.Persistence)\b", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex Storage();

    [GeneratedRegex(@"(?<![A-Za-z0-9_.~/*-])/(work|tmp|root|farm|home)/|[A-Z]:\\Users\\", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex MachinePath();

    [GeneratedRegex(@"\b(nu[g]et|npm[j]s|py[p]i|yarn[p]kg|pythonho[s]ted)\.(org|com)\b", RegexOptions.ExplicitCapture | RegexOptions.IgnoreCase, 1000)]
    private static partial Regex PackageHost();
}
