using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.Plans;

/// <summary>Which frequencies stand at the ports of a stage, from the scheme. Direct conversion has one range everywhere before the audio.</summary>
internal static class PortFrequencies
{
    private static readonly Dictionary<string, FrequencyRange> Nothing = [];

    /// <summary>Frequencies at ports that differ from the band; empty for direct conversion.</summary>
    public static IReadOnlyDictionary<string, FrequencyRange> Of(string stage, Kit kit, FrequencyRange band)
    {
        var ranges = kit.Scheme.Conversions
            .Where(c => c.Oscillator == stage && c.IntermediateFrequencyHz is not null)
            .Select(c => Oscillator(band, c.Side, c.IntermediateFrequencyHz!.Value))
            .ToList();
        return ranges.Count == 0 ? Nothing : new Dictionary<string, FrequencyRange>(StringComparer.Ordinal) { ["output"] = ranges[0] };
    }

    private static FrequencyRange Oscillator(FrequencyRange band, MixingSide side, double ifHz)
    {
        var ends = new[] { band.Low.Hertz, band.High.Hertz }.Select(rf => side switch
        {
            MixingSide.High => rf + ifHz,
            MixingSide.Low => rf - ifHz,
            MixingSide.Sum => ifHz - rf,
            _ => rf,
        }).Select(Math.Abs).Order().ToArray();
        return new FrequencyRange(Frequency.FromHertz(ends[0]), Frequency.FromHertz(ends[1]));
    }
}
