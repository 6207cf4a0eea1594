using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

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
}
