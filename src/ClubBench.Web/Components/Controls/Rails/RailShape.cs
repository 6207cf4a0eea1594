namespace ClubBench.Web.Components.Controls.Rails;

/// <summary>How a connection runs over the grid, as class names and grid lines for the style sheet. Column 1 of the grid holds the phones.</summary>
internal static class RailShape
{
    public static string Classes(RailLink link)
    {
        var (from, to) = (link.From, link.To);
        var signal = link.Signal.ToString().ToLowerInvariant();
        if (link.Signal == RailSignal.Oscillator && (from.Row != to.Row || Math.Abs(from.Column - to.Column) > 1)) return $"rail-link {signal} tap {Tap(from, to)}";
        if (from.Row == to.Row) return $"rail-link {signal} flat";
        var turn = from.Column == to.Column ? "plumb" : from.Row == RailRow.Shared ? "leave" : "join";
        return $"rail-link {signal} {turn} {(to.Row < from.Row ? "up" : "down")}";
    }

    public static string Area(RailLink link)
    {
        var (from, to) = (link.From, link.To);
        var (left, right) = (Math.Min(from.Column, to.Column), Math.Max(from.Column, to.Column));
        var (top, bottom) = ((int)from.Row < (int)to.Row ? from.Row : to.Row, (int)from.Row < (int)to.Row ? to.Row : from.Row);
        return FormattableString.Invariant($"grid-column:{left + 2}/{right + 3};grid-row:{(int)top + 1}/{(int)bottom + 2};--span:{right - left + 1}");
    }

    public static string Cell(RailBlock block) => FormattableString.Invariant($"grid-column:{block.Column + 2};grid-row:{(int)block.Row + 1}");

    /// <summary>A tap runs in the channel between the rows: from the oscillator's side to the mixer's side.</summary>
    private static string Tap(RailBlock from, RailBlock to)
    {
        var side = from.Column == to.Column ? "straight" : from.Column < to.Column ? "rightward" : "leftward";
        return $"{side} {(from.Row == to.Row ? "under" : to.Row < from.Row ? "up" : "down")}";
    }
}
