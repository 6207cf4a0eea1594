using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>How a fixed crystal and a tunable oscillator make the local oscillator.</summary>
public enum PremixLaw
{
    /// <summary>Not stated.</summary>
    Unknown,

    /// <summary>Sum: follows the tunable oscillator.</summary>
    CrystalPlusOscillator,

    /// <summary>Crystal less oscillator: runs against it.</summary>
    CrystalMinusOscillator,

    /// <summary>Oscillator less crystal: follows it.</summary>
    OscillatorMinusCrystal,
}

/// <summary>Premixing: a low, stable tunable oscillator moved up by a crystal; its drift is that of both and does not grow with the band. Source: derived.</summary>
public static class Premix
{
    private const double LowestCrystalHz = 1000;

    /// <summary>The laws there are.</summary>
    public static IReadOnlyList<PremixLaw> Laws { get; } = [PremixLaw.CrystalPlusOscillator, PremixLaw.CrystalMinusOscillator, PremixLaw.OscillatorMinusCrystal];

    /// <summary>Whether the result falls as the tunable oscillator rises.</summary>
    public static bool RunsBackwards(PremixLaw law) => law == PremixLaw.CrystalMinusOscillator;

    /// <summary>Drift of the result from that of crystal and tunable oscillator (Hz each, either sign): the band does not multiply it.</summary>
    public static double DriftHertz(PremixLaw law, double crystalHertz, double oscillatorHertz)
    {
        var (x, v) = (Guard.Within(crystalHertz, -1e9, 1e9, nameof(crystalHertz)), Guard.Within(oscillatorHertz, -1e9, 1e9, nameof(oscillatorHertz)));
        return law switch
        {
            PremixLaw.CrystalPlusOscillator => x + v,
            PremixLaw.CrystalMinusOscillator => x - v,
            PremixLaw.OscillatorMinusCrystal => v - x,
            _ => throw new ArgumentOutOfRangeException(nameof(law), law, "The law must be stated."),
        };
    }

    /// <summary>Tunable oscillator that a crystal needs to give a range, or null when an end would be zero or negative.</summary>
    public static FrequencyRange? OscillatorFor(PremixLaw law, Frequency crystal, FrequencyRange wanted) => law switch
    {
        PremixLaw.CrystalPlusOscillator => Range(wanted.Low.Hertz - crystal.Hertz, wanted.High.Hertz - crystal.Hertz),
        PremixLaw.CrystalMinusOscillator => Range(crystal.Hertz - wanted.High.Hertz, crystal.Hertz - wanted.Low.Hertz),
        PremixLaw.OscillatorMinusCrystal => Range(wanted.Low.Hertz + crystal.Hertz, wanted.High.Hertz + crystal.Hertz),
        _ => throw new ArgumentOutOfRangeException(nameof(law), law, "The law must be stated."),
    };

    /// <summary>
    /// Crystals that would give a whole range with the tunable oscillator there is; null when its own range is too narrow or no crystal from 1 kHz up does it.
    /// </summary>
    public static FrequencyRange? CrystalsFor(PremixLaw law, FrequencyRange oscillator, FrequencyRange wanted) => law switch
    {
        PremixLaw.CrystalPlusOscillator => Crystals(wanted.High.Hertz - oscillator.High.Hertz, wanted.Low.Hertz - oscillator.Low.Hertz),
        PremixLaw.CrystalMinusOscillator => Crystals(wanted.High.Hertz + oscillator.Low.Hertz, wanted.Low.Hertz + oscillator.High.Hertz),
        PremixLaw.OscillatorMinusCrystal => Crystals(oscillator.Low.Hertz - wanted.Low.Hertz, oscillator.High.Hertz - wanted.High.Hertz),
        _ => throw new ArgumentOutOfRangeException(nameof(law), law, "The law must be stated."),
    };

    private static FrequencyRange? Crystals(double lowHz, double highHz) => Range(Math.Max(lowHz, LowestCrystalHz), highHz);

    private static FrequencyRange? Range(double lowHz, double highHz) =>
        lowHz > 0 && highHz >= lowHz ? new FrequencyRange(Frequency.FromHertz(lowHz), Frequency.FromHertz(highHz)) : null;
}
