using System.Globalization;
using ClubBench.Calculation.Bands;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Tests.KitAcceptance;

/// <summary>Kit A, changed and placed as a test wants it.</summary>
internal static class KitA
{
    public static Kit Kit => DemoKits.QuernThirty;

    /// <summary>The kit on its own band, at its meeting point or a frequency of its own.</summary>
    public static Chain OwnBand(Kit? kit = null, Frequency? at = null)
    {
        var conditions = ChainConditions.OwnBand(kit ?? Kit, LearntValues.None);
        return new Chain(kit ?? Kit, at is { } f ? conditions with { Reference = f, Band = FrequencyRange.At(f) } : conditions);
    }

    /// <summary>The untouched kit on another band.</summary>
    public static Chain Kept(string band, Kit? kit = null) => new(kit ?? Kit, ChainConditions.On(Target(band), kit ?? Kit, LearntValues.None));

    public static Target Target(string band) => TargetDefaults.On(band, Kit, ItuRegion.Region1)!;

    public static Plan Plan(string band, params IReadOnlyList<Choice> choices) => Plan(Kit, Target(band), choices);

    public static Plan Plan(Kit kit, Target target, IReadOnlyList<Choice> choices) =>
        Planner.Plan(new PlanInputs(kit, target, choices, DemoKits.DrawerStock, LearntValues.None, SearchEffort.Quick, 20261201, Planner.CalculationVersion));

    /// <summary>The kit with values multiplied: "L1.inductanceH", several parts by ";", a setting as "settings.name" of the stage.</summary>
    public static Kit Changed(Kit kit, string stage, string change, double factor)
    {
        var document = kit.Stage(stage);
        foreach (var (place, name) in change.Split(';').Select(c => c.Split('.')).Select(c => (c[0], c[1])))
            document = place == "settings"
                ? document.WithSetting(name, document.SettingsSi[name] * factor)
                : document.With(document.Part(place).With((name, document.Part(place).Need(name) * factor)));
        return kit.With(document);
    }

    /// <summary>A stage with other part values, by designator.</summary>
    public static StageDocument With(StageDocument stage, params IEnumerable<(string Designator, Func<Part, Part> Change)> changes) =>
        stage.With([.. changes.Select(c => c.Change(stage.Part(c.Designator)))]);

    public static double Figure(Chain chain, string stage, string name) => chain.Model(stage).Figures.Single(f => f.Name == name).Si;

    public static TwoPort Passes(Chain chain, string stage, double hertz) => chain.Facet<IPasses>(stage)!.At(Frequency.FromHertz(hertz));

    public static double LossDb(Chain chain, string stage, double megahertz) => Passes(chain, stage, megahertz * 1e6).Loss(Fifty, Fifty).Db;

    public static double ReturnLossDb(Chain chain, string stage, double megahertz) => Passes(chain, stage, megahertz * 1e6).ReturnLoss(Fifty, Fifty).Db;

    public static Resistance Fifty { get; } = Resistance.FromOhm(50);

    public static Part Holding(Part capacitor, double picofarad) => CapacitorPart.Holding(capacitor, Capacitance.FromPicofarad(picofarad));

    public static Part Wound(Part coil, string core, int turns, int? link = null) =>
        coil.With((PartValue.Turns, turns), (PartValue.Inductance, null), (PartValue.LinkTurns, link ?? coil.Value(PartValue.LinkTurns))) with { Type = core };

    /// <summary>Crystals of the demonstration, marked for 30 pF.</summary>
    public static Part Marked(Part crystal, double megahertz, double femtofarad, double picofarad) => crystal.With(
        (PartValue.Frequency, megahertz * 1e6),
        (PartValue.MotionalCapacitance, femtofarad * 1e-15),
        (PartValue.StaticCapacitance, picofarad * 1e-12));

    public static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
