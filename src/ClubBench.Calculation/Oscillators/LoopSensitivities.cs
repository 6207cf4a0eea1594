using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>
/// Fractional sensitivities S = (df/f)/(dp/p) of a pulled crystal oscillator; a free-running LC oscillator has -0.5 for its inductor.
/// Method: energy weights dX/dw of the loop. Source: derived.
/// </summary>
/// <param name="Inductor">To the series inductance; zero or below.</param>
/// <param name="Variable">To the variable capacitor itself, without its stray; below zero.</param>
/// <param name="Oscillator">To the capacitance of the sustaining circuit; below zero.</param>
/// <param name="MotionalShare">Share of the energy in the motional arm, 0..1: how far the crystal rules.</param>
/// <param name="SlopeHertzPerPicofarad">df/dC of the variable capacitor in Hz/pF; below zero.</param>
public sealed record LoopSensitivities(
    double Inductor, double Variable, double Oscillator, double MotionalShare, double SlopeHertzPerPicofarad)
{
    internal static LoopSensitivities From(StoredEnergy energy, Frequency frequency, Capacitance variable, Capacitance across)
    {
        var w = frequency.RadiansPerSecond;
        var scale = w * energy.Total;
        var variableShare = -w * energy.Variable / scale * (variable / across);
        return new LoopSensitivities(
            -energy.InductorReactance / scale,
            variableShare,
            -w * energy.Oscillator / scale,
            energy.Motional / energy.Total,
            frequency.Hertz * variableShare / variable.Picofarad);
    }
}
