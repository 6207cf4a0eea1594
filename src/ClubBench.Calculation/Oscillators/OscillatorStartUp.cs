using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>Whether an oscillator will start.</summary>
public enum StartUpVerdict
{
    /// <summary>Not judged.</summary>
    Unknown,

    /// <summary>Negative resistance below three times the loop resistance.</summary>
    Doubtful,

    /// <summary>Three to five times: starts, too slowly for keying.</summary>
    StartsSlowly,

    /// <summary>Five to twenty times: starts quickly, keyed too.</summary>
    Starts,

    /// <summary>Above twenty times: the crystal is driven hard; look at its drive power.</summary>
    Overdriven,
}

/// <summary>Start-up margin of a pulled crystal oscillator. Source: derived; the limits 3, 5 and 20 are common practice.</summary>
/// <param name="LoopResistance">Loss of crystal and inductor around the loop, above zero.</param>
/// <param name="NegativeResistance">What the sustaining circuit offers against it.</param>
public sealed record OscillatorStartUp(Resistance LoopResistance, Resistance NegativeResistance)
{
    /// <summary>Negative resistance over loop resistance; falls with the square of the frequency.</summary>
    public double Margin => NegativeResistance / LoopResistance;

    /// <summary>Judgement of the margin.</summary>
    public StartUpVerdict Verdict => Margin switch
    {
        < 3 => StartUpVerdict.Doubtful,
        < 5 => StartUpVerdict.StartsSlowly,
        <= 20 => StartUpVerdict.Starts,
        _ => StartUpVerdict.Overdriven,
    };

    /// <summary>
    /// Margin at a setting of the variable capacitor. The crystal must state its resistance; <paramref name="inductorQ"/> (above zero) gives
    /// the loss of the series inductor; <paramref name="transconductanceSiemens"/> is taken at the working current. Throws when the loop is refused.
    /// </summary>
    public static OscillatorStartUp At(
        PulledCrystalLoop loop, Capacitance variable, double inductorQ, FeedbackPair pair, double transconductanceSiemens)
    {
        Guard.Positive(loop.Crystal.MotionalResistance.Ohm, nameof(loop));
        var point = loop.PointAt(variable);
        return new OscillatorStartUp(LossAt(loop, point, inductorQ), pair.NegativeResistance(transconductanceSiemens, point.Frequency));
    }

    /// <summary>Resistance around the loop: crystals as the loop sees them plus w L/Q of the series inductor.</summary>
    public static Resistance LossAt(PulledCrystalLoop loop, PulledCrystalPoint point, double inductorQ) =>
        point.CrystalResistance
        + Resistance.FromOhm(point.Frequency.RadiansPerSecond * loop.SeriesInductance.Henry / Guard.Positive(inductorQ, nameof(inductorQ)));
}
