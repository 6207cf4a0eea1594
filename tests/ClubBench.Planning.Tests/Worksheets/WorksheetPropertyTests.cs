using ClubBench.Planning.Figures;
using ClubBench.Planning.Worksheets;
using CsCheck;

namespace ClubBench.Planning.Tests.Worksheets;

public class WorksheetPropertyTests
{
    public static TheoryData<string> Ids => [.. WorksheetList.All.Select(w => w.Id)];

    /// <summary>Three decades either side of the defaults: figures, or a named field with a reason; the net for numbers beyond everything stays unused.</summary>
    [Theory]
    [MemberData(nameof(Ids))]
    public void Run_ValuesWithinThreeDecades_GivesFiniteFiguresOrNamesFields(string id)
    {
        var sheet = WorksheetList.Find(id)!;
        var computed = 0;
        var names = sheet.Inputs.Select(i => i.Name).ToHashSet(StringComparer.Ordinal);

        Gen.Select(Gen.Double[-3, 3].Array[sheet.Inputs.Count], Gen.Int[0, 2]).Sample(
            (decades, spread) =>
            {
                var outcome = sheet.Run(Values(sheet, decades, spread));

                Assert.All(outcome.Messages, m => Assert.Contains(m.Path, names));
                Assert.DoesNotContain(outcome.Messages, m => m.Code == "worksheet-message.out-of-reach");
                if (!outcome.Succeeded) return;
                computed++;
                Assert.All(outcome.Value.Figures, f => Assert.True(double.IsFinite(f.Si), f.Name));
            },
            iter: 300, threads: 1);

        Assert.True(computed > 10, $"Only {computed} of the circuits drawn could be computed.");
    }

    [Fact]
    public void Run_ValuesBeyondEveryNumber_AreRefusedToo()
    {
        var outcome = WorksheetList.Find("resonance")!.Run(new Dictionary<string, double>(StringComparer.Ordinal) { ["inductance"] = 1e300, ["capacitance"] = 1e300 });

        Assert.Equal("inductance,capacitance", string.Join(',', outcome.Messages.Select(m => m.Path)));
        Assert.All(outcome.Messages, m => Assert.Equal("worksheet-message.out-of-reach", m.Code));
    }

    // Narrow draws too: with all inputs three decades apart few circuits are left that compute at all.
    private static Dictionary<string, double> Values(Worksheet sheet, double[] decades, int spread) =>
        sheet.Inputs.Zip(decades, (input, d) => (input, si: input.DefaultSi * Math.Pow(10, d * Math.Pow(0.2, spread))))
            .ToDictionary(x => x.input.Name, x => x.input.Kind == QuantityKind.Count ? Math.Round(x.si) : x.si, StringComparer.Ordinal);
}
