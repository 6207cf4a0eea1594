using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.StageKinds.SingleEndedFinal;

/// <summary>A single-ended class C final with a collector choke, read from its document.</summary>
internal sealed record FinalStage(Part Transistor, Part BaseReturn, Part Choke, Part? Coupling, StageDocument Document)
{
    /// <summary>Load the final works into.</summary>
    public static Resistance Load { get; } = Resistance.FromOhm(50);

    public static FinalStage Read(StageDocument stage) => new(
        stage.OneInRole(Roles.Transistor)!,
        stage.OneInRole(Roles.BaseReturn)!,
        stage.OneInRole(Roles.CollectorChoke)!,
        stage.OneInRole(Roles.CouplingCapacitor),
        stage);

    public Resistance Return => Resistance.FromOhm(BaseReturn.Need(PartValue.Resistance));

    /// <summary>The device's row of the table, or null where it has none.</summary>
    public Transistor? Device => Transistors.Find(Transistor.Type);

    /// <summary>Transition frequency: the part's own, else typical of the table, else its minimum.</summary>
    public Frequency? Transition =>
        Transistor.Value(PartValue.TransitionFrequency) is { } hz ? Frequency.FromHertz(hz) : Device?.TransitionFrequencyTypical ?? Device?.TransitionFrequencyMin;

    /// <summary>Transition frequency a pass may rest on: a minimum, or half the typical value.</summary>
    public Frequency? TransitionForVerdict =>
        Transistor.Value(PartValue.TransitionFrequency) is { } hz ? Frequency.FromHertz(hz) : Device?.TransitionFrequencyForVerdict;

    /// <summary>Current gain at low frequency: geometric middle of the table's range (common practice where only limits are known).</summary>
    public double LowFrequencyGain => Device is { CurrentGainMin: { } least } d ? Math.Sqrt(least * (d.CurrentGainMax ?? (2 * least))) : 100;

    public double LeastGain => Device?.CurrentGainMin ?? 50;

    public Voltage SupplyDrop => Voltage.FromVolt(Document.Setting(Settings.SupplyDrop, 0.35));

    public Voltage Saturation => Voltage.FromVolt(Document.Setting(Settings.Saturation, 0.8));

    public double Efficiency => Document.Setting(Settings.Efficiency, 0.6);

    /// <summary>Drive the papers ask for on the design band.</summary>
    public Power DriveNeeded => Power.FromWatt(Document.Setting(Settings.DriveNeeded, 0.08));

    public Voltage PeakBase => Voltage.FromVolt(Document.Setting(Settings.PeakBase, 1.6));

    public Capacitance ChokeParallel => Capacitance.FromFarad(Document.Setting(Settings.ChokeParallel, 0));

    public ThermalResistance HeatSink => ThermalResistance.FromKelvinPerWatt(Document.Setting(Settings.HeatSink, 20));

    public Resistance Input => Resistance.FromOhm(Document.Setting(Settings.InputResistance, 12));

    /// <summary>Drive against frequency and base return; null where the papers' figures contradict each other or the device is unknown.</summary>
    public BaseReturnGain? DriveModel(Frequency design) =>
        Transition is { } ft && BaseReturnGain.TryCreate(design, DriveNeeded, DesignReturn, PeakBase, new CurrentGain(LowFrequencyGain, ft), out var model) ? model : null;

    /// <summary>Base return the papers' drive holds for.</summary>
    public Resistance DesignReturn => Resistance.FromOhm(Document.Setting(Settings.DesignReturn, Return.Ohm));

    public static class Roles
    {
        public const string Transistor = "transistor";
        public const string BaseReturn = "base-return";
        public const string CollectorChoke = "collector-choke";
        public const string ClampDiode = "clamp-diode";
        public const string BypassCapacitor = "bypass-capacitor";
        public const string CouplingCapacitor = "coupling-capacitor";
        public const string BaseBead = "base-bead";
        public const string HeatSink = "heat-sink";
    }

    public static class Settings
    {
        public const string Saturation = "saturationVoltageV";
        public const string SupplyDrop = "supplyDropV";
        public const string Efficiency = "efficiencyRelative";
        public const string DriveNeeded = "driveNeededW";
        public const string PeakBase = "peakBaseVoltageV";
        public const string ChokeParallel = "chokeParallelCapacitanceF";
        public const string HeatSink = "heatSinkKelvinPerWatt";
        public const string InputResistance = "inputResistanceOhm";
        public const string DesignReturn = "designBaseReturnOhm";
    }
}
