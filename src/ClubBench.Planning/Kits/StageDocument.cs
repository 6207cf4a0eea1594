using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Kits;

/// <summary>One functional block of a kit in its stored form. Its kind reads it into a typed view; everything else treats it generically.</summary>
/// <param name="Key">Name on the schematic, e.g. "A5".</param>
/// <param name="Kind">Id of its stage kind.</param>
/// <param name="Variant">Variant within the kind; empty for the usual one.</param>
/// <param name="Parts">Its parts with roles.</param>
/// <param name="SettingsSi">Figures of the circuit that are not parts (currents, strays), SI values by setting name.</param>
/// <param name="StatedSi">What the kit's papers say of this stage, SI values by figure name; the back-check compares.</param>
public sealed record StageDocument(
    string Key,
    string Kind,
    string Variant,
    IReadOnlyList<Part> Parts,
    IReadOnlyDictionary<string, double> SettingsSi,
    IReadOnlyDictionary<string, double> StatedSi)
{
    /// <summary>Parts that play a role, in document order.</summary>
    public IEnumerable<Part> InRole(string role) => Parts.Where(p => p.Role == role);

    /// <summary>The first part of a role, or null.</summary>
    public Part? OneInRole(string role) => Parts.FirstOrDefault(p => p.Role == role);

    /// <summary>The part with a designator. Throws when there is none.</summary>
    public Part Part(string designator) =>
        Parts.FirstOrDefault(p => p.Designator == designator) ?? throw new KeyNotFoundException($"{Key} has no part {designator}.");

    /// <summary>A setting in SI units, or the given value when it is not set.</summary>
    public double Setting(string name, double otherwise) => SettingsSi.TryGetValue(name, out var v) ? v : otherwise;

    /// <summary>The same stage with some parts replaced, matched by designator.</summary>
    public StageDocument With(params IReadOnlyList<Part> parts)
    {
        var byName = parts.ToDictionary(p => p.Designator, StringComparer.Ordinal);
        return this with { Parts = [.. Parts.Select(p => byName.GetValueOrDefault(p.Designator, p))] };
    }

    /// <summary>The same stage with one setting changed.</summary>
    public StageDocument WithSetting(string name, double si) =>
        this with { SettingsSi = new Dictionary<string, double>(SettingsSi, StringComparer.Ordinal) { [name] = si } };
}

/// <summary>One part in its place on the board.</summary>
/// <param name="Designator">Name on the board, e.g. "C15".</param>
/// <param name="Role">What it does in its stage, a role of the stage kind.</param>
/// <param name="Type">What it is: dielectric, core, device or holder ("NP0", "T50-6", "2N3904", "HC-49/U").</param>
/// <param name="ValuesSi">Its values in SI units, by the names of <see cref="PartValue"/>.</param>
/// <param name="Place">What fits in its place; null where nobody measured.</param>
/// <param name="From">Where its values came from.</param>
public sealed record Part(
    string Designator,
    string Role,
    string Type,
    IReadOnlyDictionary<string, double> ValuesSi,
    Place? Place = null,
    Provenance From = Provenance.Published)
{
    /// <summary>A value in SI units, or null.</summary>
    public double? Value(string name) => ValuesSi.TryGetValue(name, out var v) ? v : null;

    /// <summary>A value in SI units; throws when the part does not carry it (its kind's Read refuses such parts).</summary>
    public double Need(string name) => Value(name) ?? throw new InvalidOperationException($"{Designator} carries no {name}.");

    /// <summary>The same part with values replaced or added; a null takes a value away.</summary>
    public Part With(params IEnumerable<(string Name, double? Si)> values)
    {
        var all = new Dictionary<string, double>(ValuesSi, StringComparer.Ordinal);
        foreach (var (name, si) in values)
            if (si is { } v) all[name] = v;
            else all.Remove(name);
        return this with { ValuesSi = all };
    }
}

/// <summary>What fits in a place on the board.</summary>
/// <param name="Footprint">Plain words: "two holes 5 mm", "toroid up to 13 mm".</param>
/// <param name="PitchM">Lead pitch in metre, if it matters.</param>
/// <param name="LargestM">Largest body in metre, if it matters.</param>
/// <param name="Pieces">How many parts can be put there side by side; 1 if nothing is said.</param>
public sealed record Place(string Footprint, double? PitchM = null, double? LargestM = null, int Pieces = 1);

/// <summary>Names of part values. The unit is part of the name, as in the kit file.</summary>
public static class PartValue
{
    /// <summary>Capacitance, or its larger part where two lie in parallel.</summary>
    public const string Capacitance = "capacitanceF";

    /// <summary>A second capacitor in parallel in the same place.</summary>
    public const string ParallelCapacitance = "parallelCapacitanceF";

    /// <summary>Smallest capacitance of a trimmer or variable capacitor.</summary>
    public const string MinimumCapacitance = "minimumCapacitanceF";

    /// <summary>Largest capacitance of a trimmer or variable capacitor.</summary>
    public const string MaximumCapacitance = "maximumCapacitanceF";

    /// <summary>Inductance of a choke, or the value the papers print for a winding.</summary>
    public const string Inductance = "inductanceH";

    /// <summary>Self-capacitance of a coil or choke.</summary>
    public const string SelfCapacitance = "selfCapacitanceF";

    /// <summary>Turns of the main winding.</summary>
    public const string Turns = "turns";

    /// <summary>Turns of the link winding on the same core.</summary>
    public const string LinkTurns = "linkTurns";

    /// <summary>Bare wire diameter.</summary>
    public const string WireDiameter = "wireDiameterM";

    /// <summary>Unloaded quality factor.</summary>
    public const string UnloadedQ = "unloadedQ";

    /// <summary>Inductance index of the core, where it is not the table's (learnt or from the papers), H per turn squared.</summary>
    public const string InductanceFactor = "inductanceFactorHPerTurn2";

    /// <summary>Resistance.</summary>
    public const string Resistance = "resistanceOhm";

    /// <summary>Marked frequency of a crystal.</summary>
    public const string Frequency = "frequencyHz";

    /// <summary>Load capacitance a crystal is marked for.</summary>
    public const string LoadCapacitance = "loadCapacitanceF";

    /// <summary>Motional capacitance of a crystal.</summary>
    public const string MotionalCapacitance = "motionalCapacitanceF";

    /// <summary>Static capacitance of a crystal.</summary>
    public const string StaticCapacitance = "staticCapacitanceF";

    /// <summary>Motional resistance of a crystal.</summary>
    public const string MotionalResistance = "motionalResistanceOhm";

    /// <summary>Rated voltage.</summary>
    public const string RatedVoltage = "ratedVoltageV";

    /// <summary>Zener or regulator voltage.</summary>
    public const string Voltage = "voltageV";

    /// <summary>Rated current (fuse).</summary>
    public const string RatedCurrent = "ratedCurrentA";

    /// <summary>Tolerance, relative (0.05 is 5 %).</summary>
    public const string Tolerance = "toleranceRelative";

    /// <summary>Transition frequency of a device, where it is not the table's.</summary>
    public const string TransitionFrequency = "transitionFrequencyHz";

    /// <summary>All names, for the kit file.</summary>
    public static IReadOnlySet<string> All { get; } = typeof(PartValue).GetFields().Where(f => f.IsLiteral).Select(f => (string)f.GetRawConstantValue()!).ToHashSet(StringComparer.Ordinal);
}
