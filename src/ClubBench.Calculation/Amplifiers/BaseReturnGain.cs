using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Amplifiers;

/// <summary>Drive a class C stage needs on another frequency or with another base return: a trend from one known working point. Immutable.</summary>
/// <remarks>
/// Method: the known drive splits into the share lost in the base return, Vpk^2 / 2 R, and the share of the transistor. Only the
/// former depends on the resistor. For the same collector current the base current grows as the current gain falls, and the voltage it
/// makes grows with it, so both shares grow with the inverse square of the current gain.
/// Valid: the same stage, load and output power, within about two octaves; a larger resistor always needs less drive. Conduction angle and
/// stability (6 to 470 ohm are usual) are not in it: never promise the figure, measure.
/// Source: derived.
/// </remarks>
public sealed record BaseReturnGain
{
    private readonly Frequency _f0;
    private readonly double _returnWattOhm;
    private readonly double _deviceWatt;
    private readonly CurrentGain _gain;

    private BaseReturnGain(Frequency f0, double returnWattOhm, double deviceWatt, CurrentGain gain) =>
        (_f0, _returnWattOhm, _deviceWatt, _gain) = (f0, returnWattOhm, deviceWatt, gain);

    /// <summary>Learns from a known working point; false where the resistor alone would eat more than the whole drive, so that the figures contradict each other.</summary>
    /// <param name="design">Frequency of the known point.</param>
    /// <param name="drive">Drive power needed there.</param>
    /// <param name="baseReturn">Resistor from base to emitter there, above zero.</param>
    /// <param name="drivePeak">Peak drive voltage at the base there.</param>
    /// <param name="gain">Current gain of the device.</param>
    /// <param name="model">The trend; null when false.</param>
    public static bool TryCreate(Frequency design, Power drive, Resistance baseReturn, Voltage drivePeak, CurrentGain gain, out BaseReturnGain? model)
    {
        var returnWattOhm = 0.5 * drivePeak.Volt * drivePeak.Volt;
        var device = drive.Watt - (returnWattOhm / Guard.Positive(baseReturn.Ohm, nameof(baseReturn)));
        model = device > 0 ? new BaseReturnGain(design, returnWattOhm, device, gain) : null;
        return model is not null;
    }

    /// <summary>Drive needed for the same output at a frequency with a base return above zero.</summary>
    public Power DriveNeeded(Frequency f, Resistance baseReturn) =>
        Power.FromWatt(((_returnWattOhm / Guard.Positive(baseReturn.Ohm, nameof(baseReturn))) + _deviceWatt) * Growth(f));

    /// <summary>Gain bought by changing the resistor, above zero for a larger one; the same at every frequency.</summary>
    public Decibels Bought(Resistance from, Resistance to) => Decibels.FromPowerRatio(DriveNeeded(_f0, from) / DriveNeeded(_f0, to));

    /// <summary>Gain lost by moving from one frequency to another, above zero for moving up; the same with every resistor.</summary>
    public Decibels LostByMoving(Frequency from, Frequency to) => Decibels.FromPowerRatio(Growth(to) / Growth(from));

    /// <summary>How much the available drive (above zero) falls short at a frequency with a resistor; below zero where it has something to spare.</summary>
    public Decibels Missing(Power available, Frequency f, Resistance baseReturn) =>
        Decibels.FromPowerRatio(DriveNeeded(f, baseReturn) / available);

    /// <summary>Resistor with which the available drive just suffices; null where even no resistor at all leaves something missing.</summary>
    public Resistance? ReturnFor(Power available, Frequency f)
    {
        var left = (available.Watt / Growth(f)) - _deviceWatt;
        return left > 0 ? Resistance.FromOhm(_returnWattOhm / left) : null;
    }

    private double Growth(Frequency f) => Math.Pow(_gain.At(_f0) / _gain.At(f), 2);
}
