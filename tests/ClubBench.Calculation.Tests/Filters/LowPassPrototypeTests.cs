using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using CsCheck;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Filters;

public class LowPassPrototypeTests
{
    public static TheoryData<ReferenceRow> Chebyshev => ReferenceTable.Theory("chebyshev_prototype");

    public static TheoryData<ReferenceRow> ChebyshevAttenuation => ReferenceTable.Theory("chebyshev_attenuation");

    public static TheoryData<ReferenceRow> Butterworth => ReferenceTable.Theory("butterworth");

    public static TheoryData<ReferenceRow> FilterParts => ReferenceTable.Theory("low_pass_parts");

    public static TheoryData<ReferenceRow> Ripple => ReferenceTable.Theory("passband_ripple");

    public static TheoryData<ReferenceRow> HalfWaveLoss => ReferenceTable.Theory("half_wave_filter");

    [Theory]
    [MemberData(nameof(Chebyshev))]
    [Evidence(typeof(LowPassPrototype), EvidenceKind.PublishedValue)]
    public void Chebyshev_OrderAndRipple_MatchesTheRow(ReferenceRow row)
    {
        var ripple = PassBandRipple.FromRipple(Decibels.FromDb(row.Number("ripple_db")));

        var prototype = LowPassPrototype.Chebyshev((int)row.Number("order"), ripple);

        for (var k = 1; k <= 4 && row.Has($"g{k}"); k++) Assert.Equal(row.Number($"g{k}"), prototype.Values[k - 1], row.Number("tolerance"));
        Assert.Equal(row.Number("half_power_ratio"), prototype.HalfPowerRatio, row.Number("tolerance"));
        Assert.Equal(row.Number("return_loss_db"), ripple.ReturnLoss.Db, 5e-4);
    }

    [Fact]
    public void Chebyshev_EvenOrder_EndsInAnotherResistance() =>
        Assert.Equal(1.355361, LowPassPrototype.Chebyshev(4, PassBandRipple.FromRipple(Decibels.FromDb(0.1))).LoadRatio, 2e-6);

    [Theory]
    [InlineData(LowPassForm.ShuntCapacitorFirst)]
    [InlineData(LowPassForm.SeriesInductorFirst)]
    [Evidence(typeof(LowPassPrototype), EvidenceKind.RoundTrip)]
    [Evidence(typeof(LowPassDesign), EvidenceKind.RoundTrip)]
    public void Denormalise_EvenOrder_HasItsRippleBetweenTheToldResistances(LowPassForm form)
    {
        var prototype = LowPassPrototype.Chebyshev(4, PassBandRipple.FromRipple(Decibels.FromDb(0.1)));

        var design = prototype.Denormalise(Frequency.FromMegahertz(8), FiftyOhm, form);

        foreach (var megahertz in new[] { 0.001, 3.0, 8.0, 16.0 })
        {
            var ideal = prototype.Attenuation(megahertz / 8);
            Assert.Equal(ideal.Db, design.ToLadder().Loss(Frequency.FromMegahertz(megahertz), design.Source, design.Load).Db, 1e-4);
        }
    }

    [Theory]
    [MemberData(nameof(Butterworth))]
    [Evidence(typeof(LowPassPrototype), EvidenceKind.PublishedValue)]
    public void Butterworth_Order_MatchesThePrintedTable(ReferenceRow row) =>
        Assert.Equal(row.Numbers("values"), LowPassPrototype.Butterworth((int)row.Number("order")).Values, (e, a) => Math.Abs(e - a) <= row.Number("tolerance"));

    [Theory]
    [InlineData(5, 30.1072)]
    [InlineData(7, 42.1445)]
    [Evidence(typeof(LowPassPrototype), EvidenceKind.ClosedFormLimit)]
    public void Attenuation_ButterworthAtTwiceTheEdge_IsThePowerOfTwo(int order, double db) =>
        Assert.Equal(db, LowPassPrototype.Butterworth(order).Attenuation(2).Db, 1e-4);

    [Theory]
    [MemberData(nameof(ChebyshevAttenuation))]
    public void Attenuation_Chebyshev_IsThePolynomial(ReferenceRow row)
    {
        var prototype = LowPassPrototype.Chebyshev((int)row.Number("order"), PassBandRipple.FromRipple(Decibels.FromDb(row.Number("ripple_db"))));

        Assert.Equal(row.Number("attenuation_db"), prototype.Attenuation(row.Number("multiple")).Db, row.Number("tolerance"));
    }

    [Theory]
    [MemberData(nameof(FilterParts))]
    public void Denormalise_ChebyshevFiveAndSeven_ScaleThePrototype(ReferenceRow row)
    {
        var design = row["filter"] == "f7" ? F7 : F14;

        Parts(design.Capacitors.Select(c => c.Picofarad), "capacitors_pf");
        Parts(design.Coils.Select(l => l.Microhenry), "coils_uh");

        void Parts(IEnumerable<double> actual, string column) =>
            Assert.Equal(row.Numbers(column), actual, (e, a) => Math.Abs(e - a) <= e * row.Number("relative_tolerance"));
    }

