using System.Numerics;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Plans;

/// <summary>The stages of a kit computed together in one place: own band or target. Stages do not know each other; the chain does. Immutable.</summary>
public sealed class Chain
{
    private readonly Nets _nets;
    private readonly Dictionary<string, IStageModel> _models = new(StringComparer.Ordinal);

    /// <summary>Computes every stage, from load to source, so that each sees what it drives.</summary>
    public Chain(Kit kit, ChainConditions conditions)
    {
        (Kit, Conditions, Paths, _nets) = (kit, conditions, SignalPaths.Trace(kit), new Nets(kit.Connections));
        foreach (var key in LoadToSource) _models[key] = KindOf(key).Model(kit.Stage(key), SurroundingsOf(key));
    }

    /// <summary>The kit with its current parts.</summary>
    public Kit Kit { get; }

    /// <summary>Band, power, supply, limits.</summary>
    public ChainConditions Conditions { get; }

    /// <summary>Its paths.</summary>
    public SignalPaths Paths { get; }

    /// <summary>Stage keys from the loads to the sources: transmit path backwards, receive path backwards, the rest.</summary>
    public IReadOnlyList<string> LoadToSource =>
        [.. Paths.Transmit.Stages.Reverse().Concat(Paths.Receive.Stages.Reverse()).Concat(Kit.Stages.Select(s => s.Key)).Distinct(StringComparer.Ordinal)];

    /// <summary>The same chain with one stage's parts replaced.</summary>
    public Chain With(StageDocument stage) => new(Kit.With(stage), Conditions);

    /// <summary>The computed model of a stage.</summary>
    public IStageModel Model(string stage) => _models[stage];

    /// <summary>The model as a facet, or null where the stage does not do that.</summary>
    public T? Facet<T>(string stage)
        where T : class => _models.GetValueOrDefault(stage) as T;

    /// <summary>The kind of a stage.</summary>
    public IStageKind KindOf(string stage) => StageKindList.Get(Kit.Stage(stage).Kind);

    /// <summary>The surroundings a stage is computed in.</summary>
    public Surroundings SurroundingsOf(string stage) =>
        new(
            Conditions.Band,
            Conditions.Reference,
            Conditions.DesignFrequency,
            PortFrequencies.Of(stage, Kit, Conditions.Band),
            (port, at) => Neighbour(new Port(stage, port), at),
            Kit.SupplyVoltage,
            Conditions.WantedPower,
            Kit.Mode,
            Conditions.Pitch,
            Conditions.Limits,
            Conditions.WishMargin,
            Conditions.Learnt);

    private Complex Neighbour(Port port, Frequency at)
    {
        var net = _nets.Of(port);
        if (net < 0) return Nominal(port);
        var presented = _nets.PortsOf(net).Where(p => p != port).Select(p => Presented(p, at)).OfType<Complex>().ToList();
        return presented.Count == 0 ? Nominal(port) : Complex.Reciprocal(presented.Aggregate(Complex.Zero, (y, z) => y + Complex.Reciprocal(z)));
    }

    private Complex? Presented(Port port, Frequency at) =>
        port.IsTerminal ? Terminal(port) : (_models.GetValueOrDefault(port.Stage) as IPresents)?.Impedance(port.Name, at);

    private static Complex? Terminal(Port port) => port == Port.Antenna ? 50 : port == Port.Phones ? 32 : null;

    private Complex Nominal(Port port) => KindOf(port.Stage).Description.Port(port.Name)?.NominalOhm ?? 50;
}
