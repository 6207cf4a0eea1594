namespace ClubBench.Planning.StageKinds;

/// <summary>All stage kinds. A new kind is one folder and one line here.</summary>
public static class StageKindList
{
    /// <summary>Every kind, in the order they are offered.</summary>
    public static IReadOnlyList<IStageKind> All { get; } =
    [
        new PulledCrystalOscillator.PulledCrystalOscillatorKind(),
        new UntunedBuffer.UntunedBufferKind(),
        new TunedDriver.TunedDriverKind(),
        new SingleEndedFinal.SingleEndedFinalKind(),
        new LowPassLadder.LowPassLadderKind(),
        new SeriesTunedTap.SeriesTunedTapKind(),
        new SingleTunedFrontEnd.SingleTunedFrontEndKind(),
        new GilbertProductDetector.GilbertProductDetectorKind(),
        new AudioBandPass.AudioBandPassKind(),
        new AudioOutput.AudioOutputKind(),
        new KeyingSidetone.KeyingSidetoneKind(),
        new Supply.SupplyKind(),
    ];

    private static readonly Dictionary<string, IStageKind> ById = All.ToDictionary(k => k.Description.Id, StringComparer.Ordinal);

    /// <summary>The kind with this id, or null.</summary>
    public static IStageKind? Find(string id) => ById.GetValueOrDefault(id);

    /// <summary>The kind with this id. Throws for an unknown one: kit files with unknown kinds are refused on reading.</summary>
    public static IStageKind Get(string id) => Find(id) ?? throw new KeyNotFoundException($"There is no stage kind '{id}'.");
}