    [Fact]
    [Evidence(typeof(LowPassPrototype), EvidenceKind.RoundTrip)]
    [Evidence(typeof(LowPassDesign), EvidenceKind.RoundTrip)]
    public void Denormalise_Ladder_HasTheAttenuationOfThePrototype()
    {
        var prototype = LowPassPrototype.Chebyshev(7, PassBandRipple.FromRipple(Decibels.FromDb(0.01)));

        foreach (var multiple in new[] { 0.3, 0.8, 1.0, 1.3, 2.0, 3.0 })
            Assert.Equal(prototype.Attenuation(multiple).Db, F14.ToLadder().Loss(Frequency.FromMegahertz(15.5) * multiple, FiftyOhm, FiftyOhm).Db, 1e-6);
    }

    [Theory]
    [InlineData(0.01, 0.98, 1.02)]
    [InlineData(1.0, 1.3, 2.0)]
    public void LossEstimate_TowardsTheEdge_FallsShortByUpToHalf(double multiple, double least, double most)
    {
        var prototype = LowPassPrototype.Chebyshev(5, PassBandRipple.FromReflection(0.1));
        foreach (var form in Enum.GetValues<LowPassForm>())
        {
            var design = prototype.Denormalise(Frequency.FromMegahertz(8), FiftyOhm, form);
            var f = Frequency.FromMegahertz(8 * multiple);
            var more = design.ToLadder(150, 1000).Loss(f, FiftyOhm, FiftyOhm) - design.ToLadder().Loss(f, FiftyOhm, FiftyOhm);

            Assert.InRange(more.Db / prototype.LossEstimate(multiple, 150, 1000, form).Db, least, most);
        }
    }

    [Theory]
    [MemberData(nameof(Ripple))]
    [Evidence(typeof(PassBandRipple), EvidenceKind.ClosedFormLimit)]
    [Evidence(typeof(PassBandRipple), EvidenceKind.RoundTrip)]
    public void PassBandRipple_FromEachDress_IsOneFigure(ReferenceRow row)
    {
        var ripple = PassBandRipple.FromReflection(row.Number("reflection"));

        Assert.Equal(row.Number("ripple_db"), ripple.Ripple.Db, row.Number("ripple_tolerance"));
        Assert.Equal(row.Number("return_loss_db"), ripple.ReturnLoss.Db, 1e-3);
        Assert.Equal(row.Number("swr"), ripple.StandingWaveRatio, 1e-4);
        Assert.Equal(ripple.Reflection, PassBandRipple.FromRipple(ripple.Ripple).Reflection, 1e-12);
        Assert.Equal(ripple.Reflection, PassBandRipple.FromReturnLoss(ripple.ReturnLoss).Reflection, 1e-12);
        Assert.Equal(ripple.Reflection, PassBandRipple.FromStandingWaveRatio(ripple.StandingWaveRatio).Reflection, 1e-12);
    }

    [Theory]
    [MemberData(nameof(HalfWaveLoss))]
    public void HalfWave_MultipleOfTheDesignFrequency_MatchesTheRow(ReferenceRow row)
    {
        var design = Frequency.FromMegahertz(7.1);

        var loss = LowPassDesign.HalfWave(design, FiftyOhm).ToLadder().Loss(design * row.Number("multiple"), FiftyOhm, FiftyOhm);

        Assert.Equal(row.Number("loss_db"), loss.Db, row.Number("tolerance"));
    }

    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    [InlineData(double.NaN)]
    public void FromReflection_OutsideItsRange_Throws(double reflection) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => PassBandRipple.FromReflection(reflection));

    [Fact]
    public void Chebyshev_RippleAboveThreeDecibels_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => LowPassPrototype.Chebyshev(5, PassBandRipple.FromRipple(Decibels.FromDb(3.5))));

    [Theory]
    [InlineData(0.3)]
    [InlineData(1)]
    [InlineData(1.5)]
    [InlineData(3)]
    [Evidence(typeof(LowPassPrototype), EvidenceKind.ClosedFormLimit)]
    public void Attenuation_ChebyshevOfOrderThree_IsThePolynomialWrittenOut(double x)
    {
        var ripple = PassBandRipple.FromReflection(0.1);
        var shape = ripple.Epsilon * ((4 * x * x * x) - (3 * x));

        Assert.Equal(10 * Math.Log10(1 + (shape * shape)), LowPassPrototype.Chebyshev(3, ripple).Attenuation(x).Db, 1e-9);
    }

    [Fact]
    [Evidence(typeof(PassBandRipple), EvidenceKind.Identity)]
    public void PassBandRipple_AnyReflection_SharesThePowerBetweenReflectedAndPassed() =>
        Gen.Double[0.001, 0.9].Sample(reflection =>
        {
            var ripple = PassBandRipple.FromReflection(reflection);
            return Math.Abs((-ripple.Ripple).PowerRatio + (-ripple.ReturnLoss).PowerRatio - 1) < 1e-12
                && Math.Abs((ripple.Epsilon * ripple.Epsilon) - (ripple.Ripple.PowerRatio - 1)) < 1e-9;
        });

    [Theory]
    [InlineData(3)]
    [InlineData(0.0001)]
    public void Chebyshev_RippleAtAnEndOfItsRange_IsAccepted(double rippleDb) =>
        Assert.Equal(5, LowPassPrototype.Chebyshev(5, PassBandRipple.FromRipple(Decibels.FromDb(rippleDb))).Order);
}
