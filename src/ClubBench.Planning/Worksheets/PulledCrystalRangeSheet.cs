using ClubBench.Calculation.Oscillators;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Worksheets;

/// <summary>The dial of a pulled crystal oscillator, and whether the crystal still rules.</summary>
internal static class PulledCrystalRangeSheet
{
    public static Worksheet Sheet { get; } = new(
        "pulled-crystal-range", "oscillators", OscillatorWorksheets.Loop, [.. OscillatorWorksheets.Parts, OscillatorWorksheets.SeriesInductance], v =>
        {
            var loop = OscillatorWorksheets.LoopOf(v, v.Henry(OscillatorWorksheets.SeriesInductance.Name));
            return OscillatorWorksheets.Refused(loop.Refusal()) ?? Answer(loop.Range());
        });

    private static Outcome<WorksheetAnswer> Answer(PulledCrystalRange range) => WorksheetAnswer.Judged(
        Phrases.CodeOf(range.State),
        [
            .. OscillatorWorksheets.Dial(range),
            Figure.Of("inductor-sensitivity", QuantityKind.Number, range.AtMaximum.Sensitivities.Inductor),
            Figure.Of("motional-share", QuantityKind.Ratio, range.AtMaximum.Sensitivities.MotionalShare),
            Figure.Of("slope-at-lowest", QuantityKind.FrequencyShift, range.AtMaximum.Sensitivities.SlopeHertzPerPicofarad),
            Figure.Of("slope-at-highest", QuantityKind.FrequencyShift, range.AtMinimum.Sensitivities.SlopeHertzPerPicofarad),
        ]);
}
