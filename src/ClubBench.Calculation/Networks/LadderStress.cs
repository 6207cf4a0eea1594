using System.Numerics;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Networks;

/// <summary>Peak stress on one arm. For a trap these are the values of the whole arm.</summary>
/// <param name="Voltage">Peak voltage across the arm.</param>
/// <param name="Current">Peak current through the arm.</param>
public sealed record ArmStress(Voltage Voltage, Current Current);

/// <summary>Peak stress on every arm of a ladder and the power that arrives.</summary>
/// <param name="Arms">One entry per arm, in ladder order.</param>
/// <param name="Delivered">Power in the load.</param>
public sealed record LadderStress(IReadOnlyList<ArmStress> Arms, Power Delivered)
{
    /// <summary>Walks through the ladder from a generator that could give the stated power.</summary>
    /// <remarks>
    /// Method: generator sqrt(8 R P) behind R, node voltages and arm currents by the chain matrix.
    /// Valid: sine at one frequency, linear parts; the generator is matched to its own resistance, which a power stage need not be.
    /// Source: derived.
    /// </remarks>
    /// <param name="ladder">The network.</param>
    /// <param name="f">Operating frequency.</param>
    /// <param name="available">Forward power of the generator.</param>
    /// <param name="source">Generator resistance, above zero.</param>
    /// <param name="loadOhm">Complex load, ohm, with a resistance above zero.</param>
    public static LadderStress Of(Ladder ladder, Frequency f, Power available, Resistance source, Complex loadOhm)
    {
        Guard.Positive(source.Ohm, nameof(source));
        Guard.Positive(loadOhm.Real, nameof(loadOhm));
        var input = ladder.At(f).InputImpedance(loadOhm);
        var current = Math.Sqrt(8 * source.Ohm * available.Watt) / (source.Ohm + input);
        var (voltage, arms) = (current * input, new List<ArmStress>());
        foreach (var element in ladder.Elements)
        {
            var z = element.Impedance(f);
            var (armVoltage, armCurrent) = element.Position == LadderPosition.Series ? (current * z, current) : (voltage, voltage / z);
            if (element.Position == LadderPosition.Series) voltage -= armVoltage;
            else current -= armCurrent;
            arms.Add(new ArmStress(Voltage.FromVolt(armVoltage.Magnitude), Current.FromAmpere(armCurrent.Magnitude)));
        }

        return new LadderStress(arms, Power.FromWatt(0.5 * current.Magnitude * current.Magnitude * loadOhm.Real));
    }
}
