using System.Xml.Linq;

namespace ClubBench.Planning.Tests.Conventions;

/// <summary>What the repository looks like: its top level, the direction of references, the size of files.</summary>
public class LayoutConventions
{
    private const int MostLines = 250;
    private const int MostMethodLines = 60;

    private static readonly Dictionary<string, string[]> Permitted = new(StringComparer.Ordinal)
    {
        ["ClubBench.Calculation"] = [],
        ["ClubBench.Planning"] = ["ClubBench.Calculation"],
        ["ClubBench.Club"] = ["ClubBench.Planning"],
        ["ClubBench.Printing"] = ["ClubBench.Planning"],
        ["ClubBench.Web"] = ["ClubBench.Club", "ClubBench.Printing"],
    };

    [Fact]
    public void TopLevel_Visible_HoldsExactlyThePartsOfTheHouse()
    {
        string[] agreed = ["ClubBench.sln", "DEVELOPERS.md", "README.md", "deploy", "src", "tests", "wwwroot-assets"];

        var visible = Repository.Paths.Select(p => p.Split('/')[0]).Where(n => !n.StartsWith('.')).Distinct().Order(StringComparer.Ordinal);

        Assert.Equal(agreed, visible);
    }

    [Fact]
    public void Projects_OfTheProduct_AreTheFive() =>
        Assert.Equal(Permitted.Keys.Order(StringComparer.Ordinal), ProjectFiles().Select(f => Path.GetFileNameWithoutExtension(f.Name)).Order(StringComparer.Ordinal));

    [Fact]
    public void References_OfEveryProject_RunOneWay()
    {
        var wrong =
            from project in ProjectFiles()
            from reference in XDocument.Parse(project.Text).Descendants("ProjectReference")
            let name = Path.GetFileNameWithoutExtension(reference.Attribute("Include")!.Value)
            where !Permitted[Path.GetFileNameWithoutExtension(project.Name)].Contains(name)
            select $"{project.Name} -> {name}";

        Assert.Empty(wrong);
    }

    [Fact]
    public void References_OfThePlanningAssembly_AreCalculationAlone() =>
        Assert.Equal(
            ["ClubBench.Calculation"],
            typeof(Outcome<>).Assembly.GetReferencedAssemblies().Select(a => a.Name!).Where(n => n.StartsWith("ClubBench", StringComparison.Ordinal)));

    [Fact]
    public void Files_UnderSource_FitInAHead()
    {
        var long_ = Repository.Sources.Select(f => (f.Path, Lines: f.Lines.Count)).Where(f => f.Lines > MostLines).Select(f => $"{f.Path}: {f.Lines}");

        Assert.Empty(long_);
    }

    [Fact]
    public void Methods_UnderSource_FitOnAScreen()
    {
        var long_ =
            from file in Repository.Sources.Where(f => f.Name.EndsWith(".cs", StringComparison.Ordinal))
            from member in MemberBodies.Of(file.Lines)
            where member.Lines > MostMethodLines
            select $"{file.Path}({member.Line}): {member.Lines}";

        Assert.Empty(long_);
    }

    [Fact]
    public void MemberBodies_MethodBesideNestedType_CountsOnlyTheMethod()
    {
        string[] lines = ["class A", "{", "    void F()", "    {", "        G();", "    }", "", "    class B", "    {", "        int X;", "    }", "}"];

        Assert.Equal([(4, 3)], MemberBodies.Of(lines).Select(m => (m.Line, m.Lines)));
    }

    private static IEnumerable<Repository.TrackedFile> ProjectFiles() => Repository.Under("src/").Where(f => f.Name.EndsWith(".csproj", StringComparison.Ordinal));
}
