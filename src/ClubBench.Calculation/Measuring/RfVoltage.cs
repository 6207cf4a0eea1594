using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Measuring;

/// <summary>A sine voltage across a resistance, between power and what a meter or an oscilloscope shows.</summary>
/// <remarks>Method: P = Vpp^2 / 8 R. Valid: sine; a second harmonic 20 dB down may falsify the peak by a tenth, so measure behind the filter. Source: derived.</remarks>
public static class RfVoltage
{
    /// <summary>Power of a peak-to-peak reading.</summary>
    public static Power FromPeakToPeak(Voltage reading, Resistance load) =>
        Power.FromWatt(reading.Volt * reading.Volt / (8 * Guard.Positive(load.Ohm, nameof(load))));

    /// <summary>Power of an effective (rms) reading.</summary>
    public static Power FromRms(Voltage reading, Resistance load) =>
        Power.FromWatt(reading.Volt * reading.Volt / Guard.Positive(load.Ohm, nameof(load)));

    /// <summary>Peak-to-peak voltage of a power.</summary>
    public static Voltage PeakToPeak(Power power, Resistance load) => Peak(power, load) * 2;

    /// <summary>Peak voltage of a power.</summary>
    public static Voltage Peak(Power power, Resistance load) => Voltage.FromVolt(Math.Sqrt(2 * Guard.Positive(load.Ohm, nameof(load)) * power.Watt));

    /// <summary>Effective (rms) voltage of a power.</summary>
    public static Voltage Rms(Power power, Resistance load) => Voltage.FromVolt(Math.Sqrt(Guard.Positive(load.Ohm, nameof(load)) * power.Watt));

    /// <summary>Share an oscilloscope of a given bandwidth shows of a sine, 0 to 1 (single pole).</summary>
    public static double ShareShown(Frequency f, Frequency bandwidth) => 1 / Math.Sqrt(1 + Math.Pow(f / bandwidth, 2));
}
