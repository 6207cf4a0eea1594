using System.Globalization;
using ClubBench.Planning.Text;
using ClubBench.Planning.Worksheets;

namespace ClubBench.Planning.Tests.Worksheets;

public class WorksheetTests
{
    private static readonly Dictionary<string, double> Defaults = new(StringComparer.Ordinal);

    [Fact]
    public void Run_EveryWorksheetWithItsDefaults_GivesFiguresWithWorking() => Assert.All(WorksheetList.All, w =>
    {
        var figures = w.Run(Defaults).Value;

        Assert.NotEmpty(figures);
        Assert.All(figures, f => Assert.Equal(w.Id, f.Working!.MethodId));
        Assert.All(figures, f => Assert.NotEmpty(QuantityText.Format(f, CultureInfo.InvariantCulture)));
    });

    [Fact]
    public void All_IdsInputsAndFigures_HaveTexts()
    {
        var codes = WorksheetList.All.SelectMany(w => new[] { "worksheet." + w.Id, "method." + w.Id, "worksheet-group." + w.Group }
            .Concat(w.Inputs.Select(i => "worksheet-input." + i.Name))
            .Concat(w.Run(Defaults).Value.Select(f => "figure." + f.Name)));

        Assert.Equal("", string.Join(", ", codes.Where(c => !Phrases.Has(c)).Distinct(StringComparer.Ordinal)));
    }

    [Fact]
    public void All_Ids_AreUnique() => Assert.Equal(WorksheetList.All.Count, WorksheetList.All.Select(w => w.Id).Distinct(StringComparer.Ordinal).Count());

    [Fact]
    public void Run_EveryInputBroken_NamesEveryOne() => Assert.All(WorksheetList.All, w =>
    {
        var broken = w.Inputs.ToDictionary(i => i.Name, _ => -1.0, StringComparer.Ordinal);

        var messages = w.Run(broken).Messages;

        Assert.Equal(string.Join(',', w.Inputs.Select(i => i.Name)), string.Join(',', messages.Select(m => m.Path)));
        Assert.All(messages, m => Assert.NotEmpty(Phrases.Say(m, culture: CultureInfo.InvariantCulture)));
    });

    [Theory]
    [InlineData("output-stage", "saturation", 20)]
    [InlineData("chebyshev-low-pass", "order", 4)]
    public void Run_InputsWithoutSolution_SaySo(string id, string input, double si)
    {
        var outcome = WorksheetList.Find(id)!.Run(new Dictionary<string, double>(StringComparer.Ordinal) { [input] = si });

        Assert.Equal("worksheet-message.no-solution", outcome.Messages.Single().Code);
    }

    [Theory]
    [InlineData("resonance", "resonance", 10.12e6, 0.01e6)]
    [InlineData("capacitance-for-resonance", "capacitance", 107.3e-12, 0.1e-12)]
    [InlineData("toroid-turns", "turns", 15, 0)]
    [InlineData("output-stage", "output", 1.18, 0.005)]
    [InlineData("series-tuned-tap", "capacitance", 36.4e-12, 0.05e-12)]
    [InlineData("emission-limit", "limit", 43, 0)]
    public void Run_KitValues_GiveTheFiguresCheckedForTheKit(string id, string figure, double si, double within) =>
        Assert.Equal(si, WorksheetList.Find(id)!.Run(Defaults).Value.Single(f => f.Name == figure).Si, within);
}
