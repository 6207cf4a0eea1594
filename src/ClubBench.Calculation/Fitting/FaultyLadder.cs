using System.Numerics;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Fitting;

/// <summary>The nominal filter with one gross fault in it. Source: common practice for what is left of a shorted or open part.</summary>
internal sealed class FaultyLadder(SweepFitInput input, IReadOnlyList<ParallelPair> pairs, GrossFault fault)
{
    private const double OpenCoilOhm = 1e6;
    private const double OpenCapacitorOhm = 1e9;
    private const double ShortedCoilOhm = 0.01;
    private const double ShortedCapacitorOhm = 0.05;
    private readonly Ladder _nominal = input.Nominal.WithQ(input.CoilQ, input.CapacitorQ);

    /// <summary>What it leaves of the sweep unexplained, per complex value.</summary>
    public double Rms()
    {
        var left = input.Measured.Points.SelectMany(p =>
        {
            var chain = _nominal.Elements.Select((arm, k) => At(arm, k, p.Frequency)).Aggregate(TwoPort.Through, (c, arm) => c.Then(arm));
            return Residuals(chain, p.S11, p.S21);
        });
        return Math.Sqrt(left.Average(r => (r.Real * r.Real) + (r.Imaginary * r.Imaginary)));
    }

    private IEnumerable<Complex> Residuals(TwoPort chain, Complex s11, Complex? s21)
    {
        if (input.UsesReflection) yield return chain.S11(input.Source, input.Load) - s11;
        if (input.UsesTransmission) yield return chain.S21(input.Source, input.Load) - s21!.Value;
    }

    private TwoPort At(LadderElement arm, int k, Frequency f)
    {
        if (k != fault.Arm) return arm.At(f);
        var w = f.RadiansPerSecond;
        var coil = fault.IsCoil ? Left(OpenCoilOhm, ShortedCoilOhm) : arm.CoilImpedance(w);
        var capacitor = fault.IsCoil ? arm.CapacitorImpedance(w) : HalfOfPair(k) is { } share ? arm.CapacitorImpedance(w) / share : Left(OpenCapacitorOhm, ShortedCapacitorOhm);
        var impedance = arm.IsTrap && arm.Position == LadderPosition.Series ? coil * capacitor / (coil + capacitor) : coil + capacitor;
        return arm.Position == LadderPosition.Series ? TwoPort.Series(impedance) : TwoPort.Shunt(1 / impedance);
    }

    private double Left(double open, double shorted) => fault.Kind == GrossFaultKind.Open ? open : shorted;

    private double? HalfOfPair(int arm)
    {
        if (fault.Kind is not (GrossFaultKind.OnlyFirstOfPair or GrossFaultKind.OnlySecondOfPair)) return null;
        var pair = pairs.First(p => p.Arm == arm);
        return (fault.Kind == GrossFaultKind.OnlyFirstOfPair ? pair.First : pair.Second) / (pair.First + pair.Second);
    }
}
