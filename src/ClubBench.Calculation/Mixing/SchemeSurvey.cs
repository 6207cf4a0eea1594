using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>Whether a frequency scheme is fit for a band.</summary>
public enum SchemeVerdict
{
    /// <summary>Not judged.</summary>
    Unknown,

    /// <summary>Nothing speaks against it.</summary>
    Clean,

    /// <summary>Works with a blemish: a close image, a whistle in or beside the band, an intermediate frequency near it.</summary>
    Blemished,

    /// <summary>Does not work: no oscillator, or it equals the intermediate frequency inside the band.</summary>
    Refused,
}

/// <summary>One way a set with this intermediate frequency could be moved to a band.</summary>
/// <param name="Scheme">Side and intermediate frequency.</param>
/// <param name="Verdict">Fit or not.</param>
/// <param name="Oscillator">What the mixer needs; null where there is none.</param>
/// <param name="Image">Image of the middle of the band.</param>
/// <param name="Issues">What speaks against it.</param>
/// <param name="WithSignal">Crossings of signal products up to order 7, in the band and beside it.</param>
/// <param name="Whistles">Whistles without antenna up to order 12, in the band and beside it; empty while no beat oscillator is given.</param>
public sealed record SchemeRow(
    FrequencyScheme Scheme,
    SchemeVerdict Verdict,
    FrequencyRange? Oscillator,
    Frequency? Image,
    IReadOnlyList<SchemeIssue> Issues,
    IReadOnlyList<Birdie> WithSignal,
    IReadOnlyList<Birdie> Whistles);

/// <summary>
/// Whether a superhet can move to a band with its filter kept: one row for each side. Method: scheme algebra, birdies and internal whistles.
/// Valid: the front end is made anew and judged by the image. Source: derived.
/// </summary>
public static class SchemeSurvey
{
    // From this order on a whistle drowns in the noise of the band.
    private const int HighestLoudOrder = 5;

    private static readonly InjectionSide[] Sides = [InjectionSide.LowSide, InjectionSide.HighSide, InjectionSide.SumToIntermediate];

    /// <summary>A row for each side, best verdict first, then the fewer whistles.</summary>
    /// <param name="band">Segment wanted.</param>
    /// <param name="intermediate">Intermediate frequency of the set.</param>
    /// <param name="beat">Its beat or carrier oscillator; null where it has none.</param>
    public static IReadOnlyList<SchemeRow> Of(FrequencyRange band, Frequency intermediate, Frequency? beat = null) =>
        [.. Sides.Select(side => Row(new(side, intermediate), band, beat)).OrderBy(r => r.Verdict).ThenBy(r => r.WithSignal.Count + r.Whistles.Count)];

    private static SchemeRow Row(FrequencyScheme scheme, FrequencyRange band, Frequency? beat)
    {
        var issues = scheme.IssuesOver(band);
        var oscillator = scheme.OscillatorFor(band);
        var withSignal = oscillator is null ? [] : Birdies.WithSignal(scheme, band);
        var whistles = oscillator is null || beat is not { } b ? [] : Birdies.Internal(scheme, band, b);
        return new(scheme, VerdictOf(issues, withSignal.Concat(whistles)), oscillator, oscillator is null ? null : scheme.ImageOf(band.Middle), issues, withSignal, whistles);
    }

    private static SchemeVerdict VerdictOf(IReadOnlyList<SchemeIssue> issues, IEnumerable<Birdie> heard) =>
        issues.Any(i => i is SchemeIssue.NoOscillator or SchemeIssue.OscillatorEqualsIntermediate) ? SchemeVerdict.Refused
        : issues.Count > 0 || heard.Any(b => b.Order <= HighestLoudOrder) ? SchemeVerdict.Blemished
        : SchemeVerdict.Clean;
}
