using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Amplifiers;

/// <summary>What a class E stage shall do.</summary>
/// <param name="Supply">Supply voltage.</param>
/// <param name="Saturation">Voltage left across the closed switch, below the supply.</param>
/// <param name="Output">Output power, above zero.</param>
/// <param name="Frequency">Working frequency.</param>
/// <param name="LoadedQ">Loaded Q of the series circuit, 1.8 to 50; 3 to 10 is usual.</param>
/// <param name="Choke">Supply choke; null for one large enough not to count.</param>
public sealed record ClassETask(Voltage Supply, Voltage Saturation, Power Output, Frequency Frequency, double LoadedQ, Inductance? Choke = null);

/// <summary>A switching final whose voltage is back at zero when the switch closes. Telegraphy only: it cannot carry single sideband. Immutable.</summary>
/// <remarks>
/// Method: polynomial fit for a finite loaded Q, duty 50 %.
/// Valid: loaded Q above 1.79; the shunt capacitor includes the device's own output capacitance.
/// Source: sokal-2001, from memory; confirmed by simulation in the time domain.
/// </remarks>
/// <param name="Frequency">Working frequency.</param>
/// <param name="Load">Load resistance; a network to 50 ohm goes between it and a low-pass filter.</param>
/// <param name="Shunt">Capacitance across the switch, the device's own included.</param>
/// <param name="Series">Capacitor of the series circuit.</param>
/// <param name="SeriesCoil">Coil of the series circuit.</param>
public sealed record ClassEStage(Frequency Frequency, Resistance Load, Capacitance Shunt, Capacitance Series, Inductance SeriesCoil)
{
    /// <summary>Peak of the switch voltage over the supply, ideal.</summary>
    public const double PeakVoltageRatio = 3.562;

    /// <summary>Peak of the switch current over the direct current, ideal.</summary>
    public const double PeakCurrentRatio = 2.862;

    private const double LeastQ = 1.8;
    private const double LargestQ = 50;

    // w C R of the shunt capacitor with an ideal series circuit: 8 / (pi (pi^2 + 4)).
    private const double ShuntShare = 0.183603;

    /// <summary>The parts for a task.</summary>
    public static ClassEStage Of(ClassETask task)
    {
        var q = Guard.Within(task.LoadedQ, LeastQ, LargestQ, nameof(task));
        var volts = Guard.Positive((task.Supply - task.Saturation).Volt, nameof(task));
        var (f, w) = (task.Frequency.Hertz, task.Frequency.RadiansPerSecond);
        var r = volts * volts / Guard.Positive(task.Output.Watt, nameof(task)) * 0.576801 * (1.0000086 - (0.414395 / q) - (0.577501 / (q * q)) + (0.205967 / (q * q * q)));
        var choke = task.Choke is { } l ? 1 / (w * w * Guard.Positive(l.Henry, nameof(task))) : 0;
        return new(
            task.Frequency,
            Resistance.FromOhm(r),
            Capacitance.FromFarad((1 / (34.2219 * f * r) * (0.99866 + (0.91424 / q) - (1.03175 / (q * q)))) + (0.6 * choke)),
            Capacitance.FromFarad(Math.Max((1 / (w * r) * (1 / (q - 0.104823)) * (1.00121 + (1.01468 / (q - 1.7879)))) - (0.2 * choke), 0)),
            Inductance.FromHenry(q * r / w));
    }

    /// <summary>Whether a device's own output capacitance leaves something of the shunt capacitor; where it does not, the device is too big for this frequency and power.</summary>
    public bool HasRoomFor(Capacitance deviceOutput) => deviceOutput <= Shunt;

    /// <summary>Highest frequency at which a device works into this load: its output capacitance (above zero) is then the whole shunt capacitor.</summary>
    public Frequency HighestFrequency(Capacitance deviceOutput) =>
        Frequency.FromHertz(ShuntShare / (2 * Math.PI * Load.Ohm * Guard.Positive(deviceOutput.Farad, nameof(deviceOutput))));
}
