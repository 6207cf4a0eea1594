using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.TunedDriver;

/// <summary>A class A driver with a tuned collector and a link, read from its document.</summary>
internal sealed record DriverStage(Part Transistor, Part Winding, Part TankCapacitor, Part Trimmer, StageDocument Document)
{
    public static DriverStage Read(StageDocument stage) => new(
        stage.OneInRole(Roles.Transistor)!,
        stage.OneInRole(Roles.TankWinding)!,
        stage.OneInRole(Roles.TankCapacitor)!,
        stage.OneInRole(Roles.TankTrimmer)!,
        stage);

    public double Turns => Winding.Need(PartValue.Turns);

    public double LinkTurns => Winding.Need(PartValue.LinkTurns);

    public Inductance Inductance(LearntValues learnt) =>
        WindingPart.Of(Winding, learnt)?.Inductance ?? Calculation.Quantities.Inductance.FromHenry(Winding.Need(PartValue.Inductance));

    public Capacitance Fixed => CapacitorPart.Total(TankCapacitor);

    public Capacitance TrimmerLeast => Capacitance.FromFarad(Trimmer.Need(PartValue.MinimumCapacitance));

    public Capacitance TrimmerMost => Capacitance.FromFarad(Trimmer.Need(PartValue.MaximumCapacitance));

    public Capacitance Stray => Capacitance.FromFarad(Document.Setting(Settings.Stray, 10e-12));

    public Current Collector => Current.FromAmpere(Document.Setting(Settings.CollectorCurrent, 0.03));

    public Voltage PeakSwing => Voltage.FromVolt(Document.Setting(Settings.PeakSwing, 9));

    public double CoilQ => Document.Setting(Settings.CoilQ, 150);

    public double LoadOhm => Document.Setting(Settings.Load, 12);

    /// <summary>Emitter resistance no capacitor bridges.</summary>
    public double UnbypassedOhm => Document.InRole(Roles.UnbypassedResistor).Sum(p => p.Value(PartValue.Resistance) ?? 0);

    /// <summary>Bias resistors as the signal sees them, in parallel; infinite without any.</summary>
    public double BiasOhm
    {
        get
        {
            var siemens = Document.InRole(Roles.BaseResistor).Select(p => p.Value(PartValue.Resistance)).OfType<double>().Sum(r => 1 / r);
            return siemens > 0 ? 1 / siemens : double.PositiveInfinity;
        }
    }

    public static class Roles
    {
        public const string Transistor = "transistor";
        public const string TankWinding = "tank-winding";
        public const string TankCapacitor = "tank-capacitor";
        public const string TankTrimmer = "tank-trimmer";
        public const string BaseResistor = "base-resistor";
        public const string EmitterResistor = "emitter-resistor";
        public const string UnbypassedResistor = "unbypassed-resistor";
        public const string BypassCapacitor = "bypass-capacitor";
        public const string SupplyResistor = "supply-resistor";
    }

    public static class Settings
    {
        public const string Stray = "strayF";
        public const string CollectorCurrent = "collectorCurrentA";
        public const string PeakSwing = "peakSwingV";
        public const string Load = "loadResistanceOhm";
        public const string CoilQ = "coilQ";
    }
}
