using ClubBench.Calculation.Components;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;

namespace ClubBench.Calculation.Broadband;

/// <summary>
/// Coupling and bypass capacitors, judged at the lowest frequency. Their reactance grows as frequency falls.
/// Source: derived (voltage divider); limits are common practice.
/// </summary>
public static class CouplingCapacitor
{
    private const double LeaveShare = 0.1;
    private const double CheckShare = 0.3;
    private static readonly Decibels BypassLeave = Decibels.FromDb(0.5);
    private static readonly Decibels BypassCheck = Decibels.FromDb(1.5);

    /// <summary>Loss of a capacitor in series between two resistances: 10 log10(1 + (X/R)^2), R their sum.</summary>
    public static Decibels Loss(Capacitance capacitor, Frequency frequency, Resistance sourcePlusLoad) =>
        Loss(TunedCircuit.Reactance(capacitor, frequency), sourcePlusLoad);

    /// <summary>The same for a known reactance, such as that of a capacitor with its leads.</summary>
    public static Decibels Loss(Resistance reactance, Resistance sourcePlusLoad)
    {
        var share = reactance.Ohm / Guard.Positive(sourcePlusLoad.Ohm, nameof(sourcePlusLoad));
        return Decibels.FromPowerRatio(1 + (share * share));
    }

    /// <summary>Series coupling: a reactance up to a tenth of both resistances together is left (0.04 dB), up to 0.3 checked (0.37 dB), else changed.</summary>
    public static Verdict Judge(Capacitance capacitor, Frequency frequency, Resistance sourcePlusLoad) =>
        (TunedCircuit.Reactance(capacitor, frequency) / sourcePlusLoad) switch
        {
            <= LeaveShare => Verdict.Leave,
            <= CheckShare => Verdict.Check,
            _ => Verdict.Change,
        };

    /// <summary>Capacitor to fit instead: reactance of a tenth of both resistances, next member of E6 up.</summary>
    public static Capacitance Wanted(Frequency frequency, Resistance sourcePlusLoad) =>
        Capacitance.FromFarad(PreferredValues.NextUp(TunedCircuit.CapacitanceOf(sourcePlusLoad * LeaveShare, frequency).Farad, ESeries.E6));

    /// <summary>Resistance of an emitter, 26 mV over its current above zero (room temperature). Source: common practice.</summary>
    public static Resistance EmitterResistance(Current emitter) =>
        Resistance.FromOhm(0.026 / Guard.Positive(emitter.Ampere, nameof(emitter)));

    /// <summary>Verdict on the gain an emitter bypass loses: up to 0.5 dB left, up to 1.5 dB checked, else changed.</summary>
    public static Verdict JudgeBypass(Decibels gainLoss) =>
        gainLoss <= BypassLeave ? Verdict.Leave : gainLoss <= BypassCheck ? Verdict.Check : Verdict.Change;

    /// <summary>Magnitude of the reactance of a capacitor with the inductance of its leads (about 1 nH a millimetre, common practice).</summary>
    public static Resistance WithLeads(Capacitance capacitor, Inductance leads, Frequency frequency) =>
        Resistance.FromOhm(Math.Abs(TunedCircuit.Reactance(leads, frequency).Ohm - TunedCircuit.Reactance(capacitor, frequency).Ohm));
}
