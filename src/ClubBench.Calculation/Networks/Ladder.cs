using System.Collections.Immutable;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Networks;

/// <summary>One frequency of a sweep.</summary>
/// <param name="Frequency">Where.</param>
/// <param name="Loss">Transducer loss, positive.</param>
/// <param name="ReturnLoss">Return loss at the input, positive.</param>
public sealed record LadderPoint(Frequency Frequency, Decibels Loss, Decibels ReturnLoss);

/// <summary>A ladder network from source to load. Immutable, thread safe.</summary>
/// <remarks>
/// Method: product of the chain matrices of the arms.
/// Valid: lumped parts, frequency above zero; exact within the loss model of <see cref="LadderElement"/>.
/// Source: pozar-microwave, chain matrix.
/// </remarks>
public sealed class Ladder
{
    /// <summary>Loss that defines the cut-off: half the power.</summary>
    public static readonly Decibels HalfPower = Decibels.FromPowerRatio(2);

    /// <summary>A ladder of at least one arm, listed from source to load.</summary>
    public Ladder(IEnumerable<LadderElement> elements)
    {
        Elements = [.. elements];
        if (Elements.IsEmpty) throw new ArgumentException("A ladder needs at least one arm.", nameof(elements));
    }

    /// <summary>The arms from source to load.</summary>
    public ImmutableArray<LadderElement> Elements { get; }

    /// <summary>The ladder as a two-port at one frequency.</summary>
    public TwoPort At(Frequency f)
    {
        var chain = TwoPort.Through;
        foreach (var element in Elements) chain = chain.Then(element.At(f));
        return chain;
    }

    /// <summary>The same ladder with the inductance of leads and pads in every capacitor to ground: about 0.8 to 1 nH per millimetre, 5 to 8 nH for a leaded part.</summary>
    /// <remarks>Method: the capacitor becomes a series trap, lossless leads. Source: common practice.</remarks>
    public Ladder WithLeads(Inductance perCapacitor) => new(Elements.Select(e => e.WithLead(perCapacitor)));

    /// <summary>The same ladder with other unloaded Q, above zero; none given means lossless.</summary>
    public Ladder WithQ(double? coilQ, double? capacitorQ) => new(Elements.Select(e => e.WithQ(coilQ, capacitorQ)));

    /// <summary>Transducer loss, positive: what reaches the load against what the source could give.</summary>
    public Decibels Loss(Frequency f, Resistance source, Resistance load) => At(f).Loss(source, load);

    /// <summary>Return loss at the input, positive.</summary>
    public Decibels ReturnLoss(Frequency f, Resistance source, Resistance load) => At(f).ReturnLoss(source, load);

    /// <summary>Smallest return loss over evenly spaced frequencies of a band, ends included.</summary>
    public Decibels WorstReturnLoss(FrequencyRange band, Resistance source, Resistance load, int points = 17) =>
        band.Points(points).Min(f => ReturnLoss(f, source, load));

    /// <summary>Loss and return loss, one point per frequency, same order.</summary>
    public IReadOnlyList<LadderPoint> Sweep(IEnumerable<Frequency> frequencies, Resistance source, Resistance load) =>
        [.. frequencies.Select(f => Point(f, At(f), source, load))];

    /// <summary>First frequency above a pass-band frequency that passes half the power of it; null where none is found up to 100 times it, or where the given frequency is no pass-band because it loses half the power itself.</summary>
    /// <remarks>Method: steps of 1 % upwards, then bisection to 1e-9 of the frequency.</remarks>
    public Frequency? CutOff3dB(Frequency passBand, Resistance source, Resistance load)
    {
        var passed = Loss(passBand, source, load);
        if (passed >= HalfPower) return null;
        var low = passBand;
        for (var high = low * 1.01; high < passBand * 100; (low, high) = (high, high * 1.01))
            if (Loss(high, source, load) >= passed + HalfPower) return Bisect(low, high, f => Loss(f, source, load) < passed + HalfPower);
        return null;
    }

    private static LadderPoint Point(Frequency f, TwoPort chain, Resistance source, Resistance load) =>
        new(f, chain.Loss(source, load), chain.ReturnLoss(source, load));

    private static Frequency Bisect(Frequency low, Frequency high, Func<Frequency, bool> passes)
    {
        while (high / low > 1 + 1e-9)
        {
            var middle = Frequency.FromHertz(0.5 * (low.Hertz + high.Hertz));
            (low, high) = passes(middle) ? (middle, high) : (low, middle);
        }

        return low;
    }
}
