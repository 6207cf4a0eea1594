using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Elliptic;

/// <summary>Parts of an elliptic low-pass, or why there are none.</summary>
/// <remarks>
/// Method: zero shifting; then the ladder is analysed and compared with the wanted attenuation at ten frequencies below and ten above the edge.
/// Valid: where the comparison agrees to 1e-6 dB; otherwise it is refused.
/// Source: zverev-1967; the notch order with the smallest spread of parts derived.
/// </remarks>
/// <param name="Prototype">The parts; null where refused.</param>
/// <param name="Refusal">None where there are parts.</param>
/// <param name="Deviation">Largest difference between ladder and wanted attenuation.</param>
public sealed record EllipticSynthesis(EllipticPrototype? Prototype, EllipticRefusal Refusal, Decibels Deviation)
{
    private const int PointsPerBand = 10;
    private static readonly Decibels Agreement = Decibels.FromDb(1e-6);
    private static readonly Decibels Compared = Decibels.FromDb(150);
    private static readonly Resistance OneOhm = Resistance.FromOhm(1);
    private static readonly Frequency OneRadian = Frequency.FromHertz(1 / (2 * Math.PI));

    // Places in the rising list of notches: five poles with the higher first as tables print it; seven in the order that keeps all parts above zero up to the
    // largest angle and spreads them least. The other orders mirror the ladder or give up earlier, so none is tried.
    private static readonly Dictionary<int, int[]> NotchOrder = new() { [3] = [0], [5] = [1, 0], [7] = [1, 0, 2] };

    /// <summary>Finds the parts.</summary>
    public static EllipticSynthesis Of(EllipticApproximation wanted)
    {
        var (shunts, traps) = CauerExtraction.Of(wanted, NotchOrder[wanted.Order].Select(i => wanted.Notches[i]));
        if (!shunts.Concat(traps.Select(t => t.Capacitance)).All(value => value > 0 && double.IsFinite(value))) return new(null, EllipticRefusal.NegativePart, Decibels.Zero);
        var prototype = new EllipticPrototype(wanted, shunts, traps);
        var deviation = DeviationOf(prototype);
        return deviation <= Agreement ? new(prototype, EllipticRefusal.None, deviation) : new(null, EllipticRefusal.PrecisionLost, deviation);
    }

    private static Decibels DeviationOf(EllipticPrototype prototype)
    {
        var ladder = prototype.Denormalise(OneRadian, OneOhm).ToLadder();
        var below = Enumerable.Range(0, PointsPerBand).Select(i => (i + 0.5) / PointsPerBand).ToList();
        return below.Concat(below.Select(x => prototype.Wanted.StopBandEdge / x)).Max(x => Difference(ladder, prototype.Wanted, x));
    }

    // On a notch the last digit of its place decides, so the comparison ends where nobody could measure it.
    private static Decibels Difference(Ladder ladder, EllipticApproximation wanted, double multiple)
    {
        var (reached, ideal) = (ladder.Loss(OneRadian * multiple, OneOhm, OneOhm), wanted.Attenuation(multiple));
        return Decibels.FromDb(Math.Abs(Math.Min(reached.Db, Compared.Db) - Math.Min(ideal.Db, Compared.Db)));
    }
}
