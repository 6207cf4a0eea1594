using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Sweeps;

/// <summary>The same sweep as it would look between other resistances.</summary>
/// <remarks>
/// Method: waves of the old reference written as waves of the new one, S' = M (S - P)(1 - P S)^-1 M^-1, P the reflection of the new reference on the old.
/// Valid: real references; two ports need all four parameters.
/// Source: derived.
/// </remarks>
public static class SweepReference
{
    /// <summary>Refers a sweep to one resistance above zero; null where half of a two-port was not measured or an active network has no finite counterpart.</summary>
    public static Sweep? To(Sweep sweep, Resistance reference)
    {
        var r = Guard.Positive(reference.Ohm, nameof(reference));
        var (one, two) = (new Port(sweep.Reference1.Ohm, r), new Port(sweep.Reference2.Ohm, r));
        if (one.IsSame && (sweep.Ports == 1 || two.IsSame)) return sweep with { Reference1 = reference, Reference2 = reference };
        var points = sweep.Points.Select(p => Moved(p, one, two)).OfType<SweepPoint>().ToList();
        return points.Count == sweep.Points.Length ? new([.. points], reference, reference) : null;
    }

    private static SweepPoint? Moved(SweepPoint p, Port one, Port two)
    {
        if (p.S21 is null) return Finite(p with { S11 = (p.S11 - one.Reflection) / (1 - (one.Reflection * p.S11)) });
        if (p is not { S21: { } s21, S12: { } s12, S22: { } s22 }) return null;
        var (p1, p2) = (one.Reflection, two.Reflection);
        var up = new Matrix2(p.S11 - p1, s12, s21, s22 - p2);
        var down = new Matrix2(1 - (p1 * p.S11), -p1 * s12, -p2 * s21, 1 - (p2 * s22));
        if (down.Inverse() is not { } inverse) return null;
        var (moved, scale) = (up.Times(inverse), one.Scale / two.Scale);
        return Finite(new(p.Frequency, moved.A11, moved.A21 / scale, moved.A12 * scale, moved.A22));
    }

    private static SweepPoint? Finite(SweepPoint point) => double.IsFinite(point.LargestPowerOut) ? point : null;

    private readonly record struct Port(double OldOhm, double NewOhm)
    {
        public bool IsSame => OldOhm == NewOhm;

        public double Reflection => (NewOhm - OldOhm) / (NewOhm + OldOhm);

        public double Scale => (NewOhm + OldOhm) / (2 * Math.Sqrt(NewOhm * OldOhm));
    }
}
