using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>Fixed capacitor and coil that make a variable capacitor cover a range.</summary>
/// <param name="Fixed">Capacitance across the variable capacitor, strays included.</param>
/// <param name="Coil">Inductance; below about 0.5 uH it is hard to keep stable, and a capacitor in series with the variable one is better.</param>
public sealed record Bandspread(Capacitance Fixed, Inductance Coil)
{
    /// <summary>
    /// Fixed parts for a range of frequencies (width above zero) and a variable capacitor of <paramref name="minimum"/> to
    /// <paramref name="maximum"/>; null when its swing is too small for the range, or it has none.
    /// Method: k = (f_hi/f_lo)^2; C = (C_max - k C_min)/(k - 1). Source: derived.
    /// </summary>
    public static Bandspread? For(FrequencyRange range, Capacitance minimum, Capacitance maximum)
    {
        Guard.Positive(range.WidthHertz, nameof(range));
        var k = range.High / range.Low * (range.High / range.Low);
        var fixedF = (maximum.Farad - (k * minimum.Farad)) / (k - 1);
        if (fixedF < 0 || maximum <= minimum) return null;
        var w = range.Low.RadiansPerSecond;
        return new Bandspread(Capacitance.FromFarad(fixedF), Inductance.FromHenry(1 / (w * w * (fixedF + maximum.Farad))));
    }

    /// <summary>Swing of a variable capacitor behind a series capacitor (above zero).</summary>
    public static (Capacitance Minimum, Capacitance Maximum) Behind(Capacitance series, Capacitance minimum, Capacitance maximum) =>
        (FeedbackPair.InSeries(series, minimum), FeedbackPair.InSeries(series, maximum));
}
