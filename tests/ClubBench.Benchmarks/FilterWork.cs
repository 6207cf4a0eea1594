using ClubBench.Calculation.Components;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Benchmarks;

/// <summary>Search of real values and yield of low-pass ladders.</summary>
internal static class FilterWork
{
    private static readonly Resistance Line = Resistance.FromOhm(50);
    private static readonly FrequencyRange Band = FrequencyRange.FromMegahertz(14.0, 14.1);
    private static readonly LowPassRequirement Requirement = new(Band, Decibels.FromDb(24), [new(2, Decibels.FromDb(40)), new(3, Decibels.FromDb(60))]);

    private static readonly LowPassDesign Seven =
        LowPassPrototype.Chebyshev(7, PassBandRipple.FromRipple(Decibels.FromDb(0.01))).Denormalise(Frequency.FromMegahertz(15.5), Line);

    private static readonly LowPassDesign Five =
        LowPassPrototype.Chebyshev(5, PassBandRipple.FromRipple(Decibels.FromDb(0.01))).Denormalise(Frequency.FromMegahertz(15.5), Line);

    private static readonly LowPassDesign Twelve = new(
        LowPassForm.ShuntCapacitorFirst,
        [.. Enumerable.Repeat(Capacitance.FromPicofarad(300), 6)],
        [.. Enumerable.Repeat(Inductance.FromMicrohenry(0.75), 6)],
        Line,
        Line);

    public static IEnumerable<Workload> All =>
    [
        new("low-pass-candidates", 10, () => Question(Seven, symmetric: true)),
        Search("low-pass-search-mirrored-seven", 10, Question(Seven, symmetric: true) with { Keep = 1, PassPoints = 5 }),
        Search("low-pass-search-mirrored-seven-fifty-best", 50, Question(Seven, symmetric: true)),
        Search("low-pass-search-unrestricted-five", 100, Question(Five, symmetric: false)),
        Yield("yield-seven-parts", 100, new(Seven, Requirement, new(0.05, 0.05, 0.02), 1, 150, 1000) { Trials = 10_000, PassPoints = 5 }),
        Yield("yield-twelve-parts-201-points", 1000, new(Twelve, Requirement, new(0.05, 0.05, 0.02), 1, 150, 1000) { Trials = 10_000, PassPoints = 201 }),
    ];

    private static Workload Search(string name, double wantedMs, LowPassSearchInput question) => new(name, wantedMs, () => LowPassSearch.Run(question));

    private static Workload Yield(string name, double wantedMs, LadderYieldInput question) => new(name, wantedMs, () => LadderYield.Of(question));

    private static LowPassSearchInput Question(LowPassDesign exact, bool symmetric) => new(
        exact,
        [.. exact.Capacitors.Select(c => LowPassCandidates.Capacitors(c, Values, 0.12, pairs: symmetric))],
        [.. exact.Coils.Select(l => LowPassCandidates.Coils(l, InductanceFactor.FromNanohenryPerTurnSquared(3.0)))],
        Requirement,
        150,
        1000) { Symmetric = symmetric };

    private static IEnumerable<(Capacitance Value, int StockRank)> Values =>
        PreferredValues.Between(10e-12, 1e-9, ESeries.E24).Select(v => (Capacitance.FromFarad(v), 0));
}
