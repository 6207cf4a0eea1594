using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>
/// The two feedback capacitors of a Colpitts sustaining circuit. Immutable.
/// Source: derived (series connection; negative resistance of the three-point circuit).
/// </summary>
/// <param name="BaseEmitter">C1, control electrode to emitter or source, above zero.</param>
/// <param name="EmitterGround">C2, emitter or source to ground, above zero.</param>
public sealed record FeedbackPair(Capacitance BaseEmitter, Capacitance EmitterGround)
{
    /// <summary>Input capacitance of the device, across the whole pair; zero when it is neglected.</summary>
    public Capacitance DeviceInput { get; init; }

    /// <summary>Capacitance the circuit shows at its crystal terminal: C1 and C2 in series, plus the device.</summary>
    public Capacitance OscillatorCapacitance => InSeries(BaseEmitter, EmitterGround) + DeviceInput;

    /// <summary>Whether each capacitor is at least five times the device's own, so that the device does not set the frequency. Source: common practice.</summary>
    public bool SwampsDevice => BaseEmitter >= DeviceInput * 5 && EmitterGround >= DeviceInput * 5;

    /// <summary>The pair with a capacitor switched across C2.</summary>
    public FeedbackPair WithAcrossEmitter(Capacitance added) => this with { EmitterGround = EmitterGround + added };

    /// <summary>
    /// Negative resistance the pair offers, gm/(w^2 C1 C2); falls with the square of the frequency.
    /// <paramref name="transconductanceSiemens"/> at the working current, above zero.
    /// </summary>
    public Resistance NegativeResistance(double transconductanceSiemens, Frequency frequency)
    {
        var w = frequency.RadiansPerSecond;
        return Resistance.FromOhm(Guard.Positive(transconductanceSiemens, nameof(transconductanceSiemens)) / (w * w * BaseEmitter.Farad * EmitterGround.Farad));
    }

    /// <summary>
    /// Largest equal pair that still offers <paramref name="margin"/> times the loop resistance: C = sqrt(gm/(w^2 M R)).
    /// </summary>
    public static FeedbackPair LargestEqual(double transconductanceSiemens, Frequency frequency, Resistance loopResistance, double margin)
    {
        var w = frequency.RadiansPerSecond;
        var wanted = Guard.Positive(margin, nameof(margin)) * Guard.Positive(loopResistance.Ohm, nameof(loopResistance));
        var each = Capacitance.FromFarad(Math.Sqrt(Guard.Positive(transconductanceSiemens, nameof(transconductanceSiemens)) / wanted) / w);
        return new FeedbackPair(each, each);
    }

    internal static Capacitance InSeries(Capacitance a, Capacitance b) => Capacitance.FromFarad(a.Farad * b.Farad / (a.Farad + b.Farad));
}
