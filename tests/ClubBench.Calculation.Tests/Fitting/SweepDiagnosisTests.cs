using ClubBench.Calculation.Fitting;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tests.Elliptic;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Fitting;

public class SweepDiagnosisTests
{
    public static TheoryData<ReferenceRow> Cases => ReferenceTable.Theory("sweep-fit");

    [Theory]
    [MemberData(nameof(Cases))]
    public void Of_NoisyExample_FindsThePartsToTheToleranceOfTheTable(ReferenceRow row)
    {
        var question = Boards.Question(Boards.Shown(Boards.Built(Boards.Example), 0.002)) with { Data = Enum.Parse<FittedData>(row["data"]) };

        var fit = SweepDiagnosis.Of(question);

        Assert.Equal(FitRefusal.None, fit.Refusal);
        Assert.All(row["fitted_scales"].Split(';').Select(Ellipses.Number).Zip(fit.Parts), x => Assert.Equal(x.First, x.Second.Scale, row.Number("tolerance")));
        if (row.Has("true_q")) Assert.Equal(row.Number("true_q"), fit.CoilQ!.Value, row.Number("true_q") * row.Number("q_tolerance"));
    }

    [Fact]
    public void Of_TransmissionAlone_SeesTheEndCapacitorsFaintlyAndTheRestWell()
    {
        var fit = SweepDiagnosis.Of(Boards.Question(Boards.Shown(Boards.Built(Boards.Example), 0.002)) with { Data = FittedData.Transmission });

        Assert.Equal(
            [PartVisibility.Faint, PartVisibility.WellSeen, PartVisibility.WellSeen, PartVisibility.WellSeen, PartVisibility.Faint],
            fit.Parts.Select(p => p.Visibility));
    }

    [Theory]
    [InlineData(FittedData.All)]
    [InlineData(FittedData.Reflection)]
    [Evidence(typeof(SweepDiagnosis), EvidenceKind.RoundTrip)]
    public void Of_CleanSweep_FindsTheTruth(FittedData data)
    {
        var fit = SweepDiagnosis.Of(Boards.Question(Boards.Shown(Boards.Built(Boards.Example))) with { Data = data });

        Assert.All(Boards.Example.Zip(fit.Parts), x => Assert.Equal(x.First, x.Second.Scale, 1e-3));
        Assert.Equal(1, fit.Parts[1].SurplusTurns(18), 0.01);
        Assert.Equal([1], fit.Deviating.Where(p => p.IsCoil && p.Scale > 1.05).Select(p => p.Arm));
    }

    [Fact]
    public void Of_DelaysOfTheFixture_AreFoundAndTheirOmissionIsRefused()
    {
        var late = Boards.Question(Boards.Shown(Boards.Built(Boards.Example), 0.002, 1, 1, 1));

        var fit = SweepDiagnosis.Of(late);

        Assert.Equal(1, fit.Delay1Nanosecond, 0.02);
        Assert.Equal(1, fit.Delay2Nanosecond, 0.05);
        Assert.All(Boards.Example.Zip(fit.Parts), x => Assert.Equal(x.First, x.Second.Scale, 0.01));
    }

    [Fact]
    public void Of_AnotherFilterThanPlanned_NamesNoPart()
    {
        var fit = SweepDiagnosis.Of(Boards.Question(Boards.Shown(Seven20.ToLadder(150, 1000), 0.002)));

        Assert.Equal(FitRefusal.ModelDoesNotFit, fit.Refusal);
        Assert.Empty(fit.Parts);
        Assert.True(fit.RmsResidual > 3 * fit.Noise);
    }

    [Fact]
    public void Of_PassBandOnly_SaysWhatToSweep()
    {
        var fit = SweepDiagnosis.Of(Boards.Question(Boards.Shown(Boards.Built(Boards.Example), at: FrequencyRange.FromMegahertz(6.9, 7.4).Points(101))));

        Assert.Equal(FitRefusal.CoversTooLittle, fit.Refusal);
        Assert.InRange(fit.Wanted!.Value.Low.Megahertz, 0.5, 1.5);
        Assert.InRange(fit.Wanted.Value.High.Megahertz, 30, 45);
    }

    [Fact]
    public void Of_FewPoints_IsRefused() =>
        Assert.Equal(FitRefusal.TooFewPoints, SweepDiagnosis.Of(Boards.Question(Boards.Shown(Boards.Built(Boards.Example), at: FrequencyRange.FromMegahertz(1, 30).Points(19)))).Refusal);

    [Fact]
    public void Of_SizesAlone_AreRefused()
    {
        var sweep = Boards.Shown(Boards.Built(Boards.Example));
        var sizes = sweep with { Points = [.. sweep.Points.Select(p => p with { S11 = p.S11.Magnitude, S21 = p.S21!.Value.Magnitude })] };

        Assert.Equal(FitRefusal.AnglesMissing, SweepDiagnosis.Of(Boards.Question(sizes)).Refusal);
    }

