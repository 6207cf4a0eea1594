using System.Collections.Immutable;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Elliptic;

/// <summary>A coil and a capacitor that together make one notch, for 1 ohm and an edge at 1 rad/s. Immutable.</summary>
/// <param name="Inductance">Henry of the scaled filter.</param>
/// <param name="Capacitance">Farad of the scaled filter.</param>
public readonly record struct EllipticTrap(double Inductance, double Capacitance)
{
    /// <summary>Notch as a multiple of the edge.</summary>
    public double Notch => 1 / Math.Sqrt(Inductance * Capacitance);
}

/// <summary>An elliptic low-pass for 1 ohm and an edge at 1 rad/s: capacitors to ground with parallel traps in the line between them. Immutable.</summary>
/// <param name="Wanted">What it does.</param>
/// <param name="Shunts">Capacitors to ground in ladder order, farad of the scaled filter.</param>
/// <param name="Traps">Traps between them, in ladder order.</param>
public sealed record EllipticPrototype(EllipticApproximation Wanted, ImmutableArray<double> Shunts, ImmutableArray<EllipticTrap> Traps)
{
    /// <summary>The real filter, for an edge and equal ends of a resistance above zero.</summary>
    public EllipticFilter Denormalise(Frequency edge, Resistance resistance, LowPassForm form = LowPassForm.ShuntCapacitorFirst) =>
        new(this, edge, Resistance.FromOhm(Guard.Positive(resistance.Ohm, nameof(resistance))), form);
}

/// <summary>An elliptic low-pass of real parts between equal ends. Immutable.</summary>
/// <remarks>
/// Method: scaling of the prototype. Beginning with a coil, the roles swap: coils in the line and series traps to ground (dual network).
/// Valid: a trap needs its own capacitor within 2 % or a coil that is trimmed; above its highest notch the loss comes back to the least stop-band loss.
/// Source: zverev-1967; the remarks are common practice.
/// </remarks>
/// <param name="Prototype">Scaled parts.</param>
/// <param name="Edge">Last frequency with the ripple.</param>
/// <param name="Resistance">Both ends, above zero.</param>
/// <param name="Form">Capacitor first (fewest coils, traps in the line) or coil first (fewest capacitors, traps to ground).</param>
public sealed record EllipticFilter(EllipticPrototype Prototype, Frequency Edge, Resistance Resistance, LowPassForm Form)
{
    /// <summary>Notches, rising.</summary>
    public IReadOnlyList<Frequency> Notches => [.. Prototype.Wanted.Notches.Select(n => Edge * n)];

    /// <summary>Smallest capacitor of all.</summary>
    public Capacitance SmallestCapacitor => ToLadder().Elements.Where(e => e.Capacitance is not null).Min(e => e.Capacitance!.Value);

    /// <summary>Smallest coil of all.</summary>
    public Inductance SmallestCoil => ToLadder().Elements.Where(e => e.Inductance is not null).Min(e => e.Inductance!.Value);

    /// <summary>Whether every part is large enough to be built with leads and strays around it.</summary>
    public bool IsBuildable => SmallestCapacitor >= LowPassDesign.SmallestCapacitor && SmallestCoil >= LowPassDesign.SmallestCoil;

    /// <summary>The ladder for analysis; no Q given means lossless, and a lossless trap blocks without end.</summary>
    public Ladder ToLadder(double? coilQ = null, double? capacitorQ = null)
    {
        var (w, r) = (Edge.RadiansPerSecond, Resistance.Ohm);
        var capacitorFirst = Form == LowPassForm.ShuntCapacitorFirst;
        return new(Prototype.Shunts.SelectMany((g, k) => k < Prototype.Traps.Length ? [Plain(g), Trap(Prototype.Traps[k])] : new[] { Plain(g) }));

        LadderElement Plain(double g) => capacitorFirst ? LadderElement.ShuntCapacitor(Farad(g), capacitorQ) : LadderElement.SeriesInductor(Henry(g), coilQ);
        LadderElement Trap(EllipticTrap t) => capacitorFirst
            ? LadderElement.SeriesTrap(Henry(t.Inductance), Farad(t.Capacitance), coilQ, capacitorQ)
            : LadderElement.ShuntTrap(Henry(t.Capacitance), Farad(t.Inductance), coilQ, capacitorQ);
        Capacitance Farad(double g) => Capacitance.FromFarad(g / (w * r));
        Inductance Henry(double g) => Inductance.FromHenry(g * r / w);
    }
}
