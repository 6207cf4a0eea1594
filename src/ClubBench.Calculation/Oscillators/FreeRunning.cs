using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>
/// Capacitance or inductance that sets the frequency of the usual free-running oscillators; the resonance of the tank follows from it.
/// Add the strays across the coil and the input capacitance of the device. Source: derived.
/// </summary>
public static class FreeRunning
{
    /// <summary>Colpitts: variable capacitor across the coil, feedback pair in series across it.</summary>
    public static Capacitance Colpitts(Capacitance variable, FeedbackPair pair) => variable + pair.OscillatorCapacitance;

    /// <summary>Clapp: a series capacitor (above zero) in front of the pair swamps the device.</summary>
    public static Capacitance Clapp(FeedbackPair pair, Capacitance series) => FeedbackPair.InSeries(pair.OscillatorCapacitance, series);

    /// <summary>Seiler: as Clapp, with the variable capacitor across the coil.</summary>
    public static Capacitance Seiler(Capacitance variable, FeedbackPair pair, Capacitance series) => variable + Clapp(pair, series);

    /// <summary>Hartley: the two parts of a tapped coil with their mutual inductance, L1 + L2 + 2 M.</summary>
    public static Inductance Hartley(Inductance first, Inductance second, Inductance mutual) => first + second + (2 * mutual);

    /// <summary>
    /// Shift in Hz when a capacitance in a tank moves by a little: -f dC/(2 C). <paramref name="changePicofarad"/> has either sign;
    /// <paramref name="total"/> is above zero.
    /// </summary>
    public static double ShiftHertz(Frequency frequency, double changePicofarad, Capacitance total) =>
        -frequency.Hertz * changePicofarad / (2 * Guard.Positive(total.Picofarad, nameof(total)));
}
