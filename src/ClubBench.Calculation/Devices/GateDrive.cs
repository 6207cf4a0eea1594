using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Devices;

/// <summary>What the gate of a field-effect transistor asks of its driver, and what the switch itself turns into heat.</summary>
/// <remarks>
/// Method: charging current of the gate capacitance; energy per cycle.
/// Valid: sine drive from a source that can give the current; hard switching with full swing of the gate.
/// Source: derived. Drive doubles with each octave: list it with the conversion.
/// </remarks>
public static class GateDrive
{
    /// <summary>Gate capacitance as the driver sees it: the reverse capacitance counts as often as the drain swings (Miller).</summary>
    /// <param name="input">Input capacitance less the reverse capacitance is not meant: the sheet's Ciss as printed.</param>
    /// <param name="reverse">Reverse transfer capacitance, Crss.</param>
    /// <param name="voltageGain">Voltage gain from gate to drain, zero or above.</param>
    public static Capacitance EffectiveInput(Capacitance input, Capacitance reverse, double voltageGain) =>
        input + (reverse * (1 + Guard.NotNegative(voltageGain, nameof(voltageGain))));

    /// <summary>Peak current of a sine drive: 2 pi f C V.</summary>
    public static Current PeakCurrent(Frequency frequency, Capacitance effectiveInput, Voltage peak) =>
        Current.FromAmpere(frequency.RadiansPerSecond * effectiveInput.Farad * peak.Volt);

    /// <summary>Power a gate resistance takes at a peak current: I^2 R / 2.</summary>
    public static Power LossIn(Resistance gate, Current peak) => Power.FromWatt(0.5 * peak.Ampere * peak.Ampere * gate.Ohm);

    /// <summary>Average current of hard switching: charge times frequency.</summary>
    /// <param name="chargeCoulomb">Total gate charge, coulomb, above zero.</param>
    /// <param name="frequency">Switching frequency.</param>
    public static Current AverageCurrent(double chargeCoulomb, Frequency frequency) =>
        Current.FromAmpere(Guard.Positive(chargeCoulomb, nameof(chargeCoulomb)) * frequency.Hertz);

    /// <summary>Power of hard switching: average current times gate voltage.</summary>
    /// <param name="chargeCoulomb">Total gate charge, coulomb, above zero.</param>
    /// <param name="frequency">Switching frequency.</param>
    /// <param name="gate">Swing of the gate voltage.</param>
    public static Power SwitchingPower(double chargeCoulomb, Frequency frequency, Voltage gate) =>
        Power.FromWatt(AverageCurrent(chargeCoulomb, frequency).Ampere * gate.Volt);

    /// <summary>Heat from emptying the output capacitance at every cycle: C V^2 f / 2. Not in class E, where the voltage is gone by then.</summary>
    public static Power OutputCapacitanceLoss(Capacitance output, Voltage drain, Frequency frequency) =>
        Power.FromWatt(0.5 * output.Farad * drain.Volt * drain.Volt * frequency.Hertz);

    /// <summary>Heat in the closed switch. Take 1.5 to 2 times the resistance of the sheet when it is hot.</summary>
    public static Power ConductionLoss(Resistance closed, Current effective) => Power.FromWatt(effective.Ampere * effective.Ampere * closed.Ohm);
}
