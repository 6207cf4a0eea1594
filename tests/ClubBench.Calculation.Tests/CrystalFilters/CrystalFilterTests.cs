using ClubBench.Calculation.Components;
using ClubBench.Calculation.CrystalFilters;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using CsCheck;
using MathNet.Numerics.LinearAlgebra;
using Complex = System.Numerics.Complex;

namespace ClubBench.Calculation.Tests.CrystalFilters;

public class CrystalFilterTests
{
    private static readonly CrystalParameters Nine =
        new(Frequency.FromHertz(8_998_000), Capacitance.FromFarad(17e-15), Capacitance.FromPicofarad(4.2), Resistance.FromOhm(12));

    private static readonly Frequency Narrow = Frequency.FromHertz(500);

    private static readonly CrystalFilter Four = CrystalFilterDesign.Of(new(CrystalFilterPrototype.EqualCapacitor(4), Nine, Narrow)).Filter!;

    public static TheoryData<ReferenceRow> Responses => ReferenceTable.Theory("crystal-filter-response");

    public static TheoryData<ReferenceRow> Nodal => ReferenceTable.Theory("crystal-filter-nodal");

    [Theory]
    [MemberData(nameof(Responses))]
    public void Response_ReferenceRow_IsThatOfTheTable(ReferenceRow row)
    {
        var response = CrystalFilterResponse.Of(CrystalFilterRows.Built(row), Frequency.FromHertz(row.Number("width_hz")))!;

        Assert.Equal(row.Number("loss_db"), response.Loss.Db, row.Number("tolerance_db"));
        Share(row, "width3_hz", response.Width3dBHertz);
        Share(row, "width6_hz", response.Band6dB.WidthHertz);
        Share(row, "width60_hz", response.Band60dB?.WidthHertz);
        if (row.Has("estimate_db")) Assert.Equal(row.Number("estimate_db"), CrystalFilterRows.Design(row).EstimatedLoss!.Value.Db, row.Number("tolerance_db"));
    }

    [Theory]
    [Evidence(typeof(CrystalFilter), EvidenceKind.IndependentRecomputation)]
    [Evidence(typeof(CrystalFilterResponse), EvidenceKind.IndependentRecomputation)]
    [MemberData(nameof(Nodal))]
    public void Response_NodalRow_IsThatOfTheNodeVoltages(ReferenceRow row)
    {
        var filter = CrystalFilterRows.Built(row);
        var response = CrystalFilterResponse.Of(filter, Frequency.FromHertz(row.Number("width_hz")))!;

        Assert.Equal(row.Number("expected_loss_db"), response.Loss.Db, row.Number("tolerance_db"));
        Assert.Equal(row.Number("expected_width3_hz"), response.Width3dBHertz, row.Number("tolerance_hz"));
        Assert.Equal(row.Number("expected_width6_hz"), response.Band6dB.WidthHertz, row.Number("tolerance_hz"));
        Assert.Equal(row.Number("expected_probe_db"), filter.Loss(Frequency.FromHertz(row.Number("probe_hz"))).Db, row.Number("tolerance_db"));
        Assert.Equal(row.Has("expected_width60_hz"), response.Band60dB is not null);
        if (row.Has("expected_width60_hz")) Assert.Equal(row.Number("expected_width60_hz"), response.Band60dB!.Value.WidthHertz, row.Number("tolerance_hz"));
    }

    [Fact]
    [Evidence(typeof(CrystalFilter), EvidenceKind.IndependentRecomputation)]
    public void Loss_AnyFilter_IsThatOfTheNodalEquations() =>
        Gen.Select(Gen.Int[2, 8], Gen.Double[0.05, 1], Gen.Double[300, 2400], Gen.Double[-2, 2], Gen.Double[-80, 80]).Sample((n, ripple, hz, place, off) =>
        {
            var prototype = CrystalFilterPrototype.Chebyshev(n, PassBandRipple.FromRipple(Decibels.FromDb(ripple)));
            var equal = CrystalFilterDesign.Of(new(prototype, Nine, Frequency.FromHertz(hz))).Filter!;
            var filter = equal.WithResonances([.. equal.Meshes.Select((m, i) => At(i % 2 == 0 ? off : -off))]);
            var f = Frequency.FromHertz(filter.Middle.Hertz + (place * hz));
            return Math.Abs(filter.Loss(f).Db - NodalLoss(filter, f)) < 1e-6;
        });

    [Fact]
    [Evidence(typeof(CrystalFilter), EvidenceKind.Identity)]
    public void At_AnyFrequency_IsReciprocal() =>
        Assert.All(Enumerable.Range(-10, 21), i => Assert.Equal(0, (Four.At(Frequency.FromHertz(8_998_000 + (i * 400))).Determinant - Complex.One).Magnitude, 1e-6));

