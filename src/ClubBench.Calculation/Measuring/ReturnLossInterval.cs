using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Measuring;

/// <summary>What a bridge or coupler of limited directivity leaves open about a return loss. Immutable.</summary>
/// <remarks>Method: the leak adds to the reflection in unknown phase. Valid: directivity referred to the measuring plane. Source: derived.</remarks>
/// <param name="Least">Smallest return loss it may be.</param>
/// <param name="Most">Largest return loss it may be; null where a perfect match is possible.</param>
public sealed record ReturnLossInterval(Decibels Least, Decibels? Most)
{
    /// <summary>Interval of a reading; both above 0 dB.</summary>
    public static ReturnLossInterval Of(Decibels reading, Decibels directivity)
    {
        var measured = Math.Pow(10, -Guard.Positive(reading.Db, nameof(reading)) / 20);
        var leak = Math.Pow(10, -Guard.Positive(directivity.Db, nameof(directivity)) / 20);
        var least = Decibels.FromDb(-20 * Math.Log10(Math.Min(1, measured + leak)));
        return new ReturnLossInterval(least, MostOf(Math.Abs(measured - leak)));
    }

    private static Decibels? MostOf(double difference) => difference < 1e-9 ? null : Decibels.FromDb(-20 * Math.Log10(difference));
}
