using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Crystals;

/// <summary>
/// A crystal in series between a source and a load of low resistance, swept through its series resonance. Immutable.
/// Method: insertion loss at the peak gives Rm, the -3 dB width gives Lm. Valid: 12.5 ohm each side at 7 MHz: C0 moves Lm by less than 0.3 %.
/// Source: derived; iec-60444-1 is the standard's version, from memory.
/// </summary>
/// <param name="Peak">Frequency of the peak.</param>
/// <param name="Bandwidth3dBHertz">Width at -3 dB, Hz, above zero; needs a resolution of a tenth of it.</param>
/// <param name="InsertionLoss">Loss at the peak against a short in place of the crystal, 0 dB or above.</param>
/// <param name="Source">Source resistance.</param>
/// <param name="Load">Load resistance.</param>
public sealed record TransmissionMeasurement(
    Frequency Peak, double Bandwidth3dBHertz, Decibels InsertionLoss, Resistance Source, Resistance Load)
{
    /// <summary>Width at -3 dB, Hz.</summary>
    public double Bandwidth3dBHertz { get; init; } = Guard.Positive(Bandwidth3dBHertz, nameof(Bandwidth3dBHertz));

    /// <summary>Loss at the peak, 0 dB or above: a negative one means the through calibration must be made again.</summary>
    public Decibels InsertionLoss { get; init; } = Decibels.FromDb(Guard.NotNegative(InsertionLoss.Db, nameof(InsertionLoss)));

    /// <summary>Rm = (Rs + Rl)(10^(IL/20) - 1).</summary>
    public Resistance MotionalResistance => (Source + Load) * (InsertionLoss.AmplitudeRatio - 1);

    /// <summary>Lm = (Rs + Rl + Rm)/(2 pi B).</summary>
    public Inductance MotionalInductance =>
        Inductance.FromHenry((Source + Load + MotionalResistance).Ohm / (2 * Math.PI * Bandwidth3dBHertz));

    /// <summary>Cm from Lm and the peak frequency.</summary>
    public Capacitance MotionalCapacitance =>
        Capacitance.FromFarad(1 / (Peak.RadiansPerSecond * Peak.RadiansPerSecond * MotionalInductance.Henry));

    /// <summary>The crystal, with its static capacitance measured apart (above zero).</summary>
    public CrystalParameters WithStatic(Capacitance staticCapacitance) => new(Peak, MotionalCapacitance, staticCapacitance, MotionalResistance);

    /// <summary>Whether a resolution in Hz (above zero) is fine enough for the width: ten steps. Source: common practice.</summary>
    public bool IsResolvedBy(double resolutionHertz) => Bandwidth3dBHertz >= 10 * Guard.Positive(resolutionHertz, nameof(resolutionHertz));
}
