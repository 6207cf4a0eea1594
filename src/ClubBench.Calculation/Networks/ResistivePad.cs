using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Networks;

/// <summary>How the three resistors of a pad are joined.</summary>
public enum PadForm
{
    /// <summary>Two resistors to ground with one between them.</summary>
    Pi,

    /// <summary>Two resistors in the line with one to ground between them.</summary>
    Tee,
}

/// <summary>A resistive attenuator between equal resistances. Immutable.</summary>
/// <param name="Form">Pi or T.</param>
/// <param name="Outer">The two equal outer resistors.</param>
/// <param name="Inner">The resistor between them.</param>
/// <param name="Impedance">Resistance on both sides.</param>
public sealed record ResistivePad(PadForm Form, Resistance Outer, Resistance Inner, Resistance Impedance)
{
    /// <summary>The pad with the wanted attenuation, matched on both sides.</summary>
    /// <remarks>Method: matched symmetric attenuator with k = 10^(A/20). Valid: 0.1 to 60 dB. Source: pozar-microwave.</remarks>
    public static ResistivePad For(PadForm form, Decibels attenuation, Resistance impedance)
    {
        Guard.Within(attenuation.Db, 0.1, 60, nameof(attenuation));
        var (k, z) = (attenuation.AmplitudeRatio, Guard.Positive(impedance.Ohm, nameof(impedance)));
        var (outer, inner) = form == PadForm.Pi
            ? (z * (k + 1) / (k - 1), z * ((k * k) - 1) / (2 * k))
            : (z * (k - 1) / (k + 1), 2 * z * k / ((k * k) - 1));
        return new ResistivePad(form, Resistance.FromOhm(outer), Resistance.FromOhm(inner), impedance);
    }

    /// <summary>Attenuation with these resistors, standard values or exact ones.</summary>
    public Decibels Attenuation => Chain.Loss(Impedance, Impedance);

    /// <summary>Return loss with these resistors, the far side terminated.</summary>
    public Decibels ReturnLoss => Chain.ReturnLoss(Impedance, Impedance);

    /// <summary>Share of the power going in that heats the first resistor of a pi, 0 to 1; of the whole input for a matched pad.</summary>
    public double InputResistorShare => Form == PadForm.Pi
        ? InputOhm / Outer.Ohm
        : Outer.Ohm / InputOhm;

    private double InputOhm => Chain.InputImpedance(Impedance.Ohm).Real;

    private TwoPort Chain => Form == PadForm.Pi
        ? TwoPort.Shunt(1 / Outer.Ohm).Then(TwoPort.Series(Inner.Ohm)).Then(TwoPort.Shunt(1 / Outer.Ohm))
        : TwoPort.Series(Outer.Ohm).Then(TwoPort.Shunt(1 / Inner.Ohm)).Then(TwoPort.Series(Outer.Ohm));
}
