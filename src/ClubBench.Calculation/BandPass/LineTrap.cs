using System.Numerics;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;

namespace ClubBench.Calculation.BandPass;

/// <summary>Where a trap sits.</summary>
public enum TrapPlace
{
    /// <summary>Coil and capacitor in series, from the line to ground.</summary>
    Shunt,

    /// <summary>Coil and capacitor in parallel, in the line.</summary>
    InLine,
}

/// <summary>A trap against one frequency (an intermediate frequency, a broadcast station, an image) in a line. Immutable.</summary>
/// <remarks>
/// Method: depth and harm to the band pull against each other; a large reactance harms less to ground, a small one in the line.
/// Valid: a trap at least 15 % away from the band; nearer it would take the wanted signal.
/// Source: derived (chain matrix of one arm).
/// </remarks>
/// <param name="Place">To ground or in the line.</param>
/// <param name="Notch">Frequency that is blocked.</param>
/// <param name="Coil">Inductance, above zero.</param>
/// <param name="UnloadedQ">Q of the coil, above zero.</param>
public sealed record LineTrap(TrapPlace Place, Frequency Notch, Inductance Coil, double UnloadedQ)
{
    /// <summary>Nearest a trap may lie to the band, as a share. Source: common practice.</summary>
    public const double LeastDistance = 0.15;

    /// <summary>Loss on the band from which to warn. Source: common practice.</summary>
    public static readonly Decibels LossWorthAWarning = Decibels.FromDb(0.5);

    /// <summary>The capacitor that makes it resonate.</summary>
    public Capacitance Capacitor => TunedCircuit.CapacitanceFor(Coil, Notch);

    /// <summary>Loss between source and load at any frequency, zero or above.</summary>
    public Decibels Loss(Frequency f, Resistance source, Resistance load)
    {
        var detuning = (f / Notch) - (Notch / f);
        var x = TunedCircuit.Reactance(Coil, Notch).Ohm;
        var q = Guard.Positive(UnloadedQ, nameof(UnloadedQ));
        return Place == TrapPlace.Shunt
            ? TwoPort.Shunt(1 / new Complex(x / q, x * detuning)).Loss(source, load) - TwoPort.Through.Loss(source, load)
            : TwoPort.Series(1 / new Complex(1 / (q * x), detuning / x)).Loss(source, load) - TwoPort.Through.Loss(source, load);
    }

    /// <summary>Whether the trap lies far enough from a band.</summary>
    public bool KeepsAwayFrom(FrequencyRange band) => Notch / band.High >= 1 + LeastDistance || Notch / band.Low <= 1 - LeastDistance;
}
