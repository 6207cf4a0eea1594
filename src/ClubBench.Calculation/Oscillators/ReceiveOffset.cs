using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>A capacitor found for an offset, or the nearest that can be had.</summary>
/// <param name="IsFound">Whether the wanted offset is reached.</param>
/// <param name="Capacitor">The capacitor, or the end of the search that comes nearest.</param>
/// <param name="OffsetHertz">Signed offset this capacitor gives at the reference setting, Hz.</param>
public sealed record OffsetSolution(bool IsFound, Capacitance Capacitor, double OffsetHertz);

/// <summary>
/// Transmit/receive offset of a pulled crystal oscillator by one fixed capacitor. Method: difference of two exact loop solutions.
/// Source: derived. The offset depends on the dial: quote it at the frequency the club uses.
/// </summary>
public static class ReceiveOffset
{
    // A microfarad is a short circuit at HF, a hundredth of a picofarad an open one.
    private const double SmallestF = 1e-14;
    private const double LargestF = 1e-6;

    /// <summary>
    /// Signed offset in Hz at a setting of the variable capacitor: frequency with the capacitor in circuit minus frequency without.
    /// Throws when either loop is refused there.
    /// </summary>
    public static double At(PulledCrystalLoop loop, OffsetPlace place, Capacitance added, Capacitance variable) =>
        place.With(loop, added).FrequencyAt(variable).Hertz - loop.FrequencyAt(variable).Hertz;

    /// <summary>
    /// The capacitor that shifts by <paramref name="wantedHertz"/> (size, above zero; the place gives the sign) at a setting of the variable
    /// capacitor. Not found when even a short circuit (or, in series, the smallest capacitor) shifts less, or the loop fails before: the result
    /// then holds the end that comes nearest. Throws when the loop itself is refused there.
    /// </summary>
    public static OffsetSolution Solve(PulledCrystalLoop loop, OffsetPlace place, double wantedHertz, Capacitance variable)
    {
        Guard.Positive(wantedHertz, nameof(wantedHertz));
        var strongest = place.Sign < 0 ? LargestF : SmallestF;
        if (!IsPast(strongest)) return Result(Capacitance.FromFarad(strongest));

        var growing = place.Sign < 0;
        var turn = Bisection.TurningPoint(x => IsPast(Math.Exp(x)) == growing, Math.Log(SmallestF), Math.Log(LargestF), 1e-12);
        var weakerSide = growing ? -1e-9 : 1e-9;
        return Result(Capacitance.FromFarad(Math.Exp(turn + weakerSide)));

        bool IsPast(double farad)
        {
            var added = Capacitance.FromFarad(farad);
            return place.With(loop, added).RefusalAt(variable) != LoopRefusal.None || Math.Abs(At(loop, place, added, variable)) >= wantedHertz;
        }

        OffsetSolution Result(Capacitance capacitor)
        {
            var offsetHz = At(loop, place, capacitor, variable);
            return new OffsetSolution(Math.Abs(offsetHz) >= wantedHertz * (1 - 1e-6), capacitor, offsetHz);
        }
    }
}
