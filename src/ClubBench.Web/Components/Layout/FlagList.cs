using System.Text.RegularExpressions;
using ClubBench.Web.State;

namespace ClubBench.Web.Components.Layout;

/// <summary>A divider flag: its name, where it leads from what is open, and which addresses lie behind it.</summary>
internal sealed record Flag(string Name, Func<OpenPlace, string> Address, string Pattern)
{
    public bool Covers(string path) => Regex.IsMatch(path, Pattern, RegexOptions.CultureInvariant | RegexOptions.NonBacktracking);
}

/// <summary>The places of the notebook, in the order of the work.</summary>
internal static class FlagList
{
    public static IReadOnlyList<Flag> All { get; } =
    [
        new("flag.kits", _ => "/kits", "^/$|^/kits(/[^/]+)?$|^/kits/[^/]+/stages"),
        new("flag.bands", p => p.Kit is { } kit ? $"/kits/{kit}/bands" : "/bands", "^/bands|^/kits/[^/]+/bands"),
        new("flag.plan", p => p.Plan is { } plan ? $"/plans/{plan}" : "/plans", "^/plans(/[^/]+)?$|^/plans/[^/]+/target"),
        new("flag.cards", p => p.Plan is { } plan ? $"/plans/{plan}/cards" : "/cards", "^/cards|^/plans/[^/]+/cards"),
        new("flag.order", p => p.Plan is { } plan ? $"/plans/{plan}/parts-order" : "/parts-orders", "^/parts-orders|^/plans/[^/]+/parts-order"),
        new("flag.group-builds", _ => "/group-builds", "^/group-builds"),
        new("flag.nights", _ => "/nights", "^/nights(/[^/]+)?$"),
        new("flag.room", _ => "/room", "^/room|^/nights/[^/]+/room"),
        new("flag.worksheets", _ => "/worksheets", "^/worksheets"),
        new("flag.club", _ => "/club", "^/club"),
    ];
}