    [Fact]
    [Evidence(typeof(CrystalFilter), EvidenceKind.ClosedFormLimit)]
    [Evidence(typeof(CrystalFilterResponse), EvidenceKind.ClosedFormLimit)]
    public void Response_LosslessCrystalsWithoutStaticCapacitance_IsTheWidthDesigned()
    {
        var ideal = Nine with { MotionalResistance = default, StaticCapacitance = Capacitance.FromPicofarad(1e-3) };
        var filter = CrystalFilterDesign.Of(new(CrystalFilterPrototype.Butterworth(5), ideal, Narrow)).Filter!;

        var response = CrystalFilterResponse.Of(filter, Narrow)!;

        Assert.Equal(500, response.Width3dBHertz, 0.5);
        Assert.Equal(0, response.Loss.Db, 1e-3);
        Assert.Equal(filter.Middle.Hertz, response.Center.Hertz, 1);
    }

    [Fact]
    public void Response_WrongTerminations_RipplesAndTheRightOnesDoNot()
    {
        var filter = CrystalFilterDesign.Of(new(CrystalFilterPrototype.Butterworth(4), Nine, Frequency.FromHertz(1200))).Filter!;

        var wrong = filter with { Source = filter.Source / 4, Load = filter.Load / 4 };

        Assert.True(CrystalFilterResponse.Of(filter, Frequency.FromHertz(1200))!.Ripple.Db < 0.05);
        Assert.True(CrystalFilterResponse.Of(wrong, Frequency.FromHertz(1200))!.Ripple.Db > 1);
    }

    [Fact]
    public void Response_UpperSkirt_IsSteeperThanTheLower()
    {
        var response = CrystalFilterResponse.Of(Four, Narrow)!;

        Assert.True(response.Band60dB!.Value.High.Hertz - response.Center.Hertz < response.Center.Hertz - response.Band60dB.Value.Low.Hertz);
        Assert.InRange(response.ShapeFactor!.Value, 4.5, 5);
    }

    [Fact]
    [Evidence(typeof(CrystalFilter), EvidenceKind.Identity)]
    public void Response_TurnedAround_IsTheSame()
    {
        var turned = Four with { Meshes = [.. Four.Meshes.Reverse()], Couplings = [.. Four.Couplings.Reverse()] };

        Assert.All(Enumerable.Range(-5, 11), i => Assert.Equal(Four.Loss(At(i * 150)).Db, turned.Loss(At(i * 150)).Db, 1e-9));
    }

    [Fact]
    public void Rounded_E12_ChangesNoCapacitorByMoreThanATenth()
    {
        var rounded = Four.Rounded(ESeries.E12);

        Assert.Equal(470, rounded.Couplings[0].Picofarad, 1e-9);
        Assert.InRange(CrystalFilterResponse.Of(rounded, Narrow)!.Width3dBHertz, 410, 450);
    }

    [Fact]
    public void Filter_WithoutACapacitorBetweenTwo_Throws() =>
        Assert.Throws<ArgumentException>(() => new CrystalFilter(Four.Meshes, [.. Four.Couplings.Skip(1)], Four.Source, Four.Load));

    [Fact]
    public void WithResonances_OtherNumber_Throws() => Assert.Throws<ArgumentException>(() => Four.WithResonances([Nine.SeriesResonance]));

    [Fact]
    public void Response_NothingPasses_IsNone()
    {
        var apart = Four.WithResonances([At(0), At(3000), At(-4000), At(8000)]);

        Assert.Null(CrystalFilterResponse.Of(apart, Narrow));
        Assert.NotNull(CrystalFilterResponse.Of(Four, Narrow));
    }

    // Node voltages by solving the admittance matrix: no chain of two-ports.
    private static double NodalLoss(CrystalFilter filter, Frequency f)
    {
        var n = filter.Meshes.Length + 1;
        var y = Matrix<Complex>.Build.Dense(n, n);
        for (var i = 0; i < n - 1; i++)
        {
            var impedance = filter.Meshes[i].Crystal.Impedance(f) + (filter.Meshes[i].Series is { } c ? 1 / new Complex(0, f.RadiansPerSecond * c.Farad) : 0);
            (y[i, i], y[i + 1, i + 1], y[i, i + 1], y[i + 1, i]) = (y[i, i] + (1 / impedance), y[i + 1, i + 1] + (1 / impedance), -1 / impedance, -1 / impedance);
            if (i < n - 2) y[i + 1, i + 1] += new Complex(0, f.RadiansPerSecond * filter.Couplings[i].Farad);
        }

        y[0, 0] += 1 / filter.Source.Ohm;
        y[n - 1, n - 1] += 1 / filter.Load.Ohm;
        var current = Vector<Complex>.Build.Dense(n, i => i == 0 ? 1 / filter.Source.Ohm : Complex.Zero);
        return -20 * Math.Log10(2 * y.Solve(current)[n - 1].Magnitude);
    }

    private static Frequency At(double offsetHertz) => Frequency.FromHertz(8_998_000 + offsetHertz);

    private static void Share(ReferenceRow row, string column, double? actual)
    {
        if (row.Has(column)) Assert.Equal(row.Number(column), actual!.Value, row.Number(column) * row.Number("relative_tolerance"));
    }
}
