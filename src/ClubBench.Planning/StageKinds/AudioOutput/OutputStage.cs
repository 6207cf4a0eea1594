using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.StageKinds.AudioOutput;

/// <summary>Audio output amplifier with one power circuit, read from its document.</summary>
internal sealed record OutputStage(StageDocument Document)
{
    public static OutputStage Read(StageDocument stage) => new(stage);

    /// <summary>A capacitor across the gain pins lifts the gain.</summary>
    public bool HasGainCapacitor => Document.OneInRole(Roles.GainCapacitor) is not null;

    public bool IsDamped => Document.OneInRole(Roles.DampingResistor) is not null && Document.OneInRole(Roles.DampingCapacitor) is not null;

    public bool IsDecoupled => SupplyResistor is not null && SupplyCapacitor is not null;

    public Capacitance? OutputCapacitor => CapacitorOf(Roles.OutputCapacitor);

    public Resistance? SupplyResistor => ResistorOf(Roles.SupplyResistor);

    public Capacitance? SupplyCapacitor => CapacitorOf(Roles.SupplyCapacitor);

    public Resistance? MuteResistor => ResistorOf(Roles.MuteResistor);

    public Capacitance? MuteCapacitor => CapacitorOf(Roles.MuteCapacitor);

    private Resistance? ResistorOf(string role) => Document.OneInRole(role)?.Value(PartValue.Resistance) is { } ohm ? Resistance.FromOhm(ohm) : null;

    private Capacitance? CapacitorOf(string role) => Document.OneInRole(role)?.Value(PartValue.Capacitance) is { } farad ? Capacitance.FromFarad(farad) : null;

    public static class Roles
    {
        public const string Power = "power-circuit";
        public const string GainCapacitor = "gain-capacitor";
        public const string OutputCapacitor = "output-capacitor";
        public const string DampingResistor = "damping-resistor";
        public const string DampingCapacitor = "damping-capacitor";
        public const string SupplyCapacitor = "supply-capacitor";
        public const string SupplyResistor = "supply-resistor";
        public const string MuteTransistor = "mute-transistor";
        public const string MuteResistor = "mute-resistor";
        public const string MuteCapacitor = "mute-capacitor";
    }
}
