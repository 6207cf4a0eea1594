using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Amplifiers;

/// <summary>Peak voltage and current on a line that is not matched. Immutable.</summary>
/// <remarks>Method: standing wave. Valid: short lossless line; dissipation in the device may double anywhere on the circle. Source: derived.</remarks>
/// <param name="Voltage">Peak voltage at the worst place.</param>
/// <param name="Current">Peak current at the worst place.</param>
public sealed record MismatchStress(Voltage Voltage, Current Current)
{
    /// <summary>With a forward power held constant.</summary>
    /// <param name="forward">Forward power.</param>
    /// <param name="impedance">Line impedance, above zero.</param>
    /// <param name="standingWaveRatio">1 or above; positive infinity stands for an open or shorted line.</param>
    public static MismatchStress FromForward(Power forward, Resistance impedance, double standingWaveRatio)
    {
        var reflection = double.IsPositiveInfinity(standingWaveRatio) ? 1 : (Ratio(standingWaveRatio) - 1) / (standingWaveRatio + 1);
        return Of(Math.Sqrt(2 * Guard.Positive(impedance.Ohm, nameof(impedance)) * forward.Watt) * (1 + reflection), impedance);
    }

    /// <summary>With a power that still reaches the load.</summary>
    /// <param name="delivered">Power in the load.</param>
    /// <param name="impedance">Line impedance, above zero.</param>
    /// <param name="standingWaveRatio">1 or above, finite.</param>
    public static MismatchStress FromDelivered(Power delivered, Resistance impedance, double standingWaveRatio) =>
        Of(Math.Sqrt(2 * Guard.Positive(impedance.Ohm, nameof(impedance)) * delivered.Watt * Ratio(standingWaveRatio)), impedance);

    private static MismatchStress Of(double volt, Resistance impedance) =>
        new(Voltage.FromVolt(volt), Current.FromAmpere(volt / impedance.Ohm));

    private static double Ratio(double standingWaveRatio) => Guard.Within(standingWaveRatio, 1, 1e6, nameof(standingWaveRatio));
}
