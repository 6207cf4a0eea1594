using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.LowPassLadder;

/// <summary>A low-pass ladder read from its document: shunt capacitors and series windings, alternating from the transmitter to the antenna.</summary>
internal sealed record LowPassStage(IReadOnlyList<Part> Capacitors, IReadOnlyList<Part> Coils, double CoilQ, double CapacitorQ)
{
    /// <summary>Line impedance of the ladder.</summary>
    public static Resistance Line { get; } = Resistance.FromOhm(50);

    public static LowPassStage Read(StageDocument stage) =>
        new([.. stage.InRole(Roles.ShuntCapacitor)], [.. stage.InRole(Roles.SeriesWinding)], stage.Setting(Settings.CoilQ, 150), stage.Setting(Settings.CapacitorQ, 1000));

    /// <summary>Inductances of the coils, with what the club has learnt of their cores.</summary>
    public IReadOnlyList<Inductance> Inductances(LearntValues learnt) =>
        [.. Coils.Select(c => WindingPart.Of(c, learnt)?.Inductance ?? Inductance.FromHenry(c.Need(PartValue.Inductance)))];

    /// <summary>The ladder with losses.</summary>
    public Ladder Ladder(LearntValues learnt) => new(Elements(Inductances(learnt)));

    /// <summary>The ladder as a design of values only.</summary>
    public LowPassDesign Design(LearntValues learnt) =>
        new(LowPassForm.ShuntCapacitorFirst, [.. Capacitors.Select(CapacitorPart.Total)], [.. Inductances(learnt)], Line, Line);

    private IEnumerable<LadderElement> Elements(IReadOnlyList<Inductance> coils)
    {
        for (var i = 0; i < Capacitors.Count; i++)
        {
            yield return LadderElement.ShuntCapacitor(CapacitorPart.Total(Capacitors[i]), CapacitorQ);
            if (i < coils.Count) yield return LadderElement.SeriesInductor(coils[i], CoilQ);
        }
    }

    public static class Roles
    {
        public const string ShuntCapacitor = "shunt-capacitor";
        public const string SeriesWinding = "series-winding";
    }

    public static class Settings
    {
        public const string CoilQ = "coilQ";
        public const string CapacitorQ = "capacitorQ";
    }
}
