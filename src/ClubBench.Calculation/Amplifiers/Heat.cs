using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Amplifiers;

/// <summary>Path of heat from a junction to the air. Immutable.</summary>
/// <remarks>
/// Method: thermal resistances in series, steady state (boards are tuned key-down, so no relief for duty).
/// Valid: constant heat; case to sink 0.5 to 1 K/W with paste, 1 to 2 K/W with an insulating pad.
/// Source: derived; the 25 K reserve and 40 C inside a box are common practice.
/// </remarks>
/// <param name="JunctionToCase">From the data sheet.</param>
/// <param name="CaseToSink">Paste or pad.</param>
/// <param name="SinkToAir">Heat sink.</param>
public sealed record Heat(ThermalResistance JunctionToCase, ThermalResistance CaseToSink, ThermalResistance SinkToAir)
{
    /// <summary>How far below its rating a junction is designed to stay.</summary>
    public static readonly TemperatureRise Reserve = TemperatureRise.FromKelvin(25);

    /// <summary>Air inside a closed box.</summary>
    public static readonly Temperature BoxAir = Temperature.FromCelsius(40);

    /// <summary>Junction temperature while this power is turned into heat.</summary>
    public Temperature Junction(Temperature air, Power heat) => JunctionFor(JunctionToCase + CaseToSink + SinkToAir, air, heat);

    /// <summary>Junction temperature of a device without a heat sink.</summary>
    public static Temperature JunctionFor(ThermalResistance junctionToAir, Temperature air, Power heat) =>
        Temperature.FromCelsius(air.Celsius + (heat.Watt * junctionToAir.KelvinPerWatt));

    /// <summary>Most heat a device without a sink may make and keep the reserve; zero where even none is too much.</summary>
    public static Power MostWithoutSink(ThermalResistance junctionToAir, Temperature junctionMax, Temperature air) =>
        Power.FromWatt(Math.Max(0, junctionMax.Celsius - Reserve.Kelvin - air.Celsius) / Guard.Positive(junctionToAir.KelvinPerWatt, nameof(junctionToAir)));

    /// <summary>Largest heat sink resistance that keeps the junction at a limit; null where no heat sink can do it.</summary>
    public ThermalResistance? LargestSink(Temperature junctionLimit, Temperature air, Power heat)
    {
        var left = ((junctionLimit.Celsius - air.Celsius) / Guard.Positive(heat.Watt, nameof(heat)))
            - JunctionToCase.KelvinPerWatt - CaseToSink.KelvinPerWatt;
        return left < 0 ? null : ThermalResistance.FromKelvinPerWatt(left);
    }

    /// <summary>Rated power at a case temperature above the one it is rated at; zero at and above the highest junction temperature.</summary>
    public static Power Derated(Power rated, Temperature ratedAt, Temperature junctionMax, Temperature @case)
    {
        Guard.Positive(junctionMax.Celsius - ratedAt.Celsius, nameof(ratedAt));
        return rated * Math.Clamp((junctionMax.Celsius - @case.Celsius) / (junctionMax.Celsius - ratedAt.Celsius), 0, 1);
    }
}
