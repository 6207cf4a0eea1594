using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.Supply;

/// <summary>A computed supply: what the rig draws, as an estimate, against the fuse, and what is left over the regulator.</summary>
internal sealed class SupplyModel : IStageModel
{
    private readonly SupplyStage _stage;
    private readonly Surroundings _surroundings;

    public SupplyModel(SupplyStage stage, Surroundings surroundings)
    {
        (_stage, _surroundings) = (stage, surroundings);
        BehindDiode = Voltage.FromVolt(surroundings.SupplyVoltage.Volt - stage.DiodeDrop.Volt);
        var transmitter = surroundings.WantedPower is { } p ? p.Watt / (stage.Efficiency * BehindDiode.Volt) : 0;
        Drawn = Current.FromAmpere(transmitter + stage.RestCurrent.Ampere);
        HeadroomVolt = stage.Regulated is { } v ? BehindDiode.Volt - v.Volt : null;
    }

    /// <summary>What the rig has after the polarity diode.</summary>
    public Voltage BehindDiode { get; }

    /// <summary>Key-down current, estimated.</summary>
    public Current Drawn { get; }

    /// <summary>Volts left over the regulator, either sign; null without one.</summary>
    public double? HeadroomVolt { get; }

    /// <summary>Fuse rating over the current drawn.</summary>
    public double FuseRatio => _stage.FuseRating / Drawn;

    public IReadOnlyList<Figure> Figures =>
    [
        .. _stage.Regulated is { } v ? [Figure.Stated("regulated-voltage", QuantityKind.Voltage, v.Volt)] : Array.Empty<Figure>(),
        Figure.Of("drawn-current", Drawn, CurrentWorking) with { Digits = 2 },
        Figure.Of("fuse-ratio", QuantityKind.Number, FuseRatio, FuseWorking) with { Digits = 2 },
        .. HeadroomVolt is { } h ? [Figure.Of("headroom", QuantityKind.Voltage, h, HeadroomWorking) with { Digits = 3 }] : Array.Empty<Figure>(),
    ];

    private Figure Supply => Figure.Stated("supply", QuantityKind.Voltage, _surroundings.SupplyVoltage.Volt);

    private Figure Drop => new("diode-drop", QuantityKind.Voltage, _stage.DiodeDrop.Volt, From: Provenance.Typical);

    private Working CurrentWorking => new(
        "supply-current",
        [
            .. _surroundings.WantedPower is { } p ? [Figure.Of("power", p)] : Array.Empty<Figure>(),
            new Figure("efficiency", QuantityKind.Ratio, _stage.Efficiency, From: Provenance.CommonPractice),
            Supply,
            Drop,
            new Figure("rest-current", QuantityKind.Current, _stage.RestCurrent.Ampere, From: Provenance.Typical),
        ],
        SourceRef.CommonPractice("estimate before anything is measured"));

    private Working FuseWorking => new("fuse-ratio", [Figure.Stated("fuse-rating", QuantityKind.Current, _stage.FuseRating.Ampere), Figure.Of("drawn-current", Drawn)], SourceRef.CommonPractice("fuses"));

    private Working HeadroomWorking => new("regulator-headroom", [Supply, Drop, Figure.Stated("regulated-voltage", QuantityKind.Voltage, _stage.Regulated?.Volt ?? 0)], SourceRef.Derived("difference of voltages"));
}
