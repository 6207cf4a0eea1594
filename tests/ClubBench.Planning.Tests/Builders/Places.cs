using System.Numerics;
using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Tests.Builders;

/// <summary>Surroundings for a single stage, without a chain around it.</summary>
internal static class Places
{
    public static Surroundings ThirtyMetres { get; } = On(10.111, 10.124, 10.1175);

    public static Surroundings TwentyMetres { get; } = On(14.03, 14.07, 14.05);

    public static Surroundings FortyMetres { get; } = On(7.01, 7.04, 7.025);

    /// <summary>Megahertz; the neighbour is 3 kohm (a mixer) at radio frequencies and 32 ohm (phones) at audio.</summary>
    public static Surroundings On(double low, double high, double reference, double pitchHz = 700, double supplyV = 12, double powerW = 1.1) => new(
        FrequencyRange.FromMegahertz(low, high),
        Frequency.FromMegahertz(reference),
        Frequency.FromMegahertz(10.1175),
        new Dictionary<string, FrequencyRange>(),
        (_, at) => at.Hertz > 1e5 ? new Complex(3000, 0) : new Complex(32, 0),
        Voltage.FromVolt(supplyV),
        Power.FromWatt(powerW),
        Mode.Cw,
        Frequency.FromHertz(pitchHz),
        EmissionLimitSet.NationalLicence,
        TargetDefaults.WishMargin,
        LearntValues.None);
}

/// <summary>Shorthand for one stage of the demonstration kit.</summary>
internal static class Quern
{
    public static StageDocument Stage(string key) => DemoKits.QuernThirty.Stage(key);

    public static IStageKind KindOf(StageDocument stage) => StageKindList.Get(stage.Kind);

    public static double Figure(StageDocument stage, string name, Surroundings surroundings) =>
        KindOf(stage).Model(stage, surroundings).Figures.Single(f => f.Name == name).Si;

    public static IReadOnlyList<Finding> Judge(StageDocument stage, Surroundings surroundings) =>
        KindOf(stage).Judge(stage, KindOf(stage).Model(stage, surroundings), surroundings, []);

    public static IReadOnlyList<Alternative> Convert(StageDocument stage, Surroundings to) =>
        KindOf(stage).Convert(stage, Places.ThirtyMetres, to, [], Shelf.EverythingCanBeBought);

    /// <summary>The stage with one value moved: "C19.capacitanceF" names a part's value, a bare name a setting.</summary>
    public static StageDocument Moved(StageDocument stage, string name, double factor)
    {
        if (name.Length == 0) return stage;
        if (name.Split('.') is not [var designator, var value])
            return stage.WithSetting(name, factor * stage.Setting(name, KindOf(stage).Description.Settings.Single(s => s.Name == name).Default));
        var part = stage.Part(designator);
        return stage.With(part.With((value, factor * part.Need(value))));
    }

    public static StageDocument With(StageDocument stage, string designator, string value, double si) => stage.With(stage.Part(designator).With((value, si)));

    public static StageDocument Without(StageDocument stage, string designator) => stage with { Parts = [.. stage.Parts.Where(p => p.Designator != designator)] };
}
