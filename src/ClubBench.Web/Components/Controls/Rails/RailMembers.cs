using ClubBench.Planning.Kits;

namespace ClubBench.Web.Components.Controls.Rails;

/// <summary>The traced paths read in one direction, towards the antenna, and who belongs to which.</summary>
internal sealed class RailMembers
{
    private readonly HashSet<string> _receive;
    private readonly HashSet<string> _transmit;

    public RailMembers(SignalPaths paths)
    {
        Receive = [.. paths.Receive.Stages.Reverse()];
        Transmit = [.. paths.Transmit.Stages];
        Oscillators = [.. paths.Oscillators.Select(o => (o.Mixer, (IReadOnlyList<string>)[.. o.Path.Stages]))];
        _receive = Fed(Receive);
        _transmit = Fed(Transmit);
    }

    /// <summary>Receive stages from phones to antenna.</summary>
    public IReadOnlyList<string> Receive { get; }

    /// <summary>Transmit stages from source to antenna.</summary>
    public IReadOnlyList<string> Transmit { get; }

    /// <summary>Oscillator runs, each with the mixer it drives.</summary>
    public IReadOnlyList<(string Mixer, IReadOnlyList<string> Stages)> Oscillators { get; }

    public bool OnReceive(string stage) => _receive.Contains(stage);

    public bool OnTransmit(string stage) => _transmit.Contains(stage);

    /// <summary>Stages of a path and of the oscillators that drive its mixers.</summary>
    private HashSet<string> Fed(IReadOnlyList<string> path) =>
        [.. path, .. Oscillators.Where(o => path.Contains(o.Mixer, StringComparer.Ordinal)).SelectMany(o => o.Stages)];
}
