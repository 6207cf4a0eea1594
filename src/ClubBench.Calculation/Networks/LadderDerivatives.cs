using System.Collections.Immutable;
using System.Numerics;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Networks;

/// <summary>How one arm moves loss and return loss.</summary>
/// <param name="LossPerPercentCoil">dB more loss for a coil 1 % larger; null without a coil.</param>
/// <param name="LossPerPercentCapacitor">dB more loss for a capacitor 1 % larger; null without one.</param>
/// <param name="ReturnLossPerPercentCoil">dB more return loss for a coil 1 % larger; null without a coil.</param>
/// <param name="ReturnLossPerPercentCapacitor">dB more return loss for a capacitor 1 % larger; null without one.</param>
public sealed record ArmSensitivity(
    Decibels? LossPerPercentCoil,
    Decibels? LossPerPercentCapacitor,
    Decibels? ReturnLossPerPercentCoil,
    Decibels? ReturnLossPerPercentCapacitor);

/// <summary>What of an arm may differ from its nominal value.</summary>
internal enum ArmParameter
{
    /// <summary>Inductance.</summary>
    Coil,

    /// <summary>Capacitance.</summary>
    Capacitor,

    /// <summary>Unloaded Q of the coil.</summary>
    CoilQ,
}

/// <summary>Exact derivatives of a ladder at one frequency: group delay and the influence of every part. Immutable.</summary>
/// <remarks>
/// Method: rows of the chain up to each arm and columns after it; every derivative is a product of one of each.
/// Valid: where the ladder passes anything at all; the slope of the return loss needs a reflection that is not zero.
/// Source: derived (chain rule on the chain matrix), checked against finite differences.
/// </remarks>
public sealed class LadderDerivatives
{
    private readonly ImmutableArray<LadderElement> _elements;
    private readonly Frequency _f;
    private readonly double _w;
    private readonly Complex _denominator;
    private readonly double _passing;
    private readonly Complex _reflection;
    private readonly Complex[] _denominatorSlopes;
    private readonly Complex[] _numeratorSlopes;

    /// <summary>Takes the derivatives of a ladder between two real resistances above zero.</summary>
    public LadderDerivatives(Ladder ladder, Frequency f, Resistance source, Resistance load)
    {
        var (rs, rl) = (Guard.Positive(source.Ohm, nameof(source)), Guard.Positive(load.Ohm, nameof(load)));
        (_elements, _f, _w) = (ladder.Elements, f, f.RadiansPerSecond);
        var arms = ladder.Elements.Select(e => e.At(f)).ToArray();
        var columns = ColumnsAfter(arms, rl);
        (_denominator, _denominatorSlopes) = Slopes(arms, columns, rs);
        (var numerator, _numeratorSlopes) = Slopes(arms, columns, -rs);
        _reflection = numerator / _denominator;
        _passing = 2 * Math.Sqrt(rs * rl);
    }

    /// <summary>Group delay of the transmission; below zero only in odd corners of a stop-band.</summary>
    /// <returns>Seconds.</returns>
    public double GroupDelaySecond =>
        _elements.Select((e, k) => _denominatorSlopes[k] * FrequencySlope(e) / _denominator).Aggregate(Complex.Zero, Complex.Add).Imaginary;

    /// <summary>Influence of each arm, in ladder order.</summary>
    public IReadOnlyList<ArmSensitivity> Sensitivities =>
        [.. _elements.Select((e, k) => new ArmSensitivity(
            Loss(k, e.HasCoil ? CoilSlope(e) : null),
            Loss(k, e.HasCapacitor ? CapacitorSlope(e) : null),
            ReturnLoss(k, e.HasCoil ? CoilSlope(e) : null),
            ReturnLoss(k, e.HasCapacitor ? CapacitorSlope(e) : null)))];

    /// <summary>Reflection at the input and transmission.</summary>
    internal (Complex Reflection, Complex Transmission) Scattering => (_reflection, _passing / _denominator);

    /// <summary>Slopes of reflection and transmission against the natural logarithm of a parameter of arm k.</summary>
    internal (Complex Reflection, Complex Transmission) Slope(int k, ArmParameter parameter)
    {
        var arm = _elements[k];
        var x = parameter switch
        {
            ArmParameter.Coil => CoilSlope(arm),
            ArmParameter.Capacitor => CapacitorSlope(arm),
            _ => ArmSlope(arm, -_w * arm.InductanceHenry * arm.CoilLoss, coil: true),
        };
        var denominatorSlope = _denominatorSlopes[k] * x / _denominator;
        return ((_numeratorSlopes[k] * x / _denominator) - (_reflection * denominatorSlope), -_passing / _denominator * denominatorSlope);
    }

    private Decibels? Loss(int k, Complex? slope) =>
        slope is { } x ? PerPercent((_denominatorSlopes[k] * x / _denominator).Real) : null;

    private Decibels? ReturnLoss(int k, Complex? slope)
    {
        if (slope is not { } x || _reflection.Magnitude < 1e-9) return null;
        var reflectionSlope = (_numeratorSlopes[k] - (_reflection * _denominatorSlopes[k])) * x / _denominator;
        return PerPercent(-(reflectionSlope / _reflection).Real);
    }

    private static Decibels PerPercent(double perNeper) => Decibels.FromDb(20 / Math.Log(10) * perNeper / 100);

    // Slopes of the arm's own immittance (impedance in the line, admittance to ground) against ln L, ln C and angular frequency.
    private Complex CoilSlope(LadderElement e) => ArmSlope(e, e.CoilImpedance(_w), coil: true);

    private Complex CapacitorSlope(LadderElement e) => ArmSlope(e, -e.CapacitorImpedance(_w), coil: false);

    private Complex ArmSlope(LadderElement e, Complex impedanceSlope, bool coil)
    {
        if (e.Position == LadderPosition.Shunt) return -impedanceSlope / Square(e.Impedance(_f));
        if (!e.IsTrap) return impedanceSlope;
        var own = coil ? e.CoilImpedance(_w) : e.CapacitorImpedance(_w);
        return impedanceSlope * Square(e.Impedance(_f) / own);
    }

    private Complex FrequencySlope(LadderElement e) =>
        ((e.HasCoil ? CoilSlope(e) : Complex.Zero) + (e.HasCapacitor ? CapacitorSlope(e) : Complex.Zero)) / _w;

    private static Complex Square(Complex z) => z * z;

    private static (Complex V, Complex I)[] ColumnsAfter(TwoPort[] arms, double loadOhm)
    {
        var columns = new (Complex V, Complex I)[arms.Length];
        (Complex V, Complex I) column = (loadOhm, Complex.One);
        for (var k = arms.Length - 1; k >= 0; k--)
        {
            columns[k] = column;
            column = ((arms[k].A * column.V) + (arms[k].B * column.I), (arms[k].C * column.V) + (arms[k].D * column.I));
        }

        return columns;
    }

    private (Complex Total, Complex[] Slopes) Slopes(TwoPort[] arms, (Complex V, Complex I)[] columns, double sourceOhm)
    {
        (Complex V, Complex I) row = (Complex.One, sourceOhm);
        var slopes = new Complex[arms.Length];
        for (var k = 0; k < arms.Length; k++)
        {
            slopes[k] = _elements[k].Position == LadderPosition.Series ? row.V * columns[k].I : row.I * columns[k].V;
            row = ((row.V * arms[k].A) + (row.I * arms[k].C), (row.V * arms[k].B) + (row.I * arms[k].D));
        }

        // Behind the last arm stands the load itself.
        return ((row.V * columns[^1].V) + (row.I * columns[^1].I), slopes);
    }
}
