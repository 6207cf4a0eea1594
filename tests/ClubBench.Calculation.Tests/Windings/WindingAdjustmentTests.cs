using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using ClubBench.Calculation.Statistics;
using ClubBench.Calculation.Windings;
using CsCheck;

namespace ClubBench.Calculation.Tests.Windings;

public class WindingAdjustmentTests
{
    private static readonly Gen<WindingReading> Readings = Gen.Select(
        Gen.Int[1, 80], Gen.Double[0.3, 3], Gen.Double[0, 0.1], Gen.Double[0, 0.1], Gen.Double[0, 0.15], Gen.Double[0, 0.15],
        (turns, ratio, u, trim, spread, squeeze) => new WindingReading(turns, ratio, u) { Trim = trim, Limits = new(spread, squeeze) });

    public static TheoryData<ReferenceRow> Cases => ReferenceTable.Theory("winding-adjustment");

    [Theory]
    [MemberData(nameof(Cases))]
    public void For_Reading_GivesTheActionOfTheTable(ReferenceRow row)
    {
        var reading = new WindingReading((int)row.Number("turns"), row.Number("ratio"), row.Number("uncertainty")) { Trim = row.Number("trim") };

        var advice = WindingAdjustment.For(reading);

        Assert.Equal(Enum.Parse<WindingAction>(row["action"]), advice.Action);
        Assert.Equal((row.Number("change"), row.Number("first")), (advice.TurnChange, advice.FirstStep));
        Assert.Equal(bool.Parse(row["firm"]), advice.IsFirm);
        Assert.Equal(row.Number("residual"), advice.Residual, 0.0006);
    }

    [Fact]
    [Evidence(typeof(WindingAdjustment), EvidenceKind.Identity)]
    public void For_AnyReading_NeverMovesAwayFromTheTarget() =>
        Readings.Sample(r =>
        {
            var advice = WindingAdjustment.For(r);
            var before = Math.Abs(r.Ratio - 1);
            return Math.Abs(advice.Residual) <= before + 1e-12 && Math.Abs(advice.RatioAfterFirstStep - 1) <= before + 1e-12;
        });

    [Fact]
    [Evidence(typeof(WindingAdjustment), EvidenceKind.Identity)]
    public void For_AnyReading_StepsTheRightWayAndNoFurtherThanAsked() =>
        Readings.Sample(r =>
        {
            var advice = WindingAdjustment.For(r);
            var turnsChange = advice.Action is WindingAction.Remove or WindingAction.Add or WindingAction.Rewind;
            return turnsChange == (advice.TurnChange != 0)
                && Math.Abs(advice.FirstStep) <= Math.Abs(advice.TurnChange)
                && (!turnsChange || (Math.Sign(advice.TurnChange) == Math.Sign(1 - r.Ratio) && advice.FirstStep != 0))
                && r.Turns + advice.TurnChange >= 1;
        });

    [Fact]
    [Evidence(typeof(WindingAdjustment), EvidenceKind.RoundTrip)]
    public void For_RepeatedOnAnExactReading_EndsWithoutTurnsToChange() =>
        Readings.Sample(r =>
        {
            for (var i = 0; i < 100; i++)
            {
                var advice = WindingAdjustment.For(r);
                if (advice.FirstStep == 0) return true;
                r = r with { Turns = r.Turns + advice.FirstStep, Ratio = advice.RatioAfterFirstStep };
            }

            return false;
        });

    [Fact]
    public void For_WithinTheAcceptableDeviation_SaysNothing()
    {
        var reading = new WindingReading(15, 1.03, 0.02) { Acceptable = 0.04 };

        Assert.Equal(WindingAction.None, WindingAdjustment.For(reading).Action);
        Assert.Equal(WindingAction.Spread, WindingAdjustment.For(reading with { Acceptable = 0 }).Action);
    }

    [Fact]
    public void For_TailTooShortToAdd_AsksToRewind()
    {
        var reading = new WindingReading(33, 0.86, 0.03);

        Assert.Equal(WindingAction.Rewind, WindingAdjustment.For(reading with { TailAllowsAdding = false }).Action);
        Assert.Equal(WindingAction.Add, WindingAdjustment.For(reading).Action);
    }

    [Fact]
    [Evidence(typeof(WindingAdjustment), EvidenceKind.ClosedFormLimit)]
    public void For_CapacitorToChange_BringsTheCircuitToResonance()
    {
        var advice = WindingAdjustment.For(new WindingReading(8, 1.15, 0.02));

        Assert.Equal(1, 1.15 * advice.CapacitanceFactor, 12);
    }

