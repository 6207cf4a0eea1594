using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.Parts;

/// <summary>A part read as a winding on a toroid of the tables, with the club's learnt inductance index where there is one.</summary>
/// <param name="Part">The part.</param>
/// <param name="Core">Its core.</param>
/// <param name="Turns">Turns of the main winding.</param>
/// <param name="Index">Inductance index used.</param>
/// <param name="IndexFrom">Where the index came from.</param>
/// <param name="IndexTolerance">Relative tolerance of the index: a limit for a catalogue value, expanded uncertainty for a learnt one.</param>
public sealed record WindingPart(Part Part, ToroidCore Core, int Turns, InductanceFactor Index, Provenance IndexFrom, double IndexTolerance)
{
    /// <summary>Wire diameter taken where the part names none (common practice for low-power boards).</summary>
    public const double UsualWireMillimetre = 0.4;

    /// <summary>Inductance of the winding, spread over the whole core.</summary>
    public Inductance Inductance => Index.Of(Turns);

    /// <summary>Turns of the link, or null.</summary>
    public int? LinkTurns => Part.Value(PartValue.LinkTurns) is { } n ? (int)n : null;

    /// <summary>Wire it is wound with.</summary>
    public Wire Wire => WireOf(Part);

    /// <summary>The winding with its core and wire: capacity, fill, wire length.</summary>
    public ToroidWinding Winding => new(Core, Turns, Wire);

    /// <summary>The inductance as a figure with its working.</summary>
    public Figure Figure(string name = "inductance") =>
        new(name, QuantityKind.Inductance, Inductance.Henry, IndexTolerance * Inductance.Henry, Provenance.Derived, new Working("winding-inductance", [IndexFigure, Figures.Figure.Of("turns", QuantityKind.Count, Turns)], Source));

    /// <summary>The index as a figure.</summary>
    public Figure IndexFigure => new("inductance-index", QuantityKind.InductanceFactor, Index.NanohenryPerTurnSquared * 1e-9, IndexTolerance * Index.NanohenryPerTurnSquared * 1e-9, IndexFrom);

    private SourceRef Source => IndexFrom == Provenance.Measured ? SourceRef.Derived("mean of the club's boards") : Core.Source;

    /// <summary>Reads a part; null where its type is no toroid of the tables or it carries no turns.</summary>
    public static WindingPart? Of(Part part, LearntValues learnt)
    {
        if (Cores.FindToroid(part.Type) is not { } core || part.Value(PartValue.Turns) is not { } turns) return null;
        var (index, from, tolerance) = IndexOf(core, part, learnt);
        return new WindingPart(part, core, (int)Math.Round(turns), index, from, tolerance);
    }

    /// <summary>The index the club would reckon with for a core: learnt, else the table's.</summary>
    public static InductanceFactor IndexOf(ToroidCore core, LearntValues learnt) =>
        learnt.InductanceFactors.TryGetValue(core.Designation, out var l) ? InductanceFactor.FromNanohenryPerTurnSquared(l.NanohenryPerTurnSquared) : core.InductanceFactor;

    /// <summary>Wire a part is wound with.</summary>
    public static Wire WireOf(Part part) => Wire.Millimetre(part.Value(PartValue.WireDiameter) is { } metre ? metre * 1e3 : UsualWireMillimetre);

    /// <summary>Inductance of a part that is a winding, by the tables or its own index; null where it cannot be told.</summary>
    public static Inductance? InductanceOf(Part part) => Of(part, LearntValues.None)?.Inductance ?? (part.Value(PartValue.Inductance) is { } h ? Inductance.FromHenry(h) : null);

    private static (InductanceFactor Index, Provenance From, double Tolerance) IndexOf(ToroidCore core, Part part, LearntValues learnt)
    {
        if (learnt.InductanceFactors.TryGetValue(core.Designation, out var l))
            return (InductanceFactor.FromNanohenryPerTurnSquared(l.NanohenryPerTurnSquared), Provenance.Measured, l.ExpandedUncertainty / l.NanohenryPerTurnSquared);
        return part.Value(PartValue.InductanceFactor) is { } own
            ? (InductanceFactor.FromNanohenryPerTurnSquared(own * 1e9), Provenance.Published, core.InductanceFactorTolerance)
            : (core.InductanceFactor, Provenance.Published, core.InductanceFactorTolerance);
    }
}
