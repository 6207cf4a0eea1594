using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Kits;

/// <summary>Checks a whole kit: its inner references, and every stage by its kind. Collects all issues; paths are those of the kit file.</summary>
public static class KitValidation
{
    /// <summary>Issues of a kit; empty when it is sound.</summary>
    public static IReadOnlyList<FieldMessage> Check(Kit kit) => Check(kit, StageKindList.Find);

    internal static IReadOnlyList<FieldMessage> Check(Kit kit, Func<string, IStageKind?> kinds) => [.. CheckReferences(kit), .. Stages(kit, kinds), .. Ports(kit, kinds)];

    /// <summary>Issues that show without knowing any stage kind.</summary>
    internal static IEnumerable<FieldMessage> CheckReferences(Kit kit) => [.. Keys(kit), .. Designators(kit), .. Conversions(kit), .. Connections(kit), .. BringUp(kit)];

    private static IEnumerable<FieldMessage> Keys(Kit kit)
    {
        var seen = new HashSet<string>(StringComparer.Ordinal);
        foreach (var (stage, i) in kit.Stages.Select((s, i) => (s, i)))
            if (stage.Key.Any(c => !char.IsAsciiLetterOrDigit(c) && c != '-')) yield return FieldMessage.Error($"stages[{i}].key", "kit.key-malformed", ("key", stage.Key));
            else if (!seen.Add(stage.Key)) yield return FieldMessage.Error($"stages[{i}].key", "kit.key-twice", ("key", stage.Key));
    }

    private static IEnumerable<FieldMessage> Designators(Kit kit)
    {
        var seen = new Dictionary<string, string>(StringComparer.Ordinal);
        foreach (var (stage, i) in kit.Stages.Select((s, i) => (s, i)))
            foreach (var (part, j) in stage.Parts.Select((p, j) => (p, j)))
                if (!seen.TryAdd(part.Designator, stage.Key))
                    yield return FieldMessage.Error($"stages[{i}].parts[{j}].designator", "kit.designator-twice", ("part", part.Designator), ("first", seen[part.Designator]), ("second", stage.Key));
    }

    private static IEnumerable<FieldMessage> Conversions(Kit kit)
    {
        foreach (var (conversion, i) in kit.Scheme.Conversions.Select((c, i) => (c, i)))
        {
            if (!Has(kit, conversion.Mixer)) yield return NoStage($"scheme.conversions[{i}].mixer", conversion.Mixer);
            if (!Has(kit, conversion.Oscillator)) yield return NoStage($"scheme.conversions[{i}].oscillator", conversion.Oscillator);
            if ((conversion.Side == MixingSide.Same) == (conversion.IntermediateFrequencyHz is not null))
                yield return FieldMessage.Error(
                    $"scheme.conversions[{i}].intermediateFrequencyHz",
                    conversion.Side == MixingSide.Same ? "kit.conversion-without-frequency" : "kit.conversion-needs-frequency");
        }
    }

    private static IEnumerable<FieldMessage> Connections(Kit kit) =>
        from end in Ends(kit) where !end.Port.IsTerminal && !Has(kit, end.Port.Stage) select NoStage(end.Path, end.Port.Stage);

    private static IEnumerable<FieldMessage> BringUp(Kit kit)
    {
        var seen = new HashSet<string>(StringComparer.Ordinal);
        foreach (var (key, i) in kit.BringUp.Select((k, i) => (k, i)))
            if (!Has(kit, key)) yield return NoStage($"bringUp[{i}]", key);
            else if (!seen.Add(key)) yield return FieldMessage.Error($"bringUp[{i}]", "kit.stage-twice", ("stage", key));
        foreach (var stage in kit.Stages.Where(s => !seen.Contains(s.Key)))
            yield return FieldMessage.Warning("bringUp", "kit.bring-up-incomplete", ("stage", stage.Key));
    }

    private static IEnumerable<FieldMessage> Stages(Kit kit, Func<string, IStageKind?> kinds) =>
        kit.Stages.SelectMany((stage, i) => kinds(stage.Kind) is { } kind
            ? kind.Validate(stage, $"stages[{i}]")
            : [FieldMessage.Error($"stages[{i}].kind", "kit.kind-unknown", ("kind", stage.Kind), ("known", string.Join(", ", StageKindList.All.Select(k => k.Description.Id))))]);

    private static IEnumerable<FieldMessage> Ports(Kit kit, Func<string, IStageKind?> kinds) =>
        from end in Ends(kit)
        let stage = kit.Stages.FirstOrDefault(s => s.Key == end.Port.Stage)
        let description = stage is null ? null : kinds(stage.Kind)?.Description
        where description is not null && description.Port(end.Port.Name) is null
        select FieldMessage.Error(end.Path, "kit.port-unknown", ("stage", end.Port.Stage), ("port", end.Port.Name), ("known", string.Join(", ", description.Ports.Select(p => p.Name))));

    private static IEnumerable<(Port Port, string Path)> Ends(Kit kit) =>
        kit.Connections.SelectMany((c, i) => new[] { (c.From, $"connections[{i}].from"), (c.To, $"connections[{i}].to") });

    private static bool Has(Kit kit, string stage) => kit.Stages.Any(s => s.Key == stage);

    private static FieldMessage NoStage(string path, string stage) => FieldMessage.Error(path, "kit.stage-unknown", ("stage", stage));
}
