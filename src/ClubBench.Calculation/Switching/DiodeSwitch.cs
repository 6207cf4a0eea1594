using System.Numerics;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Switching;

/// <summary>What the stored charge of a diode switch allows.</summary>
public enum DiodeSwitchVerdict
{
    /// <summary>Not judged.</summary>
    Unknown,

    /// <summary>Charge at least five times what a half cycle moves: leave it.</summary>
    Clean,

    /// <summary>Two to five times: check the harmonics.</summary>
    CheckHarmonics,

    /// <summary>Below twice: the diode opens within the cycle.</summary>
    Unsuitable,
}

/// <summary>A biased diode in the power path. Clean only while its stored charge outlasts half a cycle, so lower bands are the hard ones. Immutable.</summary>
/// <remarks>Method: charge balance. Valid: PIN and slow rectifier diodes above a few MHz. Source: common practice; lifetimes from data sheets.</remarks>
/// <param name="Bias">Direct current through the diode.</param>
/// <param name="Lifetime">Carrier lifetime: 1 to 5 us for PIN types, about 5 us for slow rectifiers.</param>
public sealed record DiodeSwitch(Current Bias, Duration Lifetime)
{
    /// <summary>Stored charge over the charge the signal moves in half a cycle.</summary>
    /// <param name="power">Power through the switch, above zero.</param>
    /// <param name="line">Line resistance, above zero.</param>
    /// <param name="f">Frequency.</param>
    public double ChargeRatio(Power power, Resistance line, Frequency f)
    {
        var peakAmpere = Math.Sqrt(2 * Guard.Positive(power.Watt, nameof(power)) / Guard.Positive(line.Ohm, nameof(line)));
        return Bias.Ampere * Lifetime.Second * Math.PI * f.Hertz / peakAmpere;
    }

    /// <summary>Judges the charge ratio.</summary>
    public DiodeSwitchVerdict Judge(Power power, Resistance line, Frequency f) => ChargeRatio(power, line, f) switch
    {
        >= 5 => DiodeSwitchVerdict.Clean,
        >= 2 => DiodeSwitchVerdict.CheckHarmonics,
        _ => DiodeSwitchVerdict.Unsuitable,
    };

    /// <summary>Lowest frequency at which the switch is clean.</summary>
    public Frequency CleanAbove(Power power, Resistance line) =>
        Frequency.FromHertz(5 / ChargeRatio(power, line, Frequency.FromHertz(1)));

    /// <summary>Isolation of one diode that is off, in a line of equal resistances.</summary>
    public static Decibels OffIsolation(Capacitance off, Resistance line, Frequency f) =>
        Decibels.FromAmplitudeRatio((1 + (1 / new Complex(0, 2 * f.RadiansPerSecond * Guard.Positive(off.Farad, nameof(off)) * Guard.Positive(line.Ohm, nameof(line))))).Magnitude);
}
