using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Whether a receiver wants a preamplifier at a site, and how much gain.</summary>
internal static class PreamplifierSheet
{
    // The sites in the order the input's label numbers them.
    private static readonly NoiseSite[] Sites = [NoiseSite.City, NoiseSite.Residential, NoiseSite.Rural, NoiseSite.QuietRural];

    internal static readonly SourceRef SystemNoise = new("itu-r-p372", "system noise formula", SourceStatus.FromMemory);

    /// <summary>Frequencies the noise laws are used for.</summary>
    internal static readonly WorksheetInput Frequency = new("frequency", QuantityKind.Frequency, 14.06e6, 0.3e6, 250e6);

    public static Worksheet Sheet { get; } = new(
        "preamplifier", "receiver", SystemNoise,
        [
            new("site", QuantityKind.Count, 4, 1, Sites.Length),
            Frequency,
            new("direct-conversion", QuantityKind.Count, 0, 0, 1),
            new("receiver-noise", QuantityKind.Decibels, 15, 0, 100),
            new("antenna-loss", QuantityKind.Decibels, 0, 0, 60),
            new("preamplifier-noise", QuantityKind.Decibels, 4, 0, 60),
            new("permitted-degradation", QuantityKind.Decibels, 0.5, 0.01, 20),
        ],
        v =>
        {
            var credit = v.IsSet("direct-conversion") ? PreamplifierNeed.DirectConversionCredit : Decibels.Zero;
            var own = v.Db("receiver-noise") - credit;
            return own < Decibels.Zero
                ? Conflict("worksheet-conflict.quieter-than-images", "receiver-noise", "direct-conversion")
                : Answer(v, own);
        });

    private static Outcome<WorksheetAnswer> Answer(WorksheetValues v, Decibels own)
    {
        var judgement = PreamplifierNeed.Judge(own + v.Db("antenna-loss"), Sites[v.Whole("site") - 1], v.Hertz("frequency"));
        List<Figure> figures =
        [
            Figure.Of("degradation-quiet", judgement.AtQuietHour),
            Figure.Of("degradation-median", judgement.AtMedian),
            Figure.Of("noise-quiet", judgement.Quiet.Figure),
            Figure.Of("largest-noise-and-loss", judgement.LargestNoiseFigureAndLoss),
        ];
        if (PreamplifierNeed.RequiredGain(own, v.Db("preamplifier-noise"), v.Db("antenna-loss"), judgement.Quiet.Figure, v.Db("permitted-degradation")) is { } gain)
            figures.Add(Figure.Of("preamplifier-gain", gain));
        return Judged(Phrases.CodeOf(judgement.Verdict), figures);
    }
}
