using ClubBench.Planning.Figures;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;
using Tap = ClubBench.Calculation.Switching.SeriesTunedTap;

namespace ClubBench.Planning.StageKinds.SeriesTunedTap;

/// <summary>What a receive tap has to say: does the trimmer reach, does the transmitter leave the diodes alive, is the loss bearable. Limits: common practice.</summary>
internal static class TapJudgement
{
    public static IReadOnlyList<Finding> Of(TapStage stage, TapModel model, Surroundings surroundings, string key) =>
        [.. Tuning(stage, model, surroundings, key), .. Transmit(stage, model, key), .. Receive(stage, model, key)];

    private static IEnumerable<Finding> Tuning(TapStage stage, TapModel model, Surroundings surroundings, string key)
    {
        IReadOnlyList<Figure> figures =
        [
            Figure.Of("needed", model.Needed),
            Figure.Of("least", model.Place.Least),
            Figure.Of("most", model.Place.Most),
            Figure.Of("at", model.Reference),
        ];
        var travel = model.Place.WorstTravel(surroundings.Band);
        if (travel < 0)
            yield return new Finding("tap.out-of-trimmer", Severity.Fault, key, stage.Choke.Designator, figures, StageAction.Change, OpenItemCodes.ReceiveTap);
        else if (travel < TunablePlace.BenchShare)
            yield return new Finding("tap.trimmer-near-end", Severity.Warning, key, stage.Trimmer.Designator, figures, StageAction.Check);
    }

    private static IEnumerable<Finding> Transmit(TapStage stage, TapModel model, string key)
    {
        IReadOnlyList<Figure> figures =
        [
            Figure.Of("reactance", model.Tap.Reactance),
            Figure.Of("least", Tap.LeastReactance),
            Figure.Of("most", Tap.MostReactance),
            Figure.Of("return-loss", model.Tap.TransmitReturnLoss),
        ];
        if (model.DiodeCurrent is { } current && current > Tap.MostDiodeCurrent)
        {
            IReadOnlyList<Figure> currents = [Figure.Of("current", current), Figure.Of("most-current", Tap.MostDiodeCurrent), Figure.Of("power", model.Power!.Value)];
            yield return new Finding("tap.diodes-overloaded", Severity.Fault, key, stage.Choke.Designator, currents, StageAction.Change, OpenItemCodes.ReceiveTap);
        }

        if (model.Tap.Reactance < Tap.LeastReactance) yield return new Finding("tap.loads-line", Severity.Warning, key, stage.Choke.Designator, figures, StageAction.Check);
        else if (model.Tap.Reactance > Tap.MostReactance) yield return new Finding("tap.too-sharp", Severity.Warning, key, stage.Choke.Designator, figures, StageAction.Check);
    }

    private static IEnumerable<Finding> Receive(TapStage stage, TapModel model, string key)
    {
        if (model.Tap.Loss > Tap.MostLoss)
            yield return new Finding("tap.lossy-choke", Severity.Warning, key, stage.Choke.Designator, [Figure.Of("loss", model.Tap.Loss), Figure.Of("most", Tap.MostLoss)], StageAction.Check);
        if (stage.Document.InRole(TapStage.Roles.ClampDiode).Count() is var diodes and < 2)
            yield return new Finding("tap.clamps-missing", Severity.Fault, key, null, [Figure.Of("diodes", QuantityKind.Count, diodes)], StageAction.Check);
    }
}
