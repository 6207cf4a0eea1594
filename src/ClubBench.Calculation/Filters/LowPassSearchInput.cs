using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Filters;

/// <summary>A capacitor that may be fitted in one place: a single part, or two in parallel.</summary>
/// <param name="First">The part, or the larger of two.</param>
/// <param name="Second">The part beside it, or null.</param>
/// <param name="StockRank">0 for parts in the drawer, higher for parts harder to get; only breaks ties.</param>
public sealed record CapacitorChoice(Capacitance First, Capacitance? Second = null, int StockRank = 0)
{
    /// <summary>Capacitance of the place.</summary>
    public Capacitance Value => Second is { } second ? First + second : First;

    /// <summary>Number of parts, one or two.</summary>
    public int Parts => Second is null ? 1 : 2;
}

/// <summary>A coil that may be fitted in one place.</summary>
/// <param name="Turns">Whole turns.</param>
/// <param name="Value">Inductance expected of them.</param>
public sealed record CoilChoice(int Turns, Inductance Value);

/// <summary>What the filter must do to one harmonic of every frequency of the band.</summary>
/// <param name="Harmonic">2 for the second harmonic, and so on.</param>
/// <param name="Attenuation">Smallest transducer loss wanted there.</param>
public sealed record HarmonicRequirement(int Harmonic, Decibels Attenuation);

/// <summary>What a filter must reach: the pass-band and its return loss, and the loss at harmonics of both ends of the band.</summary>
/// <param name="Band">Pass-band.</param>
/// <param name="ReturnLoss">Smallest return loss wanted in the band.</param>
/// <param name="Harmonics">Wanted attenuations; may be empty.</param>
public sealed record LowPassRequirement(FrequencyRange Band, Decibels ReturnLoss, IReadOnlyList<HarmonicRequirement> Harmonics);

/// <summary>Question to the search for real values.</summary>
/// <param name="Exact">Design with exact values; gives form, order and terminations.</param>
/// <param name="Capacitors">Candidates of each capacitor place, in ladder order.</param>
/// <param name="Coils">Candidates of each coil place, in ladder order.</param>
/// <param name="Requirement">What must be reached.</param>
/// <param name="CoilQ">Unloaded Q used to tell the figures of the best; null means lossless.</param>
/// <param name="CapacitorQ">Unloaded Q used to tell the figures of the best; null means lossless.</param>
public sealed record LowPassSearchInput(
    LowPassDesign Exact,
    IReadOnlyList<IReadOnlyList<CapacitorChoice>> Capacitors,
    IReadOnlyList<IReadOnlyList<CoilChoice>> Coils,
    LowPassRequirement Requirement,
    double? CoilQ = null,
    double? CapacitorQ = null)
{
    /// <summary>How many of the best are kept, 1 to 1000.</summary>
    public int Keep { get; init; } = 50;

    /// <summary>Frequencies in the pass-band, ends included, 2 to 201.</summary>
    public int PassPoints { get; init; } = 17;

    /// <summary>Whether places that mirror each other must hold equal parts: far fewer combinations and fewer different values to sort.</summary>
    public bool Symmetric { get; init; }

    /// <summary>Most combinations to try; beyond, the candidates farthest from the exact values are left out and the answer is no longer the true best.</summary>
    public long MostCombinations { get; init; } = 20_000_000;
}
