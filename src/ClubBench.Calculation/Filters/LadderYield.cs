using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Statistics;

namespace ClubBench.Calculation.Filters;

/// <summary>How far the parts of a room's boards scatter, each as a half width of an even distribution (0.05 for 5 %), 0 to 0.5.</summary>
/// <param name="Capacitor">Every capacitor on its own.</param>
/// <param name="CoreBatch">All coils of one core batch together: the club buys one bag.</param>
/// <param name="Coil">Every coil on its own, around its batch.</param>
public sealed record PartScatter(double Capacitor, double CoreBatch, double Coil);

/// <summary>Question to the yield trial.</summary>
/// <param name="Design">Filter with nominal values.</param>
/// <param name="Requirement">What a good board must reach.</param>
/// <param name="Scatter">How far parts scatter.</param>
/// <param name="Seed">Fixed per plan, so that the same plan tells the same number again.</param>
/// <param name="CoilQ">Unloaded Q; null means lossless.</param>
/// <param name="CapacitorQ">Unloaded Q; null means lossless.</param>
public sealed record LadderYieldInput(
    LowPassDesign Design, LowPassRequirement Requirement, PartScatter Scatter, ulong Seed, double? CoilQ = null, double? CapacitorQ = null)
{
    /// <summary>Boards tried, 100 to 1 000 000; 20 000 tell the share to 0.7 %.</summary>
    public int Trials { get; init; } = 20_000;

    /// <summary>Frequencies in the pass-band, ends included, 2 to 401.</summary>
    public int PassPoints { get; init; } = 17;

    /// <summary>Core batch of every coil, in ladder order; empty when all coils share one.</summary>
    public IReadOnlyList<int> CoreBatches { get; init; } = [];
}

/// <summary>How many of many boards meet a requirement. Immutable.</summary>
/// <param name="Passed">Boards that met everything, with the interval of the share.</param>
/// <param name="ReturnLoss">Smallest return loss in the band that 95 of 100 boards reach.</param>
/// <param name="Harmonics">Attenuation of each wanted harmonic that 95 of 100 boards reach, same order.</param>
/// <param name="Margin">Smallest margin that 95 of 100 boards reach; what to rank designs by.</param>
public sealed record LadderYield(Proportion Passed, Decibels ReturnLoss, IReadOnlyList<HarmonicFigure> Harmonics, Decibels Margin)
{
    /// <summary>Tries the boards.</summary>
    /// <remarks>
    /// Method: Monte Carlo with even distributions, the fair worst case of sorted bins; one draw per core batch and trial, then one per part.
    /// Valid: independent parts apart from the core batch. Source: derived; the scatter of parts is common practice.
    /// </remarks>
    public static LadderYield Of(LadderYieldInput input)
    {
        Guard.Within(input.Trials, 100, 1_000_000, nameof(input.Trials));
        Guard.Within(input.PassPoints, 2, 401, nameof(input.PassPoints));
        var boards = new BoardDraw(input);
        var response = new BoardResponse(input);
        var figures = new double[input.Requirement.Harmonics.Count + 1];
        var reached = figures.Select(_ => new double[input.Trials]).ToArray();
        for (var t = 0; t < input.Trials; t++)
        {
            response.Of(boards.Next(), figures);
            for (var k = 0; k < reached.Length; k++) reached[k][t] = figures[k];
        }

        return Told(input, reached);
    }

    private static LadderYield Told(LadderYieldInput input, double[][] reached)
    {
        double[] wanted = [.. input.Requirement.Harmonics.Select(h => h.Attenuation.Db), input.Requirement.ReturnLoss.Db];
        var margins = Enumerable.Range(0, input.Trials).Select(t => wanted.Select((w, k) => reached[k][t] - w).Min()).ToArray();
        var harmonics = input.Requirement.Harmonics
            .Select((h, k) => (h.Harmonic, Level: FifthPercentile(reached[k]), h.Attenuation))
            .Select(h => new HarmonicFigure(h.Harmonic, h.Level, h.Level - h.Attenuation)).ToList();
        return new LadderYield(new Proportion(margins.Count(m => m >= 0), input.Trials), FifthPercentile(reached[^1]), harmonics, FifthPercentile(margins));
    }

    private static Decibels FifthPercentile(double[] db) => Decibels.FromDb(db.Order().ElementAt((int)(0.05 * db.Length)));
}
