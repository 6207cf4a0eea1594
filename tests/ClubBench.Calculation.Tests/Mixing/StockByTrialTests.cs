using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Mixing;

public class StockByTrialTests
{
    private static readonly FrequencyRange Twenty = FrequencyRange.FromMegahertz(14.0001237, 14.3501237);

    private static readonly Gen<(double A, double B)> TwoCrystals = Gen.Select(Gen.Double[1, 20], Gen.Double[0.1, 10]).Select((a, more) => (a * 1e6, (a + more) * 1e6));

    public static TheoryData<ReferenceRow> Followed => ReferenceTable.Theory("birdies-followed");

    [Fact]
    [Evidence(typeof(StockProducts), EvidenceKind.IndependentRecomputation)]
    public void Products_EveryPairOfWholeNumbersTriedOut_AreAllAndNoOthers() => Gen.Select(TwoCrystals, Gen.Int[1, 7]).Sample((x, order) =>
    {
        var tried = from i in Enumerable.Range(-order, (2 * order) + 1) from j in Enumerable.Range(-order, (2 * order) + 1)
                    where Math.Abs(i) + Math.Abs(j) <= order
                    let hertz = (i * x.A) + (j * x.B)
                    where hertz >= Twenty.Low.Hertz && hertz <= Twenty.High.Hertz
                    select (Math.Round(hertz), Math.Abs(i) + Math.Abs(j));

        var found = StockProducts.In(Twenty, [Frequency.FromHertz(x.A), Frequency.FromHertz(x.B)], order);

        Assert.Equal(tried.Order(), found.Select(p => (Math.Round(p.Product.Hertz), p.Order)).Order());
    });

    [Fact]
    [Evidence(typeof(StockProducts), EvidenceKind.Identity)]
    public void Products_EveryFrequencyDoubled_AreTheSameMultiples() => TwoCrystals.Sample(x =>
    {
        var once = StockProducts.In(Twenty, [Frequency.FromHertz(x.A), Frequency.FromHertz(x.B)]);
        var doubled = StockProducts.In(new(Twenty.Low * 2, Twenty.High * 2), [Frequency.FromHertz(2 * x.A), Frequency.FromHertz(2 * x.B)]);

        Assert.Equal(once.Select(p => (p.FirstMultiple, p.SecondMultiple, 2 * p.Product.Hertz)), doubled.Select(p => (p.FirstMultiple, p.SecondMultiple, p.Product.Hertz)));
    });

    [Fact]
    [Evidence(typeof(CrystalHarmonics), EvidenceKind.IndependentRecomputation)]
    public void HarmonicIn_AnyRange_IsTheFirstMultipleFromItsLowerEndOn() => Gen.Select(Gen.Double[0.5, 40], Gen.Double[1, 30], Gen.Double[0.01, 3]).Sample((x, low, width) =>
    {
        var k = (int)Math.Ceiling(low / x);

        Assert.Equal(k <= 5 && k * x <= low + width ? k : null, CrystalHarmonics.In(FrequencyRange.FromMegahertz(low, low + width), Frequency.FromMegahertz(x)));
    });

    [Fact]
    [Evidence(typeof(CrystalHarmonics), EvidenceKind.Identity)]
    public void HarmonicNear_AnyFrequency_IsThatInTenKilohertzAround() => Gen.Select(Gen.Double[1, 10], Gen.Int[1, 6], Gen.Double[-9000, 9000]).Sample((x, k, off) =>
    {
        var f = Frequency.FromHertz((k * x * 1e6) + off);
        var around = new FrequencyRange(Frequency.FromHertz(f.Hertz - 5000), Frequency.FromHertz(f.Hertz + 5000));

        Assert.Equal(CrystalHarmonics.In(around, Frequency.FromMegahertz(x)), CrystalHarmonics.Near(f, Frequency.FromMegahertz(x)));
    });

    [Fact]
    [Evidence(typeof(ConverterSearch), EvidenceKind.IndependentRecomputation)]
    public void Converters_EverySignOfEveryCrystalTriedOut_AreAllAndNoOthers() => Gen.Select(Gen.Double[1.8, 28], Gen.Double[1, 40].Array[6]).Sample((mhz, stock) =>
    {
        var (low, high) = (mhz, mhz + 0.1);
        bool Hears(double x, double from, double to) => Enumerable.Range(1, 5).Any(k => k * x >= from && k * x <= to);
        var tried = from x in stock from sign in new (int Signal, int Crystal)[] { (1, -1), (-1, 1), (1, 1) }
                    let ends = new[] { (sign.Signal * low) + (sign.Crystal * x), (sign.Signal * high) + (sign.Crystal * x) }
                    where ends.Min() >= 1.5003 && ends.Max() <= 12.0003 && !Hears(x, low, high) && !Hears(x, ends.Min(), ends.Max())
                    select (Math.Round(ends[0], 6), Math.Round(ends[1], 6), Math.Round(x, 6));

        var found = ConverterSearch.Of(FrequencyRange.FromMegahertz(low, high), FrequencyRange.FromMegahertz(1.5003, 12.0003), [.. stock.Select(Frequency.FromMegahertz)]);

        Assert.Equal(tried.Order(), found.Select(c => (Math.Round(c.AtBandLow.Megahertz, 6), Math.Round(c.AtBandHigh.Megahertz, 6), Math.Round(c.Crystal.Megahertz, 6))).Order());
    });

