using System.Numerics;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;

namespace ClubBench.Calculation.Broadband;

/// <summary>What decided a verdict on a winding.</summary>
public enum WindingReason
{
    /// <summary>Everything has room.</summary>
    None,

    /// <summary>The impedance is low against the resistance.</summary>
    LowImpedance,

    /// <summary>The core takes too much of the power.</summary>
    CoreLoss,

    /// <summary>Alternating flux is above its guide value.</summary>
    Flux,

    /// <summary>Direct current drives the core towards saturation.</summary>
    Bias,

    /// <summary>The wire is long against the wavelength.</summary>
    WireLength,

    /// <summary>The verdict would turn with an index 20 % lower or a permeability 30 % off.</summary>
    Uncertain,
}

/// <summary>A broadband winding where it works.</summary>
/// <param name="Winding">The winding.</param>
/// <param name="LowestFrequency">Lowest frequency it must serve.</param>
/// <param name="Resistance">Resistance level at this winding, above zero.</param>
public sealed record WindingDuty(FerriteWinding Winding, Frequency LowestFrequency, Resistance Resistance)
{
    /// <summary>Judgement of its alternating flux.</summary>
    public CoreLoad Flux { get; init; }

    /// <summary>Judgement of its direct current.</summary>
    public CoreLoad Bias { get; init; }

    /// <summary>Whether the wire is longer than an eighth of a wavelength in the line.</summary>
    public bool IsWireTooLong { get; init; }

    /// <summary>Whether the verdict must survive the tolerances of index and permeability. On unless the figures are measured.</summary>
    public bool WidenForTolerance { get; init; } = true;
}

/// <summary>Verdict on a winding with what it rests on. Immutable.</summary>
/// <param name="Verdict">Leave, check or change.</param>
/// <param name="Reason">What decided.</param>
/// <param name="Loading">Impedance, loss and standing wave ratio, nominal.</param>
/// <param name="ProposedTurns">Turns that would give four times the resistance and at most 0.3 dB in the core; the present ones where these do.</param>
public sealed record WindingJudgement(Verdict Verdict, WindingReason Reason, ShuntLoading Loading, int ProposedTurns)
{
    private const double EnoughRatio = 4;
    private const double LeastRatio = 2;
    private static readonly Decibels EnoughLoss = Decibels.FromDb(0.3);
    private static readonly Decibels MostLoss = Decibels.FromDb(1);

    /// <summary>
    /// Judges a winding at its lowest frequency: change below twice the resistance or above 1 dB core loss, check below four times or above 0.3 dB
    /// or when tolerances would turn the verdict. Null where the permeability is not known at that frequency. All windings of a transformer
    /// must be scaled by the same factor afterwards. Source: common practice (four times the impedance at the lowest frequency).
    /// </summary>
    public static WindingJudgement? Of(WindingDuty duty)
    {
        if (duty.Winding.Permeability(duty.LowestFrequency) is not { } mu) return null;
        var loading = new ShuntLoading(duty.Winding.Impedance(duty.LowestFrequency, mu), duty.Resistance);
        var (verdict, reason) = Decide(duty, loading);
        if (verdict == Verdict.Leave && duty.WidenForTolerance && Widened(duty, mu).Any(l => Decide(duty, l).Verdict != Verdict.Leave))
            (verdict, reason) = (Verdict.Check, WindingReason.Uncertain);
        return new(verdict, reason, loading, Propose(duty.Winding.Turns, loading));
    }

    /// <summary>Longest wire of a bifilar or line winding: an eighth of a wavelength at 0.7 of the speed of light. Source: common practice.</summary>
    public static Length LongestWire(Frequency highest) => Length.FromMetre(0.7 * 299_792_458 / (8 * highest.Hertz));

    /// <summary>Turns of two windings scaled up together: the smallest multiple of the reduced ratio with at least the proposed turns on the first.</summary>
    public static (int First, int Second) KeepRatio(int first, int second, int proposedFirst)
    {
        var divisor = (int)BigInteger.GreatestCommonDivisor(Guard.Within(first, 1, 1000, nameof(first)), Guard.Within(second, 1, 1000, nameof(second)));
        var multiple = (int)Math.Ceiling(proposedFirst / (first / (double)divisor));
        return (multiple * first / divisor, multiple * second / divisor);
    }

    private static (Verdict Verdict, WindingReason Reason) Decide(WindingDuty duty, ShuntLoading loading)
    {
        if (loading.Ratio < LeastRatio) return (Verdict.Change, WindingReason.LowImpedance);
        if (loading.CoreDissipation > MostLoss) return (Verdict.Change, WindingReason.CoreLoss);
        if (duty.Flux == CoreLoad.Refuse) return (Verdict.Change, WindingReason.Flux);
        if (duty.Bias == CoreLoad.Refuse) return (Verdict.Change, WindingReason.Bias);
        if (duty.IsWireTooLong) return (Verdict.Change, WindingReason.WireLength);
        if (loading.Ratio < EnoughRatio) return (Verdict.Check, WindingReason.LowImpedance);
        if (loading.CoreDissipation > EnoughLoss) return (Verdict.Check, WindingReason.CoreLoss);
        if (duty.Flux == CoreLoad.Check) return (Verdict.Check, WindingReason.Flux);
        return duty.Bias == CoreLoad.Check ? (Verdict.Check, WindingReason.Bias) : (Verdict.Leave, WindingReason.None);
    }

    // Index 20 % low; each part of the permeability 30 % either way, independently.
    private static IEnumerable<ShuntLoading> Widened(WindingDuty duty, ComplexPermeability mu)
    {
        var nominal = duty.Winding.Impedance(duty.LowestFrequency, mu);
        yield return new(0.8 * nominal, duty.Resistance);
        foreach (var inductive in new[] { 1 - FerritePermeability.Uncertainty, 1 + FerritePermeability.Uncertainty })
            foreach (var lossy in new[] { 1 - FerritePermeability.Uncertainty, 1 + FerritePermeability.Uncertainty })
                yield return new(new Complex(lossy * nominal.Real, inductive * nominal.Imaginary), duty.Resistance);
    }

    private static int Propose(int turns, ShuntLoading loading)
    {
        var byImpedance = EnoughRatio / loading.Ratio;
        var byLoss = (loading.CoreDissipation.PowerRatio - 1) / (EnoughLoss.PowerRatio - 1);
        return Math.Max(turns, (int)Math.Ceiling((turns * Math.Sqrt(Math.Max(byImpedance, byLoss))) - 1e-9));
    }
}
