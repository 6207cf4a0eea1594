using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Amplifiers;

/// <summary>Supply side of a final stage at full swing: power, load, current, heat and peak voltage. Nothing here depends on the band. Immutable.</summary>
/// <remarks>
/// Method: sine of amplitude supply less saturation voltage across the load.
/// Valid: full voltage swing; saturation at RF is 0.5 to 2 V for bipolar and 2 to 3 V for field-effect devices.
/// Source: derived; saturation, efficiencies and peak factors are common practice.
/// </remarks>
public readonly record struct OutputStage
{
    /// <summary>From the supply at the stage and its saturation voltage, which must be the smaller.</summary>
    public OutputStage(Voltage supply, Voltage saturation)
    {
        if (saturation >= supply) throw new ArgumentException($"The saturation voltage ({saturation}) must lie below the supply ({supply}).", nameof(saturation));
        (Supply, Saturation) = (supply, saturation);
    }

    /// <summary>Supply at the stage, behind diodes and resistors.</summary>
    public Voltage Supply { get; }

    /// <summary>Voltage left across the device at the peak of its current.</summary>
    public Voltage Saturation { get; }

    private double SwingSquared => (Supply.Volt - Saturation.Volt) * (Supply.Volt - Saturation.Volt);

    /// <summary>Power into a load above zero.</summary>
    public Power Power(Resistance load) => Quantities.Power.FromWatt(SwingSquared / (2 * Guard.Positive(load.Ohm, nameof(load))));

    /// <summary>Load one device needs for a power above zero. Below 1 ohm use push-pull or a higher supply.</summary>
    public Resistance Load(Power power) => Resistance.FromOhm(SwingSquared / (2 * Guard.Positive(power.Watt, nameof(power))));

    /// <summary>Load from collector to collector of a push-pull pair for a power above zero.</summary>
    public Resistance PushPullLoad(Power power) => Load(power) * 4;

    /// <summary>Direct current at this output power and efficiency (above 0 to 1).</summary>
    public Current DirectCurrent(Power output, double efficiency) =>
        Current.FromAmpere(output.Watt / (Efficient(efficiency) * Supply.Volt));

    /// <summary>Heat in the device: what the supply gives and the load does not get, and the drive.</summary>
    public static Power Dissipation(Power output, double efficiency, Power drive) => (output * ((1 / Efficient(efficiency)) - 1)) + drive;

    /// <summary>Efficiency usually reached, 0 to 1; null where the class is not stated. Common practice.</summary>
    public static double? UsualEfficiency(StageClass stage) => stage switch
    {
        StageClass.ClassA => 0.35,
        StageClass.ClassAbSingle or StageClass.ClassAbPushPull => 0.55,
        StageClass.ClassCBroadband or StageClass.ClassCTuned => 0.65,
        StageClass.ClassD or StageClass.ClassE => 0.8,
        _ => null,
    };

    /// <summary>Peak voltage at the device: twice the supply with choke or tuned load, 3.56 times it in class E; up to four times it into a bad match.</summary>
    public Voltage PeakVoltage(StageClass stage) => Supply * (stage == StageClass.ClassE ? 3.562 : 2);

    /// <summary>Peak voltage to allow for when the load is badly wrong. Common practice.</summary>
    public Voltage PeakVoltageIntoBadMatch => Supply * 4;

    private static double Efficient(double efficiency) =>
        Guard.Within(Guard.Positive(efficiency, nameof(efficiency)), 0, 1, nameof(efficiency));
}
