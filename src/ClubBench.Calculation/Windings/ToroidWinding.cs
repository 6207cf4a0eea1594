using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Windings;

/// <summary>A single-layer winding on a ring. One pass through the hole is one turn. Immutable.</summary>
/// <param name="Core">The ring.</param>
/// <param name="Turns">Passes through the hole, one or more.</param>
/// <param name="Wire">The wire.</param>
public sealed record ToroidWinding(ToroidCore Core, int Turns, Wire Wire)
{
    /// <summary>Usual gap between start and finish, in degrees. Source: common practice (keeps self-capacitance low).</summary>
    public const double UsualGapDegrees = 30;

    // Card rule: 10 % slack, two tails of 40 mm, next 10 mm. Source: common practice.
    private const double Slack = 1.10;
    private static readonly Length Tails = Length.FromMillimetre(80);

    /// <summary>Inductance with the listed index of the core.</summary>
    public Inductance Inductance => Core.InductanceFactor.Of(Turns);

    /// <summary>Turns that fit in one layer with the usual gap.</summary>
    public int Capacity => CapacityOf(Core, Wire);

    /// <summary>Share of the single layer that is filled, above 1 where it does not fit; null where the wire does not pass at all.</summary>
    public double? Fill => Capacity == 0 ? null : (double)Turns / Capacity;

    /// <summary>Whether the winding fits in a single layer.</summary>
    public bool Fits => Turns <= Capacity;

    /// <summary>Wire of one turn: (OD - ID) + 2 H + pi d, d overall. Source: common practice (turn laid close around the section).</summary>
    public Length LengthPerTurn => TurnLength(Core, Wire);

    /// <summary>Length to cut: turns with 10 % slack and two tails of 40 mm, not rounded.</summary>
    public Length WireLength => (Turns * LengthPerTurn * Slack) + Tails;

    /// <summary>Length to cut as printed on a card: rounded up to the next 10 mm.</summary>
    public Length CutLength => NextTenMillimetre(WireLength);

    /// <summary>The same with one turn more on each tail, where turns may have to be added after measuring.</summary>
    public Length CutLengthToAdjust => NextTenMillimetre(WireLength + (2 * LengthPerTurn));

    /// <summary>Wire of one turn on a ring.</summary>
    public static Length TurnLength(ToroidCore core, Wire wire) =>
        core.OuterDiameter - core.InnerDiameter + (2 * core.Height) + (Math.PI * wire.Overall);

    /// <summary>
    /// Turns of a wire that fit in one layer against the inner wall. Method: circles of the overall diameter d on the circle of their centres,
    /// pitch 2 asin(d/(ID - d)). Valid: any d; zero where the wire does not pass, one where it passes but once. Source: derived.
    /// </summary>
    /// <param name="core">The ring.</param>
    /// <param name="wire">The wire.</param>
    /// <param name="gapDegrees">Free angle between start and finish, 0 to 350 degrees.</param>
    /// <param name="strands">Wires laid side by side in each turn, one or more.</param>
    public static int CapacityOf(ToroidCore core, Wire wire, double gapDegrees = UsualGapDegrees, int strands = 1) =>
        CapacityOf(core.InnerDiameter, wire.Overall, gapDegrees, strands);

    /// <summary>Turns that fit a hole of this diameter with wire of this overall diameter; see the overload with core and wire.</summary>
    public static int CapacityOf(Length hole, Length overall, double gapDegrees = UsualGapDegrees, int strands = 1)
    {
        Guard.Positive(overall.Metre, nameof(overall));
        Guard.Within(gapDegrees, 0, 350, nameof(gapDegrees));
        Guard.Within(strands, 1, 8, nameof(strands));
        if (overall > hole) return 0;
        if (2 * overall >= hole) return strands == 1 ? 1 : 0;
        var pitch = 2 * Math.Asin(overall / (hole - overall));
        var angle = 2 * Math.PI * (1 - (gapDegrees / 360));
        return (int)Math.Floor((angle / (strands * pitch)) + 1e-9);
    }

    /// <summary>The thickest listed metric wire with which these turns fill at most this share of a single layer; null where none does.</summary>
    public static Wire? LargestWire(ToroidCore core, int turns, double largestFill = 1) =>
        Wires.Metric.LastOrDefault(w => turns <= largestFill * CapacityOf(core, w));

    private static Length NextTenMillimetre(Length length) => Length.FromMillimetre(10 * Math.Ceiling((length.Millimetre / 10) - 1e-9));
}
