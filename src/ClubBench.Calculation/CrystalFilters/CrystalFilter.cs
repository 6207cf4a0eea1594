using System.Collections.Immutable;
using System.Numerics;
using ClubBench.Calculation.Components;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.CrystalFilters;

/// <summary>One crystal in the line and the capacitor in series with it, where there is one.</summary>
/// <param name="Crystal">The crystal with its own, measured series resonance; no resistance stated means lossless.</param>
/// <param name="Series">Capacitor that tunes the mesh; null where none is needed.</param>
public sealed record CrystalMesh(CrystalParameters Crystal, Capacitance? Series)
{
    /// <summary>Capacitor that tunes the mesh, above zero; null where none is needed.</summary>
    public Capacitance? Series { get; init; } = Series is { } c ? Capacitance.FromFarad(Guard.Positive(c.Farad, nameof(Series))) : null;
}

/// <summary>Crystals in the line with capacitors from their junctions to ground: a lower-sideband ladder, steeper above than below. Immutable, thread safe.</summary>
/// <remarks>
/// Method: chain matrix of the whole network, C0 and loss of every crystal included.
/// Valid: lumped parts and lossless capacitors; far from the pass-band the layout decides (believe at most 80 dB), and other modes of the plates pass above it.
/// Source: pozar-microwave, chain matrix; iec-60122-1 for the crystal.
/// </remarks>
/// <param name="Meshes">Two crystals or more, from source to load.</param>
/// <param name="Couplings">Capacitor to ground behind each crystal but the last, each above zero.</param>
/// <param name="Source">Resistance the filter is fed from, above zero.</param>
/// <param name="Load">Resistance it works into, above zero.</param>
public sealed record CrystalFilter(ImmutableArray<CrystalMesh> Meshes, ImmutableArray<Capacitance> Couplings, Resistance Source, Resistance Load)
{
    /// <summary>Capacitor to ground behind each crystal but the last.</summary>
    public ImmutableArray<Capacitance> Couplings { get; init; } = Couplings.Length == Meshes.Length - 1 && Meshes.Length >= 2 && Couplings.All(c => c.Farad > 0)
        ? Couplings
        : throw new ArgumentException("A crystal filter has two crystals or more and a capacitor above zero between every two.", nameof(Couplings));

    /// <summary>Mean of the frequencies the meshes are tuned to, C0 left out: the f0 of the design formulas.</summary>
    public Frequency Middle => Frequency.FromHertz(Enumerable.Range(0, Meshes.Length).Average(i => MeshFrequency(i).Hertz));

    /// <summary>The same with C0 counted: where the pass-band begins to be looked for.</summary>
    public Frequency LoadedMiddle => Frequency.FromHertz(
        Enumerable.Range(0, Meshes.Length).Average(i => Meshes[i].Crystal.LoadedFrequency(Capacitance.FromFarad(1 / Elastance(i))).Hertz));

    /// <summary>The network between its ends at one frequency.</summary>
    public TwoPort At(Frequency f)
    {
        var chain = Arm(Meshes[0], f);
        for (var i = 1; i < Meshes.Length; i++)
            chain = chain.Then(TwoPort.Shunt(new Complex(0, f.RadiansPerSecond * Couplings[i - 1].Farad))).Then(Arm(Meshes[i], f));
        return chain;
    }

    /// <summary>Transducer loss between the ends, zero or above.</summary>
    public Decibels Loss(Frequency f) => At(f).Loss(Source, Load);

    /// <summary>Frequency a crystal has with its series capacitor and the capacitors at both its sides alone: alike for all meshes of a sound design.</summary>
    public Frequency MeshFrequency(int mesh)
    {
        var crystal = Meshes[mesh].Crystal;
        return crystal.SeriesResonance * Math.Sqrt(1 + (crystal.MotionalCapacitance.Farad * Elastance(mesh)));
    }

    /// <summary>The same filter built from crystals of these series resonances, one per mesh in order; Cm stays, so Lm follows.</summary>
    public CrystalFilter WithResonances(IReadOnlyList<Frequency> measured)
    {
        if (measured.Count != Meshes.Length) throw new ArgumentException($"The filter has {Meshes.Length} crystals, {measured.Count} resonances were given.", nameof(measured));
        return this with { Meshes = [.. Meshes.Select((m, i) => m with { Crystal = m.Crystal with { SeriesResonance = measured[i] } })] };
    }

    /// <summary>The same filter with the nearest capacitors of a series of preferred values.</summary>
    public CrystalFilter Rounded(ESeries series) => this with
    {
        Couplings = [.. Couplings.Select(c => Nearest(c, series))],
        Meshes = [.. Meshes.Select(m => m with { Series = m.Series is { } c ? Nearest(c, series) : null })],
    };

    private double Elastance(int mesh) =>
        (mesh > 0 ? 1 / Couplings[mesh - 1].Farad : 0) + (mesh < Couplings.Length ? 1 / Couplings[mesh].Farad : 0) + (Meshes[mesh].Series is { } series ? 1 / series.Farad : 0);

    private static Capacitance Nearest(Capacitance c, ESeries series) => Capacitance.FromPicofarad(PreferredValues.Nearest(c.Picofarad, series));

    private static TwoPort Arm(CrystalMesh mesh, Frequency f)
    {
        var impedance = mesh.Crystal.Impedance(f);
        return TwoPort.Series(mesh.Series is { } c ? impedance + (1 / new Complex(0, f.RadiansPerSecond * c.Farad)) : impedance);
    }
}
