using ClubBench.Calculation.BandPass;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.CrystalFilters;

/// <summary>What a crystal filter does, as against what it was designed for.</summary>
/// <remarks>
/// Method: pass-band as of every band-pass; from its edges outwards in steps of a fiftieth of the bandwidth, then bisection to a millihertz.
/// Valid: a single pass-band within twice the expected bandwidth of the middle.
/// Source: derived.
/// </remarks>
/// <param name="PassBand">Least loss and the half-power band.</param>
/// <param name="Ripple">Deepest dip between peaks inside the half-power band; zero for a single peak.</param>
/// <param name="Band6dB">Where the loss is 6 dB more than the least.</param>
/// <param name="Band60dB">Where it is 60 dB more; null where a skirt does not get there within 40 bandwidths.</param>
public sealed record CrystalFilterResponse(BandPassResponse PassBand, Decibels Ripple, FrequencyRange Band6dB, FrequencyRange? Band60dB)
{
    private const int StepsPerBandwidth = 50;
    private const int FurthestBandwidths = 40;
    private static readonly Decibels Six = Decibels.FromDb(6);
    private static readonly Decibels Sixty = Decibels.FromDb(60);

    /// <summary>Least loss.</summary>
    public Decibels Loss => PassBand.PeakLoss;

    /// <summary>Width between the half-power points, Hz.</summary>
    public double Width3dBHertz => PassBand.Band.WidthHertz;

    /// <summary>Middle of the half-power band: where a carrier is placed from.</summary>
    public Frequency Center => PassBand.Band.Middle;

    /// <summary>Width at 60 dB over width at 6 dB, above 1; null where the 60 dB width is not reached.</summary>
    public double? ShapeFactor => Band60dB?.WidthHertz / Band6dB.WidthHertz;

    /// <summary>Analyses a filter of about this bandwidth; null where no pass-band is found near its middle.</summary>
    public static CrystalFilterResponse? Of(CrystalFilter filter, Frequency bandwidth)
    {
        if (BandPassResponse.Of(filter.Loss, filter.LoadedMiddle, bandwidth) is not { } passBand) return null;
        var stepHz = bandwidth.Hertz / StepsPerBandwidth;
        return SkirtsAt(filter, passBand, Six, stepHz) is { } six
            ? new(passBand, RippleOf(filter, passBand), six, SkirtsAt(filter, passBand, Sixty, stepHz))
            : null;
    }

    private static FrequencyRange? SkirtsAt(CrystalFilter filter, BandPassResponse passBand, Decibels down, double stepHz)
    {
        var limit = passBand.PeakLoss + down;
        return (Skirt(passBand.Band.Low, -stepHz), Skirt(passBand.Band.High, stepHz)) is ({ } low, { } high) ? new FrequencyRange(low, high) : null;

        Frequency? Skirt(Frequency from, double stepHz)
        {
            for (var i = 0; i < StepsPerBandwidth * FurthestBandwidths; i++)
            {
                var (inside, outside) = (from.Hertz + (i * stepHz), from.Hertz + ((i + 1) * stepHz));
                if (outside <= 0) return null;
                if (filter.Loss(Frequency.FromHertz(outside)) > limit) return Bisect(filter, limit, inside, outside);
            }

            return null;
        }
    }

    private static Frequency Bisect(CrystalFilter filter, Decibels limit, double insideHz, double outsideHz)
    {
        while (Math.Abs(outsideHz - insideHz) > 1e-3)
        {
            var middle = 0.5 * (insideHz + outsideHz);
            (insideHz, outsideHz) = filter.Loss(Frequency.FromHertz(middle)) <= limit ? (middle, outsideHz) : (insideHz, middle);
        }

        return Frequency.FromHertz(insideHz);
    }

    // A dip is a place lossier than both neighbours; the edges themselves are none.
    private static Decibels RippleOf(CrystalFilter filter, BandPassResponse passBand)
    {
        var losses = passBand.Band.Points(201).Select(filter.Loss).ToList();
        var dips = Enumerable.Range(1, losses.Count - 2).Where(i => losses[i] > losses[i - 1] && losses[i] >= losses[i + 1]).Select(i => losses[i]);
        return dips.Append(passBand.PeakLoss).Max() - passBand.PeakLoss;
    }
}
