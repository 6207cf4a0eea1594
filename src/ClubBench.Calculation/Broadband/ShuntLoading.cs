using System.Numerics;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Broadband;

/// <summary>
/// What the magnetising impedance of a transformer does in a system of equal resistances on both sides, all referred to the same winding.
/// Source: derived (admittance across a matched line). Immutable.
/// </summary>
/// <param name="Impedance">Impedance of the winding in ohm, not zero.</param>
/// <param name="Resistance">Resistance level at the winding, above zero.</param>
public sealed record ShuntLoading(Complex Impedance, Resistance Resistance)
{
    /// <summary>Insertion loss, zero or above: 20 log10|1 + y/2|, y = R/Z.</summary>
    public Decibels InsertionLoss => Decibels.FromAmplitudeRatio(Complex.Abs(1 + (Admittance / 2)));

    /// <summary>Part of it that heats the core: 10 log10(1 + Re y).</summary>
    public Decibels CoreDissipation => Decibels.FromPowerRatio(1 + Admittance.Real);

    /// <summary>Standing wave ratio the source sees, 1 or above.</summary>
    public double StandingWaveRatio
    {
        get
        {
            var reflection = Complex.Abs(Admittance / (2 + Admittance));
            return (1 + reflection) / (1 - reflection);
        }
    }

    /// <summary>How many times the resistance the impedance is.</summary>
    public double Ratio => Complex.Abs(Impedance) / Resistance.Ohm;

    private Complex Admittance => Resistance.Ohm / Impedance;
}