    [Fact]
    [Evidence(typeof(WindingAdjustment), EvidenceKind.ClosedFormLimit)]
    public void ExpectedReading_AfterRemovingTurns_RisesWithTheTurns()
    {
        var reading = new WindingReading(33, 1.10, 0.02);
        var advice = WindingAdjustment.For(reading);

        Assert.Equal(7.0 * 33 / 32, advice.ExpectedReading(Frequency.FromMegahertz(7), reading).Megahertz, 9);
    }

    [Fact]
    [Evidence(typeof(WindingReading), EvidenceKind.ClosedFormLimit)]
    public void RatioFrom_LowFrequency_IsALargeCoil() =>
        Assert.Equal(1.21, WindingReading.RatioFrom(Frequency.FromMegahertz(7.7), Frequency.FromMegahertz(7)), 12);

    [Fact]
    [Evidence(typeof(WindingReading), EvidenceKind.ClosedFormLimit)]
    public void UncertaintyFrom_CapacitorAlone_IsTwiceIt() => Assert.Equal(0.02, WindingReading.UncertaintyFrom(0, 0.01), 12);

    [Fact]
    [Evidence(typeof(AdjustmentLimits), EvidenceKind.ClosedFormLimit)]
    public void TrimRange_TrimmerOffCentre_CountsTheNearerEndLessAFifth()
    {
        var range = AdjustmentLimits.TrimRange(Capacitance.FromPicofarad(100), Capacitance.FromPicofarad(90), Capacitance.FromPicofarad(130));

        Assert.Equal(0.08, range, 12);
        Assert.Equal(0, AdjustmentLimits.TrimRange(Capacitance.FromPicofarad(100), Capacitance.FromPicofarad(100), Capacitance.FromPicofarad(130)));
    }

    [Fact]
    public void LimitsFor_WindingAndCore_FollowRoomAndMaterial()
    {
        Assert.Equal(AdjustmentLimits.Usual, AdjustmentLimits.For(new(Cores.FindToroid("T37-6")!, 15, Wire.Millimetre(0.4))));
        Assert.Equal(AdjustmentLimits.Crowded, AdjustmentLimits.For(new(Cores.FindToroid("T37-6")!, 28, Wire.Millimetre(0.4))));
        Assert.Equal(AdjustmentLimits.Ferrite, AdjustmentLimits.For(new(Cores.FindToroid("FT37-61")!, 15, Wire.Millimetre(0.4))));
    }

    [Fact]
    [Evidence(typeof(WindingReading), EvidenceKind.Identity)]
    public void RatioFrom_ReadingsSwapped_IsTheInverse() =>
        Gen.Select(Gen.Double[1, 60], Gen.Double[1, 60]).Sample((a, b) =>
        {
            var (f, g) = (Frequency.FromMegahertz(a), Frequency.FromMegahertz(b));
            return Math.Abs((WindingReading.RatioFrom(f, g) * WindingReading.RatioFrom(g, f)) - 1) < 1e-12 && WindingReading.RatioFrom(f, g) > 1 == a > b;
        });

    [Fact]
    [Evidence(typeof(WindingReading), EvidenceKind.RoundTrip)]
    public void RatioFrom_ResonancesOfTwoCoils_IsTheRatioOfTheCoils() =>
        Gen.Select(Gen.Double[0.1, 50], Gen.Double[0.5, 2], Gen.Double[20, 500]).Sample((uh, ratio, pf) =>
        {
            var (wanted, c) = (Inductance.FromMicrohenry(uh), Capacitance.FromPicofarad(pf));
            return Math.Abs((WindingReading.RatioFrom(TunedCircuit.ResonantFrequency(wanted, c), TunedCircuit.ResonantFrequency(wanted * ratio, c)) / ratio) - 1) < 1e-9;
        });

    [Fact]
    [Evidence(typeof(WindingReading), EvidenceKind.IndependentRecomputation)]
    public void UncertaintyFrom_SimulatedErrors_IsTwiceTheirDeviation()
    {
        var random = new SeededRandom(5);
        double Ratio()
        {
            var (f, c) = (random.Normal(1, 0.004), random.Normal(1, 0.01));
            return 1 / (f * f * c);
        }

        var ratios = Enumerable.Range(0, 20_000).Select(_ => Ratio()).ToList();
        var mean = ratios.Average();
        var deviation = Math.Sqrt(ratios.Average(r => (r - mean) * (r - mean)));

        Assert.Equal(1, WindingReading.UncertaintyFrom(0.004, 0.01) / (2 * deviation), 0.02);
    }
}
