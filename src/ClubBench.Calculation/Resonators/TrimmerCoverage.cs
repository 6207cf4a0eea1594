using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Statistics;

namespace ClubBench.Calculation.Resonators;

/// <summary>A tuned circuit with a trimmer and the limits of its parts. Immutable.</summary>
/// <param name="Inductance">Nominal inductance, above zero.</param>
/// <param name="InductanceTolerance">Relative tolerance (0.05 = 5 %); 0.01 to 0.02 once the winding has been adjusted.</param>
/// <param name="FixedCapacitor">Nominal fixed capacitor; zero where there is none.</param>
/// <param name="FixedTolerance">Relative tolerance of it.</param>
/// <param name="TrimmerMinimum">The largest minimum the data sheet allows.</param>
/// <param name="TrimmerMaximum">The smallest maximum the data sheet allows.</param>
/// <param name="StrayMinimum">Least stray capacitance.</param>
/// <param name="StrayMaximum">Most stray capacitance.</param>
/// <param name="Band">Frequencies to be reached.</param>
public sealed record TrimmedCircuit(
    Inductance Inductance,
    double InductanceTolerance,
    Capacitance FixedCapacitor,
    double FixedTolerance,
    Capacitance TrimmerMinimum,
    Capacitance TrimmerMaximum,
    Capacitance StrayMinimum,
    Capacitance StrayMaximum,
    FrequencyRange Band);

/// <summary>
/// Whether the trimmer reaches the band on every board. The largest inductance needs the smallest capacitance at the upper end of the band,
/// the smallest inductance the largest at the lower end. Source: derived (worst case over independent limits). Immutable.
/// </summary>
public sealed record TrimmerCoverage
{
    private readonly TrimmedCircuit circuit;

    private TrimmerCoverage(TrimmedCircuit circuit) => this.circuit = circuit;

    /// <summary>Spare capacitance at the upper end of the band in pF, worst case; negative is missing.</summary>
    public double MarginHighPicofarad =>
        (LeastNeeded - (circuit.FixedCapacitor * (1 + circuit.FixedTolerance)).Farad - circuit.StrayMaximum.Farad - circuit.TrimmerMinimum.Farad) / 1e-12;

    /// <summary>Spare capacitance at the lower end of the band in pF, worst case; negative is missing.</summary>
    public double MarginLowPicofarad =>
        ((circuit.FixedCapacitor * (1 - circuit.FixedTolerance)).Farad + circuit.StrayMinimum.Farad + circuit.TrimmerMaximum.Farad - MostNeeded) / 1e-12;

    /// <summary>Whether every board within its limits reaches the whole band.</summary>
    public bool Covered => MarginHighPicofarad >= 0 && MarginLowPicofarad >= 0;

    /// <summary>Tuning range with nominal parts and mean stray.</summary>
    public FrequencyRange NominalRange => new(Nominal(circuit.TrimmerMaximum), Nominal(circuit.TrimmerMinimum));

    /// <summary>Fixed capacitor that would make both margins equal; null where strays and trimmer alone are already too much.</summary>
    public Capacitance? CentredFixedCapacitor
    {
        get
        {
            var farad = 0.5 * (LeastNeeded + MostNeeded - Parasitic - circuit.TrimmerMinimum.Farad - circuit.TrimmerMaximum.Farad);
            return farad > 0 ? Capacitance.FromFarad(farad) : null;
        }
    }

    /// <summary>Smallest trimmer maximum that would cover the lower end in the worst case.</summary>
    public Capacitance NeededTrimmerMaximum =>
        Capacitance.FromPicofarad(Math.Max(0, circuit.TrimmerMaximum.Picofarad - MarginLowPicofarad));

    private double LeastNeeded => TunedCircuit.CapacitanceFor(circuit.Inductance * (1 + circuit.InductanceTolerance), circuit.Band.High).Farad;

    private double MostNeeded => TunedCircuit.CapacitanceFor(circuit.Inductance * (1 - circuit.InductanceTolerance), circuit.Band.Low).Farad;

    private double Parasitic => circuit.StrayMinimum.Farad + circuit.StrayMaximum.Farad;

    /// <summary>Examines a circuit. Tolerances from 0 to below 1; the trimmer maximum not below its minimum, likewise the strays.</summary>
    public static TrimmerCoverage Of(TrimmedCircuit circuit)
    {
        Guard.Positive(circuit.Inductance.Henry, nameof(circuit.Inductance));
        Guard.Within(circuit.InductanceTolerance, 0, 0.9, nameof(circuit.InductanceTolerance));
        Guard.Within(circuit.FixedTolerance, 0, 0.9, nameof(circuit.FixedTolerance));
        Guard.NotNegative(circuit.TrimmerMaximum.Farad - circuit.TrimmerMinimum.Farad, nameof(circuit.TrimmerMaximum));
        Guard.NotNegative(circuit.StrayMaximum.Farad - circuit.StrayMinimum.Farad, nameof(circuit.StrayMaximum));
        return new(circuit);
    }

    /// <summary>
    /// How many of a number of imagined boards reach the whole band. Inductance, fixed capacitor and stray are drawn independently and uniformly
    /// within their limits (a data-sheet tolerance is a limit). The same seed gives the same count; 20 000 draws have a standard error of at
    /// most 0.35 %. Method: Monte Carlo. Source: common practice.
    /// </summary>
    public Proportion Yield(ulong seed, int draws = 20_000)
    {
        var random = new SeededRandom(seed);
        var passing = 0;
        for (var i = 0; i < Guard.Within(draws, 1, 10_000_000, nameof(draws)); i++)
            if (Reaches(random)) passing++;
        return new(passing, draws);
    }

    private bool Reaches(SeededRandom random)
    {
        var l = circuit.Inductance * random.Uniform(1 - circuit.InductanceTolerance, 1 + circuit.InductanceTolerance);
        var c = (circuit.FixedCapacitor.Farad * random.Uniform(1 - circuit.FixedTolerance, 1 + circuit.FixedTolerance))
            + random.Uniform(circuit.StrayMinimum.Farad, circuit.StrayMaximum.Farad);
        return c + circuit.TrimmerMinimum.Farad <= TunedCircuit.CapacitanceFor(l, circuit.Band.High).Farad
            && c + circuit.TrimmerMaximum.Farad >= TunedCircuit.CapacitanceFor(l, circuit.Band.Low).Farad;
    }

    private Frequency Nominal(Capacitance trimmer) =>
        TunedCircuit.ResonantFrequency(circuit.Inductance, circuit.FixedCapacitor + Capacitance.FromFarad(0.5 * Parasitic) + trimmer);
}
