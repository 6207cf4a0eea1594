using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Statistics;

namespace ClubBench.Calculation.Choosing;

/// <summary>Boards of any ladder, traps included, with scattered parts.</summary>
/// <remarks>
/// Method: Monte Carlo with even distributions, every capacitor on its own, the coils together by their batch and each around it.
/// Valid: to compare families; for a ladder without traps the yield of the design is faster and tells more.
/// Source: derived; the scatter of parts is common practice.
/// </remarks>
/// <param name="Scatter">How far parts scatter.</param>
/// <param name="Seed">Fixed per plan, so that the same plan tells the same number again.</param>
/// <param name="Trials">Boards tried, 100 to 100 000; 2000 tell the share to 2.2 %.</param>
public sealed record ScatterTrial(PartScatter Scatter, ulong Seed, int Trials = 2000)
{
    /// <summary>Share of boards that meet the requirement between equal ends.</summary>
    public Proportion Of(Ladder ladder, Resistance resistance, LowPassRequirement requirement)
    {
        Guard.Within(Trials, 100, 100_000, nameof(Trials));
        foreach (var x in new[] { Scatter.Capacitor, Scatter.CoreBatch, Scatter.Coil }) Guard.Within(x, 0, 0.5, nameof(Scatter));
        var random = new SeededRandom(Seed);
        var passed = Enumerable.Range(0, Trials).Count(_ => LowPassFigures.Of(Board(ladder, random), resistance, resistance, requirement).Margin.Db >= 0);
        return new Proportion(passed, Trials);
    }

    private Ladder Board(Ladder ladder, SeededRandom random)
    {
        var batch = Factor(Scatter.CoreBatch);
        return new Ladder(ladder.Elements.Select(e => e.Scaled(batch * Factor(Scatter.Coil), Factor(Scatter.Capacitor))));

        double Factor(double halfWidth) => 1 + random.Uniform(-halfWidth, halfWidth);
    }
}
