using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>What to change where a wanted span leaves the crystal no longer in control.</summary>
public enum SpanRemedyKind
{
    /// <summary>Not stated.</summary>
    Unknown,

    /// <summary>One crystal more in parallel.</summary>
    AnotherCrystal,

    /// <summary>A variable capacitor with a smaller minimum.</summary>
    SmallerMinimum,
}

/// <summary>One change that gives the span with the crystal in control.</summary>
/// <param name="Kind">What is changed.</param>
/// <param name="Loop">The loop with that change, at the largest value that does, and with its inductor.</param>
public sealed record SpanRemedy(SpanRemedyKind Kind, PulledCrystalLoop Loop);

/// <summary>
/// Changes that bring a wanted span within what is safe, in the order to be offered. Smaller feedback capacitors are none: they narrow the span of an inductor and the
/// widest that is safe. Source: derived; the order is common practice.
/// </summary>
public static class SpanRemedies
{
    private const double SmallestVariableF = 1e-12;

    /// <summary>
    /// Changes of <paramref name="loop"/>, its inductor ignored, that give <paramref name="spanHertz"/> (above zero) with the crystal in control; empty where it is so
    /// already or no single change helps: then accept a stable inductor and a warm-up, or switch two ranges.
    /// Method: halving between the minimum there is and 1 pF.
    /// </summary>
    public static IReadOnlyList<SpanRemedy> Of(PulledCrystalLoop loop, double spanHertz)
    {
        Guard.Positive(spanHertz, nameof(spanHertz));
        return Solved(loop, spanHertz) is not null ? [] : [.. Changes(loop, spanHertz).OfType<SpanRemedy>()];
    }

    private static IEnumerable<SpanRemedy?> Changes(PulledCrystalLoop loop, double spanHertz)
    {
        yield return loop.CrystalCount < 8 && Solved(loop with { CrystalCount = loop.CrystalCount + 1 }, spanHertz) is { } more ? new(SpanRemedyKind.AnotherCrystal, more) : null;
        yield return LargestMinimum(loop, spanHertz) is { } reached ? new(SpanRemedyKind.SmallerMinimum, reached) : null;
    }

    private static PulledCrystalLoop? LargestMinimum(PulledCrystalLoop loop, double spanHertz)
    {
        var present = loop.VariableMinimum.Farad;
        if (SmallestVariableF >= present || With(SmallestVariableF) is not { } best) return null;
        return With(0.999 * Bisection.TurningPoint(f => With(f) is null, SmallestVariableF, present, present * 1e-3)) ?? best;

        PulledCrystalLoop? With(double farad) => Solved(loop with { VariableMinimum = Capacitance.FromFarad(farad) }, spanHertz);
    }

    // The loop with the inductor that gives the span, or null where that leaves the crystal not in control.
    private static PulledCrystalLoop? Solved(PulledCrystalLoop loop, double spanHertz)
    {
        if (loop.WithInductance(default).Refusal() != LoopRefusal.None) return null;
        var solution = PulledCrystalDesign.ForSpan(loop, spanHertz);
        return solution.Shortfall != SpanShortfall.InductorTakesOver && solution.Range.State == CrystalControlState.CrystalControlled
            ? loop.WithInductance(solution.Inductance)
            : null;
    }
}
