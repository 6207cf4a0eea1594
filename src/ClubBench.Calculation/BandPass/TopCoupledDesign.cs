using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;

namespace ClubBench.Calculation.BandPass;

/// <summary>What a coupled band-pass shall do and with which coils.</summary>
/// <param name="Prototype">Shape and number of resonators.</param>
/// <param name="Center">Middle of the band.</param>
/// <param name="Bandwidth3dB">Half-power bandwidth.</param>
/// <param name="Coil">Inductance of each coil, above zero.</param>
/// <param name="UnloadedQ">Q of each coil, above zero.</param>
/// <param name="Unavoidable">What is at a node anyway: strays, half the trimmer, an end's coupling. Zero where not told.</param>
public sealed record BandPassTask(CouplingPrototype Prototype, Frequency Center, Frequency Bandwidth3dB, Inductance Coil, double UnloadedQ, Capacitance Unavoidable = default);

/// <summary>Why there is no such filter.</summary>
public enum BandPassRefusal
{
    /// <summary>There is.</summary>
    None,

    /// <summary>More than 30 % of the centre: top coupling is not for that.</summary>
    TooWide,

    /// <summary>The loaded Q asked for reaches the coils' own Q.</summary>
    CoilsTooLossy,

    /// <summary>Three resonators of such coils lose more than 8.5 dB.</summary>
    ThreeTooLossy,

    /// <summary>A node has no capacitance left.</summary>
    NodeOvercommitted,
}

/// <summary>What is to be said with a filter that works.</summary>
public enum BandPassRemark
{
    /// <summary>Coupling capacitor below 1 pF: it cannot be bought reliably.</summary>
    CouplingTooSmall,

    /// <summary>Coupling capacitor below 2 pF: its tolerance moves the coupling.</summary>
    CouplingSmall,

    /// <summary>More than 10 % of the centre: the response leans to one side.</summary>
    Skewed,
}

/// <summary>A designed top-coupled band-pass, or why there is none and what would do.</summary>
/// <remarks>
/// Method: equal coils; coupling k BW/f0 times the resonant capacitance; ends that load the end resonator, its own loss taken off.
/// Valid: bandwidth up to 30 % of the centre. Predict with the network, not with the prototype.
/// Source: zverev-1967 for k and q; derived.
/// </remarks>
/// <param name="Filter">The filter; null where refused.</param>
/// <param name="Refusal">The reason.</param>
/// <param name="Remarks">What is to be said with it.</param>
/// <param name="EndLoadedQ">Loaded Q of an end resonator, its own loss included.</param>
/// <param name="LeastBandwidth">Bandwidth at which the loaded Q equals the coils' own.</param>
/// <param name="LargestCoil">Inductance from which a node has nothing left; null where nothing is unavoidable.</param>
public sealed record TopCoupledDesign(
    TopCoupledFilter? Filter, BandPassRefusal Refusal, IReadOnlyList<BandPassRemark> Remarks, double EndLoadedQ, Frequency LeastBandwidth, Inductance? LargestCoil)
{
    private const double Widest = 0.30;
    private const double SkewedFrom = 0.10;
    private const double LeastScaledQOfThree = 3.3;

    /// <summary>Designs the filter.</summary>
    public static TopCoupledDesign Of(BandPassTask task)
    {
        var width = task.Bandwidth3dB / task.Center;
        var endQ = task.Prototype.EndQ / width;
        var total = TunedCircuit.CapacitanceFor(task.Coil, task.Center);
        var coupling = total * (task.Prototype.Coupling * width);
        var nodes = NodeShares(task.Prototype, width).Select(share => (total.Farad * share) - task.Unavoidable.Farad).ToList();
        var refusal = RefusalOf(task, width, endQ, nodes);
        return new(
            refusal == BandPassRefusal.None ? FilterOf(task, endQ, nodes, coupling) : null,
            refusal,
            refusal == BandPassRefusal.None ? [.. RemarksOf(coupling, width)] : [],
            endQ,
            task.Center * (task.Prototype.EndQ / Guard.Positive(task.UnloadedQ, nameof(task))),
            LargestCoilOf(task, width));
    }

    private static BandPassRefusal RefusalOf(BandPassTask task, double width, double endQ, List<double> nodes) =>
        width > Widest ? BandPassRefusal.TooWide
        : endQ >= task.UnloadedQ ? BandPassRefusal.CoilsTooLossy
        : task.Prototype.Order == 3 && task.UnloadedQ * width < LeastScaledQOfThree ? BandPassRefusal.ThreeTooLossy
        : nodes.Min() <= 0 ? BandPassRefusal.NodeOvercommitted
        : BandPassRefusal.None;

    // The unavoidable part is back at its node: the network sees all of it.
    private static TopCoupledFilter FilterOf(BandPassTask task, double endQ, List<double> nodes, Capacitance coupling) => new(
        task.Center,
        task.Coil,
        task.UnloadedQ,
        [.. nodes.Select(c => Capacitance.FromFarad(c) + task.Unavoidable)],
        coupling,
        TunedCircuit.Reactance(task.Coil, task.Center) * (1 / ((1 / endQ) - (1 / task.UnloadedQ))));

    // What of the resonant capacitance is left at each node once its couplings are taken off.
    private static IEnumerable<double> NodeShares(CouplingPrototype prototype, double width) =>
        Enumerable.Range(0, prototype.Order).Select(i => 1 - ((i > 0 && i < prototype.Order - 1 ? 2 : 1) * prototype.Coupling * width));

    private static IEnumerable<BandPassRemark> RemarksOf(Capacitance coupling, double width)
    {
        if (coupling.Picofarad < 1) yield return BandPassRemark.CouplingTooSmall;
        else if (coupling.Picofarad < 2) yield return BandPassRemark.CouplingSmall;
        if (width > SkewedFrom) yield return BandPassRemark.Skewed;
    }

    private static Inductance? LargestCoilOf(BandPassTask task, double width)
    {
        var share = NodeShares(task.Prototype, width).Min();
        return task.Unavoidable.Farad > 0 && share > 0 ? TunedCircuit.InductanceFor(task.Unavoidable * (1 / share), task.Center) : null;
    }
}
