using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Noise;

/// <summary>External noise at a site.</summary>
/// <param name="Figure">Noise figure Fa in dB above kT0B.</param>
/// <param name="CountsGalactic">Whether galactic noise is in it.</param>
/// <param name="IsExtrapolated">Whether the formula was stretched beyond the frequencies it is stated for.</param>
public sealed record SiteNoise(Decibels Figure, bool CountsGalactic, bool IsExtrapolated);

/// <summary>
/// Noise that an antenna brings in. Method: Fam = c - d log10(f/MHz) by site category, galactic noise added as power.
/// Valid: 0.3 to 250 MHz, a short lossless vertical antenna; without lightning noise, which adds below 10 MHz at night and in summer.
/// Source: itu-r-p372, constants in <c>Tables/external-noise.csv</c>; adding the medians as powers is an approximation.
/// </summary>
public static class ExternalNoise
{
    /// <summary>Below this frequency the ionosphere usually keeps galactic noise out; the critical frequency of the day replaces it.</summary>
    public static Frequency UsualGalacticLimit { get; } = Frequency.FromMegahertz(10);

    private static readonly Dictionary<string, NoiseLaw> Laws = CsvTable.Read("external-noise", NoiseLaw.Read).ToDictionary(l => l.Category, StringComparer.Ordinal);

    /// <summary>Source of the constants of a site category.</summary>
    public static SourceRef SourceOf(NoiseSite site) => LawOf(site).Source;

    /// <summary>How far the noise of a site lies below its median in the quiet tenth of the hours and above it in the loud tenth.</summary>
    public static (Decibels Below, Decibels Above) DecilesOf(NoiseSite site) => (LawOf(site).LowerDecile, LawOf(site).UpperDecile);

    /// <summary>Median man-made noise of a site in dB above kT0B. Throws outside 0.3 to 250 MHz and for an unknown site.</summary>
    public static Decibels ManMade(NoiseSite site, Frequency frequency) => LawOf(site).Median(Within(frequency));

    /// <summary>Median galactic noise in dB above kT0B; heard only above the critical frequency of the ionosphere.</summary>
    public static Decibels Galactic(Frequency frequency) => Laws["galactic"].Median(Within(frequency));

    /// <summary>
    /// Noise of a site at an hour: man-made noise (its lower decile at the quiet hour) plus the galactic median from
    /// <paramref name="galacticFrom"/> on (10 MHz when not given). Throws outside 0.3 to 250 MHz.
    /// </summary>
    public static SiteNoise At(NoiseSite site, Frequency frequency, NoiseHour hour, Frequency? galacticFrom = null)
    {
        var law = LawOf(site);
        var manMade = ManMade(site, frequency) - (hour == NoiseHour.Quiet ? law.LowerDecile : Decibels.Zero);
        var countsGalactic = frequency >= (galacticFrom ?? UsualGalacticLimit);
        var total = manMade.PowerRatio + (countsGalactic ? Galactic(frequency).PowerRatio : 0);
        return new SiteNoise(Decibels.FromPowerRatio(total), countsGalactic, !law.StatedFor.Contains(frequency));
    }

    /// <summary>
    /// External noise from a club's own measurement: how far the receiver's noise rises when the antenna replaces a 50 ohm load.
    /// <paramref name="receiver"/> is its noise figure (for direct conversion the double-sideband value), <paramref name="rise"/> 0 dB or above.
    /// Method: fa = F (Y - 1) + 1. Source: derived.
    /// </summary>
    public static Decibels FromMeasuredRise(Decibels receiver, Decibels rise)
    {
        Guard.NotNegative(rise.Db, nameof(rise));
        return Decibels.FromPowerRatio((receiver.PowerRatio * (rise.PowerRatio - 1)) + 1);
    }

    private static Frequency Within(Frequency frequency)
    {
        Guard.Within(frequency.Megahertz, 0.3, 250, nameof(frequency));
        return frequency;
    }

    private static NoiseLaw LawOf(NoiseSite site) => site switch
    {
        NoiseSite.City => Laws["city"],
        NoiseSite.Residential => Laws["residential"],
        NoiseSite.Rural => Laws["rural"],
        NoiseSite.QuietRural => Laws["quiet_rural"],
        _ => throw new ArgumentOutOfRangeException(nameof(site), site, "The site category must be stated."),
    };

    private sealed record NoiseLaw(string Category, double InterceptDb, double SlopeDb, FrequencyRange StatedFor, Decibels LowerDecile, Decibels UpperDecile, SourceRef Source)
    {
        public Decibels Median(Frequency f) => Decibels.FromDb(InterceptDb - (SlopeDb * Math.Log10(f.Megahertz)));

        public static NoiseLaw Read(CsvRow r) => new(
            r.Text("category"),
            r.Number("c_db"),
            r.Number("d_db_per_decade"),
            FrequencyRange.FromMegahertz(r.Number("f_min_mhz"), r.Number("f_max_mhz")),
            Decibels.FromDb(r.Number("lower_decile_db")),
            Decibels.FromDb(r.Number("upper_decile_db")),
            r.Source());
    }
}
