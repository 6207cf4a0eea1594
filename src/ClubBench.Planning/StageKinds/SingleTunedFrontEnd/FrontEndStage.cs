using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.SingleTunedFrontEnd;

/// <summary>One tuned circuit between the antenna side and a mixer, fed through a link, read from its document.</summary>
internal sealed record FrontEndStage(Part Winding, Part FixedCapacitor, Part Trimmer, StageDocument Document)
{
    /// <summary>What the link is fed from: the antenna side behind the output filter.</summary>
    public static Resistance FedFrom { get; } = Resistance.FromOhm(50);

    public static FrontEndStage Read(StageDocument stage) => new(
        stage.OneInRole(Roles.Winding)!,
        stage.OneInRole(Roles.FixedCapacitor)!,
        stage.OneInRole(Roles.Trimmer)!,
        stage);

    public double Turns => Winding.Need(PartValue.Turns);

    public double LinkTurns => Winding.Need(PartValue.LinkTurns);

    /// <summary>Resistance of the line as it stands across the whole coil.</summary>
    public Resistance SourceAtTop => FedFrom * (Turns / LinkTurns * (Turns / LinkTurns));

    public double CoilQ => Document.Setting(Settings.CoilQ, 180);

    public Inductance Inductance(LearntValues learnt) =>
        WindingPart.Of(Winding, learnt)?.Inductance ?? Calculation.Quantities.Inductance.FromHenry(Winding.Need(PartValue.Inductance));

    /// <summary>Coil, capacitor, trimmer and strays together.</summary>
    public TunablePlace Tank(LearntValues learnt) => new(
        Inductance(learnt),
        CapacitorPart.Total(FixedCapacitor),
        Capacitance.FromFarad(Trimmer.Need(PartValue.MinimumCapacitance)),
        Capacitance.FromFarad(Trimmer.Need(PartValue.MaximumCapacitance)),
        Capacitance.FromFarad(Document.Setting(Settings.Stray, 8e-12)));

    public static class Roles
    {
        public const string Winding = "winding";
        public const string FixedCapacitor = "fixed-capacitor";
        public const string Trimmer = "trimmer";
    }

    public static class Settings
    {
        public const string Stray = "strayF";
        public const string CoilQ = "coilQ";
    }
}
