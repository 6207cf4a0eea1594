using ClubBench.Calculation.Elliptic;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Elliptic;

public class EllipticPrototypeTests
{
    private const double Lossless = 1e15;
    private static readonly Resistance Line = Resistance.FromOhm(50);

    public static TheoryData<ReferenceRow> Cases => ReferenceTable.Theory("elliptic-prototype");

    public static TheoryData<ReferenceRow> Filters => ReferenceTable.Theory("elliptic-filter");

    [Theory]
    [MemberData(nameof(Cases))]
    public void Of_Case_HasThePartsNotchesAndModesOfTheTable(ReferenceRow row)
    {
        var wanted = Ellipses.Of(row);

        var prototype = EllipticSynthesis.Of(wanted).Prototype!;

        Assert.Equal(row.Number("stop_band_edge"), wanted.StopBandEdge, 1e-6);
        Assert.Equal(row.Number("stop_loss_db"), wanted.StopBandLoss.Db, row.Number("loss_tolerance"));
        Ellipses.Same(row, "notches", wanted.Notches);
        Ellipses.Same(row, "parts", Ellipses.InLadderOrder(prototype));
        Ellipses.Same(row, "modes", wanted.Modes.SelectMany(m => new[] { m.Real, m.Imaginary }).Append(wanted.RealMode));
    }

    [Theory]
    [MemberData(nameof(Filters))]
    public void Denormalise_WorkedExample_HasItsPartsNotchesAndLosses(ReferenceRow row)
    {
        var ripple = PassBandRipple.FromReflection(row.Number("reflection"));
        var task = new EllipticTask((int)row.Number("order"), ripple, Frequency.FromMegahertz(row.Number("edge_mhz")), Line);

        var filter = EllipticDesign.Of(task, row.Number("angle_degrees")).Filter!;

        Ellipses.Same(row, "parts", filter.ToLadder().Elements.SelectMany(e => new[] { e.Inductance?.Microhenry, e.Capacitance?.Picofarad }).OfType<double>());
        Ellipses.Same(row, "notches_mhz", filter.Notches.Select(n => n.Megahertz));
        foreach (var point in row["losses"].Split(';').Select(p => p.Split(':').Select(Ellipses.Number).ToList()))
            Assert.Equal(point[1], filter.ToLadder().Loss(Frequency.FromMegahertz(point[0]), Line, Line).Db, point[1] < 1 ? 0.0005 : row.Number("loss_tolerance"));
    }

    [Theory]
    [InlineData(3)]
    [InlineData(5)]
    [InlineData(7)]
    [Evidence(typeof(EllipticSynthesis), EvidenceKind.ClosedFormLimit)]
    public void Of_AngleTowardsNothing_IsChebyshev(int order)
    {
        var ripple = PassBandRipple.FromReflection(0.2);
        var chebyshev = LowPassPrototype.Chebyshev(order, ripple);

        var (two, one) = (Parts(2), Parts(1));

        for (var i = 0; i < order; i++)
        {
            Assert.Equal(chebyshev.Values[i], two[i], 2e-3);
            Assert.InRange(Math.Abs((one[i] - chebyshev.Values[i]) / (two[i] - chebyshev.Values[i])), 0.2, 0.3);
        }

        // Without the capacitors of the traps, which vanish.
        List<double> Parts(double angle)
        {
            var prototype = EllipticSynthesis.Of(EllipticApproximation.Of(order, ripple, angle)).Prototype!;
            return [.. prototype.Shunts.Zip(prototype.Traps.Append(default), (c, t) => new[] { c, t.Inductance }).SelectMany(x => x).Take(order)];
        }
    }

    [Fact]
    public void Of_TwoDegrees_HasTheFirstCapacitorOfChebyshev() =>
        Assert.Equal(1.301894, EllipticSynthesis.Of(EllipticApproximation.Of(5, PassBandRipple.FromReflection(0.2), 2)).Prototype!.Shunts[0], 3e-4);

    [Fact]
    public void Of_AnyOrderRippleAndAngle_HasPartsThatDoWhatIsWanted() =>
        Ellipses.AnyWithParts.Sample(wanted => EllipticSynthesis.Of(wanted).Refusal == EllipticRefusal.None);

    [Fact]
    public void Of_AnyOrderRippleAndAngle_HasPartsOrSaysThatOneIsNegative() => Ellipses.Any.Sample(
        x => EllipticSynthesis.Of(EllipticApproximation.Of(x.Order, x.Ripple, x.Angle)).Refusal is EllipticRefusal.None or EllipticRefusal.NegativePart);

    [Fact]
    public void ToLadder_AnyFilter_HasTheLossOfTheNodalEquationsAndKeepsTheEnergy() => Gen.Select(Ellipses.AnyWithParts, Gen.Double[0.1, 4], Gen.Bool).Sample(
        (wanted, multiple, coilFirst) =>
        {
            var form = coilFirst ? LowPassForm.SeriesInductorFirst : LowPassForm.ShuntCapacitorFirst;
            var filter = EllipticSynthesis.Of(wanted).Prototype!.Denormalise(Frequency.FromMegahertz(8), Line, form);
            var (f, ladder) = (filter.Edge * multiple, filter.ToLadder(200, 1000));
            var (s21, s11) = (filter.ToLadder().At(f).S21(Line, Line).Magnitude, filter.ToLadder().At(f).S11(Line, Line).Magnitude);
            Assert.Equal(NodalEquations.Transmission(ladder, f, Line, Line, 200, 1000).Magnitude, ladder.At(f).S21(Line, Line).Magnitude, 1e-12);
            Assert.Equal(1, (s21 * s21) + (s11 * s11), 1e-9);
        },
        iter: 200);

