using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Transmit/receive offset by a capacitor switched across the emitter capacitor.</summary>
internal static class ReceiveOffsetSheet
{
    public static Worksheet Sheet { get; } = new(
        "receive-offset", "oscillators", OscillatorWorksheets.Loop,
        [
            .. OscillatorWorksheets.Parts,
            OscillatorWorksheets.SeriesInductance,
            new("tuning-setting", QuantityKind.Capacitance, 50e-12),
            new("offset-capacitor", QuantityKind.Capacitance, 100e-12),
            new("wanted-offset", QuantityKind.FrequencyShift, 700),
        ],
        v =>
        {
            var loop = OscillatorWorksheets.LoopOf(v, v.Henry(OscillatorWorksheets.SeriesInductance.Name));
            var place = new OffsetPlace.AcrossEmitterCapacitor(OscillatorWorksheets.Pair(v));
            var (setting, fitted) = (v.Farad("tuning-setting"), v.Farad("offset-capacitor"));
            if (setting < loop.VariableMinimum || setting > loop.VariableMaximum) return Conflict("worksheet-conflict.setting-outside", "tuning-setting", "tuning-least", "tuning-most");
            return OscillatorWorksheets.Refused(loop.RefusalAt(setting))
                ?? OscillatorWorksheets.Refused(place.With(loop, fitted).RefusalAt(setting))
                ?? Answer(ReceiveOffset.At(loop, place, fitted, setting), ReceiveOffset.Solve(loop, place, v["wanted-offset"], setting));
        });

    private static Outcome<WorksheetAnswer> Answer(double fittedHertz, OffsetSolution solved) => Judged(
        solved.IsFound ? "worksheet-verdict.offset-found" : "worksheet-verdict.offset-out-of-reach",
        Figure.Of("offset-now", QuantityKind.FrequencyShift, fittedHertz) with { Digits = 3 },
        Figure.Of("offset-part", solved.Capacitor),
        Figure.Of("offset-then", QuantityKind.FrequencyShift, solved.OffsetHertz) with { Digits = 3 });
}
