using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Resonators;

/// <summary>
/// The single tuned circuit. C is always the total at the node: fixed capacitor, trimmer at its setting, coupling capacitors and strays.
/// Source: derived (Thomson's formula and the parallel resonant circuit), unless a member says otherwise.
/// </summary>
public static class TunedCircuit
{
    /// <summary>Largest rejection worth believing: beyond it stray coupling decides. Source: common practice.</summary>
    public static readonly Decibels RejectionLimit = Decibels.FromDb(60);

    /// <summary>Resonant frequency 1/(2 pi sqrt(L C)) of an inductance and a total capacitance, both above zero.</summary>
    public static Frequency ResonantFrequency(Inductance inductance, Capacitance capacitance)
    {
        Guard.Positive(inductance.Henry, nameof(inductance));
        Guard.Positive(capacitance.Farad, nameof(capacitance));
        return Frequency.FromHertz(1 / (2 * Math.PI * Math.Sqrt(inductance.Henry * capacitance.Farad)));
    }

    /// <summary>Total capacitance that brings an inductance above zero to resonance.</summary>
    public static Capacitance CapacitanceFor(Inductance inductance, Frequency frequency) =>
        Capacitance.FromFarad(1 / (Square(frequency.RadiansPerSecond) * Guard.Positive(inductance.Henry, nameof(inductance))));

    /// <summary>Inductance that brings a total capacitance above zero to resonance.</summary>
    public static Inductance InductanceFor(Capacitance capacitance, Frequency frequency) =>
        Inductance.FromHenry(1 / (Square(frequency.RadiansPerSecond) * Guard.Positive(capacitance.Farad, nameof(capacitance))));

    /// <summary>Magnitude of the reactance of an inductance.</summary>
    public static Resistance Reactance(Inductance inductance, Frequency frequency) =>
        Resistance.FromOhm(frequency.RadiansPerSecond * inductance.Henry);

    /// <summary>Magnitude of the reactance of a capacitance above zero.</summary>
    public static Resistance Reactance(Capacitance capacitance, Frequency frequency) =>
        Resistance.FromOhm(1 / (frequency.RadiansPerSecond * Guard.Positive(capacitance.Farad, nameof(capacitance))));

    /// <summary>Inductance of this reactance.</summary>
    public static Inductance InductanceOf(Resistance reactance, Frequency frequency) =>
        Inductance.FromHenry(reactance.Ohm / frequency.RadiansPerSecond);

    /// <summary>Capacitance of this reactance above zero.</summary>
    public static Capacitance CapacitanceOf(Resistance reactance, Frequency frequency) =>
        Capacitance.FromFarad(1 / (frequency.RadiansPerSecond * Guard.Positive(reactance.Ohm, nameof(reactance))));

    /// <summary>
    /// Rejection at a frequency against the response at resonance, zero or above: 10 log10(1 + QL^2 (f/f0 - f0/f)^2).
    /// Valid: near resonance for any coupling; an octave and more away the coupling decides (capacitive coupling at the top: up to 12 dB less
    /// above). Not capped: see <see cref="RejectionLimit"/>.
    /// </summary>
    /// <param name="at">Where the rejection is wanted.</param>
    /// <param name="resonance">Resonant frequency.</param>
    /// <param name="loadedQ">Loaded Q, above zero.</param>
    public static Decibels Rejection(Frequency at, Frequency resonance, double loadedQ)
    {
        var detuning = (at / resonance) - (resonance / at);
        return Decibels.FromPowerRatio(1 + Square(Guard.Positive(loadedQ, nameof(loadedQ)) * detuning));
    }

    /// <summary>Relative change of resonant frequency for a change of part of the total capacitance: -dC/(2 C).</summary>
    /// <param name="changePicofarad">Change of one capacitor in pF, either sign, small against the total.</param>
    /// <param name="total">Total capacitance, above zero.</param>
    public static double FrequencyShift(double changePicofarad, Capacitance total) =>
        -Guard.Finite(changePicofarad, nameof(changePicofarad)) / (2 * Guard.Positive(total.Picofarad, nameof(total)));

    private static double Square(double x) => x * x;
}
