namespace ClubBench.Web.Components.Controls.Rails;

/// <summary>Columns by the longest way to a stage, so that every connection runs to the right; ends at the antenna share the last column.</summary>
internal static class RailColumns
{
    public static Dictionary<string, int> Of(RailMembers members)
    {
        var edges = Pairs(members.Receive).Concat(Pairs(members.Transmit)).Distinct().ToList();
        var column = members.Receive.Concat(members.Transmit).Distinct(StringComparer.Ordinal).ToDictionary(s => s, _ => 0, StringComparer.Ordinal);
        for (var pass = 0; pass < column.Count && Push(edges, column); pass++) { }

        foreach (var last in new[] { members.Receive, members.Transmit }.Where(p => p.Count > 0).Select(p => p[^1])) column[last] = column.Values.Max();
        return Ranked(column);
    }

    /// <summary>Moves the far end of each edge right where needed. The caller stops after as many passes as there are stages, so a ring of stages ends too.</summary>
    private static bool Push(List<(string From, string To)> edges, Dictionary<string, int> column)
    {
        var moved = false;
        foreach (var (from, to) in edges.Where(e => column[e.To] <= column[e.From]))
            (column[to], moved) = (column[from] + 1, true);
        return moved;
    }

    private static Dictionary<string, int> Ranked(Dictionary<string, int> column)
    {
        var ranks = column.Values.Distinct().Order().Select((value, rank) => (value, rank)).ToDictionary(r => r.value, r => r.rank);
        return column.ToDictionary(c => c.Key, c => ranks[c.Value], StringComparer.Ordinal);
    }

    private static IEnumerable<(string From, string To)> Pairs(IReadOnlyList<string> path) => path.Zip(path.Skip(1));
}
