using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;

namespace ClubBench.Calculation.Windings;

/// <summary>Why two resonance readings give no inductance.</summary>
public enum ResonanceRefusal
{
    /// <summary>They do.</summary>
    None,

    /// <summary>More capacitance must lower the frequency: readings and capacitors are mixed up.</summary>
    MixedUp,

    /// <summary>The stray capacitance comes out clearly negative: a capacitor value or a reading is wrong.</summary>
    NegativeStray,
}

/// <summary>An inductance found with one known capacitor.</summary>
/// <param name="Inductance">The inductance.</param>
/// <param name="RelativeUncertainty">Relative standard uncertainty.</param>
public sealed record OneCapacitorResult(Inductance Inductance, double RelativeUncertainty);

/// <summary>Inductance and stray capacitance found with two known capacitors. Immutable.</summary>
/// <param name="Inductance">The inductance; null where refused.</param>
/// <param name="InductanceUncertainty">Standard uncertainty of it; zero where refused.</param>
/// <param name="StrayPicofarad">Stray capacitance of winding, fixture and probe in pF; may come out a little negative.</param>
/// <param name="StrayUncertainty">Standard uncertainty of the stray.</param>
/// <param name="Refusal">The reason; None where there is a result.</param>
public sealed record TwoCapacitorResult(
    Inductance? Inductance, Inductance InductanceUncertainty, double StrayPicofarad, Capacitance StrayUncertainty, ResonanceRefusal Refusal)
{
    /// <summary>A stray above 30 pF is more than winding and fixture have: look again. Source: common practice.</summary>
    public bool HasLargeStray => StrayPicofarad > 30;
}

/// <summary>A resonance read with a known capacitor across the coil.</summary>
/// <param name="Capacitor">The capacitor, above zero.</param>
/// <param name="Frequency">The resonant frequency read.</param>
public sealed record ResonancePoint(Capacitance Capacitor, Frequency Frequency);

/// <summary>
/// Inductance of a coil from resonance. Uncertainties are relative standard ones; an error of the capacitors is common to all boards measured on
/// one fixture and does not average out. Valid: below a third of self-resonance; two capacitors at least four to one apart.
/// Source: derived (Thomson's formula; uncertainty by partial derivatives as in gum-2008, 5.1.2).
/// </summary>
public static class InductanceFromResonance
{
    /// <summary>From one capacitor and an assumed stray: L = 1/(w^2 (C + Cs)).</summary>
    /// <param name="point">Capacitor and frequency.</param>
    /// <param name="stray">Assumed stray capacitance.</param>
    /// <param name="frequencyUncertainty">Relative standard uncertainty of the frequency.</param>
    /// <param name="capacitorUncertainty">Relative standard uncertainty of the capacitor.</param>
    /// <param name="strayUncertainty">Standard uncertainty of the stray.</param>
    public static OneCapacitorResult FromOne(
        ResonancePoint point, Capacitance stray, double frequencyUncertainty, double capacitorUncertainty, Capacitance strayUncertainty)
    {
        var total = point.Capacitor + stray;
        var (uf, uc, us) = (2 * frequencyUncertainty, capacitorUncertainty * (point.Capacitor / total), strayUncertainty / total);
        return new(TunedCircuit.InductanceFor(total, point.Frequency), Math.Sqrt((uf * uf) + (uc * uc) + (us * us)));
    }

    /// <summary>From two capacitors, which gives the stray as well.</summary>
    /// <param name="larger">The larger capacitor and its (lower) frequency.</param>
    /// <param name="smaller">The smaller capacitor and its (higher) frequency.</param>
    /// <param name="frequencyUncertainty">Relative standard uncertainty of each frequency.</param>
    /// <param name="capacitorUncertainty">Relative standard uncertainty of each capacitor, independent.</param>
    public static TwoCapacitorResult FromTwo(
        ResonancePoint larger, ResonancePoint smaller, double frequencyUncertainty = 0, double capacitorUncertainty = 0)
    {
        if (larger.Capacitor <= smaller.Capacitor || larger.Frequency >= smaller.Frequency)
            return new(null, default, 0, default, ResonanceRefusal.MixedUp);

        var (c1, c2) = (larger.Capacitor.Farad, smaller.Capacitor.Farad);
        var (a, b) = (InverseSquare(larger.Frequency), InverseSquare(smaller.Frequency));
        var l = (a - b) / (c1 - c2);
        var strayF = ((b * c1) - (a * c2)) / (a - b);
        var ul = RootSum(2 * a * frequencyUncertainty, 2 * b * frequencyUncertainty, l * c1 * capacitorUncertainty, l * c2 * capacitorUncertainty) / (c1 - c2);
        var slope = 2 * frequencyUncertainty * a * b * (c1 - c2) / (a - b);
        var us = RootSum(slope, slope, b * c1 * capacitorUncertainty, a * c2 * capacitorUncertainty) / (a - b);
        var refusal = strayF < -Math.Max(2 * us, 1e-15) ? ResonanceRefusal.NegativeStray : ResonanceRefusal.None;
        return new(
            refusal == ResonanceRefusal.None ? Inductance.FromHenry(l) : null, Inductance.FromHenry(ul), strayF / 1e-12, Capacitance.FromFarad(us), refusal);
    }

    private static double InverseSquare(Frequency f) => 1 / (f.RadiansPerSecond * f.RadiansPerSecond);

    private static double RootSum(params ReadOnlySpan<double> parts)
    {
        var sum = 0.0;
        foreach (var p in parts) sum += p * p;
        return Math.Sqrt(sum);
    }
}
