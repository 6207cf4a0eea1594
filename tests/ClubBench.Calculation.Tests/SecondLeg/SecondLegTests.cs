using ClubBench.Calculation.BandPass;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using ClubBench.Calculation.Statistics;

namespace ClubBench.Calculation.Tests.SecondLeg;

/// <summary>Two hundred random cases of each area, computed a second time by other code in another language.</summary>
public class SecondLegTests
{
    private const int Cases = 200;
    private const double Agreement = 1e-6;

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Fact]
    [Evidence(typeof(LowPassPrototype), EvidenceKind.IndependentRecomputation)]
    public async Task LowPass_AttenuationOfThePrototype_IsThatOfItsPoles()
    {
        var random = new SeededRandom(1);
        var cases = Draw(() => new { Order = 1 + random.Below(11), RippleDb = random.NextUnit() < 0.3 ? 0 : random.Uniform(0.01, 2.9), Multiple = random.Uniform(0.05, 4) });

        await AgreeAsync("low-pass", cases, c => [Prototype(c.Order, c.RippleDb).Attenuation(c.Multiple).Db]);
    }

    [Fact]
    [Evidence(typeof(LowPassPrototype), EvidenceKind.IndependentRecomputation)]
    [Evidence(typeof(LowPassDesign), EvidenceKind.IndependentRecomputation)]
    public async Task LowPass_LadderOfTheDesign_LosesWhatThePolesSay()
    {
        var random = new SeededRandom(2);
        var cases = Draw(() => new { Order = 1 + (2 * random.Below(5)), RippleDb = random.NextUnit() < 0.3 ? 0 : random.Uniform(0.01, 1), Multiple = random.Uniform(0.05, 3) });

        await AgreeAsync("low-pass", cases, c =>
        {
            var (edge, line) = (Frequency.FromMegahertz(10), Resistance.FromOhm(50));
            return [Prototype(c.Order, c.RippleDb).Denormalise(edge, line).ToLadder().Loss(edge * c.Multiple, line, line).Db];
        });
    }

    [Fact]
    [Evidence(typeof(Ladder), EvidenceKind.IndependentRecomputation)]
    public async Task Ladder_RandomArms_LosesAndReflectsByTheNodeEquations()
    {
        var random = new SeededRandom(3);
        var cases = Draw(() => new
        {
            Arms = Enumerable.Range(0, 3 + random.Below(7)).Select(i => Arm(random, i)).ToList(),
            Hertz = 1e6 * Math.Pow(10, random.Uniform(0, 1.6)),
            Source = random.Uniform(10, 300),
            Load = random.Uniform(10, 300),
        });

        await AgreeAsync("ladder", cases, c =>
        {
            var ladder = new Ladder(c.Arms.Select(Element));
            var (f, source, load) = (Frequency.FromHertz(c.Hertz), Resistance.FromOhm(c.Source), Resistance.FromOhm(c.Load));
            return [ladder.Loss(f, source, load).Db, ladder.ReturnLoss(f, source, load).Db];
        });
    }

    [Fact]
    [Evidence(typeof(PulledCrystalLoop), EvidenceKind.IndependentRecomputation)]
    public async Task Crystal_RandomLoops_RunWhereTheReactanceVanishes()
    {
        var random = new SeededRandom(4);
        var cases = Draw(() => Loop(random), c => c.Of().RefusalAt(Capacitance.FromFarad(c.VariableF)) == LoopRefusal.None);

        await AgreeAsync("crystal", cases, c => [c.Of().FrequencyAt(Capacitance.FromFarad(c.VariableF)).Hertz], 1e-11);
    }

    [Fact]
    [Evidence(typeof(TopCoupledFilter), EvidenceKind.IndependentRecomputation)]
    public async Task Coupled_RandomFilters_LoseWhatTheNodeEquationsSay()
    {
        var random = new SeededRandom(5);
        var cases = Draw(() => Coupled(random), c => c.Filter is not null);

        await AgreeAsync("coupled", [.. cases.Select(c => c.Case)], c => [c.Of().Loss(Frequency.FromHertz(c.Hertz)).Db]);
    }

    [Fact]
    [Evidence(typeof(ExternalNoise), EvidenceKind.IndependentRecomputation)]
    [Evidence(typeof(Cascade), EvidenceKind.IndependentRecomputation)]
    [Evidence(typeof(PreamplifierNeed), EvidenceKind.IndependentRecomputation)]
    public async Task Noise_RandomSitesAndChains_AddUpAsByTheRecommendationAndFriis()
    {
        var random = new SeededRandom(6);
        var sites = new[] { ("city", NoiseSite.City), ("residential", NoiseSite.Residential), ("rural", NoiseSite.Rural), ("quietRural", NoiseSite.QuietRural) };
        var cases = Draw(() => new
        {
            Site = sites[random.Below(4)].Item1,
            Hertz = 1e6 * Math.Pow(10, random.Uniform(0.1, 1.47)),
            Stages = Enumerable.Range(0, 1 + random.Below(6)).Select(_ => new { GainDb = random.Uniform(-10, 30), NoiseDb = random.Uniform(0.1, 15) }).ToList(),
        });

        await AgreeAsync("noise", cases, c =>
        {
            var outside = ExternalNoise.ManMade(sites.First(s => s.Item1 == c.Site).Item2, Frequency.FromHertz(c.Hertz));
            var own = Cascade.NoiseFigure([.. c.Stages.Select(s => new ReceiverStage(Decibels.FromDb(s.GainDb), Decibels.FromDb(s.NoiseDb)))]);
            return [outside.Db, own.Db, PreamplifierNeed.Degradation(own, outside).Db];
        });
    }

    private static LowPassPrototype Prototype(int order, double rippleDb) =>
        rippleDb == 0 ? LowPassPrototype.Butterworth(order) : LowPassPrototype.Chebyshev(order, PassBandRipple.FromRipple(Decibels.FromDb(rippleDb)));

    private static List<T> Draw<T>(Func<T> one, Func<T, bool>? fits = null)
    {
        var drawn = new List<T>();
        for (var tries = 0; drawn.Count < Cases && tries < 100 * Cases; tries++)
            if (one() is var next && (fits is null || fits(next)))
                drawn.Add(next);
        Assert.Equal(Cases, drawn.Count);
        return drawn;
    }

    private static async Task AgreeAsync<T>(string area, List<T> cases, Func<T, double[]> ours, double relative = Agreement)
    {
        var theirs = await Recomputed.ByScriptAsync(area, cases, Cancellation);

        Assert.Equal(Cases, theirs.Length);
        for (var i = 0; i < Cases; i++)
            foreach (var (mine, other) in ours(cases[i]).Zip(theirs[i]))
                Assert.True(Math.Abs(mine - other) <= relative * Math.Max(Math.Abs(other), 1), $"{area} {i}: {mine:R} here, {other:R} there; {cases[i]}");
    }

    private static ArmCase Arm(SeededRandom random, int place)
    {
        var trap = random.NextUnit() < 0.25;
        var series = place % 2 == 1;
        var (henry, farad) = (random.Uniform(0.1e-6, 5e-6), random.Uniform(20e-12, 1e-9));
        return new(series, series || trap ? henry : 0, !series || trap ? farad : 0, random.Uniform(40, 300), random.Uniform(300, 2000));
    }

    private static LadderElement Element(ArmCase a) => a switch
    {
        { Series: true, Farad: 0 } => LadderElement.SeriesInductor(Inductance.FromHenry(a.Henry), a.CoilQ),
        { Series: true } => LadderElement.SeriesTrap(Inductance.FromHenry(a.Henry), Capacitance.FromFarad(a.Farad), a.CoilQ, a.CapacitorQ),
        { Henry: 0 } => LadderElement.ShuntCapacitor(Capacitance.FromFarad(a.Farad), a.CapacitorQ),
        _ => LadderElement.ShuntTrap(Inductance.FromHenry(a.Henry), Capacitance.FromFarad(a.Farad), a.CoilQ, a.CapacitorQ),
    };

    private static LoopCase Loop(SeededRandom random) => new(
        1 + random.Below(3), random.Uniform(3e6, 20e6), random.Uniform(8e-15, 25e-15), random.Uniform(3e-12, 6e-12), random.Uniform(0, 1e-12),
        random.Uniform(0.5e-6, 15e-6), random.Uniform(0.5e-12, 2e-12), random.Uniform(0, 3e-12), random.Uniform(10e-12, 150e-12), random.Uniform(40e-12, 120e-12));

    private static (CoupledCase Case, TopCoupledFilter? Filter) Coupled(SeededRandom random)
    {
        var center = Frequency.FromMegahertz(random.Uniform(1.8, 28));
        var design = TopCoupledDesign.Of(new(CouplingPrototype.Butterworth(2 + random.Below(2)), center, center * random.Uniform(0.02, 0.15), TunedCircuit.InductanceOf(Resistance.FromOhm(random.Uniform(40, 250)), center), random.Uniform(80, 300)));
        return (new(center.Hertz, random.Uniform(0.4, 2.5) * center.Hertz, design.Filter!), design.Filter);
    }
}

