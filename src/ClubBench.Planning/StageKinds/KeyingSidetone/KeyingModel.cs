using ClubBench.Calculation.Keying;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.KeyingSidetone;

/// <summary>A computed keying stage: sidetone from the timer's parts, rise time as the papers give it beside what the shaping parts allow.</summary>
internal sealed class KeyingModel(KeyingStage stage, Surroundings surroundings) : IStageModel
{
    /// <summary>A switching transistor conducts over part of the swing only: it rises up to this much faster than resistor and capacitor alone (common practice).</summary>
    private const double FastestShare = 0.25;

    /// <summary>Pitch of the sidetone; null where the board has none.</summary>
    public Frequency? Sidetone { get; } = stage.Sidetone?.Frequency;

    public Frequency Pitch { get; } = surroundings.Pitch;

    public Duration RiseTime { get; } = stage.RiseTime;

    /// <summary>10 to 90 % rise of the shaping resistor and capacitor alone; null where either is missing.</summary>
    public Duration? ShapingRise { get; } = stage.Shaping is var (r, c) ? KeyingEnvelope.RiseOf(r, c) : null;

    /// <summary>Whether the shaping parts can give the rise time of the papers.</summary>
    public bool PartsAgree => ShapingRise is not { } rise || (RiseTime.Second <= rise.Second && RiseTime.Second >= FastestShare * rise.Second);

    public IReadOnlyList<Figure> Figures =>
    [
        .. stage.Sidetone is { } timer ? [Figure.Of("sidetone", timer.Frequency, SidetoneWorking(timer)) with { Digits = 3 }] : Array.Empty<Figure>(),
        new Figure("rise-time", QuantityKind.Duration, RiseTime.Second, From: stage.RiseTimeIsGiven ? Provenance.Published : Provenance.CommonPractice, Digits: 2),
        .. stage.Shaping is var (r, c)
            ? [Figure.Of("shaping-rise", QuantityKind.Duration, ShapingRise!.Value.Second, new Working("keying-rise", [Figure.Of("shaping-resistor", r), Figure.Of("shaping-capacitor", c)], SourceRef.Derived("charging through a resistor"))) with { Digits = 2 }]
            : Array.Empty<Figure>(),
    ];

    private static Working SidetoneWorking(Calculation.Audio.TimerAstable timer) => new(
        "timer-astable",
        [Figure.Of("timer-a", timer.ToSupply), Figure.Of("timer-b", timer.ToCapacitor), Figure.Of("timer-capacitor", timer.Capacitor)],
        SourceRef.Derived("thresholds at one and two thirds of the supply"));
}