    [Fact]
    [Evidence(typeof(EllipticSynthesis), EvidenceKind.IndependentRecomputation)]
    [Evidence(typeof(EllipticPrototype), EvidenceKind.IndependentRecomputation)]
    [Evidence(typeof(EllipticFilter), EvidenceKind.IndependentRecomputation)]
    public void ToLadder_AnyFilterByNodalEquations_LosesWhatIsWanted() => Gen.Select(Ellipses.AnyWithParts, Gen.Double[0.1, 4], Gen.Bool).Sample(
        (wanted, multiple, coilFirst) =>
        {
            var form = coilFirst ? LowPassForm.SeriesInductorFirst : LowPassForm.ShuntCapacitorFirst;
            var filter = EllipticSynthesis.Of(wanted).Prototype!.Denormalise(Frequency.FromMegahertz(8), Line, form);

            var passed = NodalEquations.Transmission(filter.ToLadder(), filter.Edge * multiple, Line, Line, Lossless, Lossless).Magnitude;

            Assert.Equal(Math.Pow(10, -wanted.Attenuation(multiple).Db / 20), passed, 1e-6);
        },
        iter: 200);

    [Fact]
    [Evidence(typeof(EllipticSynthesis), EvidenceKind.RoundTrip)]
    public void Of_AnyFilter_ShowsTheNotchesAndReflectionZerosThatWereWanted() => Ellipses.AnyWithParts.Sample(wanted =>
    {
        var prototype = EllipticSynthesis.Of(wanted).Prototype!;
        var ladder = prototype.Denormalise(Frequency.FromMegahertz(8), Line).ToLadder();

        Assert.Equal(wanted.Notches, prototype.Traps.Select(t => t.Notch).Order(), (e, a) => Math.Abs((a / e) - 1) < 1e-9);
        Assert.All(wanted.ReflectionZeros, w => Assert.Equal(0, ladder.At(Frequency.FromMegahertz(8 * w)).S11(Line, Line).Magnitude, 1e-6));
    });

    [Fact]
    [Evidence(typeof(EllipticPrototype), EvidenceKind.RoundTrip)]
    [Evidence(typeof(EllipticFilter), EvidenceKind.RoundTrip)]
    public void Denormalise_AnyEdgeAndResistance_ScalesBackToThePrototype() => Gen.Select(Ellipses.AnyWithParts, Gen.Double[1, 60], Gen.Double[10, 600]).Sample((wanted, mhz, ohm) =>
    {
        var prototype = EllipticSynthesis.Of(wanted).Prototype!;
        var radians = 2 * Math.PI * mhz * 1e6;

        var arms = prototype.Denormalise(Frequency.FromMegahertz(mhz), Resistance.FromOhm(ohm)).ToLadder().Elements;

        var back = arms.SelectMany(e => new[] { e.Inductance?.Henry * radians / ohm, e.Capacitance?.Farad * radians * ohm }).OfType<double>();
        Assert.Equal(Ellipses.InLadderOrder(prototype), back, (e, a) => Math.Abs((a / e) - 1) < 1e-12);
    });

    [Fact]
    [Evidence(typeof(EllipticPrototype), EvidenceKind.Identity)]
    [Evidence(typeof(EllipticFilter), EvidenceKind.Identity)]
    public void ToLadder_CoilFirst_IsTheDualWithTheSameLoss()
    {
        var prototype = EllipticSynthesis.Of(EllipticApproximation.Of(5, PassBandRipple.FromReflection(0.1), 35)).Prototype!;
        var edge = Frequency.FromMegahertz(8);
        var (pi, tee) = (prototype.Denormalise(edge, Line), prototype.Denormalise(edge, Line, LowPassForm.SeriesInductorFirst));

        Assert.Equal(5, tee.ToLadder().Elements.Count(e => e.Inductance is not null));
        Assert.Equal(2, pi.ToLadder().Elements.Count(e => e.Inductance is not null));
        foreach (var f in FrequencyRange.FromMegahertz(1, 40).Points(50))
            Assert.Equal(pi.ToLadder().Loss(f, Line, Line).Db, tee.ToLadder().Loss(f, Line, Line).Db, 1e-6);
    }

    [Fact]
    [Evidence(typeof(EllipticFilter), EvidenceKind.ClosedFormLimit)]
    public void ToLadder_LosslessAtItsNotch_StaysFinite()
    {
        var prototype = EllipticSynthesis.Of(EllipticApproximation.Of(7, PassBandRipple.FromReflection(0.1), 45)).Prototype!;
        foreach (var form in Enum.GetValues<LowPassForm>())
        {
            var filter = prototype.Denormalise(Frequency.FromMegahertz(8), Line, form);
            foreach (var notch in filter.Notches) Assert.InRange(filter.ToLadder().Loss(notch, Line, Line).Db, 200, 300);
        }
    }
}
