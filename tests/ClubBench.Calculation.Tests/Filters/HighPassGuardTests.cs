using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tests.Elliptic;
using CsCheck;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Filters;

public class HighPassGuardTests
{
    private static readonly PassBandRipple TwentyDb = PassBandRipple.FromReflection(0.1);

    public static TheoryData<ReferenceRow> Cases => ReferenceTable.Theory("high-pass-guard");

    [Theory]
    [MemberData(nameof(Cases))]
    public void ToLadder_Case_HasThePartsAndLossesOfTheTable(ReferenceRow row)
    {
        var prototype = LowPassPrototype.Chebyshev((int)row.Number("order"), PassBandRipple.FromReflection(row.Number("reflection")));
        var ladder = new HighPassGuard(prototype, Frequency.FromMegahertz(row.Number("edge_mhz")), FiftyOhm).ToLadder();

        Ellipses.Same(row, "parts", ladder.Elements.SelectMany(e => new[] { e.Inductance?.Microhenry, e.Capacitance?.Picofarad }).OfType<double>());
        foreach (var point in row["losses"].Split(';').Select(p => p.Split(':').Select(Ellipses.Number).ToList()))
            Assert.Equal(point[1], ladder.Loss(Frequency.FromMegahertz(point[0]), FiftyOhm, FiftyOhm).Db, row.Number("loss_tolerance"));
    }

    [Fact]
    [Evidence(typeof(HighPassGuard), EvidenceKind.Identity)]
    [Evidence(typeof(HighPassGuard), EvidenceKind.RoundTrip)]
    public void Attenuation_AnyFrequency_IsThatOfTheLowPassMirroredAtTheEdge() =>
        Gen.Select(Gen.Int[1, 5], Gen.Double[0.2, 5], Gen.Double[0.01, 1]).Sample((half, ratio, rippleDb) =>
        {
            var prototype = LowPassPrototype.Chebyshev((2 * half) + 1, PassBandRipple.FromRipple(Decibels.FromDb(rippleDb)));
            var edge = Frequency.FromMegahertz(1.75);
            var guard = new HighPassGuard(prototype, edge, FiftyOhm);
            var mirrored = prototype.Denormalise(edge, FiftyOhm).ToLadder().Loss(edge / ratio, FiftyOhm, FiftyOhm);

            Assert.Equal(guard.Attenuation(edge * ratio).Db, guard.ToLadder().Loss(edge * ratio, FiftyOhm, FiftyOhm).Db, 1e-6);
            Assert.Equal(mirrored.Db, guard.Attenuation(edge * ratio).Db, 1e-6);
        });

    [Fact]
    public void ToLadder_Lossy_HasTheLossOfTheNodalEquations()
    {
        var ladder = new HighPassGuard(LowPassPrototype.Butterworth(7), Frequency.FromMegahertz(3.3), FiftyOhm).ToLadder(120, 800);

        foreach (var f in FrequencyRange.FromMegahertz(1, 10).Points(20))
            Assert.Equal(NodalEquations.Transmission(ladder, f, FiftyOhm, FiftyOhm, 120, 800).Magnitude, ladder.At(f).S21(FiftyOhm, FiftyOhm).Magnitude, 1e-12);
    }

    [Fact]
    [Evidence(typeof(HighPassGuard), EvidenceKind.IndependentRecomputation)]
    public void ToLadder_AnyGuardByNodalEquations_LosesTheIdealAttenuation() => Gen.Select(Gen.Int[1, 4], Gen.Double[0.2, 5]).Sample((half, ratio) =>
    {
        var guard = new HighPassGuard(LowPassPrototype.Chebyshev((2 * half) + 1, TwentyDb), Frequency.FromMegahertz(1.75), FiftyOhm);

        Assert.Equal(guard.Attenuation(guard.Edge * ratio).Db, NodalLossDb(guard, guard.Edge * ratio), 1e-6);
    });

    [Fact]
    public void ToLadder_EvenOrder_Throws() =>
        Assert.Throws<InvalidOperationException>(() => new HighPassGuard(LowPassPrototype.Chebyshev(4, TwentyDb), Frequency.FromMegahertz(1.75), FiftyOhm).ToLadder());

