using System.Globalization;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Drawings;

/// <summary>Collects a schematic while a stage kind draws; marks parts that differ between before and after.</summary>
internal sealed class SchematicSketch(StageDescription description, StageDocument before, StageDocument? after)
{
    private readonly List<Symbol> _symbols = [];
    private readonly List<Wire> _wires = [];
    private readonly List<TestPoint> _points = [];

    /// <summary>Draws a part of the stage as it will be, with its old value where it changes.</summary>
    public void Part(SymbolKind kind, int x, int y, Orientation orientation, Part part)
    {
        var old = before.Parts.FirstOrDefault(p => p.Designator == part.Designator);
        var changed = after is not null && !PartChanges.Same(old, part);
        var marking = !changed ? Marking.Untouched : old is null ? Marking.Added : Marking.Changed;
        _symbols.Add(new Symbol(kind, x, y, orientation, part.Designator, TextOf(part), changed && old is not null ? TextOf(old) : null, marking));
    }

    /// <summary>Draws the first part of a role, if the stage has one; tells whether it had.</summary>
    public bool Role(SymbolKind kind, int x, int y, Orientation orientation, string role)
    {
        if ((after ?? before).OneInRole(role) is not { } part) return false;
        Part(kind, x, y, orientation, part);
        return true;
    }

    /// <summary>A symbol without a part: ground, supply, antenna, named block.</summary>
    public void Sign(SymbolKind kind, int x, int y, string text = "") =>
        _symbols.Add(new Symbol(kind, x, y, Orientation.Down, "", text, null, Marking.Untouched));

    /// <summary>Ground below a point.</summary>
    public void Ground(int x, int y) => Sign(SymbolKind.Ground, x, y);

    /// <summary>A labelled end that leads to another stage.</summary>
    public void Terminal(int x, int y, string port) => Sign(SymbolKind.Terminal, x, y, port);

    /// <summary>A straight wire.</summary>
    public void Wire(int x1, int y1, int x2, int y2) => _wires.Add(new Wire(x1, y1, x2, y2));

    /// <summary>A lettered test point.</summary>
    public void Point(string letter, int x, int y) => _points.Add(new TestPoint(letter, x, y));

    /// <summary>The finished schematic.</summary>
    public Schematic Finish() => new(_symbols, _wires, _points);

    private string TextOf(Part part) =>
        PartText.Short(part, description.Role(part.Role)?.Class ?? PartClass.Other, CultureInfo.InvariantCulture);
}
