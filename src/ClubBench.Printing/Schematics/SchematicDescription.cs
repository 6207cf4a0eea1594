using ClubBench.Planning.Drawings;

namespace ClubBench.Printing.Schematics;

/// <summary>Says in one sentence what a schematic shows, for those who do not see it.</summary>
internal static class SchematicDescription
{
    public static string Of(Schematic schematic)
    {
        var named = schematic.Symbols.Where(s => s.Designator.Length > 0).ToList();
        var changed = named.Where(s => s.Marking is Marking.Changed or Marking.Added).Select(Changed).ToList();
        return changed.Count == 0
            ? Texts.Say("schematic.unchanged", named.Count)
            : Texts.Say("schematic.changed", named.Count, string.Join(", ", changed));
    }

    private static string Changed(Symbol symbol) => symbol.OldValue is null
        ? Texts.Say("schematic.added", symbol.Designator, symbol.Value)
        : Texts.Say("schematic.replaced", symbol.Designator, symbol.Value, symbol.OldValue);
}