    [Theory]
    [InlineData(0, 0.60)]
    [InlineData(1, 1.20)]
    [InlineData(3, 1.20)]
    [InlineData(4, 0.60)]
    [Evidence(typeof(SweepDiagnosis), EvidenceKind.Identity)]
    public void Of_OneFaultAndTransmissionAlone_TellsTheMirrorArmAsWell(int arm, double scale)
    {
        var scales = new double[] { 1, 1, 1, 1, 1 };
        scales[arm] = scale;
        var question = Boards.Question(Boards.Shown(Boards.Built(scales, 150), 0.002)) with { CapacitorSpread = 0.20 };

        var blind = SweepDiagnosis.Of(question with { Data = FittedData.Transmission });
        var seeing = SweepDiagnosis.Of(question);

        Assert.All(blind.Deviating.Where(p => p.Arm != 2), p => Assert.Equal(4 - p.Arm, p.MirrorArm));
        Assert.NotEmpty(blind.Deviating);
        Assert.Contains(seeing.Deviating, p => p.Arm == arm && p.MirrorArm is null);
        Assert.Equal(scale, seeing.Parts[arm].Scale, 0.01);
    }

    [Theory]
    [InlineData(0.10)]
    [InlineData(0.25)]
    [InlineData(0.40)]
    [InlineData(0.60)]
    public void Of_OnePartFarOff_IsFoundFromTheNominalStart(double off)
    {
        for (var arm = 0; arm < 5; arm++)
            foreach (var scale in new[] { 1 + off, 1 - off })
            {
                var scales = new double[] { 1, 1, 1, 1, 1 };
                scales[arm] = scale;
                var sweep = Boards.Shown(Boards.Built(scales), 0.002, 1, 0.5, -0.5, FrequencyRange.FromMegahertz(1, 30).Points(101));

                var fit = SweepDiagnosis.Of(Boards.Question(sweep) with { CapacitorSpread = 0.3, CoilSpread = 0.3 });

                Assert.Equal(FitRefusal.None, fit.Refusal);
                Assert.Equal(scale, fit.Parts[arm].Scale, 0.02);
            }
    }

    [Fact]
    public void Of_ManyNoises_ScattersAsItsStandardDeviationsSay()
    {
        var misses = Enumerable.Range(1, 40).SelectMany(seed =>
        {
            var fit = SweepDiagnosis.Of(Boards.Question(Boards.Shown(Boards.Built(Boards.Example), 0.002, (ulong)seed)));
            return Boards.Example.Zip(fit.Parts, (truth, part) => Math.Log(part.Scale / truth) / part.StandardDeviation);
        }).ToList();

        Assert.Equal(1, Math.Sqrt(misses.Average(m => m * m)), 0.2);
    }

    [Fact]
    public void Of_NoiseNotTold_IsTakenFromTheResidual() =>
        Assert.Equal(0.002, SweepDiagnosis.Of(Boards.Question(Boards.Shown(Boards.Built(Boards.Example), 0.002)) with { Noise = null }).Noise, 2e-4);

    [Fact]
    [Evidence(typeof(SweepDiagnosis), EvidenceKind.RoundTrip)]
    public void Of_FilterWithATrap_FindsItsCoilAndItsCapacitor()
    {
        var model = new Ladder([.. F7.ToLadder().Elements.Take(3), LadderElement.SeriesTrap(Inductance.FromMicrohenry(0.9), Capacitance.FromPicofarad(62)), F7.ToLadder().Elements[4]]);
        var scales = new[] { 1.02, 0.97, 1.05, 1.1, 0.95 };
        var built = new Ladder(model.Elements.Select((e, k) => e.WithQ(120, 1000).Scaled(scales[k], scales[k])));

        var fit = SweepDiagnosis.Of(new(model, 150, 1000, Boards.Shown(built)) { Noise = 0.002 });

        Assert.Equal([1.02, 0.97, 1.05, 1.1, 1.1, 0.95], fit.Parts.Select(p => Math.Round(p.Scale, 2)));
        Assert.Equal(120, fit.CoilQ!.Value, 0.5);
    }

    [Fact]
    [Evidence(typeof(SweepDiagnosis), EvidenceKind.IndependentRecomputation)]
    public void Of_Example_IsWhatAnotherMinimiserFindsWithDifferencesForSlopes()
    {
        var sweep = Boards.Shown(Boards.Built(Boards.Example), 0.002);
        var fit = SweepDiagnosis.Of(Boards.Question(sweep));

        var other = SecondMinimiser.Of(sweep);

        Assert.All(fit.Parts.Select(p => Math.Log(p.Scale)).Zip(other), x => Assert.Equal(x.Second, x.First, 1e-6));
        Assert.Equal(Math.Log(fit.CoilQ!.Value / 150), other[5], 1e-5);
        Assert.Equal(fit.Delay1Nanosecond, other[6], 1e-5);
        Assert.Equal(fit.Delay2Nanosecond, other[7], 1e-5);
    }
}
