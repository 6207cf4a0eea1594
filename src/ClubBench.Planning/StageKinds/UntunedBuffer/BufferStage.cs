using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.StageKinds.UntunedBuffer;

/// <summary>An untuned two-transistor buffer with a tap for the receiver's mixer, read from its document.</summary>
internal sealed record BufferStage(Part Follower, Part Amplifier, Part Tap, IReadOnlyList<Part> Couplings, IReadOnlyList<Part> Bypasses, StageDocument Document)
{
    public static BufferStage Read(StageDocument stage) => new(
        stage.OneInRole(Roles.FollowerTransistor)!,
        stage.OneInRole(Roles.AmplifierTransistor)!,
        stage.OneInRole(Roles.TapCapacitor)!,
        [.. stage.InRole(Roles.CouplingCapacitor)],
        [.. stage.InRole(Roles.BypassCapacitor)],
        stage);

    /// <summary>Power it gives into the driver, as the papers say; it does not hang on the band while the devices have gain.</summary>
    public Power Output => Power.FromWatt(Document.Setting(Settings.OutputPower, 2e-3));

    /// <summary>Open-circuit voltage at the tap.</summary>
    public Voltage TapPeakToPeak => Voltage.FromVolt(Document.Setting(Settings.TapVoltage, 0.35));

    public Current Collector => Current.FromAmpere(Document.Setting(Settings.CollectorCurrent, 5e-3));

    /// <summary>Source and load around the coupling capacitor between the two transistors.</summary>
    public Resistance AroundCoupling => Resistance.FromOhm(Document.Setting(Settings.AroundCoupling, 300));

    /// <summary>Emitter resistance no capacitor bridges.</summary>
    public double UnbypassedOhm => Document.InRole(Roles.UnbypassedResistor).Sum(p => p.Value(PartValue.Resistance) ?? 0);

    public static class Roles
    {
        public const string FollowerTransistor = "follower-transistor";
        public const string AmplifierTransistor = "amplifier-transistor";
        public const string BiasResistor = "bias-resistor";
        public const string FollowerResistor = "follower-resistor";
        public const string EmitterResistor = "emitter-resistor";
        public const string UnbypassedResistor = "unbypassed-resistor";
        public const string CouplingCapacitor = "coupling-capacitor";
        public const string BypassCapacitor = "bypass-capacitor";
        public const string TapCapacitor = "oscillator-tap-capacitor";
    }

    public static class Settings
    {
        public const string OutputPower = "outputPowerW";
        public const string TapVoltage = "tapVoltagePeakToPeakV";
        public const string CollectorCurrent = "collectorCurrentA";
        public const string AroundCoupling = "couplingResistanceOhm";
        public const string Load = "loadResistanceOhm";
    }
}
