using System.Globalization;
using ClubBench.Calculation.Elliptic;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Elliptic;

/// <summary>Elliptic filters of reference rows, and any of them.</summary>
internal static class Ellipses
{
    /// <summary>Any order on offer.</summary>
    public static readonly Gen<int> Order = Gen.Int[1, 3].Select(i => (2 * i) + 1);

    /// <summary>Any order, ripple and angle on offer.</summary>
    public static readonly Gen<(int Order, PassBandRipple Ripple, double Angle)> Any =
        Gen.Select(Order, Gen.Double[-4, 0.47].Select(e => PassBandRipple.FromRipple(Decibels.FromDb(Math.Pow(10, e)))), Gen.Double[1, 80]);

    /// <summary>Any that has parts: at an angle up to nearly the largest of its ripple, where a part vanishes.</summary>
    public static readonly Gen<EllipticApproximation> AnyWithParts = Gen.Select(Any, Gen.Double[0, 0.98]).Select((x, share) =>
        EllipticApproximation.Of(x.Order, x.Ripple, 1 + (share * (NotchPlacement.GreatestAngleDegrees(x.Order, x.Ripple) - 1))));

    public static EllipticApproximation Of(ReferenceRow row)
    {
        var order = (int)row.Number("order");
        var ripple = row.Has("ripple_db") ? PassBandRipple.FromRipple(Decibels.FromDb(row.Number("ripple_db"))) : PassBandRipple.FromReflection(row.Number("reflection"));
        return row.Has("angle_degrees")
            ? EllipticApproximation.Of(order, ripple, row.Number("angle_degrees"))
            : EllipticApproximation.FromStopBandEdge(order, ripple, row.Number("stop_band_edge"));
    }

    public static IEnumerable<double> InLadderOrder(EllipticPrototype prototype) =>
        prototype.Shunts.Zip(prototype.Traps.Select(t => new[] { t.Inductance, t.Capacitance }).Append([]), (c, trap) => trap.Prepend(c)).SelectMany(x => x);

    /// <summary>The numbers of a column, semicolons between them, against what was computed; an empty column says nothing.</summary>
    public static void Same(ReferenceRow row, string column, IEnumerable<double> computed)
    {
        if (!row.Has(column)) return;
        var (expected, actual) = (row[column].Split(';').Select(Number).ToList(), computed.ToList());
        Assert.Equal(expected.Count, actual.Count);
        foreach (var (e, a) in expected.Zip(actual))
            Assert.Equal(e, a, row.Columns.Contains("tolerance") && row.Has("tolerance") ? row.Number("tolerance") : Math.Abs(e) * row.Number("relative_tolerance"));
    }

    public static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
