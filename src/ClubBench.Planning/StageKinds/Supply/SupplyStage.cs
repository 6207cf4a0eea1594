using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.StageKinds.Supply;

/// <summary>Supply input with polarity diode, fuse and regulator, read from its document.</summary>
internal sealed record SupplyStage(Part PolarityDiode, Part Fuse, Part? Regulator, StageDocument Document)
{
    public static SupplyStage Read(StageDocument stage) =>
        new(stage.OneInRole(Roles.PolarityDiode)!, stage.OneInRole(Roles.Fuse)!, stage.OneInRole(Roles.Regulator), stage);

    public Current FuseRating => Current.FromAmpere(Fuse.Need(PartValue.RatedCurrent));

    /// <summary>Regulated voltage; null where the papers name no regulator.</summary>
    public Voltage? Regulated => Regulator?.Value(PartValue.Voltage) is { } v ? Voltage.FromVolt(v) : null;

    public Voltage DiodeDrop => Voltage.FromVolt(Document.Setting(Settings.DiodeDrop, 0.35));

    public Current RestCurrent => Current.FromAmpere(Document.Setting(Settings.RestCurrent, 0.08));

    public double Efficiency => Document.Setting(Settings.Efficiency, 0.5);

    public static class Roles
    {
        public const string PolarityDiode = "polarity-diode";
        public const string Fuse = "fuse";
        public const string Reservoir = "reservoir-capacitor";
        public const string Regulator = "regulator";
        public const string RegulatorCapacitor = "regulator-capacitor";
    }

    public static class Settings
    {
        public const string DiodeDrop = "diodeDropV";
        public const string RestCurrent = "restCurrentA";
        public const string Efficiency = "transmitterEfficiencyRelative";
    }
}
