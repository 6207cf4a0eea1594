using System.Numerics;
using ClubBench.Calculation.Components;
using ClubBench.Calculation.CrystalFilters;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;

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
    public void At_AnyFrequency_IsReciprocal() =>
        Assert.All(Enumerable.Range(-10, 21), i => Assert.Equal(0, (Four.At(Frequency.FromHertz(8_998_000 + (i * 400))).Determinant - Complex.One).Magnitude, 1e-6));

    [Fact]
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

    private static Frequency At(double offsetHertz) => Frequency.FromHertz(8_998_000 + offsetHertz);

    private static void Share(ReferenceRow row, string column, double? actual)
    {
        if (row.Has(column)) Assert.Equal(row.Number(column), actual!.Value, row.Number(column) * row.Number("relative_tolerance"));
    }
}
