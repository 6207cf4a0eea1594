using ClubBench.Planning.Drawings;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.StageKinds.LowPassLadder;

/// <summary>Draws the ladder and its response.</summary>
internal static class LowPassDrawing
{
    private const int Column = 10;

    public static Schematic Of(StageDocument before, StageDocument? after)
    {
        var stage = LowPassStage.Read(after ?? before);
        var sketch = new SchematicSketch(LowPassLadderKind.DescriptionOf, before, after);
        var last = stage.Capacitors.Count - 1;
        sketch.Terminal(0, 4, LowPassLadderKind.Input);
        sketch.Wire(0, 4, 3, 4);
        for (var i = 0; i <= last; i++)
        {
            var x = 3 + (i * Column);
            sketch.Part(SymbolKind.Capacitor, x, 4, Orientation.Down, stage.Capacitors[i]);
            sketch.Ground(x, 8);
            if (i >= stage.Coils.Count) continue;
            sketch.Wire(x, 4, x + 3, 4);
            sketch.Part(SymbolKind.ToroidCoil, x + 3, 4, Orientation.Across, stage.Coils[i]);
            sketch.Wire(x + 7, 4, x + Column, 4);
        }

        var end = 3 + (last * Column);
        sketch.Wire(end, 4, end + 3, 4);
        sketch.Terminal(end + 3, 4, LowPassLadderKind.Output);
        return sketch.Finish();
    }
}
