using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Resonators;

/// <summary>What stays when a tuned circuit is moved to another frequency.</summary>
public enum ResonatorMove
{
    /// <summary>L and C both fall with frequency: loaded Q and tap ratios stay. The default.</summary>
    KeepReactance,

    /// <summary>Only the winding changes; going up, the loaded Q rises and the bandwidth in kHz stays.</summary>
    KeepCapacitance,

    /// <summary>Only capacitors change; going up, the loaded Q falls and strays become a large share.</summary>
    KeepInductance,
}

/// <summary>Inductance and total capacitance of a tuned circuit. Immutable.</summary>
/// <param name="Inductance">Above zero.</param>
/// <param name="Capacitance">Total at the node, above zero.</param>
public sealed record Resonator(Inductance Inductance, Capacitance Capacitance)
{
    /// <summary>Resonant frequency.</summary>
    public Frequency Resonance => TunedCircuit.ResonantFrequency(Inductance, Capacitance);

    /// <summary>Reactance of either element at resonance: sqrt(L/C).</summary>
    public Resistance Reactance => Resistance.FromOhm(Math.Sqrt(Inductance.Henry / Capacitance.Farad));

    /// <summary>The circuit for another frequency. Only the total scales: strays and trimmer are taken off afterwards. Source: derived.</summary>
    public Resonator MovedTo(Frequency target, ResonatorMove move)
    {
        var ratio = target / Resonance;
        return move switch
        {
            ResonatorMove.KeepCapacitance => new(Inductance / (ratio * ratio), Capacitance),
            ResonatorMove.KeepInductance => new(Inductance, Capacitance / (ratio * ratio)),
            _ => new(Inductance / ratio, Capacitance / ratio),
        };
    }

    /// <summary>The circuit of a chosen reactance (above zero) at a frequency.</summary>
    public static Resonator WithReactance(Resistance reactance, Frequency target) =>
        new(TunedCircuit.InductanceOf(reactance, target), TunedCircuit.CapacitanceOf(reactance, target));

    /// <summary>
    /// Fixed capacitor that is left of the total after what cannot be left out (strays, trimmer at mid travel, coupling).
    /// False where these already exceed the total; the capacitor is then zero and the excess says by how much.
    /// </summary>
    public bool TryFixedCapacitor(Capacitance unavoidable, out Capacitance fixedCapacitor, out Capacitance excess)
    {
        var fits = Capacitance > unavoidable;
        fixedCapacitor = fits ? Capacitance - unavoidable : default;
        excess = fits ? default : unavoidable - Capacitance;
        return fits;
    }
}
