using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Audio;

/// <summary>
/// Filter centre, sidetone, receive offset and BFO pitch of a telegraphy set must agree, or a station tuned in by ear is not answered on its
/// frequency. Limit 50 Hz: common practice.
/// </summary>
public static class PitchAgreement
{
    /// <summary>Largest spread in Hz that still counts as agreement. Source: common practice.</summary>
    public const double LargestSpreadHertz = 50;

    /// <summary>
    /// The pitch that does not agree: the key of the one furthest from the middle when the spread exceeds 50 Hz, or null when all agree.
    /// With two pitches the first is named; then either may be wrong.
    /// </summary>
    public static string? OddOneOut(IReadOnlyList<KeyValuePair<string, Frequency>> pitches)
    {
        if (pitches.Count < 2) return null;
        var sorted = pitches.Select(p => p.Value.Hertz).Order().ToList();
        if (sorted[^1] - sorted[0] <= LargestSpreadHertz) return null;
        var middle = 0.5 * (sorted[(sorted.Count - 1) / 2] + sorted[sorted.Count / 2]);
        return pitches.MaxBy(p => Math.Abs(p.Value.Hertz - middle)).Key;
    }
}
