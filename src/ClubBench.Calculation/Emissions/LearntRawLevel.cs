using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Emissions;

/// <summary>Raw harmonic level of a stage learnt from readings behind known filters: better than any table. Immutable.</summary>
/// <remarks>
/// Method: raw = reading + (filter loss at the harmonic - at the carrier), mean over boards; uncertainty for one more board
/// sqrt(s^2 (1 + 1/n) + u^2) with the instrument's u, and s = 4 dB while only one board was read.
/// Valid: the same stage, load line and drive; on a new band <see cref="OnNewBand"/> adds 3 dB. No reading at the instrument's floor: that is only an upper bound.
/// Source: derived.
/// </remarks>
/// <param name="Raw">Level ahead of the filter with the uncertainty of one more board.</param>
/// <param name="SampleDeviation">Spread of the boards; 4 dB assumed for a single one.</param>
/// <param name="Boards">Number of boards read.</param>
public sealed record LearntRawLevel(UncertainLevel Raw, Decibels SampleDeviation, int Boards)
{
    private const double SingleBoardDb = 4;
    private const double NewBandDb = 3;

    /// <summary>Learns from one reading per board, each with the suppression of the filter fitted then.</summary>
    /// <param name="readings">Level relative to the carrier at the antenna, and filter loss at the harmonic less that at the carrier. At least one.</param>
    /// <param name="instrument">Standard uncertainty of the instrument.</param>
    public static LearntRawLevel From(IReadOnlyList<(Decibels Level, Decibels Suppression)> readings, Decibels instrument)
    {
        var n = Guard.Within(readings.Count, 1, int.MaxValue, nameof(readings));
        var raw = readings.Select(r => r.Level.Db + r.Suppression.Db).ToList();
        var mean = raw.Average();
        var s = n == 1 ? SingleBoardDb : Math.Sqrt(raw.Sum(x => (x - mean) * (x - mean)) / (n - 1));
        var u = Math.Sqrt((s * s * (1 + (1.0 / n))) + (instrument.Db * instrument.Db));
        return new LearntRawLevel(new UncertainLevel(Decibels.FromDb(mean), Decibels.FromDb(u)), Decibels.FromDb(s), n);
    }

    /// <summary>The same knowledge carried to another band: a new band is a new stage, so 3 dB more uncertainty.</summary>
    public LearntRawLevel OnNewBand() => this with { Raw = Raw with { StandardUncertainty = Raw.StandardUncertainty + Decibels.FromDb(NewBandDb) } };
}
