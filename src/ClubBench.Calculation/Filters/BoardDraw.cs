using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Statistics;

namespace ClubBench.Calculation.Filters;

/// <summary>Draws the factors of one board after the other.</summary>
internal sealed class BoardDraw(LadderYieldInput input)
{
    private readonly SeededRandom _random = new(input.Seed);
    private readonly int[] _batches = Batches(input);
    private readonly double[] _batchFactors = new double[Batches(input).Append(-1).Max() + 1];
    private readonly double[] _factors = new double[input.Design.Order];

    /// <summary>Factors of the next board, in ladder order; they stand until the one after it is drawn.</summary>
    public ReadOnlySpan<double> Next()
    {
        for (var b = 0; b < _batchFactors.Length; b++) _batchFactors[b] = Factor(input.Scatter.CoreBatch);
        for (var k = 0; k < _factors.Length; k++)
            _factors[k] = input.Design.IsCapacitor(k) ? Factor(input.Scatter.Capacitor) : _batchFactors[_batches[k / 2]] * Factor(input.Scatter.Coil);
        return _factors;
    }

    private double Factor(double halfWidth) => 1 + _random.Uniform(-halfWidth, halfWidth);

    private static int[] Batches(LadderYieldInput input)
    {
        foreach (var x in new[] { input.Scatter.Capacitor, input.Scatter.CoreBatch, input.Scatter.Coil }) Guard.Within(x, 0, 0.5, nameof(input.Scatter));
        var given = input.CoreBatches.Count == 0 ? [.. new int[input.Design.Coils.Length]] : input.CoreBatches.ToArray();
        if (given.Length != input.Design.Coils.Length) throw new ArgumentException("Every coil needs its core batch.", nameof(input));
        foreach (var batch in given) Guard.Within(batch, 0, given.Length, nameof(input.CoreBatches));
        return given;
    }
}
