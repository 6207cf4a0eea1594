using System.Collections.Immutable;
using System.Numerics;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.BandPass;

/// <summary>Two or three equal coils to ground, each with its capacitor, coupled by small capacitors at their tops. Immutable, thread safe.</summary>
/// <remarks>
/// Method: chain matrix of the network; each coil has a series resistance w0 L/Qu that does not change over the sweep.
/// Valid: lumped parts; far from the band strays and layout decide (believe at most 60 dB).
/// Source: pozar-microwave, chain matrix; common practice for the loss model.
/// </remarks>
/// <param name="Center">Frequency at which the coil has its Q.</param>
/// <param name="Coil">Inductance of each coil.</param>
/// <param name="UnloadedQ">Q of each coil at the centre, above zero.</param>
/// <param name="NodeCapacitances">Everything to ground at each node, strays and trimmer included, coupling capacitors not.</param>
/// <param name="Coupling">Capacitor between neighbours.</param>
/// <param name="End">Resistance at each end, as seen at the top.</param>
public sealed record TopCoupledFilter(Frequency Center, Inductance Coil, double UnloadedQ, ImmutableArray<Capacitance> NodeCapacitances, Capacitance Coupling, Resistance End)
{
    /// <summary>The network between its ends at one frequency.</summary>
    public TwoPort At(Frequency f)
    {
        var chain = Node(0, f);
        for (var i = 1; i < NodeCapacitances.Length; i++)
            chain = chain.Then(TwoPort.Series(1 / new Complex(0, f.RadiansPerSecond * Coupling.Farad))).Then(Node(i, f));
        return chain;
    }

    /// <summary>Transducer loss between the ends, zero or above.</summary>
    public Decibels Loss(Frequency f) => At(f).Loss(End, End);

    /// <summary>What a node resonates at with its neighbours shorted to ground: all nodes alike, whatever the order. Method: dishal-1951.</summary>
    public Frequency NodeResonance(int node)
    {
        var neighbours = node > 0 && node < NodeCapacitances.Length - 1 ? 2 : 1;
        return Resonators.TunedCircuit.ResonantFrequency(Coil, NodeCapacitances[node] + (Coupling * neighbours));
    }

    private TwoPort Node(int node, Frequency f)
    {
        var coil = new Complex(Center.RadiansPerSecond * Coil.Henry / UnloadedQ, f.RadiansPerSecond * Coil.Henry);
        return TwoPort.Shunt(new Complex(0, f.RadiansPerSecond * NodeCapacitances[node].Farad) + (1 / coil));
    }
}
