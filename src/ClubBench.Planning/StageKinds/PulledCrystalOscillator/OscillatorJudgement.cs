using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.PulledCrystalOscillator;

/// <summary>What a pulled crystal oscillator has to say: inside the band, crystal in control, span, offset, start-up. Thresholds: common practice.</summary>
internal static class OscillatorJudgement
{
    /// <summary>Crystals are marked within this much; a dial end may lie so far outside the papers' band without alarm.</summary>
    private const double CrystalTolerance = 50e-6;

    /// <summary>Below this span per frequency a dial hardly tunes.</summary>
    private const double LeastSpanTwoCrystals = 1.0e-3;
    private const double LeastSpanOneCrystal = 0.5e-3;

    /// <summary>An offset may differ so much from the pitch before "nobody answers": what a pitch control of an ear still takes.</summary>
    public const double OffsetRoom = 0.25;

    /// <summary>At the club's own frequency the offset may differ this much before it is worth a word.</summary>
    private const double ClubOffsetRoom = 0.4;

    public const double LeastStartUpMargin = 3;

    public static IReadOnlyList<Finding> Of(OscillatorStage stage, OscillatorModel model, Surroundings surroundings, string key)
    {
        if (model.Range is not { } range)
            return [new Finding("oscillator.no-frequency", Severity.Fault, key, stage.Choke.Designator, [], StageAction.Change, OpenItemCodes.OscillatorRange)];
        return [.. Band(stage, range, surroundings, key), .. Control(stage, range, key), .. Span(stage, range, key), .. Offset(stage, model, surroundings, key), .. StartUp(model, key)];
    }

    /// <summary>Whether a dial lies in a band, tolerance of the crystals allowed for.</summary>
    public static bool LiesInside(PulledCrystalRange range, FrequencyRange band) =>
        range.Low.Hertz >= band.Low.Hertz * (1 - CrystalTolerance) && range.High.Hertz <= band.High.Hertz * (1 + CrystalTolerance);

    public static double LeastSpan(int crystals) => crystals > 1 ? LeastSpanTwoCrystals : LeastSpanOneCrystal;

    private static IEnumerable<Finding> Band(OscillatorStage stage, PulledCrystalRange range, Surroundings surroundings, string key)
    {
        IReadOnlyList<Figure> figures = [.. Ends(range), Figure.Of("band-low", surroundings.Band.Low) with { Digits = 6 }, Figure.Of("band-high", surroundings.Band.High) with { Digits = 6 }, Figure.Of("club", surroundings.Reference) with { Digits = 6 }];
        if (range.High < surroundings.Band.Low || range.Low > surroundings.Band.High)
            yield return new Finding("oscillator.other-band", Severity.Fault, key, stage.Crystals[0].Designator, figures, StageAction.Change, OpenItemCodes.OscillatorRange);
        else if (!LiesInside(range, surroundings.Band))
            yield return new Finding("oscillator.leaves-band", Severity.Fault, key, stage.Choke.Designator, figures, StageAction.Change, OpenItemCodes.OscillatorRange);
        else if (!range.Frequencies.Contains(surroundings.Reference))
            yield return new Finding("oscillator.misses-club", Severity.Warning, key, null, figures, StageAction.Check);
    }

    private static IEnumerable<Finding> Control(OscillatorStage stage, PulledCrystalRange range, string key)
    {
        IReadOnlyList<Figure> figures =
        [
            Figure.Of("span", QuantityKind.Frequency, range.SpanHertz) with { Digits = 3 },
            Figure.Of("share", QuantityKind.Ratio, -2 * range.AtMaximum.Sensitivities.Inductor),
            .. range.AtMaximum.InductorResonanceRatio is { } ratio ? [Figure.Of("distance", QuantityKind.Number, ratio)] : Array.Empty<Figure>(),
        ];
        switch (range.State)
        {
            case CrystalControlState.InductorControlled:
                yield return new Finding("oscillator.inductor-controlled", Severity.Fault, key, stage.Choke.Designator, figures, StageAction.Change, OpenItemCodes.OscillatorRange);
                break;
            case CrystalControlState.TakingOver:
                yield return new Finding("oscillator.inductor-taking-over", Severity.Warning, key, stage.Choke.Designator, figures, StageAction.Change, OpenItemCodes.OscillatorRange);
                break;
            case CrystalControlState.Stretched:
                yield return new Finding("oscillator.stretched", Severity.Warning, key, stage.Choke.Designator, figures, StageAction.Check);
                break;
            default:
                yield return new Finding("oscillator.crystal-controlled", Severity.Note, key, null, figures, StageAction.Keep);
                break;
        }
    }

