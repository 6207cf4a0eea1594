using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Switching;

/// <summary>Receive tap of a transmit line: a coil from the line to a node with clamp diodes, and a capacitor on to the receiver, in resonance. Immutable.</summary>
/// <remarks>
/// Method: on receive a series circuit at resonance; on transmit the diodes ground the node, so the line sees the coil alone.
/// Valid: near resonance, diodes across the inner node only: across the far end they would short the line through the resonance.
/// Source: derived; the wanted ranges are common practice.
/// </remarks>
public sealed record SeriesTunedTap
{
    /// <summary>Least reactance that leaves the transmit line alone.</summary>
    public static readonly Resistance LeastReactance = Resistance.FromOhm(250);

    /// <summary>Largest reactance that still tunes broadly.</summary>
    public static readonly Resistance MostReactance = Resistance.FromOhm(700);

    /// <summary>Largest receive loss worth having.</summary>
    public static readonly Decibels MostLoss = Decibels.FromDb(1.5);

    /// <summary>Largest peak current for small switching diodes.</summary>
    public static readonly Current MostDiodeCurrent = Current.FromMilliampere(100);

    /// <summary>From the coil (above zero, with its unloaded Q), the operating frequency, and the resistances of line and receiver above zero.</summary>
    public SeriesTunedTap(Inductance coil, double unloadedQ, Frequency f, Resistance line, Resistance receiver)
    {
        Guard.Positive(coil.Henry, nameof(coil));
        (Coil, UnloadedQ, Frequency) = (coil, Guard.Positive(unloadedQ, nameof(unloadedQ)), f);
        Guard.Positive(line.Ohm, nameof(line));
        Guard.Positive(receiver.Ohm, nameof(receiver));
        (Line, Receiver) = (line, receiver);
    }

    /// <summary>The coil on the line side.</summary>
    public Inductance Coil { get; }

    /// <summary>Its unloaded Q.</summary>
    public double UnloadedQ { get; }

    /// <summary>Operating frequency.</summary>
    public Frequency Frequency { get; }

    /// <summary>Line resistance.</summary>
    public Resistance Line { get; }

    /// <summary>Receiver input resistance.</summary>
    public Resistance Receiver { get; }

    /// <summary>Reactance of the coil, and of the capacitor at resonance.</summary>
    public Resistance Reactance => Resistance.FromOhm(Frequency.RadiansPerSecond * Coil.Henry);

    /// <summary>Capacitor, trimmer and strays together, that resonates.</summary>
    public Capacitance Capacitor => Capacitance.FromFarad(1 / (Frequency.RadiansPerSecond * Reactance.Ohm));

    /// <summary>Loss on receive.</summary>
    public Decibels Loss => Decibels.FromAmplitudeRatio(SeriesOhm / (Line.Ohm + Receiver.Ohm));

    /// <summary>Width between the half-power points, in hertz.</summary>
    public double BandwidthHertz => Frequency.Hertz * SeriesOhm / Reactance.Ohm;

    /// <summary>Peak current in the diodes while transmitting.</summary>
    /// <param name="power">Transmit power.</param>
    /// <param name="standingWaveRatio">Of the line, 1 or above.</param>
    public Current DiodeCurrent(Power power, double standingWaveRatio = 1) =>
        Current.FromAmpere(Math.Sqrt(2 * power.Watt * Line.Ohm * Guard.Within(standingWaveRatio, 1, 1e3, nameof(standingWaveRatio))) / Reactance.Ohm);

    /// <summary>Return loss the tap leaves on the transmit line.</summary>
    public Decibels TransmitReturnLoss
    {
        get
        {
            var b = Line.Ohm / Reactance.Ohm;
            return Decibels.FromAmplitudeRatio(Math.Sqrt(4 + (b * b)) / b);
        }
    }

    private double SeriesOhm => Line.Ohm + Receiver.Ohm + (Reactance.Ohm / UnloadedQ);
}