/// <summary>One arm of a ladder as the script gets it.</summary>
internal sealed record ArmCase(bool Series, double Henry, double Farad, double CoilQ, double CapacitorQ);

/// <summary>One oscillator loop as the script gets it.</summary>
internal sealed record LoopCase(int Count, double SeriesHz, double MotionalF, double StaticF, double HolderF, double Henry, double CoilF, double NodeF, double VariableF, double OscillatorF)
{
    public PulledCrystalLoop Of() => new(
        new CrystalParameters(Frequency.FromHertz(SeriesHz), Capacitance.FromFarad(MotionalF), Capacitance.FromFarad(StaticF), default),
        Capacitance.FromFarad(VariableF * 0.5), Capacitance.FromFarad(VariableF * 2), Inductance.FromHenry(Henry), Capacitance.FromFarad(OscillatorF))
    {
        CrystalCount = Count, HolderCapacitance = Capacitance.FromFarad(HolderF), InductorSelfCapacitance = Capacitance.FromFarad(CoilF), NodeStray = Capacitance.FromFarad(NodeF),
    };
}

/// <summary>One coupled filter as the script gets it.</summary>
internal sealed class CoupledCase(double centerHz, double hertz, TopCoupledFilter filter)
{
    public double CenterHz => centerHz;

    public double Hertz => hertz;

    public double Henry => filter.Coil.Henry;

    public double UnloadedQ => filter.UnloadedQ;

    public double CouplingF => filter.Coupling.Farad;

    public double EndOhm => filter.End.Ohm;

    public IReadOnlyList<double> NodesF => [.. filter.NodeCapacitances.Select(c => c.Farad)];

    public TopCoupledFilter Of() => filter;
}
