using System.Numerics;
using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.SingleEndedFinal;

/// <summary>A computed single-ended final. Power and heat hang on supply and load, drive on the band.</summary>
internal sealed class FinalModel : IStageModel, IAmplifies, IMakesHarmonics, IGetsHot, IDrawsSupply, IPresents
{
    /// <summary>Junction to case where the table is silent, and a pad between (common practice for a small power package).</summary>
    private static readonly ThermalResistance UsualJunctionToCase = ThermalResistance.FromKelvinPerWatt(10);
    private static readonly ThermalResistance Pad = ThermalResistance.FromKelvinPerWatt(1);
    private readonly FinalStage _stage;
    private readonly BaseReturnGain? _drive;

    public FinalModel(FinalStage stage, Surroundings surroundings)
    {
        (_stage, At) = (stage, surroundings.Reference);
        _drive = stage.DriveModel(surroundings.DesignFrequency);
        Output = new OutputStage(surroundings.SupplyVoltage - stage.SupplyDrop, stage.Saturation).Power(FinalStage.Load);
        SupplyCurrent = Current.FromAmpere(Output.Watt / (stage.Efficiency * surroundings.SupplyVoltage.Volt));
        Lost = _drive?.LostByMoving(surroundings.DesignFrequency, At) ?? Decibels.Zero;
        ChokeCore = Cores.FindToroid(stage.Choke.Type);
        LowestBand = surroundings.Band.Low;
        Choke = ChokeCore is { } core ? new FerriteWinding(core, (int)stage.Choke.Need(PartValue.Turns)).Impedance(LowestBand, stage.ChokeParallel) : null;
        BiasShare = ChokeCore is { } biased ? FluxDensity.BiasShare(biased, (int)stage.Choke.Need(PartValue.Turns), SupplyCurrent) : null;
    }

    /// <summary>The club's frequency.</summary>
    public Frequency At { get; }

    /// <summary>Lower end of the band, where chokes are weakest.</summary>
    public Frequency LowestBand { get; }

    /// <summary>Output into the matched load.</summary>
    public Power Output { get; }

    /// <summary>Gain lost against the design band; negative where it rises.</summary>
    public Decibels Lost { get; }

    public ToroidCore? ChokeCore { get; }

    /// <summary>Choke impedance at the lower band end; null outside the permeability table.</summary>
    public Complex? Choke { get; }

    /// <summary>Direct flux as a share of saturation; null where the mix is unknown.</summary>
    public double? BiasShare { get; }

    public Current SupplyCurrent { get; }

    public IReadOnlyList<Figure> Figures =>
    [
        Figure.Of("output-power", Output, PowerWorking),
        Figure.Of("gain", Gain(At), DriveWorking),
        Figure.Of("drive", DriveFor(Output, At), DriveWorking),
        Figure.Of("supply-current", SupplyCurrent, PowerWorking),
        .. Choke is { } z ? ChokeFigures(z) : [],
        .. BiasShare is { } share ? [Figure.Of("choke-bias", QuantityKind.Ratio, share, BiasWorking)] : Array.Empty<Figure>(),
        .. _stage.Transition is { } ft ? [Figure.Of("transition-ratio", QuantityKind.Number, ft / At)] : Array.Empty<Figure>(),
    ];

    public Power MostOutput(Frequency at) => Output;

    public Power DriveFor(Power output, Frequency at) =>
        (_drive?.DriveNeeded(at, _stage.Return) ?? _stage.DriveNeeded) * (output / Output);

    public Decibels Gain(Frequency at) => Decibels.FromPowerRatio(Output / DriveFor(Output, at));

    /// <summary>Gain bought by another base return; null where the drive cannot be told.</summary>
    public Decibels? Bought(Resistance other) => _drive?.Bought(_stage.Return, other);

    public (Decibels Level, Decibels StandardUncertainty) Harmonic(int order) =>
        RawHarmonicLevels.Find(StageClass.ClassCBroadband, order) is { } raw ? (raw.Level, raw.StandardUncertainty) : (Decibels.FromDb(-26), Decibels.FromDb(5));

    public Power Dissipation(Frequency at) => OutputStage.Dissipation(Output, _stage.Efficiency, DriveFor(Output, at));

    public (Temperature Junction, Temperature Limit) Heat(Power dissipation, Temperature ambient)
    {
        var path = new Heat(_stage.Device?.JunctionToCase ?? UsualJunctionToCase, Pad, _stage.HeatSink);
        var limit = (_stage.Device?.JunctionMax ?? Temperature.FromCelsius(150)).Celsius - Calculation.Amplifiers.Heat.Reserve.Kelvin;
        return (path.Junction(ambient, dissipation), Temperature.FromCelsius(limit));
    }

    public Complex Impedance(string port, Frequency at) => port == SingleEndedFinalKind.Input ? _stage.Input.Ohm : FinalStage.Load.Ohm;

    private static IEnumerable<Figure> ChokeFigures(Complex z)
    {
        var working = new Working("ferrite-choke", [], SourceRef.Derived("complex permeability of the core's mix at the frequency"));
        yield return Figure.Of("choke-impedance", QuantityKind.Resistance, z.Magnitude, working);
        yield return Figure.Of("choke-resistance", QuantityKind.Resistance, z.Real, working);
        yield return Figure.Of("choke-reactance", QuantityKind.Resistance, z.Imaginary, working);
    }

    private Working PowerWorking => new(
        "output-power",
        [Figure.Of("saturation", QuantityKind.Voltage, _stage.Saturation.Volt), Figure.Of("supply-drop", QuantityKind.Voltage, _stage.SupplyDrop.Volt), Figure.Of("load", FinalStage.Load)],
        SourceRef.Derived("sine of full swing across the load"));

    private Working DriveWorking => new(
        "base-return-gain",
        [
            Figure.Of("drive-at-design", _stage.DriveNeeded),
            Figure.Of("base-return", _stage.Return),
            .. _stage.Transition is { } ft ? [Figure.Of("transition-frequency", ft)] : Array.Empty<Figure>(),
            Figure.Of("at", At),
        ],
        SourceRef.Derived("trend; measure"));

    private Working BiasWorking => new("choke-bias", [Figure.Of("current", SupplyCurrent), Figure.Of("turns", QuantityKind.Count, _stage.Choke.Need(PartValue.Turns))], SourceRef.CommonPractice());
}
