using System.Reflection;
using System.Xml.Linq;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Tests.Conventions;

/// <summary>Methods of calculation say what they are and where they come from.</summary>
public class DocumentationConventions
{
    private static readonly Assembly Product = typeof(Sources).Assembly;
    private static readonly Dictionary<string, string> Comments = Read();

    [Fact]
    public void PublicMethodClasses_All_NameMethodSourceOrTable()
    {
        var silent = Product.GetExportedTypes()
            .Where(t => t is { IsAbstract: true, IsSealed: true, IsNested: false })
            .Where(t => t.Name != "Guard" && !CommentsOf(t).Any(NamesItsOrigin))
            .Select(t => t.FullName);

        Assert.Empty(silent);
    }

    [Theory]
    [InlineData("Method: chain matrix.", true)]
    [InlineData("Rows of Tables/cores.csv.", true)]
    [InlineData("Where it comes from: unknown.", false)]
    public void NamesItsOrigin_Examples_AreToldApart(string comment, bool named) => Assert.Equal(named, NamesItsOrigin(comment));

    // The rows of a table carry their sources themselves.
    private static bool NamesItsOrigin(string comment) =>
        comment.Contains("Source:", StringComparison.Ordinal) || comment.Contains("Method:", StringComparison.Ordinal) || comment.Contains(".csv", StringComparison.Ordinal);

    private static IEnumerable<string> CommentsOf(Type type) =>
        Comments.Where(c => c.Key == $"T:{type.FullName}" || c.Key.Contains($":{type.FullName}.", StringComparison.Ordinal)).Select(c => c.Value);

    private static Dictionary<string, string> Read() =>
        XDocument.Load(Path.ChangeExtension(Product.Location, ".xml")).Descendants("member").ToDictionary(m => m.Attribute("name")!.Value, m => m.Value, StringComparer.Ordinal);
}
