using System.Numerics;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Devices;

/// <summary>An active two-port at one frequency as admittances in siemens: I1 = y11 V1 + y12 V2, I2 = y21 V1 + y22 V2. Immutable.</summary>
/// <param name="Y11">Input admittance, output shorted.</param>
/// <param name="Y12">Reverse transfer admittance, input shorted.</param>
/// <param name="Y21">Forward transfer admittance, output shorted.</param>
/// <param name="Y22">Output admittance, input shorted.</param>
public readonly record struct AdmittanceTwoPort(Complex Y11, Complex Y12, Complex Y21, Complex Y22)
{
    /// <summary>Transducer gain: power in the load over available power, real terminations above zero.</summary>
    /// <remarks>Method: admittance form of the transducer gain. Valid: a forward path that is not zero. Source: gray-meyer.</remarks>
    public Decibels TransducerGain(Resistance source, Resistance load)
    {
        var (gs, gl) = (1 / Guard.Positive(source.Ohm, nameof(source)), 1 / Guard.Positive(load.Ohm, nameof(load)));
        var denominator = ((Y11 + gs) * (Y22 + gl)) - (Y12 * Y21);
        return Decibels.FromAmplitudeRatio(2 * Math.Sqrt(gs * gl) * (Y21 / denominator).Magnitude);
    }

    /// <summary>Input impedance with a real load above zero, ohm.</summary>
    public Complex InputImpedance(Resistance load) => 1 / (Y11 - (Y12 * Y21 / (Y22 + (1 / Guard.Positive(load.Ohm, nameof(load))))));

    /// <summary>Rollett's factor: above 1, with both own conductances above zero, nothing passive at either end makes it oscillate. Needs some reverse path.</summary>
    public double StabilityFactor => ((2 * Y11.Real * Y22.Real) - (Y12 * Y21).Real) / (Y12 * Y21).Magnitude;

    /// <summary>Whether it is stable at this frequency with any passive terminations.</summary>
    public bool IsUnconditionallyStable => StabilityFactor > 1 && Y11.Real > 0 && Y22.Real > 0;

    /// <summary>Largest gain that keeps a stage stable by loading it.</summary>
    public Decibels MaximumStableGain => Decibels.FromPowerRatio((Y21 / Y12).Magnitude);
}
