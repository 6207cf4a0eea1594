namespace ClubBench.Calculation.Quantities;

/// <summary>A run of frequencies from low to high, both included; low may equal high (a spot frequency). Immutable.</summary>
public readonly record struct FrequencyRange
{
    /// <summary>Makes a range. Throws when <paramref name="high"/> is below <paramref name="low"/>.</summary>
    public FrequencyRange(Frequency low, Frequency high)
    {
        if (high < low) throw new ArgumentException($"The upper end ({high}) lies below the lower end ({low}).", nameof(high));
        (Low, High) = (low, high);
    }

    /// <summary>Lower end.</summary>
    public Frequency Low { get; }

    /// <summary>Upper end.</summary>
    public Frequency High { get; }

    /// <summary>Arithmetic middle.</summary>
    public Frequency Middle => Frequency.FromHertz(0.5 * (Low.Hertz + High.Hertz));

    /// <summary>Width in hertz, zero for a spot frequency.</summary>
    public double WidthHertz => High.Hertz - Low.Hertz;

    /// <summary>From two ends in MHz.</summary>
    public static FrequencyRange FromMegahertz(double low, double high) => new(Frequency.FromMegahertz(low), Frequency.FromMegahertz(high));

    /// <summary>A single frequency as a range.</summary>
    public static FrequencyRange At(Frequency spot) => new(spot, spot);

    /// <summary>Whether a frequency lies inside, ends included.</summary>
    public bool Contains(Frequency f) => f >= Low && f <= High;

    /// <summary>Evenly spaced frequencies, both ends included; a spot frequency gives one point.</summary>
    public IReadOnlyList<Frequency> Points(int count)
    {
        Guard.Within(count, 2, 100_000, nameof(count));
        if (WidthHertz == 0) return [Low];
        var (low, step) = (Low.Hertz, WidthHertz / (count - 1));
        return [.. Enumerable.Range(0, count).Select(i => Frequency.FromHertz(low + (step * i)))];
    }
}
