using ClubBench.Calculation.Oscillators;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Worksheets;

/// <summary>The series inductor that gives a pulled crystal oscillator a wanted span, or the nearest attempt with the reason.</summary>
internal static class SeriesInductorSheet
{
    public static Worksheet Sheet { get; } = new(
        "series-inductor", "oscillators", OscillatorWorksheets.Loop, [.. OscillatorWorksheets.Parts, new("wanted-span", QuantityKind.Frequency, 13.2e3)], v =>
        {
            var loop = OscillatorWorksheets.LoopOf(v, default);
            return OscillatorWorksheets.Refused(loop.Refusal()) ?? Answer(loop, PulledCrystalDesign.ForSpan(loop, v["wanted-span"]));
        });

    private static Outcome<WorksheetAnswer> Answer(PulledCrystalLoop loop, InductanceForSpan found) => WorksheetAnswer.Judged(
        Phrases.CodeOf(found.Shortfall),
        [
            Figure.Of("series-inductor", found.Inductance),
            .. OscillatorWorksheets.Dial(found.Range),
            Figure.Of("largest-safe-inductor", PulledCrystalDesign.LargestSafe(loop)),
        ]);
}