    private static IEnumerable<Finding> Span(OscillatorStage stage, PulledCrystalRange range, string key)
    {
        var least = LeastSpan(stage.Crystals.Count) * range.High.Hertz;
        if (range.SpanHertz < least)
            yield return new Finding(
                "oscillator.hardly-tunes",
                Severity.Warning,
                key,
                stage.Choke.Designator,
                [Figure.Of("span", QuantityKind.Frequency, range.SpanHertz) with { Digits = 3 }, Figure.Of("least", QuantityKind.Frequency, least) with { Digits = 2 }],
                StageAction.Change,
                OpenItemCodes.OscillatorRange);
    }

    private static IEnumerable<Finding> Offset(OscillatorStage stage, OscillatorModel model, Surroundings surroundings, string key)
    {
        if (surroundings.WantedPower is null || surroundings.Mode != Mode.Cw) yield break;
        var pitch = surroundings.Pitch.Hertz;
        if (model.QuotedOffsetHertz is not { } offset)
        {
            yield return new Finding("oscillator.offset-missing", Severity.Fault, key, null, [Figure.Of("pitch", surroundings.Pitch)], StageAction.Change, OpenItemCodes.Offset);
            yield break;
        }

        IReadOnlyList<Figure> figures = [Figure.Of("offset", QuantityKind.FrequencyShift, offset), Figure.Of("pitch", surroundings.Pitch), Figure.Of("factor", QuantityKind.Number, Math.Abs(offset) / pitch) with { Digits = 2 }];
        if (Math.Abs((Math.Abs(offset) / pitch) - 1) > OffsetRoom)
            yield return new Finding("oscillator.offset-wrong", Severity.Fault, key, stage.OffsetCapacitor!.Designator, figures, StageAction.Change, OpenItemCodes.Offset);
        else if (model.ClubTuning is { } tuning && model.OffsetHertz(tuning) is { } there && Math.Abs((Math.Abs(there) / pitch) - 1) > ClubOffsetRoom)
            yield return new Finding(
                "oscillator.offset-at-club",
                Severity.Warning,
                key,
                stage.OffsetCapacitor!.Designator,
                [.. figures, Figure.Of("there", QuantityKind.FrequencyShift, there), Figure.Of("club", surroundings.Reference) with { Digits = 6 }],
                StageAction.Check);
    }

    private static IEnumerable<Finding> StartUp(OscillatorModel model, string key)
    {
        var margin = model.StartUp!.Margin;
        IReadOnlyList<Figure> figures = [Figure.Of("margin", QuantityKind.Number, margin) with { Digits = 2 }, Figure.Of("least", QuantityKind.Number, LeastStartUpMargin) with { Digits = 1 }];
        if (margin < LeastStartUpMargin)
            yield return new Finding("oscillator.start-up-doubtful", Severity.Fault, key, null, figures, StageAction.Change, OpenItemCodes.FeedbackPair);
        else if (model.StartUp.Verdict == StartUpVerdict.Overdriven)
            yield return new Finding("oscillator.overdriven", Severity.Warning, key, null, figures, StageAction.Keep);
    }

    private static IEnumerable<Figure> Ends(PulledCrystalRange range) =>
        [Figure.Of("low", range.Low) with { Digits = 6 }, Figure.Of("high", range.High) with { Digits = 6 }, Figure.Of("span", QuantityKind.Frequency, range.SpanHertz) with { Digits = 3 }];
}
