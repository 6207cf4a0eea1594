using System.Numerics;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.AudioOutput;

/// <summary>A computed audio output: gain and idle current from memory of data sheets, corner frequencies and mute time from the parts.</summary>
internal sealed class OutputModel : IStageModel, IPresents, IDrawsSupply
{
    /// <summary>Idle current of such circuits and its window, from memory of data sheets.</summary>
    public const double IdleA = 6e-3;
    public const double LeastIdleA = 4e-3;
    public const double MostIdleA = 8e-3;
    private const double GainDb = 26;
    private const double RaisedGainDb = 46;
    private const double InputOhm = 50_000;
    private readonly OutputStage _stage;

    public OutputModel(OutputStage stage, Surroundings surroundings)
    {
        _stage = stage;
        Load = Resistance.FromOhm(Complex.Abs(surroundings.Neighbour(AudioOutputKind.Output, surroundings.Pitch)));
        OutputCorner = Corner(Load, stage.OutputCapacitor);
        SupplyCorner = Corner(stage.SupplyResistor, stage.SupplyCapacitor);
    }

    /// <summary>What it works into.</summary>
    public Resistance Load { get; }

    /// <summary>Frequency below which the output capacitor loses the bass; null without one.</summary>
    public Frequency? OutputCorner { get; }

    /// <summary>Frequency above which the supply pin is kept quiet; null without both parts.</summary>
    public Frequency? SupplyCorner { get; }

    public Current SupplyCurrent => Current.FromAmpere(IdleA);

    public IReadOnlyList<Figure> Figures =>
    [
        new Figure("gain", QuantityKind.Decibels, _stage.HasGainCapacitor ? RaisedGainDb : GainDb, From: Provenance.FromMemory, Digits: 2),
        new Figure("idle-current", QuantityKind.Current, IdleA, From: Provenance.FromMemory, Digits: 1),
        .. OutputCorner is { } f ? [Figure.Of("output-corner", f, CornerWorking(Load, _stage.OutputCapacitor!.Value)) with { Digits = 2 }] : Array.Empty<Figure>(),
        .. SupplyCorner is { } s ? [Figure.Of("supply-corner", s, CornerWorking(_stage.SupplyResistor!.Value, _stage.SupplyCapacitor!.Value)) with { Digits = 2 }] : Array.Empty<Figure>(),
        .. _stage is { MuteResistor: { } r, MuteCapacitor: { } c } ? [Figure.Of("mute-time", QuantityKind.Duration, r.Ohm * c.Farad, Working("time-constant", r, c)) with { Digits = 2 }] : Array.Empty<Figure>(),
    ];

    public Complex Impedance(string port, Frequency at) => port == AudioOutputKind.Input ? InputOhm : 1;

    private static Frequency? Corner(Resistance? resistance, Capacitance? capacitance) =>
        resistance is { Ohm: > 0 } r && capacitance is { } c ? Frequency.FromHertz(1 / (2 * Math.PI * r.Ohm * c.Farad)) : null;

    private static Working CornerWorking(Resistance r, Capacitance c) => Working("corner-frequency", r, c);

    private static Working Working(string method, Resistance r, Capacitance c) =>
        new(method, [Figure.Of("resistance", r), Figure.Of("capacitance", c)], SourceRef.Derived("resistor and capacitor"));
}
