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
    /// capacitor. Not found when even a short circuit (or, in series, the smallest capacitor) shifts less: the result then holds that end.
    /// </summary>
    public static OffsetSolution Solve(PulledCrystalLoop loop, OffsetPlace place, double wantedHertz, Capacitance variable)
    {
        Guard.Positive(wantedHertz, nameof(wantedHertz));
        var strongest = place.Sign < 0 ? LargestF : SmallestF;
        if (Size(strongest) < wantedHertz) return Result(false, strongest);

        var reached = place.Sign < 0;
        var logF = Bisection.TurningPoint(x => Size(Math.Exp(x)) >= wantedHertz == reached, Math.Log(SmallestF), Math.Log(LargestF), 1e-12);
        return Result(true, Math.Exp(logF));

        double Size(double farad) => Math.Abs(At(loop, place, Capacitance.FromFarad(farad), variable));

        OffsetSolution Result(bool found, double farad)
        {
            var capacitor = Capacitance.FromFarad(farad);
            return new OffsetSolution(found, capacitor, At(loop, place, capacitor, variable));
        }
    }
}
