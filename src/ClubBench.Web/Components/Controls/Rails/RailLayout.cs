using ClubBench.Planning.Kits;

namespace ClubBench.Web.Components.Controls.Rails;

/// <summary>Which rail a stage stands on.</summary>
public enum RailRow
{
    Receive,
    Shared,
    Transmit,
}

/// <summary>What runs along a connection.</summary>
public enum RailSignal
{
    Receive,
    Transmit,
    Both,
    Oscillator,
}

/// <summary>A stage in its cell. On neither path: it serves the rig beside the signal.</summary>
public sealed record RailBlock(string Stage, int Column, RailRow Row, bool OnReceive, bool OnTransmit)
{
    public bool IsAside => !OnReceive && !OnTransmit;
}

/// <summary>A connection; <see cref="To"/> lies nearer to the antenna, or is the mixer an oscillator drives.</summary>
public sealed record RailLink(RailBlock From, RailBlock To, RailSignal Signal);

/// <summary>Where the stages of a kit stand: receive above, transmit below, shared between, antenna right, phones left.
/// Computed from the traced paths alone.</summary>
public sealed record RailLayout(int Columns, IReadOnlyList<RailBlock> Blocks, IReadOnlyList<RailLink> Links)
{
    /// <summary>The block next to the phones; null without a receive path.</summary>
    public RailBlock? Phones { get; private init; }

    /// <summary>Blocks that reach the antenna, receive and transmit.</summary>
    public IReadOnlyList<RailBlock> AtAntenna { get; private init; } = [];

    /// <summary>Lays out the stages, kept in the given order.</summary>
    public static RailLayout Of(SignalPaths paths, IReadOnlyList<string> stages)
    {
        var members = new RailMembers(paths);
        var columns = RailColumns.Of(members);
        var cells = RailCells.Place(stages, members, columns);
        var blocks = stages.Select(s => cells[s]).ToList();
        return new RailLayout(blocks.Select(b => b.Column).DefaultIfEmpty(-1).Max() + 1, blocks, RailLinks.Between(cells, members))
        {
            Phones = members.Receive.Count > 0 ? cells[members.Receive[0]] : null,
            AtAntenna = [.. new[] { members.Receive, members.Transmit }.Where(p => p.Count > 0).Select(p => cells[p[^1]]).Distinct()],
        };
    }
}
