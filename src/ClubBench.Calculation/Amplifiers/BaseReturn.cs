using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Amplifiers;

/// <summary>Working point a resistor from base to emitter gives a class C stage. Immutable.</summary>
/// <remarks>
/// Method: the base current flows back through the resistor and biases the base against conduction.
/// Valid: class C with a sine drive; a stage without any return for direct current charges its coupling capacitor and stops.
/// Source: derived; the limit of 0.3 V is common practice.
/// </remarks>
/// <param name="Bias">Voltage the resistor holds the base below the emitter.</param>
/// <param name="Conduction">Angle of conduction; null where the drive peak never reaches conduction.</param>
/// <param name="ReversePeak">Largest reverse voltage of the base, to compare with its rating (5 to 6 V, 2 to 4 V for some RF types).</param>
/// <param name="DriveLost">Drive power heating the resistor.</param>
public sealed record BaseReturn(Voltage Bias, ConductionAngle? Conduction, Voltage ReversePeak, Power DriveLost)
{
    /// <summary>Largest bias that keeps the stage well behaved, at the least current gain.</summary>
    public static readonly Voltage UsualBiasLimit = Voltage.FromVolt(0.3);

    /// <summary>Works out the working point.</summary>
    /// <param name="resistor">From base to emitter, above zero.</param>
    /// <param name="collector">Direct collector current.</param>
    /// <param name="currentGain">Direct current gain, at least 1; the least one gives the worst bias.</param>
    /// <param name="drivePeak">Peak drive voltage at the base, above zero.</param>
    /// <param name="baseEmitter">Voltage at which the base conducts, about 0.7 V.</param>
    public static BaseReturn Of(Resistance resistor, Current collector, double currentGain, Voltage drivePeak, Voltage baseEmitter)
    {
        Guard.Positive(resistor.Ohm, nameof(resistor));
        Guard.Positive(drivePeak.Volt, nameof(drivePeak));
        var bias = Voltage.FromVolt(collector.Ampere / Guard.Within(currentGain, 1, 1e5, nameof(currentGain)) * resistor.Ohm);
        return new BaseReturn(
            bias,
            Angle((baseEmitter.Volt + bias.Volt) / drivePeak.Volt),
            drivePeak + bias,
            Power.FromWatt(drivePeak.Volt * drivePeak.Volt / (2 * resistor.Ohm)));
    }

    // Below ten degrees the stage hardly conducts at all.
    private static ConductionAngle? Angle(double cosine)
    {
        var degrees = cosine < 1 ? 2 * Math.Acos(cosine) * 180 / Math.PI : 0;
        return degrees < 10 ? null : ConductionAngle.FromDegrees(degrees);
    }
}
