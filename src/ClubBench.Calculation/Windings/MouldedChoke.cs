using ClubBench.Calculation.Components;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Windings;

/// <summary>What a moulded choke is used for.</summary>
public enum ChokeUse
{
    /// <summary>Part of a tuned circuit: self-resonance three times the frequency or more.</summary>
    Resonator,

    /// <summary>Blocks radio frequency: self-resonance one and a half times the frequency or more.</summary>
    Choke,
}

/// <summary>Small moulded chokes as bought. Measure before relying on them in a tuned circuit: Q is 30 to 60. Source: common practice.</summary>
public static class MouldedChoke
{
    private static readonly IReadOnlyList<(double Microhenry, double Mhz)> Typical =
        CsvTable.Read("moulded-choke-self-resonance", r => (r.Number("inductance_uh"), r.Number("self_resonance_mhz")));

    /// <summary>Planning value of Q with its range, 30 to 60.</summary>
    public static CoilQ Quality { get; } = new(Math.Sqrt(30.0 * 60.0), Math.Sqrt(2), SourceRef.CommonPractice("small moulded chokes"));

    /// <summary>The inductance that can be bought: nearest member of E12.</summary>
    public static Inductance Nearest(Inductance wanted) => Inductance.FromHenry(PreferredValues.Nearest(wanted.Henry, ESeries.E12));

    /// <summary>
    /// Typical self-resonance of a small axial choke; null outside 1 uH to 1 mH. Method: log-log between listed values. Source: table
    /// moulded-choke-self-resonance, from memory.
    /// </summary>
    public static Frequency? TypicalSelfResonance(Inductance inductance)
    {
        // 1 mH counted in microhenry is 1000 but for the last bit.
        var uh = Math.Round(inductance.Microhenry, 6);
        if (uh < Typical[0].Microhenry || uh > Typical[^1].Microhenry) return null;
        var i = 1;
        while (Typical[i].Microhenry < uh) i++;
        var ((l1, f1), (l2, f2)) = (Typical[i - 1], Typical[i]);
        return Frequency.FromMegahertz(f1 * Math.Pow(f2 / f1, Math.Log(uh / l1) / Math.Log(l2 / l1)));
    }

    /// <summary>Whether a self-resonance leaves enough room for a use at a frequency.</summary>
    public static bool Serves(Frequency selfResonance, Frequency frequency, ChokeUse use) =>
        selfResonance / frequency >= (use == ChokeUse.Resonator ? 3 : 1.5);
}
