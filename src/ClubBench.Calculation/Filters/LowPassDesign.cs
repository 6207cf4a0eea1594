using System.Collections.Immutable;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Filters;

/// <summary>Which part a low-pass ladder starts with.</summary>
public enum LowPassForm
{
    /// <summary>Capacitor to ground first: fewest coils, shorts the harmonic current of a collector.</summary>
    ShuntCapacitorFirst,

    /// <summary>Coil in the line first: shows harmonics a high impedance, for switching stages.</summary>
    SeriesInductorFirst,
}

/// <summary>A low-pass ladder of capacitors to ground and coils in the line, alternating, with its terminations. Immutable.</summary>
public sealed record LowPassDesign
{
    /// <summary>Takes the parts in ladder order; their numbers must alternate and all values be above zero.</summary>
    public LowPassDesign(LowPassForm form, ImmutableArray<Capacitance> capacitors, ImmutableArray<Inductance> coils, Resistance source, Resistance load)
    {
        var surplus = form == LowPassForm.ShuntCapacitorFirst ? capacitors.Length - coils.Length : coils.Length - capacitors.Length;
        if (surplus is not (0 or 1)) throw new ArgumentException($"{capacitors.Length} capacitors and {coils.Length} coils do not alternate.", nameof(coils));
        foreach (var c in capacitors) Guard.Positive(c.Farad, nameof(capacitors));
        foreach (var l in coils) Guard.Positive(l.Henry, nameof(coils));
        Guard.Positive(source.Ohm, nameof(source));
        Guard.Positive(load.Ohm, nameof(load));
        (Form, Capacitors, Coils, Source, Load) = (form, capacitors, coils, source, load);
    }

    /// <summary>Which part comes first.</summary>
    public LowPassForm Form { get; }

    /// <summary>Capacitors to ground, from source to load.</summary>
    public ImmutableArray<Capacitance> Capacitors { get; init; }

    /// <summary>Coils in the line, from source to load.</summary>
    public ImmutableArray<Inductance> Coils { get; init; }

    /// <summary>Resistance the filter is driven from.</summary>
    public Resistance Source { get; }

    /// <summary>Resistance the filter feeds.</summary>
    public Resistance Load { get; }

    /// <summary>Number of parts.</summary>
    public int Order => Capacitors.Length + Coils.Length;

    /// <summary>Smallest capacitor that is more than stray capacitance (common practice).</summary>
    public static readonly Capacitance SmallestCapacitor = Capacitance.FromPicofarad(1);

    /// <summary>Smallest coil that is longer than its leads (common practice).</summary>
    public static readonly Inductance SmallestCoil = Inductance.FromNanohenry(10);

    /// <summary>Whether every part is large enough to be built with leads and strays around it.</summary>
    public bool IsBuildable => Capacitors.All(c => c >= SmallestCapacitor) && Coils.All(l => l >= SmallestCoil);

    /// <summary>Whether place k of the ladder (0 is nearest the source) holds a capacitor.</summary>
    public bool IsCapacitor(int place) => (place % 2 == 0) == (Form == LowPassForm.ShuntCapacitorFirst);

    /// <summary>The ladder for analysis; no Q given means lossless.</summary>
    public Ladder ToLadder(double? coilQ = null, double? capacitorQ = null) =>
        new(Enumerable.Range(0, Order).Select(k => IsCapacitor(k)
            ? LadderElement.ShuntCapacitor(Capacitors[k / 2], capacitorQ)
            : LadderElement.SeriesInductor(Coils[k / 2], coilQ)));

    /// <summary>A double half-wave filter: every reactance equals the resistance at the design frequency, the middle capacitor half of it.</summary>
    /// <remarks>
    /// Method: two constant-k pi sections; a match at the design frequency for any load, cut-off at 1.414 times it.
    /// Valid: choose the design frequency inside the band, not above it.
    /// Source: common practice; constant-k theory after O. Zobel 1923.
    /// </remarks>
    public static LowPassDesign HalfWave(Frequency design, Resistance resistance)
    {
        var (w, r) = (design.RadiansPerSecond, Guard.Positive(resistance.Ohm, nameof(resistance)));
        var (outer, coil) = (Capacitance.FromFarad(1 / (w * r)), Inductance.FromHenry(r / w));
        return new LowPassDesign(LowPassForm.ShuntCapacitorFirst, [outer, 2 * outer, outer], [coil, coil], resistance, resistance);
    }
}
