using System.Numerics;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Networks;

/// <summary>Where an arm of a ladder sits.</summary>
public enum LadderPosition
{
    /// <summary>From the line to ground.</summary>
    Shunt,

    /// <summary>In the line.</summary>
    Series,
}

/// <summary>One arm of a ladder: a coil, a capacitor, or a trap of both (in the line they lie in parallel, to ground in series). Immutable.</summary>
/// <remarks>
/// Method: losses as a series resistance, coil w L / Q, capacitor 1 / (w C Q), with Q constant over frequency.
/// Valid: inside one band and for stop-band figures away from a notch; a notch of lossless parts blocks without end, so give traps a Q.
/// Source: common practice.
/// </remarks>
public readonly record struct LadderElement
{
    private LadderElement(LadderPosition position, double henry, double farad, double? coilQ, double? capacitorQ)
    {
        (Position, InductanceHenry, CapacitanceFarad) = (position, henry, farad);
        CoilLoss = coilQ is { } l ? 1 / Guard.Positive(l, nameof(coilQ)) : 0;
        CapacitorLoss = capacitorQ is { } c ? 1 / Guard.Positive(c, nameof(capacitorQ)) : 0;
    }

    /// <summary>In the line or to ground.</summary>
    public LadderPosition Position { get; }

    /// <summary>The coil, or null where the arm has none.</summary>
    public Inductance? Inductance => HasCoil ? Quantities.Inductance.FromHenry(InductanceHenry) : null;

    /// <summary>The capacitor, or null where the arm has none.</summary>
    public Capacitance? Capacitance => HasCapacitor ? Quantities.Capacitance.FromFarad(CapacitanceFarad) : null;

    /// <summary>Whether the arm holds both a coil and a capacitor.</summary>
    public bool IsTrap => HasCoil && HasCapacitor;

    internal double InductanceHenry { get; private init; }

    internal double CapacitanceFarad { get; private init; }

    internal double CoilLoss { get; private init; }

    internal double CapacitorLoss { get; private init; }

    internal bool HasCoil => InductanceHenry > 0;

    internal bool HasCapacitor => CapacitanceFarad > 0;

    /// <summary>A coil in the line. Above zero; no Q given means lossless.</summary>
    public static LadderElement SeriesInductor(Inductance value, double? unloadedQ = null) =>
        new(LadderPosition.Series, Guard.Positive(value.Henry, nameof(value)), 0, unloadedQ, null);

    /// <summary>A coil to ground. Above zero; no Q given means lossless.</summary>
    public static LadderElement ShuntInductor(Inductance value, double? unloadedQ = null) =>
        new(LadderPosition.Shunt, Guard.Positive(value.Henry, nameof(value)), 0, unloadedQ, null);

    /// <summary>A capacitor to ground. Above zero; no Q given means lossless.</summary>
    public static LadderElement ShuntCapacitor(Capacitance value, double? unloadedQ = null) =>
        new(LadderPosition.Shunt, 0, Guard.Positive(value.Farad, nameof(value)), null, unloadedQ);

    /// <summary>A capacitor in the line. Above zero; no Q given means lossless.</summary>
    public static LadderElement SeriesCapacitor(Capacitance value, double? unloadedQ = null) =>
        new(LadderPosition.Series, 0, Guard.Positive(value.Farad, nameof(value)), null, unloadedQ);

    /// <summary>A coil with a capacitor across it in the line: blocks at its resonance.</summary>
    public static LadderElement SeriesTrap(Inductance coil, Capacitance capacitor, double? coilQ = null, double? capacitorQ = null) =>
        new(LadderPosition.Series, Guard.Positive(coil.Henry, nameof(coil)), Guard.Positive(capacitor.Farad, nameof(capacitor)), coilQ, capacitorQ);

    /// <summary>A coil and a capacitor in series to ground: shorts at its resonance. Also a capacitor with the inductance of its leads.</summary>
    public static LadderElement ShuntTrap(Inductance coil, Capacitance capacitor, double? coilQ = null, double? capacitorQ = null) =>
        new(LadderPosition.Shunt, Guard.Positive(coil.Henry, nameof(coil)), Guard.Positive(capacitor.Farad, nameof(capacitor)), coilQ, capacitorQ);

    /// <summary>The same arm with its coil and capacitor multiplied, for tolerances and sensitivities. Factors above zero.</summary>
    public LadderElement Scaled(double coilFactor, double capacitorFactor) => this with
    {
        InductanceHenry = InductanceHenry * Guard.Positive(coilFactor, nameof(coilFactor)),
        CapacitanceFarad = CapacitanceFarad * Guard.Positive(capacitorFactor, nameof(capacitorFactor)),
    };

    /// <summary>The same arm with other unloaded Q, above zero; no Q given means lossless.</summary>
    public LadderElement WithQ(double? coilQ, double? capacitorQ) => this with
    {
        CoilLoss = coilQ is { } l ? 1 / Guard.Positive(l, nameof(coilQ)) : 0,
        CapacitorLoss = capacitorQ is { } c ? 1 / Guard.Positive(c, nameof(capacitorQ)) : 0,
    };

    /// <summary>A capacitor to ground with an inductance in its leads; every other arm as it is.</summary>
    internal LadderElement WithLead(Inductance lead) => Position == LadderPosition.Shunt && HasCapacitor && !HasCoil ? this with { InductanceHenry = lead.Henry } : this;

    /// <summary>Impedance of the arm, ohm.</summary>
    public Complex Impedance(Frequency f) =>
        IsTrap && Position == LadderPosition.Series
            ? Inverse((1 / CoilImpedance(f.RadiansPerSecond)) + (1 / CapacitorImpedance(f.RadiansPerSecond)))
            : CoilImpedance(f.RadiansPerSecond) + CapacitorImpedance(f.RadiansPerSecond);

    /// <summary>The arm as a two-port.</summary>
    public TwoPort At(Frequency f) =>
        Position == LadderPosition.Series ? TwoPort.Series(Impedance(f)) : TwoPort.Shunt(Inverse(Impedance(f)));

    // Without losses a trap met exactly at its notch has no inverse; this is far beyond what any figure shows.
    private static Complex Inverse(Complex immittance) => immittance == Complex.Zero ? 1e100 : 1 / immittance;

    internal Complex CoilImpedance(double w) => HasCoil ? w * InductanceHenry * new Complex(CoilLoss, 1) : Complex.Zero;

    internal Complex CapacitorImpedance(double w) => HasCapacitor ? new Complex(CapacitorLoss, -1) / (w * CapacitanceFarad) : Complex.Zero;
}
