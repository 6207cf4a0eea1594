namespace ClubBench.Web.Components.Controls.Rails;

/// <summary>Connections between placed blocks. What both paths use is drawn once.</summary>
internal static class RailLinks
{
    public static IReadOnlyList<RailLink> Between(IReadOnlyDictionary<string, RailBlock> cells, RailMembers members)
    {
        var receive = Pairs(members.Receive).ToHashSet();
        var transmit = Pairs(members.Transmit).ToHashSet();
        var links = receive.Union(transmit).Select(p => Link(p, receive.Contains(p) ? transmit.Contains(p) ? RailSignal.Both : RailSignal.Receive : RailSignal.Transmit));
        var drives = members.Oscillators.Where(o => o.Stages.Count > 0)
            .SelectMany(o => Pairs(o.Stages).Append((o.Stages[^1], o.Mixer)))
            .Where(p => !receive.Contains(p) && !transmit.Contains(p)).Distinct().Select(p => Link(p, RailSignal.Oscillator));
        return [.. links, .. drives];

        RailLink Link((string From, string To) pair, RailSignal signal) => new(cells[pair.From], cells[pair.To], signal);
    }

    private static IEnumerable<(string From, string To)> Pairs(IReadOnlyList<string> path) => path.Zip(path.Skip(1));
}
