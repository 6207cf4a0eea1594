using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;

namespace ClubBench.Calculation.Windings;

/// <summary>What the capacitance between turns does to a coil. In a tuned circuit it is part of the total capacitance: never count it twice.</summary>
public static class SelfResonance
{
    /// <summary>Self-resonant frequency of a coil with its self-capacitance, both above zero.</summary>
    public static Frequency Of(Inductance inductance, Capacitance selfCapacitance) => TunedCircuit.ResonantFrequency(inductance, selfCapacitance);

    /// <summary>
    /// Inductance a coil shows below self-resonance: L/(1 - (f/fs)^2). Null at and above it, where the coil is no inductance any more.
    /// At a third of self-resonance it is 12.5 % high: plan with the index only below. Source: derived.
    /// </summary>
    public static Inductance? Apparent(Inductance inductance, Frequency frequency, Frequency selfResonance)
    {
        var share = frequency / selfResonance;
        return share < 1 ? inductance / (1 - (share * share)) : null;
    }

    /// <summary>Impedance of a low-loss choke on either side of self-resonance: w L/|1 - (f/fs)^2|; null exactly there, where loss decides.</summary>
    public static Resistance? Impedance(Inductance inductance, Frequency frequency, Frequency selfResonance)
    {
        var share = frequency / selfResonance;
        var detuning = Math.Abs(1 - (share * share));
        return detuning == 0 ? null : TunedCircuit.Reactance(inductance, frequency) / detuning;
    }

    /// <summary>
    /// Self-capacitance of a single-layer solenoid, one end at ground: D (0.1126 l/D + 0.08 + 0.27 sqrt(D/l)) pF with D in cm.
    /// Valid: length over diameter 0.5 to 5, within 8 %. Source: medhurst-1947.
    /// </summary>
    public static Capacitance OfSolenoid(Length diameter, Length coilLength)
    {
        var slimness = Guard.Positive(coilLength.Metre, nameof(coilLength)) / Guard.Positive(diameter.Metre, nameof(diameter));
        return Capacitance.FromPicofarad(diameter.Centimetre * ((0.1126 * slimness) + 0.08 + (0.27 / Math.Sqrt(slimness))));
    }

    /// <summary>Self-capacitance to assume for a single-layer toroid with a gap of 30 degrees, least and most. Source: common practice.</summary>
    public static (Capacitance Least, Capacitance Most) OfToroid(ToroidCore core) => core switch
    {
        FerriteCore => (Capacitance.FromPicofarad(2), Capacitance.FromPicofarad(6)),
        _ when core.OuterDiameter.Millimetre < 15 => (Capacitance.FromPicofarad(1), Capacitance.FromPicofarad(2)),
        _ => (Capacitance.FromPicofarad(2), Capacitance.FromPicofarad(4)),
    };
}
