using System.Numerics;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Devices;

/// <summary>Resistors around a common-emitter transistor.</summary>
/// <param name="BaseShunt">From base to ground; null for none.</param>
/// <param name="Emitter">From emitter to ground, not bypassed; null for a grounded emitter.</param>
/// <param name="Feedback">From collector to base; null for none.</param>
public sealed record StageResistors(Resistance? BaseShunt = null, Resistance? Emitter = null, Resistance? Feedback = null)
{
    /// <summary>Nothing around the transistor.</summary>
    public static StageResistors None { get; } = new();
}

/// <summary>Small-signal model of a bipolar transistor at one working point. Immutable.</summary>
/// <remarks>
/// Method: hybrid-pi; the two inner nodes are eliminated to a two-port of admittances.
/// Valid: small signals, class A and AB, up to about fT / 3; for class C the trend only.
/// Source: gray-meyer, hybrid-pi model; rollett-1962 for the stability factor.
/// </remarks>
public sealed record HybridPi
{
    /// <summary>Thermal voltage kT/q at 25 C (si-2019).</summary>
    public static readonly Voltage ThermalVoltage = Voltage.FromMillivolt(25.693);

    private static readonly Resistance OutputResistance = Resistance.FromKiloohm(50);

    private HybridPi(Current collector, CurrentGain gain, Capacitance feedback, Resistance spreading) =>
        (Collector, Gain, Feedback, Spreading) = (collector, gain, feedback, spreading);

    /// <summary>Collector current.</summary>
    public Current Collector { get; }

    /// <summary>Current gain.</summary>
    public CurrentGain Gain { get; }

    /// <summary>Collector-base capacitance.</summary>
    public Capacitance Feedback { get; }

    /// <summary>Base spreading resistance.</summary>
    public Resistance Spreading { get; }

    /// <summary>Transconductance in siemens.</summary>
    public double TransconductanceSiemens => Collector.Ampere / ThermalVoltage.Volt;

    private double EmitterFarad => (TransconductanceSiemens / Gain.Transition.RadiansPerSecond) - Feedback.Farad;

    /// <summary>Makes the model; false where transition frequency and feedback capacitance contradict each other at this current.</summary>
    /// <param name="collector">Collector current, above zero.</param>
    /// <param name="gain">Current gain at that current.</param>
    /// <param name="feedback">Collector-base capacitance at the working voltage.</param>
    /// <param name="spreading">Base spreading resistance, above zero: 10 to 50 ohm for RF types.</param>
    /// <param name="model">The model; null when false.</param>
    public static bool TryCreate(Current collector, CurrentGain gain, Capacitance feedback, Resistance spreading, out HybridPi? model)
    {
        Guard.Positive(collector.Ampere, nameof(collector));
        Guard.Positive(spreading.Ohm, nameof(spreading));
        var candidate = new HybridPi(collector, gain, feedback, spreading);
        model = candidate.EmitterFarad > 0 ? candidate : null;
        return model is not null;
    }

    /// <summary>The stage as admittances between base and collector, siemens.</summary>
    public AdmittanceTwoPort At(Frequency f, StageResistors? around = null)
    {
        var (r, w) = (around ?? StageResistors.None, f.RadiansPerSecond);
        var gm = TransconductanceSiemens;
        var toBase = new Complex(1 / Spreading.Ohm, 0);
        var toEmitter = new Complex(gm / Gain.LowFrequency, w * EmitterFarad);
        var toCollector = new Complex(0, w * Feedback.Farad);
        var output = new Complex(1 / OutputResistance.Ohm, 0);

        // Inner nodes: the base behind its spreading resistance and the emitter; the outer ones are base and collector.
        var inner = toBase + toEmitter + toCollector;
        var emitter = toEmitter + output + gm + Conductance(r.Emitter);
        var (innerToEmitter, emitterToInner) = (-toEmitter, -toEmitter - gm);
        var (i11, i12, i21, i22) = r.Emitter is { Ohm: > 0 }
            ? Inverse(inner, innerToEmitter, emitterToInner, emitter)
            : (1 / inner, Complex.Zero, Complex.Zero, Complex.Zero);

        // Columns of the outer nodes into the inner ones, and rows back.
        var (baseIn, collectorIn, collectorEmitter) = (-toBase, -toCollector, -output);
        var (innerOut, emitterOut) = (gm - toCollector, -output - gm);
        return new AdmittanceTwoPort(
            toBase - (baseIn * i11 * baseIn) + Conductance(r.BaseShunt) + Conductance(r.Feedback),
            -(baseIn * ((i11 * collectorIn) + (i12 * collectorEmitter))) - Conductance(r.Feedback),
            -(((innerOut * i11) + (emitterOut * i21)) * baseIn) - Conductance(r.Feedback),
            toCollector + output - (innerOut * ((i11 * collectorIn) + (i12 * collectorEmitter)))
                - (emitterOut * ((i21 * collectorIn) + (i22 * collectorEmitter))) + Conductance(r.Feedback));
    }

    private static double Conductance(Resistance? r) => r is { Ohm: > 0 } value ? 1 / value.Ohm : 0;

    private static (Complex I11, Complex I12, Complex I21, Complex I22) Inverse(Complex a, Complex b, Complex c, Complex d)
    {
        var determinant = (a * d) - (b * c);
        return (d / determinant, -b / determinant, -c / determinant, a / determinant);
    }
}
