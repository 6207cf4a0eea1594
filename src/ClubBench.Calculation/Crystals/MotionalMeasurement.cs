using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Crystals;

/// <summary>Crystal parameters from a counter and known capacitors. Method: exact inversion of fL = fs sqrt(1 + Cm/(C0 + CL)). Source: derived.</summary>
public static class MotionalMeasurement
{
    /// <summary>
    /// Two loads with a known series resonance. One hertz of reading error at 9 MHz is about 0.1 % of Cm.
    /// Method: u = (f/fs)^2 - 1; Cm = (CL2 - CL1)/(1/u2 - 1/u1); C0 = Cm/u1 - CL1.
    /// </summary>
    public static MeasuredCrystal FromTwoLoads(Frequency series, LoadedReading first, LoadedReading second)
    {
        var (small, large) = InOrder(first, second);
        if (large.Frequency <= series || small.Frequency <= large.Frequency || small.Load >= large.Load) return Refused(MeasurementRefusal.NotFalling);
        var (u1, u2) = (Excess(small.Frequency, series), Excess(large.Frequency, series));
        var motionalF = (large.Load - small.Load).Farad / ((1 / u2) - (1 / u1));
        return Checked(series, motionalF, (motionalF / u1) - small.Load.Farad);
    }

    /// <summary>
    /// Three loads and nothing else known. Method: f^2 = a + b/(c + CL) with a = fs^2, b = fs^2 Cm, c = C0.
    /// </summary>
    public static MeasuredCrystal FromThreeLoads(LoadedReading first, LoadedReading second, LoadedReading third)
    {
        LoadedReading[] r = [.. new[] { first, second, third }.OrderBy(x => x.Load)];
        if (r[0].Load >= r[1].Load || r[1].Load >= r[2].Load) return Refused(MeasurementRefusal.TooFewLoads);
        if (r[0].Frequency <= r[1].Frequency || r[1].Frequency <= r[2].Frequency) return Refused(MeasurementRefusal.NotFalling);

        var (c1, c2, c3) = (r[0].Load.Farad, r[1].Load.Farad, r[2].Load.Farad);
        var rho = SquareDifference(r[0], r[1]) / SquareDifference(r[1], r[2]) * ((c3 - c2) / (c2 - c1));
        if (rho <= 1) return Refused(MeasurementRefusal.NotFlattening);
        var staticF = (c3 - (rho * c1)) / (rho - 1);
        var b = SquareDifference(r[0], r[1]) / ((1 / (staticF + c1)) - (1 / (staticF + c2)));
        var seriesSquared = (r[0].Frequency.Hertz * r[0].Frequency.Hertz) - (b / (staticF + c1));
        return seriesSquared > 0 ? Checked(Frequency.FromHertz(Math.Sqrt(seriesSquared)), b / seriesSquared, staticF) : Refused(MeasurementRefusal.NoSuchCrystal);
    }

    /// <summary>
    /// Test oscillator: its frequency with the crystal alone and with a capacitor in series. <paramref name="oscillator"/> is the capacitance the oscillator
    /// shows, <paramref name="staticCapacitance"/> the C0 with holder but without fixture. Method: Cm = (q - 1)/(1/(C0 + CL2) - q/(C0 + Cosc)), q = (fb/fa)^2.
    /// </summary>
    public static MeasuredCrystal FromOscillatorShift(
        Frequency alone, Frequency withSeries, Capacitance series, Capacitance oscillator, Capacitance staticCapacitance)
    {
        if (withSeries <= alone) return Refused(MeasurementRefusal.NotRising);
        var q = withSeries / alone * (withSeries / alone);
        var loadF = oscillator.Farad * series.Farad / (oscillator.Farad + series.Farad);
        var (near, far) = (staticCapacitance.Farad + loadF, staticCapacitance.Farad + oscillator.Farad);
        var slope = (1 / near) - (q / far);
        if (slope <= 0) return Refused(MeasurementRefusal.NoSuchCrystal);
        var motionalF = (q - 1) / slope;
        var fs = alone / Math.Sqrt(1 + (motionalF / far));
        return Checked(fs, motionalF, staticCapacitance.Farad);
    }

    /// <summary>
    /// The same by rule of thumb, 2 (Cs + C0) times the relative shift: reads some 3 % low, because the load is not the series capacitor alone. Only
    /// where the capacitance of the oscillator is unknown. Null when the frequency does not rise.
    /// </summary>
    public static Capacitance? ByRuleFromOscillatorShift(Frequency alone, Frequency withSeries, Capacitance series, Capacitance staticCapacitance) =>
        withSeries > alone ? (series + staticCapacitance) * (2 * ((withSeries / alone) - 1)) : null;

    private static MeasuredCrystal Checked(Frequency series, double motionalF, double staticF) => motionalF > 0 && staticF > 0
        ? new MeasuredCrystal(new CrystalParameters(series, Capacitance.FromFarad(motionalF), Capacitance.FromFarad(staticF), default), MeasurementRefusal.None)
        : Refused(MeasurementRefusal.NoSuchCrystal);

    private static MeasuredCrystal Refused(MeasurementRefusal why) => new(null, why);

    private static (LoadedReading Small, LoadedReading Large) InOrder(LoadedReading a, LoadedReading b) => a.Load <= b.Load ? (a, b) : (b, a);

    private static double Excess(Frequency f, Frequency series) => (f.Hertz - series.Hertz) * (f.Hertz + series.Hertz) / (series.Hertz * series.Hertz);

    private static double SquareDifference(LoadedReading a, LoadedReading b) =>
        (a.Frequency.Hertz - b.Frequency.Hertz) * (a.Frequency.Hertz + b.Frequency.Hertz);
}
