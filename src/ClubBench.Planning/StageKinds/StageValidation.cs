using ClubBench.Planning.Kits;

namespace ClubBench.Planning.StageKinds;

/// <summary>The checks that hold for every stage kind: roles, their values, settings. Collects all issues.</summary>
internal static class StageValidation
{
    public static IEnumerable<FieldMessage> Check(StageDocument stage, StageDescription description, string path)
    {
        foreach (var role in description.Roles.Where(r => r.Need == RoleNeed.Required && stage.OneInRole(r.Name) is null))
            yield return FieldMessage.Error($"{path}.parts", "kit.role-missing", ("stage", stage.Key), ("role", role.Name));
        for (var i = 0; i < stage.Parts.Count; i++)
            foreach (var message in CheckPart(stage.Parts[i], description, $"{path}.parts[{i}]")) yield return message;
        foreach (var name in stage.SettingsSi.Keys.Where(n => description.Settings.All(s => s.Name != n)))
            yield return FieldMessage.Error($"{path}.settings.{name}", "kit.setting-unknown", ("name", name));
        foreach (var (name, si) in stage.SettingsSi.Where(s => !double.IsFinite(s.Value)))
            yield return FieldMessage.Error($"{path}.settings.{name}", "kit.not-a-number", ("name", name));
    }

    private static IEnumerable<FieldMessage> CheckPart(Part part, StageDescription description, string path)
    {
        if (description.Role(part.Role) is not { } role)
        {
            yield return FieldMessage.Error($"{path}.role", "kit.role-unknown", ("role", part.Role), ("known", string.Join(", ", description.Roles.Select(r => r.Name))));
            yield break;
        }

        foreach (var name in role.Values.Where(v => part.Value(v) is null))
            yield return FieldMessage.Error($"{path}.values.{name}", "kit.value-missing", ("part", part.Designator), ("name", name));
        if (part.Value(PartValue.MaximumCapacitance) is { } most && part.Value(PartValue.MinimumCapacitance) is { } least && most <= least)
            yield return FieldMessage.Error($"{path}.values.{PartValue.MaximumCapacitance}", "kit.trimmer-without-swing", ("part", part.Designator));
        foreach (var (name, si) in part.ValuesSi)
            if (!PartValue.All.Contains(name)) yield return FieldMessage.Error($"{path}.values.{name}", "kit.value-unknown", ("part", part.Designator), ("name", name));
            else if (!double.IsFinite(si) || si < 0 || (si == 0 && !MayBeZero(name))) yield return FieldMessage.Error($"{path}.values.{name}", "kit.value-not-positive", ("part", part.Designator), ("name", name));
    }

    private static bool MayBeZero(string name) => name is PartValue.SelfCapacitance or PartValue.Tolerance or PartValue.MinimumCapacitance;
}
