using System.Numerics;
using ClubBench.Calculation.Networks;

namespace ClubBench.Calculation.Fitting;

/// <summary>One number the fit may move.</summary>
/// <param name="Arm">Arm of the ladder; -1 where it belongs to the whole board.</param>
/// <param name="Part">Coil or capacitor of that arm; the Q for the whole board; null for a delay.</param>
/// <param name="Spread">Standard deviation expected before measuring.</param>
internal sealed record FitParameter(int Arm, ArmParameter? Part, double Spread);

/// <summary>What a board with given deviations would show, and the slopes of it. Deviations are natural logarithms of value over nominal; delays in nanoseconds.</summary>
internal sealed class FitModel
{
    private const double QSpread = 0.5;
    private static readonly Complex NanosecondTurn = new(0, -1e-9);
    private readonly SweepFitInput _input;

    public FitModel(SweepFitInput input)
    {
        _input = input;
        Parameters = [.. input.Nominal.Elements.SelectMany(PartsOf), new(-1, ArmParameter.CoilQ, QSpread), new(-1, null, 1), new(-1, null, 1)];
    }

    public IReadOnlyList<FitParameter> Parameters { get; }

    /// <summary>Place of the common Q; the delays of port 1 and port 2 follow.</summary>
    public int QAt => Parameters.Count - 3;

    public Ladder LadderOf(double[] p)
    {
        var q = _input.CoilQ * Math.Exp(p[QAt]);
        var arms = _input.Nominal.Elements.ToArray();
        for (var i = 0; i < QAt; i++)
        {
            var (arm, factor) = (Parameters[i].Arm, Math.Exp(p[i]));
            arms[arm] = Parameters[i].Part == ArmParameter.Coil ? arms[arm].Scaled(factor, 1) : arms[arm].Scaled(1, factor);
        }

        return new Ladder(arms).WithQ(q, _input.CapacitorQ);
    }

    /// <summary>Every complex residual in the order of the sweep, with its slopes where wanted.</summary>
    public IEnumerable<(Complex Residual, Complex[] Slopes)> Residuals(double[] p)
    {
        var ladder = LadderOf(p);
        foreach (var point in _input.Measured.Points)
        {
            var at = new LadderDerivatives(ladder, point.Frequency, _input.Source, _input.Load);
            var turn = NanosecondTurn * point.Frequency.RadiansPerSecond;
            if (_input.UsesReflection) yield return Row(at, p, turn, point.S11, reflection: true);
            if (_input.UsesTransmission) yield return Row(at, p, turn, point.S21!.Value, reflection: false);
        }
    }

    private (Complex Residual, Complex[] Slopes) Row(LadderDerivatives at, double[] p, Complex turn, Complex measured, bool reflection)
    {
        var (first, second) = reflection ? (2.0, 0.0) : (1.0, 1.0);
        var delay = Complex.Exp(turn * ((first * p[QAt + 1]) + (second * p[QAt + 2])));
        var shown = delay * Pick(at.Scattering, reflection);
        var slopes = new Complex[Parameters.Count];
        for (var i = 0; i < QAt; i++) slopes[i] = delay * Pick(at.Slope(Parameters[i].Arm, Parameters[i].Part!.Value), reflection);
        for (var arm = 0; arm < _input.Nominal.Elements.Length; arm++)
            if (_input.Nominal.Elements[arm].HasCoil) slopes[QAt] += delay * Pick(at.Slope(arm, ArmParameter.CoilQ), reflection);
        (slopes[QAt + 1], slopes[QAt + 2]) = (first * turn * shown, second * turn * shown);
        return (shown - measured, slopes);
    }

    private static Complex Pick((Complex Reflection, Complex Transmission) pair, bool reflection) => reflection ? pair.Reflection : pair.Transmission;

    private IEnumerable<FitParameter> PartsOf(LadderElement arm, int k)
    {
        if (arm.HasCoil) yield return new(k, ArmParameter.Coil, _input.CoilSpread);
        if (arm.HasCapacitor) yield return new(k, ArmParameter.Capacitor, _input.CapacitorSpread);
    }
}
