namespace ClubBench.Web.Components.Controls.Rails;

/// <summary>Gives each stage a cell: the paths first, then oscillators near their mixers, then what stands aside in cells left over.</summary>
internal sealed class RailCells
{
    private readonly Dictionary<string, RailBlock> _cells = new(StringComparer.Ordinal);
    private readonly HashSet<(RailRow Row, int Column)> _taken = [];

    public static IReadOnlyDictionary<string, RailBlock> Place(IReadOnlyList<string> stages, RailMembers members, Dictionary<string, int> columns)
    {
        var cells = new RailCells();
        foreach (var (stage, column) in columns.OrderBy(c => c.Value)) cells.Put(stage, column, RowOf(stage, members), members);
        foreach (var (mixer, run) in members.Oscillators) cells.PutOscillator(run, columns.GetValueOrDefault(mixer), members);
        foreach (var stage in stages.Where(s => !cells._cells.ContainsKey(s))) cells.Put(stage, cells.FreeFrom(0), RailRow.Shared, members);
        return cells._cells;
    }

    private static RailRow RowOf(string stage, RailMembers members) => (members.OnReceive(stage), members.OnTransmit(stage)) switch
    {
        (true, false) => RailRow.Receive,
        (false, true) => RailRow.Transmit,
        _ => RailRow.Shared,
    };

    private void PutOscillator(IReadOnlyList<string> run, int mixer, RailMembers members)
    {
        var fresh = run.Where(s => !_cells.ContainsKey(s)).ToList();
        var column = Math.Max(0, mixer - fresh.Count);
        foreach (var stage in fresh)
        {
            column = FreeFrom(column);
            Put(stage, column, RailRow.Shared, members);
        }
    }

    private void Put(string stage, int column, RailRow row, RailMembers members)
    {
        if (!_taken.Add((row, column))) _taken.Add((row, column = FreeFrom(column, row)));
        _cells[stage] = new RailBlock(stage, column, row, members.OnReceive(stage), members.OnTransmit(stage));
    }

    private int FreeFrom(int column, RailRow row = RailRow.Shared)
    {
        while (_taken.Contains((row, column))) column++;
        return column;
    }
}
