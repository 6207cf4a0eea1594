using ClubBench.Planning.Kits;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Tests.Kits;

public class DemoKitsTests
{
    private static readonly Kit Quern = DemoKits.QuernThirty;

    [Fact]
    public void QuernThirty_File_IsWrittenAsThisProgramWritesIt()
    {
        using var file = new StreamReader(DemoKits.OpenQuernThirty());

        Assert.Equal(file.ReadToEnd(), KitFiles.TextOf(Quern));
    }

    [Fact]
    public void QuernThirty_File_IsSoundWithoutAWord()
    {
        using var file = DemoKits.OpenQuernThirty();

        Assert.Empty(KitFile.Read(file).Messages);
    }

    [Fact]
    public void QuernThirty_Paths_RunAsTheCircuitDoes()
    {
        var paths = SignalPaths.Trace(Quern);

        Assert.Equal("A1 A2 A3 A4 A5", string.Join(' ', paths.Transmit.Stages));
        Assert.Equal("A5 A6 A7 A8 A9 A10", string.Join(' ', paths.Receive.Stages));
        Assert.Equal("A8: A1 A2", string.Join("; ", paths.Oscillators.Select(o => $"{o.Mixer}: {string.Join(' ', o.Path.Stages)}")));
    }

    [Theory]
    [InlineData("A1", 15)]
    [InlineData("A5", 7)]
    [InlineData("A12", 6)]
    public void QuernThirty_Stage_HasItsParts(string stage, int parts) => Assert.Equal(parts, Quern.Stage(stage).Parts.Count);

    [Fact]
    public void QuernThirty_OutputFilter_ComesBeforeTheFinalIsKeyed()
    {
        var order = Quern.BringUp.ToList();

        Assert.True(order.IndexOf("A5") < order.IndexOf("A4"));
    }

    [Fact]
    public void QuernThirty_PrintedInductances_AgreeWithTurnsAndCoreTable()
    {
        var indexByCore = new Dictionary<string, double>(StringComparer.Ordinal) { ["T50-6"] = 4.0e-9, ["FT37-43"] = 350e-9 };
        var windings = Quern.Stages.SelectMany(s => s.Parts).Where(p => p.Value(PartValue.Turns) is not null);

        Assert.All(windings, w => Assert.Equal(indexByCore[w.Type] * Math.Pow(w.Need(PartValue.Turns), 2), w.Need(PartValue.Inductance), 1e-9));
    }

    [Fact]
    public void DrawerStock_Lines_HoldWhatTheClubHas()
    {
        var shelf = DemoKits.DrawerStock;

        Assert.Equal(40, shelf.Quantity(PartClass.Winding, "T37-6", null));
        Assert.Equal(9, shelf.Quantity(PartClass.Crystal, "HC-49/U", 7.030e6));
        Assert.Equal(0, shelf.Quantity(PartClass.Capacitor, "NP0", 510e-12));
        Assert.Equal(140, shelf.Quantity(PartClass.Winding, "wire", 0.4e-3));
        Assert.DoesNotContain(shelf.Tuned(PartClass.Capacitor), l => l.Type == "X7R");
    }
}