    [Fact]
    [Evidence(typeof(Premix), EvidenceKind.RoundTrip)]
    public void OscillatorFor_MixedWithTheCrystalAgain_GivesTheRangeWanted() => Gen.Select(Gen.Int[1, 3], Gen.Double[0.1, 40]).Sample((law, x) =>
    {
        var wanted = FrequencyRange.FromMegahertz(12.0, 12.1);
        if (Premix.OscillatorFor((PremixLaw)law, Frequency.FromMegahertz(x), wanted) is not { } oscillator) return;
        double Mixed(Frequency v) => (PremixLaw)law == PremixLaw.CrystalPlusOscillator ? v.Megahertz + x : Math.Abs(v.Megahertz - x);

        double[] ends = [Mixed(oscillator.Low), Mixed(oscillator.High)];
        Assert.Equal(12.0, ends.Min(), 1e-9);
        Assert.Equal(12.1, ends.Max(), 1e-9);
        Assert.Equal(ends[0] > ends[1], Premix.RunsBackwards((PremixLaw)law));
    });

    [Fact]
    [Evidence(typeof(PremixSearch), EvidenceKind.Identity)]
    public void Search_CrystalInTheMiddleOfAWindow_IsFoundUnlessItIsHeard() => Gen.Select(Gen.Double[3.5, 28], Gen.Double[0.455, 11]).Sample((mhz, mid) =>
    {
        var task = new PremixTask(FrequencyRange.FromMegahertz(mhz, mhz + 0.1), [Frequency.FromMegahertz(mid)], FrequencyRange.FromMegahertz(5.0, 5.5), []);

        Assert.All(PremixSearch.Of(task).Windows, w =>
        {
            var crystal = w.Crystal.Middle;
            var heard = CrystalHarmonics.In(task.Band, crystal) is not null || CrystalHarmonics.Near(task.Intermediates[0], crystal) is not null;
            var found = PremixSearch.Of(task with { Stock = [crystal] }).Found;
            Assert.Equal(!heard, found.Any(s => s.Conversion == w.Conversion && s.Law == w.Law));
        });
    });

    [Theory]
    [Evidence(typeof(SchemeSurvey), EvidenceKind.IndependentRecomputation)]
    [MemberData(nameof(Followed))]
    public void Survey_ProductsFollowedAcrossTheBand_CountInTheRowOfTheirSide(ReferenceRow row)
    {
        var side = Enum.Parse<InjectionSide>(row["side"]);
        var orders = row["expected"].Split([' ', ':'], StringSplitOptions.RemoveEmptyEntries).Chunk(3).Select(p => int.Parse(p[1], null) + int.Parse(p[2], null)).ToList();

        var judged = SchemeSurvey.Of(FrequencyRange.FromMegahertz(row.Number("low_mhz"), row.Number("high_mhz")), Frequency.FromMegahertz(row.Number("if_mhz"))).Single(r => r.Scheme.Side == side);

        Assert.Equal(orders.Count, judged.WithSignal.Count(b => b.IsInside));
        if (orders.Any(o => o <= 5)) Assert.NotEqual(SchemeVerdict.Clean, judged.Verdict);
    }

    [Fact]
    [Evidence(typeof(SchemeSurvey), EvidenceKind.Identity)]
    public void Survey_EveryFrequencyDoubled_JudgesAlike() => Gen.Select(Gen.Double[1.8, 28], Gen.Double[0.455, 11]).Sample((mhz, mid) =>
    {
        IEnumerable<(InjectionSide, SchemeVerdict, int, int)> Judged(double k) => SchemeSurvey
            .Of(FrequencyRange.FromMegahertz(k * mhz, k * (mhz + 0.2)), Frequency.FromMegahertz(k * mid), Frequency.FromMegahertz(k * (mid - 0.0015)))
            .Select(r => (r.Scheme.Side, r.Verdict, r.WithSignal.Count, r.Whistles.Count));

        Assert.Equal(Judged(1), Judged(2));
    });
}
