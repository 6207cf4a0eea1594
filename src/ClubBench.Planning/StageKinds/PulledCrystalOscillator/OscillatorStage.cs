using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.StageKinds.PulledCrystalOscillator;

/// <summary>A Colpitts crystal oscillator pulled by a series choke and a variable capacitor, read from its document.</summary>
internal sealed record OscillatorStage(
    IReadOnlyList<Part> Crystals,
    Part Choke,
    Part Tuning,
    FeedbackPair Pair,
    Part? OffsetCapacitor,
    StageDocument Document)
{
    /// <summary>Quality factor of a moulded choke (common practice, 30 to 60).</summary>
    public const double ChokeQ = 50;

    public static OscillatorStage Read(StageDocument stage) => new(
        [.. stage.InRole(Roles.Crystal)],
        stage.OneInRole(Roles.SeriesInductor)!,
        stage.OneInRole(Roles.TuningCapacitor)!,
        new FeedbackPair(Farads(stage.OneInRole(Roles.FeedbackUpper)!), Farads(stage.OneInRole(Roles.FeedbackLower)!)),
        stage.OneInRole(Roles.OffsetCapacitor),
        stage);

    /// <summary>Smallest tuning capacitance with strays.</summary>
    public Capacitance Least => Capacitance.FromFarad(Document.Setting(Settings.SmallestTuning, Tuning.Need(PartValue.MinimumCapacitance)));

    /// <summary>Largest tuning capacitance with strays.</summary>
    public Capacitance Most => Capacitance.FromFarad(Document.Setting(Settings.LargestTuning, Tuning.Need(PartValue.MaximumCapacitance)));

    /// <summary>Dial position offsets are quoted at: as the papers say, else the geometric middle.</summary>
    public Capacitance Quoted => Capacitance.FromFarad(Document.Setting(Settings.QuotedTuning, Math.Sqrt(Least.Farad * Most.Farad)));

    /// <summary>Transconductance at the working current.</summary>
    public double TransconductanceSiemens => Document.Setting(Settings.Transconductance, 0.02);

    /// <summary>The place of the offset capacitor: across the emitter capacitor of the pair.</summary>
    public OffsetPlace OffsetPlace => new OffsetPlace.AcrossEmitterCapacitor(Pair);

    /// <summary>The loop on transmit, without the offset capacitor.</summary>
    public PulledCrystalLoop Loop(int? crystals = null) => new(CrystalOf(Crystals[0]), Least, Most, Inductance.FromHenry(Choke.Need(PartValue.Inductance)), Pair.OscillatorCapacitance)
    {
        CrystalCount = crystals ?? Crystals.Count,
        InductorSelfCapacitance = Capacitance.FromFarad(Choke.Value(PartValue.SelfCapacitance) ?? 0),
        HolderCapacitance = Capacitance.FromFarad(Document.Setting(Settings.Holder, 0)),
        NodeStray = Capacitance.FromFarad(Document.Setting(Settings.NodeStray, 0)),
    };

    public static CrystalParameters CrystalOf(Part part) => CrystalParameters.FromMarkedFrequency(
        Frequency.FromHertz(part.Need(PartValue.Frequency)),
        Capacitance.FromFarad(part.Need(PartValue.LoadCapacitance)),
        Capacitance.FromFarad(part.Need(PartValue.MotionalCapacitance)),
        Capacitance.FromFarad(part.Need(PartValue.StaticCapacitance)),
        Resistance.FromOhm(part.Need(PartValue.MotionalResistance)));

    private static Capacitance Farads(Part part) => Capacitance.FromFarad(part.Need(PartValue.Capacitance));

    public static class Roles
    {
        public const string Crystal = "crystal";
        public const string SeriesInductor = "series-inductor";
        public const string TuningCapacitor = "tuning-capacitor";
        public const string Transistor = "transistor";
        public const string FeedbackUpper = "feedback-upper";
        public const string FeedbackLower = "feedback-lower";
        public const string OffsetCapacitor = "offset-capacitor";
        public const string OffsetSwitch = "offset-switch";
        public const string OffsetResistor = "offset-resistor";
        public const string BiasResistor = "bias-resistor";
        public const string EmitterResistor = "emitter-resistor";
        public const string BypassCapacitor = "bypass-capacitor";
        public const string OutputCoupling = "output-coupling";
    }

    public static class Settings
    {
        public const string SmallestTuning = "smallestTuningCapacitanceF";
        public const string LargestTuning = "largestTuningCapacitanceF";
        public const string QuotedTuning = "quotedTuningCapacitanceF";
        public const string Holder = "holderCapacitanceF";
        public const string NodeStray = "nodeStrayF";
        public const string Transconductance = "transconductanceS";
        public const string CollectorCurrent = "collectorCurrentA";
    }
}
