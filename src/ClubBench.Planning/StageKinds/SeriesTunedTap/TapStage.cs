using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;

namespace ClubBench.Planning.StageKinds.SeriesTunedTap;

/// <summary>A receive tap read from its document: choke on the line, clamp diodes at its far end, trimmer (and padding) on to the receiver.</summary>
internal sealed record TapStage(Part Choke, Part Trimmer, Part? Padding, StageDocument Document)
{
    /// <summary>Both ends of the tap.</summary>
    public static Resistance Ends { get; } = Resistance.FromOhm(50);

    public static TapStage Read(StageDocument stage) => new(
        stage.OneInRole(Roles.Choke)!,
        stage.OneInRole(Roles.Trimmer)!,
        stage.OneInRole(Roles.Padding),
        stage);

    public Inductance Inductance => Inductance.FromHenry(Choke.Need(PartValue.Inductance));

    public double ChokeQ => Choke.Value(PartValue.UnloadedQ) ?? Document.Setting(Settings.ChokeQ, 40);

    /// <summary>Choke with trimmer and padding; strays of a series place are small and left out.</summary>
    public TunablePlace Place => new(
        Inductance,
        Padding is null ? default : CapacitorPart.Total(Padding),
        Capacitance.FromFarad(Trimmer.Need(PartValue.MinimumCapacitance)),
        Capacitance.FromFarad(Trimmer.Need(PartValue.MaximumCapacitance)),
        default);

    public static class Roles
    {
        public const string Choke = "series-inductor";
        public const string Trimmer = "series-trimmer";
        public const string Padding = "padding-capacitor";
        public const string ClampDiode = "clamp-diode";
    }

    public static class Settings
    {
        public const string ChokeQ = "inductorQ";
    }
}