    [Fact]
    public void Of_EightyMetresAgainstBroadcast_TakesTheFewestParts()
    {
        var choice = HighPassChoice.Of(Frequency.FromMegahertz(3.5), Frequency.FromMegahertz(1.6), Decibels.FromDb(25), TwentyDb, FiftyOhm);

        Assert.Equal((HighPassRefusal.None, 5), (choice.Refusal, choice.Filter!.Prototype.Order));
        Assert.InRange(choice.Reached!.Value.Db, 25, 40);
        Assert.True(choice.Filter.ToLadder().Loss(Frequency.FromMegahertz(3.5), FiftyOhm, FiftyOhm) <= TwentyDb.Ripple + Decibels.FromDb(1e-9));
    }

    [Fact]
    [Evidence(typeof(HighPassChoice), EvidenceKind.RoundTrip)]
    public void Of_TopBandAgainstItsNeighbour_SaysThatNoSmallFilterHelpsAndFromWhereOneWould()
    {
        var (station, wanted) = (Frequency.FromMegahertz(1.6), Decibels.FromDb(25));

        var choice = HighPassChoice.Of(Frequency.FromMegahertz(1.8), station, wanted, TwentyDb, FiftyOhm);
        var beyond = HighPassChoice.Of(choice.LowestThatWorks!.Value, station, wanted, TwentyDb, FiftyOhm);

        Assert.Equal(HighPassRefusal.StationTooNear, choice.Refusal);
        Assert.Equal(HighPassRefusal.None, beyond.Refusal);
        Assert.Equal(25, beyond.Reached!.Value.Db, 1e-6);
        Assert.Equal(HighPassRefusal.StationTooNear, HighPassChoice.Of(choice.LowestThatWorks.Value * 0.999, station, wanted, TwentyDb, FiftyOhm).Refusal);
    }

    [Fact]
    [Evidence(typeof(HighPassChoice), EvidenceKind.IndependentRecomputation)]
    public void Of_AnyStation_IsTheFirstThatReachesItByNodalEquations() => Gen.Select(Gen.Double[0.3, 1.65], Gen.Double[1, 70]).Sample((mhz, db) =>
    {
        var (station, edge) = (Frequency.FromMegahertz(mhz), Frequency.FromMegahertz(0.95 * 1.8));
        int? first = new[] { 3, 5, 7 }.Where(n => NodalLossDb(new(LowPassPrototype.Chebyshev(n, TwentyDb), edge, FiftyOhm), station) >= db).Cast<int?>().FirstOrDefault();

        var choice = HighPassChoice.Of(Frequency.FromMegahertz(1.8), station, Decibels.FromDb(db), TwentyDb, FiftyOhm);

        Assert.Equal(first is null ? HighPassRefusal.StationTooNear : HighPassRefusal.None, choice.Refusal);
        Assert.Equal(first ?? 7, choice.Filter!.Prototype.Order);
    });

    [Theory]
    [InlineData(25, 1.6)]
    [InlineData(60, 1.0)]
    [Evidence(typeof(HighPassChoice), EvidenceKind.ClosedFormLimit)]
    public void Of_StationTooNear_TellsTheLowestThatTheHyperbolicCosineAllows(double db, double mhz)
    {
        var stretch = Math.Cosh(Math.Acosh(Math.Sqrt(Math.Pow(10, db / 10) - 1) / TwentyDb.Epsilon) / 7);

        var choice = HighPassChoice.Of(Frequency.FromMegahertz(mhz / 0.9), Frequency.FromMegahertz(mhz), Decibels.FromDb(db), TwentyDb, FiftyOhm);

        Assert.Equal(mhz * stretch / 0.95, choice.LowestThatWorks!.Value.Megahertz, 1e-9);
    }

    [Fact]
    public void Of_StationInsideTheBand_HasNoFilter()
    {
        var choice = HighPassChoice.Of(Frequency.FromMegahertz(1.8), Frequency.FromMegahertz(1.75), Decibels.FromDb(10), TwentyDb, FiftyOhm);

        Assert.Equal(HighPassRefusal.StationNotBelow, choice.Refusal);
        Assert.Null(choice.Filter);
    }

    private static double NodalLossDb(HighPassGuard guard, Frequency f) =>
        -20 * Math.Log10(NodalEquations.Transmission(guard.ToLadder(), f, FiftyOhm, FiftyOhm, 1e15, 1e15).Magnitude);
}
