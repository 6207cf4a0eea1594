using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Kits;

/// <summary>One stage on a path, with the ports the signal uses.</summary>
/// <param name="Stage">Stage key.</param>
/// <param name="From">Port it enters; empty where the stage generates it.</param>
/// <param name="To">Port it leaves.</param>
public readonly record struct PathStep(string Stage, string From, string To);

/// <summary>A run of stages from a source to an end.</summary>
/// <param name="Steps">Stages in the order of the signal; empty when there is no such path.</param>
public sealed record SignalPath(IReadOnlyList<PathStep> Steps)
{
    /// <summary>Stage keys in order.</summary>
    public IEnumerable<string> Stages => Steps.Select(s => s.Stage);

    /// <summary>Whether a stage lies on the path.</summary>
    public bool Contains(string stage) => Steps.Any(s => s.Stage == stage);

    /// <summary>Stages behind a stage, towards the end of the path; empty when it is not on it.</summary>
    public IEnumerable<string> After(string stage) => Stages.SkipWhile(s => s != stage).Skip(1);

    /// <summary>Stages before a stage; empty when it is not on the path.</summary>
    public IEnumerable<string> Before(string stage) => Contains(stage) ? Stages.TakeWhile(s => s != stage) : [];
}

/// <summary>An oscillator's way to a mixer.</summary>
/// <param name="Mixer">Mixing stage.</param>
/// <param name="Port">Its oscillator port.</param>
/// <param name="Path">From the generating stage to the stage whose output is wired to that port.</param>
public sealed record OscillatorBranch(string Mixer, string Port, SignalPath Path);

/// <summary>The paths of a kit, traced from its connections; nobody types them in.</summary>
/// <param name="Receive">Antenna to phones.</param>
/// <param name="Transmit">Oscillator (or microphone) to antenna.</param>
/// <param name="Oscillators">Every oscillator branch.</param>
public sealed record SignalPaths(SignalPath Receive, SignalPath Transmit, IReadOnlyList<OscillatorBranch> Oscillators)
{
    /// <summary>Traces the paths of a kit. Method: breadth-first search over nets of wired ports; the shortest path wins.</summary>
    public static SignalPaths Trace(Kit kit)
    {
        var nets = new Nets(kit.Connections);
        var walker = new PathWalker(kit, nets);
        var voice = kit.Mode is not Mode.Cw && nets.IsWired(Port.Microphone);
        var transmit = voice ? walker.Walk([nets.Of(Port.Microphone)], p => p.OnTransmit, Port.Antenna) : walker.FromGenerators(p => p.OnTransmit, Port.Antenna);
        return new SignalPaths(
            walker.Walk([nets.Of(Port.Antenna)], p => p.OnReceive, Port.Phones),
            transmit,
            [.. walker.OscillatorInputs().Select(port => new OscillatorBranch(port.Stage, port.Name, walker.FromGenerators(_ => true, port))).Where(b => b.Path.Steps.Count > 0)]);
    }
}

/// <summary>Groups of ports wired together.</summary>
internal sealed class Nets
{
    private readonly Dictionary<Port, int> _netOf = [];

    public Nets(IReadOnlyList<Connection> connections)
    {
        var next = 0;
        foreach (var (from, to) in connections)
        {
            var a = _netOf.GetValueOrDefault(from, -1);
            var b = _netOf.GetValueOrDefault(to, -1);
            var net = a >= 0 ? a : b >= 0 ? b : next++;
            (_netOf[from], _netOf[to]) = (net, net);
            if (a >= 0 && b >= 0 && a != b)
                foreach (var port in _netOf.Where(p => p.Value == b).Select(p => p.Key).ToList()) _netOf[port] = a;
        }
    }

    /// <summary>Net of a port; -1 for a port that is not wired.</summary>
    public int Of(Port port) => _netOf.GetValueOrDefault(port, -1);

    public bool IsWired(Port port) => _netOf.ContainsKey(port);

    public IEnumerable<Port> PortsOf(int net) => _netOf.Where(p => p.Value == net).Select(p => p.Key);
}

/// <summary>Walks from net to net through the passages of the stages.</summary>
internal sealed class PathWalker(Kit kit, Nets nets)
{
    private readonly List<(string Stage, StageDescription Description)> _stages =
        [.. kit.Stages.Select(s => (s.Key, StageKindList.Find(s.Kind)?.Description)).Where(s => s.Description is not null).Select(s => (s.Key, s.Description!))];

    public IEnumerable<Port> OscillatorInputs() =>
        _stages.SelectMany(s => s.Description.Ports.Where(p => p.IsOscillatorInput).Select(p => new Port(s.Stage, p.Name))).Where(nets.IsWired);

    public SignalPath FromGenerators(Func<Passage, bool> usable, Port end)
    {
        var starts = Steps(p => p.From.Length == 0).Select(s => (Net: nets.Of(new Port(s.Stage, s.To)), Step: s)).Where(s => s.Net >= 0).ToList();
        var paths = starts.Select(s => new SignalPath([s.Step, .. Walk([s.Net], usable, end).Steps]))
            .Where(p => ReachesEnd(p, end));
        return paths.OrderByDescending(p => p.Steps.Count).FirstOrDefault() ?? new SignalPath([]);
    }

    public SignalPath Walk(IReadOnlyList<int> starts, Func<Passage, bool> usable, Port end)
    {
        var goal = nets.Of(end);
        var cameBy = starts.Where(n => n >= 0).ToDictionary(n => n, _ => (PathStep?)null);
        var queue = new Queue<int>(cameBy.Keys);
        while (goal >= 0 && queue.TryDequeue(out var net) && net != goal)
            foreach (var step in Steps(p => p.From.Length > 0 && usable(p)).Where(s => nets.Of(new Port(s.Stage, s.From)) == net))
                if (nets.Of(new Port(step.Stage, step.To)) is >= 0 and var next && cameBy.TryAdd(next, step)) queue.Enqueue(next);
        return new SignalPath(Back(cameBy, goal));
    }

    private bool ReachesEnd(SignalPath path, Port end) => nets.Of(new Port(path.Steps[^1].Stage, path.Steps[^1].To)) == nets.Of(end);

    private IEnumerable<PathStep> Steps(Func<Passage, bool> usable) =>
        _stages.SelectMany(s => s.Description.Passages.Where(usable).Select(p => new PathStep(s.Stage, p.From, p.To)));

    private List<PathStep> Back(Dictionary<int, PathStep?> cameBy, int goal)
    {
        var steps = new List<PathStep>();
        for (var net = goal; cameBy.TryGetValue(net, out var step) && step is { } s; net = nets.Of(new Port(s.Stage, s.From))) steps.Insert(0, s);
        return steps;
    }
}
