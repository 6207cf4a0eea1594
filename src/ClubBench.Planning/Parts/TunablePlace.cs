using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;

namespace ClubBench.Planning.Parts;

/// <summary>A coil with a fixed capacitor, a trimmer and strays: what it tunes, and where the trimmer stands.</summary>
/// <param name="Inductance">The coil.</param>
/// <param name="Fixed">Fixed capacitor.</param>
/// <param name="TrimmerLeast">Trimmer open.</param>
/// <param name="TrimmerMost">Trimmer meshed.</param>
/// <param name="Stray">Strays, devices included.</param>
public sealed record TunablePlace(Inductance Inductance, Capacitance Fixed, Capacitance TrimmerLeast, Capacitance TrimmerMost, Capacitance Stray)
{
    /// <summary>Share of the travel a trimmer should keep at each end (common practice).</summary>
    public const double ComfortableShare = 0.1;

    /// <summary>Share of the travel at each end that lies outside the bench window of a receiving circuit (common practice, 20 to 80 %).</summary>
    public const double BenchShare = 0.2;

    /// <summary>Smallest total capacitance.</summary>
    public Capacitance Least => Fixed + TrimmerLeast + Stray;

    /// <summary>Largest total capacitance.</summary>
    public Capacitance Most => Fixed + TrimmerMost + Stray;

    /// <summary>Lowest frequency it tunes to.</summary>
    public Frequency Lowest => TunedCircuit.ResonantFrequency(Inductance, Most);

    /// <summary>Highest frequency it tunes to.</summary>
    public Frequency Highest => TunedCircuit.ResonantFrequency(Inductance, Least);

    /// <summary>Share of the trimmer's travel used at a frequency: 0 open, 1 meshed; outside 0 to 1 it does not reach.</summary>
    public double Travel(Frequency at) =>
        (TunedCircuit.CapacitanceFor(Inductance, at).Farad - Least.Farad) / (TrimmerMost.Farad - TrimmerLeast.Farad);

    /// <summary>Distance of the travel from the nearer end over a whole band; negative where it does not reach.</summary>
    public double WorstTravel(FrequencyRange band) =>
        new[] { Travel(band.Low), Travel(band.High) }.Min(t => Math.Min(t, 1 - t));

    /// <summary>How much of the coil's inductance the trimmer still absorbs at a frequency, relative, less a fifth in reserve (resonators and windings 6.3).</summary>
    public double TrimRange(Frequency at)
    {
        var needed = TunedCircuit.CapacitanceFor(Inductance, at).Farad;
        return Math.Max(0, 0.8 * Math.Min(needed - Least.Farad, Most.Farad - needed) / needed);
    }
}
