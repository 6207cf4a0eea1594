using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>A band to be reached with one tunable oscillator and crystals from a drawer.</summary>
/// <param name="Band">Segment to be tuned.</param>
/// <param name="Intermediates">Intermediate frequencies there are filters for.</param>
/// <param name="Oscillator">Range of the tunable oscillator.</param>
/// <param name="Stock">Crystals at hand.</param>
public sealed record PremixTask(FrequencyRange Band, IReadOnlyList<Frequency> Intermediates, FrequencyRange Oscillator, IReadOnlyList<Frequency> Stock)
{
    /// <summary>Share of the band that must be covered, 0.01 to 1.</summary>
    public double LeastShare { get; init => field = Guard.Within(value, 0.01, 1, nameof(LeastShare)); } = 1;
}

/// <summary>One way to reach the band.</summary>
/// <param name="Conversion">Side and intermediate frequency.</param>
/// <param name="Crystal">Crystal from the drawer.</param>
/// <param name="Law">How it is mixed with the tunable oscillator.</param>
/// <param name="LocalOscillator">What the receiver's mixer needs for the whole band.</param>
/// <param name="Oscillator">What of it the tunable oscillator has to give for the whole band.</param>
/// <param name="CoveredShare">Share of the band the tunable oscillator reaches, up to 1.</param>
/// <param name="Image">Image of the middle of the band.</param>
/// <param name="BirdiesInBand">Crossings of signal products up to order 7 inside the band.</param>
public sealed record PremixScheme(
    FrequencyScheme Conversion, Frequency Crystal, PremixLaw Law, FrequencyRange LocalOscillator, FrequencyRange Oscillator, double CoveredShare, Frequency? Image, int BirdiesInBand)
{
    /// <summary>Whether the dial runs against the tunable oscillator.</summary>
    public bool DialRunsBackwards => Conversion.DialRunsBackwards != Premix.RunsBackwards(Law);
}

/// <summary>A crystal that would do, where none in the drawer does.</summary>
/// <param name="Conversion">Side and intermediate frequency.</param>
/// <param name="LocalOscillator">What the receiver's mixer needs.</param>
/// <param name="Law">How the crystal would be mixed.</param>
/// <param name="Crystal">Frequencies that would do.</param>
public sealed record PremixWindow(FrequencyScheme Conversion, FrequencyRange LocalOscillator, PremixLaw Law, FrequencyRange Crystal);

/// <summary>Premix schemes from a drawer of crystals, the best first, and the crystals that would do in any case.</summary>
/// <remarks>
/// Method: every side, intermediate frequency, crystal and law; dropped where a harmonic up to the fifth of the crystal falls into the band or within
/// 5 kHz of the intermediate frequency. Order: fewer birdies, forward tuning, image further away by ratio.
/// Valid: one conversion; ordering is common practice, not a measure of quality.
/// Source: derived.
/// </remarks>
/// <param name="Found">Best first; empty where no crystal does.</param>
/// <param name="Windows">Crystals that would do, for an order.</param>
public sealed record PremixSearch(IReadOnlyList<PremixScheme> Found, IReadOnlyList<PremixWindow> Windows)
{
    private static readonly InjectionSide[] Sides = [InjectionSide.LowSide, InjectionSide.HighSide, InjectionSide.SumToIntermediate];

    /// <summary>Searches.</summary>
    public static PremixSearch Of(PremixTask task)
    {
        var conversions = (from i in task.Intermediates from side in Sides select new FrequencyScheme(side, i)).Where(c => IsUsable(c, task.Band)).ToList();
        return new(
            [.. conversions.SelectMany(c => SchemesFor(task, c)).OrderBy(s => s.BirdiesInBand).ThenBy(s => s.DialRunsBackwards).ThenByDescending(s => ImageDistance(task.Band, s))],
            [.. conversions.SelectMany(c => WindowsFor(task, c))]);
    }

    private static bool IsUsable(FrequencyScheme conversion, FrequencyRange band) =>
        !conversion.IssuesOver(band).Any(i => i is SchemeIssue.NoOscillator or SchemeIssue.OscillatorEqualsIntermediate);

    private static IEnumerable<PremixScheme> SchemesFor(PremixTask task, FrequencyScheme conversion) =>
        from crystal in task.Stock
        where CrystalHarmonics.In(task.Band, crystal) is null && CrystalHarmonics.Near(conversion.Intermediate!.Value, crystal) is null
        from law in Premix.Laws
        let local = conversion.OscillatorFor(task.Band)!.Value
        let needed = Premix.OscillatorFor(law, crystal, local)
        where needed is not null
        let share = Covered(needed.Value, task.Oscillator)
        where share >= task.LeastShare - 1e-9
        select new PremixScheme(
            conversion, crystal, law, local, needed.Value, share, conversion.ImageOf(task.Band.Middle), Birdies.WithSignal(conversion, task.Band).Count(b => b.IsInside));

    private static IEnumerable<PremixWindow> WindowsFor(PremixTask task, FrequencyScheme conversion) =>
        from law in Premix.Laws
        let local = conversion.OscillatorFor(task.Band)!.Value
        let crystals = Premix.CrystalsFor(law, task.Oscillator, local)
        where crystals is not null
        select new PremixWindow(conversion, local, law, crystals.Value);

    private static double Covered(FrequencyRange needed, FrequencyRange available)
    {
        var shared = Math.Min(needed.High.Hertz, available.High.Hertz) - Math.Max(needed.Low.Hertz, available.Low.Hertz);
        if (needed.WidthHertz == 0) return shared >= 0 ? 1 : 0;
        return Math.Max(0, shared) / needed.WidthHertz;
    }

    private static double ImageDistance(FrequencyRange band, PremixScheme scheme) =>
        scheme.Image is { } image ? Math.Abs(Math.Log(image / band.Middle)) : double.MaxValue;
}
