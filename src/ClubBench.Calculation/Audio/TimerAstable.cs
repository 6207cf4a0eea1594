using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Audio;

/// <summary>Timer circuit running free, as a sidetone generator. Immutable. Method: thresholds at one and two thirds of the supply. Source: derived.</summary>
/// <param name="ToSupply">RA, from supply to the discharge pin.</param>
/// <param name="ToCapacitor">RB, from the discharge pin to the capacitor; above zero.</param>
/// <param name="Capacitor">Timing capacitor, above zero.</param>
public sealed record TimerAstable(Resistance ToSupply, Resistance ToCapacitor, Capacitance Capacitor)
{
    /// <summary>Frequency, 1/(ln 2 (RA + 2 RB) C).</summary>
    public Frequency Frequency => Frequency.FromHertz(1 / (Math.Log(2) * (ToSupply + (2 * ToCapacitor)).Ohm * Capacitor.Farad));

    /// <summary>Share of the period the output is high, (RA + RB)/(RA + 2 RB); above one half.</summary>
    public double HighShare => (ToSupply + ToCapacitor) / (ToSupply + (2 * ToCapacitor));
}
