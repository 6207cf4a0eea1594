using System.Globalization;
using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using CsvHelper;

namespace ClubBench.Calculation.Tests.Devices;

public class TransistorsTests
{
    [Fact]
    public void All_Rows_HaveSourcesAndPlausibleFigures()
    {
        Assert.Equal(41, Transistors.All.Count);
        Assert.All(Transistors.All, t =>
        {
            Assert.NotNull(Sources.Find(t.Source.SourceId));
            Assert.True(t.TransitionFrequencyMin is null || t.TransitionFrequencyTypical is null || t.TransitionFrequencyMin <= t.TransitionFrequencyTypical);
            Assert.True(t.CurrentGainMin is null || t.CurrentGainMax is null || t.CurrentGainMin <= t.CurrentGainMax);
            Assert.True(t.JunctionToCase is null || t.JunctionToAmbient is null || t.JunctionToCase < t.JunctionToAmbient);
        });
    }

    [Theory]
    [InlineData("BD139-16", "BD139")]
    [InlineData("bd139", "BD139")]
    [InlineData("BC337-25", "BC337-25")]
    public void Find_GroupOrCase_FindsTheType(string asked, string type) => Assert.Equal(type, Transistors.Find(asked)!.Type);

    [Fact]
    public void Find_UnknownType_IsNull() => Assert.Null(Transistors.Find("QX-1"));

    [Fact]
    [Evidence(typeof(Transistor), EvidenceKind.ClosedFormLimit)]
    public void TransitionFrequencyForVerdict_TypicalOnly_IsHalved()
    {
        Assert.Equal(95, Transistors.Find("BD139")!.TransitionFrequencyForVerdict!.Value.Megahertz, 1e-9);
        Assert.Equal(300, Transistors.Find("2N3904")!.TransitionFrequencyForVerdict!.Value.Megahertz, 1e-9);
        Assert.Null(Transistors.Find("IRF510")!.TransitionFrequencyForVerdict);
    }

    [Fact]
    public void IsFromMemory_SingleFieldOrWholeRow_IsTold()
    {
        Assert.True(Transistors.Find("PN2222A")!.IsFromMemory("ft"));
        Assert.False(Transistors.Find("PN2222A")!.IsFromMemory("max_power"));
        Assert.True(Transistors.Find("RD06HHF1")!.IsFromMemory("max_power"));
    }

    [Fact]
    [Evidence(typeof(Transistor), EvidenceKind.IndependentRecomputation)]
    public void IsFromMemory_RawTableReadAgain_AgreesInEveryRow()
    {
        using var csv = new CsvReader(new StreamReader(typeof(Sources).Assembly.GetManifestResourceStream(TableName())!), CultureInfo.InvariantCulture);
        csv.Read();
        csv.ReadHeader();
        while (csv.Read())
        {
            var whole = csv.GetField("status") == "from_memory";
            var marked = $" {csv.GetField("fields_from_memory")} ";
            foreach (var field in new[] { "ft", "hfe", "c_out", "max_power", "rth_ja" })
                Assert.Equal(whole || marked.Contains($" {field} ", StringComparison.Ordinal), Transistors.Find(csv.GetField("type")!)!.IsFromMemory(field));
        }
    }

    [Fact]
    [Evidence(typeof(Transistor), EvidenceKind.Identity)]
    public void TransitionFrequencyForVerdict_EveryType_NeverExceedsWhatTheSheetStates() => Assert.All(Transistors.All, t =>
    {
        Assert.Equal(t.TransitionFrequencyMin is null && t.TransitionFrequencyTypical is null, t.TransitionFrequencyForVerdict is null);
        Assert.True(t.TransitionFrequencyForVerdict is not { } verdict || verdict <= (t.TransitionFrequencyMin ?? verdict));
        Assert.True(t.TransitionFrequencyForVerdict is not { } judged || judged <= (t.TransitionFrequencyTypical ?? judged));
    });

    private static string TableName() => typeof(Sources).Assembly.GetManifestResourceNames().Single(n => n.EndsWith(".transistors.csv", StringComparison.Ordinal));
}
