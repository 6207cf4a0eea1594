using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Noise;

/// <summary>Whether a receiver wants a preamplifier at a site, by how much its own noise degrades what the antenna brings.</summary>
public enum PreamplifierVerdict
{
    /// <summary>Not judged.</summary>
    Unknown,

    /// <summary>Up to 0.5 dB lost.</summary>
    NotNeeded,

    /// <summary>Up to 1 dB lost.</summary>
    Adequate,

    /// <summary>Up to 3 dB lost.</summary>
    Marginal,

    /// <summary>More than 3 dB lost.</summary>
    Needed,
}

/// <summary>Judgement at the quiet hour, with the median beside it.</summary>
/// <param name="Verdict">From the quiet hour.</param>
/// <param name="AtQuietHour">Degradation at the quiet hour.</param>
/// <param name="AtMedian">Degradation at the median.</param>
/// <param name="Quiet">Noise the quiet hour was judged with.</param>
/// <param name="LargestNoiseFigureAndLoss">Noise figure plus loss that would cost 1 dB at the quiet hour.</param>
public sealed record PreamplifierJudgement(
    PreamplifierVerdict Verdict, Decibels AtQuietHour, Decibels AtMedian, SiteNoise Quiet, Decibels LargestNoiseFigureAndLoss);

/// <summary>
/// Preamplifier decision. Method: D = 10 log10(1 + (l f - 1)/fa), all temperatures 290 K. Source: itu-r-p372 system noise formula, from memory;
/// limits 0.5, 1 and 3 dB are common practice.
/// </summary>
public static class PreamplifierNeed
{
    /// <summary>
    /// Direct conversion hears noise in both audio images, so its receiver noise counts half beside external noise that also arrives twice:
    /// subtract this from the single-sideband noise figure before judging. Source: derived.
    /// </summary>
    public static Decibels DirectConversionCredit { get; } = Decibels.FromPowerRatio(2);

    /// <summary>
    /// Signal-to-noise ratio lost to the receiver. <paramref name="noiseFigureAndLoss"/> is receiver noise figure plus antenna and line loss,
    /// 0 dB or above; <paramref name="external"/> the external noise figure.
    /// </summary>
    public static Decibels Degradation(Decibels noiseFigureAndLoss, Decibels external)
    {
        Guard.NotNegative(noiseFigureAndLoss.Db, nameof(noiseFigureAndLoss));
        return Decibels.FromPowerRatio(1 + ((noiseFigureAndLoss.PowerRatio - 1) / external.PowerRatio));
    }

    /// <summary>Judges a receiver at a site; <paramref name="noiseFigureAndLoss"/> as in <see cref="Degradation"/>.</summary>
    public static PreamplifierJudgement Judge(Decibels noiseFigureAndLoss, NoiseSite site, Frequency frequency, Frequency? galacticFrom = null)
    {
        var quiet = ExternalNoise.At(site, frequency, NoiseHour.Quiet, galacticFrom);
        var median = ExternalNoise.At(site, frequency, NoiseHour.Median, galacticFrom);
        var degradation = Degradation(noiseFigureAndLoss, quiet.Figure);
        return new PreamplifierJudgement(
            VerdictOf(degradation), degradation, Degradation(noiseFigureAndLoss, median.Figure), quiet, LargestFor(Decibels.FromDb(1), quiet.Figure));
    }

    /// <summary>Verdict for a degradation.</summary>
    public static PreamplifierVerdict VerdictOf(Decibels degradation) => degradation.Db switch
    {
        <= 0.5 => PreamplifierVerdict.NotNeeded,
        <= 1 => PreamplifierVerdict.Adequate,
        <= 3 => PreamplifierVerdict.Marginal,
        _ => PreamplifierVerdict.Needed,
    };

    /// <summary>Largest noise figure plus loss that stays within a degradation (0 dB or above).</summary>
    public static Decibels LargestFor(Decibels degradation, Decibels external)
    {
        Guard.NotNegative(degradation.Db, nameof(degradation));
        return Decibels.FromPowerRatio(1 + ((degradation.PowerRatio - 1) * external.PowerRatio));
    }

    /// <summary>
    /// Gain a preamplifier needs so that the degradation stays within <paramref name="degradation"/>; 0 dB when none is needed, null when no gain
    /// is enough (less antenna loss or a quieter preamplifier is). Method: G = (f_rx - 1)/(f_max - f_pre), f_max after the loss. Source: friis-1944.
    /// </summary>
    public static Decibels? RequiredGain(Decibels receiver, Decibels preamplifier, Decibels loss, Decibels external, Decibels degradation)
    {
        var permitted = LargestFor(degradation, external).PowerRatio / loss.PowerRatio;
        if (receiver.PowerRatio <= permitted) return Decibels.Zero;
        if (permitted <= preamplifier.PowerRatio) return null;
        return Decibels.FromPowerRatio((receiver.PowerRatio - 1) / (permitted - preamplifier.PowerRatio));
    }
}
