namespace ClubBench.Planning.Plans;

/// <summary>Collects what is not settled: findings of the planned chain that keep an item open, a circuit to rethink, limits nobody confirmed.</summary>
internal static class OpenItems
{
    /// <summary>Items a person's word cannot settle: only a better plan or the licence can.</summary>
    private static readonly HashSet<string> BeyondAcceptance = new(StringComparer.Ordinal)
    {
        OpenItemCodes.OutputFilter, OpenItemCodes.Harmonics, OpenItemCodes.LimitConfirmation, OpenItemCodes.Rethink,
    };

    public static IReadOnlyList<OpenItem> Of(Move move)
    {
        var accepted = move.Inputs.Choices.Where(c => !string.IsNullOrWhiteSpace(c.Reason)).Select(c => c.Stage).ToHashSet(StringComparer.Ordinal);
        var fromFindings = move.Planned.LoadToSource.SelectMany(move.Findings).Where(f => f.OpenItem is not null)
            .Where(f => BeyondAcceptance.Contains(f.OpenItem!) || !accepted.Contains(f.Stage))
            .Select(f => new OpenItem(f.OpenItem!, f.Stage, BeyondAcceptance.Contains(f.OpenItem!) ? "change" : "change-or-reason", f));
        var rethink = move.Decisions.Where(d => d.IsRethink)
            .Select(d => new OpenItem(OpenItemCodes.Rethink, d.Stage, "change", d.RethinkBecause));
        return [.. fromFindings.Concat(rethink).DistinctBy(i => (i.Code, i.Stage)), .. Limits(move.Inputs.Target), .. Missing(move)];
    }

    private static IEnumerable<OpenItem> Limits(Target target) =>
        target is { WantedPower: not null, LimitsConfirmedBy: null } ? [new OpenItem(OpenItemCodes.LimitConfirmation, "", "confirmation", null)] : [];

    /// <summary>A transmitter without any passive stage between its last amplifier and the antenna has no output filter; a transceiver must hear.</summary>
    private static IEnumerable<OpenItem> Missing(Move move)
    {
        var transmit = move.Planned.Paths.Transmit;
        var last = transmit.Stages.LastOrDefault(s => move.Planned.Facet<StageKinds.IMakesHarmonics>(s) is not null);
        if (last is not null && transmit.After(last).All(s => move.Planned.Facet<StageKinds.IPasses>(s) is null))
            yield return new OpenItem(OpenItemCodes.OutputFilter, last, "change", null);
    }
}
