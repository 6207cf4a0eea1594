using ClubBench.Calculation.Audio;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.StageKinds.KeyingSidetone;

/// <summary>Keyed supply switch with shaping, and a timer circuit for the sidetone, read from its document.</summary>
internal sealed record KeyingStage(Part Transistor, StageDocument Document)
{
    public static KeyingStage Read(StageDocument stage) => new(stage.OneInRole(Roles.Transistor)!, stage);

    /// <summary>Rise time as the papers give it, 5 ms where they do not.</summary>
    public Duration RiseTime => Duration.FromSecond(Document.Setting(Settings.RiseTime, UsualRiseTimeS));

    public bool RiseTimeIsGiven => Document.SettingsSi.ContainsKey(Settings.RiseTime);

    /// <summary>Smallest resistor the shaping capacitor is charged through, with that capacitor; null where either is missing.</summary>
    public (Resistance Resistor, Capacitance Capacitor)? Shaping =>
        Document.InRole(Roles.Resistor).Select(p => p.Value(PartValue.Resistance)).Min() is { } ohm && Value(Roles.ShapingCapacitor, PartValue.Capacitance) is { } farad
            ? (Resistance.FromOhm(ohm), Capacitance.FromFarad(farad))
            : null;

    /// <summary>The sidetone generator; null where the board has none.</summary>
    public TimerAstable? Sidetone =>
        Value(Roles.TimerResistorA, PartValue.Resistance) is { } a && Value(Roles.TimerResistorB, PartValue.Resistance) is { } b && Value(Roles.TimerCapacitor, PartValue.Capacitance) is { } c
            ? new TimerAstable(Resistance.FromOhm(a), Resistance.FromOhm(b), Capacitance.FromFarad(c))
            : null;

    private const double UsualRiseTimeS = 5e-3;

    private double? Value(string role, string name) => Document.OneInRole(role)?.Value(name);

    public static class Roles
    {
        public const string Transistor = "keying-transistor";
        public const string Resistor = "keying-resistor";
        public const string ShapingCapacitor = "shaping-capacitor";
        public const string Timer = "timer-circuit";
        public const string TimerResistorA = "timer-resistor-a";
        public const string TimerResistorB = "timer-resistor-b";
        public const string TimerCapacitor = "timer-capacitor";
        public const string SidetoneResistor = "sidetone-resistor";
    }

    public static class Settings
    {
        public const string RiseTime = "riseTimeS";
    }
}
