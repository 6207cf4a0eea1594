using System.Xml.Linq;
using ClubBench.Planning.Drawings;
using ClubBench.Printing.Fonts;
using ClubBench.Printing.Layout;
using ClubBench.Printing.Schematics;
using ClubBench.Printing.Tests.Samples;

namespace ClubBench.Printing.Tests.Schematics;

public class SchematicDrawingTests
{
    public static TheoryData<SymbolKind, Orientation> AllSymbols()
    {
        var data = new TheoryData<SymbolKind, Orientation>();
        foreach (var kind in Enum.GetValues<SymbolKind>())
            foreach (var orientation in Enum.GetValues<Orientation>()) data.Add(kind, orientation);
        return data;
    }

    [Theory]
    [MemberData(nameof(AllSymbols))]
    public void Of_EverySymbolKind_DrawsSomethingInsideTheView(SymbolKind kind, Orientation orientation)
    {
        var drawing = SchematicDrawing.Of(One(kind, orientation, Marking.Untouched), "test");

        var svg = XDocument.Parse(drawing.Svg).Root!;
        Assert.Contains(svg.Elements(), e => e.Name.LocalName is "path" or "circle");
        Assert.True(drawing.Width > 10 && drawing.Height > 10);
        var body = new PlacedSymbol(One(kind, orientation, Marking.Untouched).Symbols[0]).Body;
        var view = svg.Attribute("viewBox")!.Value.Split(' ').Select(v => float.Parse(v, System.Globalization.CultureInfo.InvariantCulture)).ToArray();
        Assert.InRange(body.X, view[0], view[0] + view[2]);
        Assert.InRange(body.Bottom, view[1], view[1] + view[3]);
    }

    [Fact]
    public void Of_ChangedPart_IsBoldWithOldValueStruck()
    {
        var changed = SchematicDrawing.Of(One(SymbolKind.Capacitor, Orientation.Down, Marking.Changed), "test").Svg;
        var untouched = SchematicDrawing.Of(One(SymbolKind.Capacitor, Orientation.Down, Marking.Untouched), "test").Svg;

        Assert.Contains("stroke-width=\"2.6\"", changed, StringComparison.Ordinal);
        Assert.Contains(">270 pF<", changed, StringComparison.Ordinal);
        Assert.Contains("font-weight=\"600\"", changed, StringComparison.Ordinal);
        Assert.DoesNotContain("stroke-width=\"2.6\"", untouched, StringComparison.Ordinal);
        Assert.DoesNotContain("var(--ink,", untouched, StringComparison.Ordinal);
    }

    [Fact]
    public void Of_RemovedPart_IsCrossedOut()
    {
        var removed = Paths(One(SymbolKind.Resistor, Orientation.Across, Marking.Removed));

        Assert.True(removed > Paths(One(SymbolKind.Resistor, Orientation.Across, Marking.Untouched)));
    }

    [Fact]
    public void Of_ThreeEnds_MeetInADot()
    {
        var tee = new Schematic([], [new Wire(0, 0, 4, 0), new Wire(2, 0, 2, 3)], []);
        var corner = new Schematic([], [new Wire(0, 0, 4, 0), new Wire(4, 0, 4, 3)], []);

        Assert.Contains("<circle", SchematicDrawing.Of(tee, "test").Svg, StringComparison.Ordinal);
        Assert.DoesNotContain("<circle", SchematicDrawing.Of(corner, "test").Svg, StringComparison.Ordinal);
    }

    [Fact]
    public void Of_TestPoint_IsLettered() =>
        Assert.Contains(">T7<", SchematicDrawing.Of(new Schematic([], [], [new TestPoint("T7", 2, 2)]), "test").Svg, StringComparison.Ordinal);

    [Fact]
    public void Of_Names_AreNeverTurned()
    {
        var svg = XDocument.Parse(SchematicDrawing.Of(SampleCards.LowPass.Drawing, "Low-pass").Svg).Root!;

        Assert.All(svg.Elements().Where(e => e.Name.LocalName == "text"), t => Assert.Null(t.Attribute("transform")));
    }

    [Fact]
    public void Of_Drawing_HasRoleTitleAndDescriptionOfTheChanges()
    {
        var svg = XDocument.Parse(SchematicDrawing.Of(SampleCards.LowPass.Drawing, "Low-pass").Svg).Root!;

        Assert.Equal("img", svg.Attribute("role")!.Value);
        Assert.Equal("Low-pass", svg.Elements().Single(e => e.Name.LocalName == "title").Value);
        Assert.Contains("C15 180 + 22 pF instead of 270 pF", svg.Elements().Single(e => e.Name.LocalName == "desc").Value, StringComparison.Ordinal);
    }

    [Fact]
    public void Of_Colours_AreAllVariablesWithFallBack()
    {
        var svg = SchematicDrawing.Of(SampleCards.LowPass.Drawing, "Low-pass").Svg;

        Assert.Empty(FixedColours.In(svg));
        Assert.Contains("var(--ink,#17212A)", svg, StringComparison.Ordinal);
    }

    [Fact]
    public void Of_LabelOverATestPoint_MovesAside()
    {
        var terminal = new Symbol(SymbolKind.Terminal, 0, 0, Orientation.Down, "", "transmitter", null, Marking.Untouched);

        Assert.True(LeftOf(new Schematic([terminal], [new Wire(0, 0, 6, 0)], [])) > -5);
        Assert.True(LeftOf(new Schematic([terminal, Capacitor(3, 0)], [new Wire(0, 0, 6, 0)], [new TestPoint("T1", 1, 0)])) < -50);
    }

    [Fact]
    public void Of_NothingToDraw_GivesAnEmptyPicture() => Assert.Contains("<svg", SchematicDrawing.Of(Schematic.Empty, "test").Svg, StringComparison.Ordinal);

    private static float LeftOf(Schematic schematic)
    {
        var text = XDocument.Parse(SchematicDrawing.Of(schematic, "test").Svg).Root!.Elements().Single(e => e.Name.LocalName == "text" && e.Value == "transmitter");
        var x = float.Parse(text.Attribute("x")!.Value, System.Globalization.CultureInfo.InvariantCulture);
        return text.Attribute("text-anchor")!.Value == "end" ? x - PlexSans.Measure("transmitter", 12.5f, FontWeight.Regular) : x;
    }

    private static Symbol Capacitor(int x, int y) => new(SymbolKind.Capacitor, x, y, Orientation.Down, "", "", null, Marking.Untouched);

    private static int Paths(Schematic schematic) => SchematicDrawing.Of(schematic, "test").Svg.Split("<path").Length;

    private static Schematic One(SymbolKind kind, Orientation orientation, Marking marking) =>
        new([new Symbol(kind, 2, 2, orientation, "C15", "200 pF", marking == Marking.Changed ? "270 pF" : null, marking)], [], []);
}
