using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Amplifiers;

/// <summary>A low-pass network that makes one resistance look like another at one frequency. Immutable.</summary>
/// <remarks>
/// Method: L sections back to back over a virtual resistance.
/// Valid: real resistances; a device's own capacitance is taken off the outer capacitor of a pi.
/// Source: pozar-microwave, lumped matching sections.
/// </remarks>
/// <param name="Ladder">The network from source to load, lossless.</param>
/// <param name="Source">Resistance on the source side.</param>
/// <param name="Load">Resistance on the load side.</param>
/// <param name="Frequency">Where it matches.</param>
/// <param name="SourceQ">Q of the section on the source side.</param>
/// <param name="LoadQ">Q of the section on the load side; equal to the other for a single L.</param>
public sealed record MatchingNetwork(Ladder Ladder, Resistance Source, Resistance Load, Frequency Frequency, double SourceQ, double LoadQ)
{
    /// <summary>Loss to expect of coils with an unloaded Q, an estimate good to about a tenth of its value.</summary>
    public Decibels EstimatedLoss(double coilQ) =>
        Decibels.FromDb(10 / Math.Log(10) * (Ladder.Elements.Length == 2 ? SourceQ : SourceQ + LoadQ) / Guard.Positive(coilQ, nameof(coilQ)));

    /// <summary>Smallest Q of a pi from the larger to the smaller resistance, or of a T the other way round.</summary>
    public static double SmallestQ(Resistance a, Resistance b) => Math.Sqrt((Math.Max(a.Ohm, b.Ohm) / Math.Min(a.Ohm, b.Ohm)) - 1);

    /// <summary>Series coil and shunt capacitor, the capacitor on the side of the larger resistance. The resistances must differ.</summary>
    public static MatchingNetwork L(Resistance source, Resistance load, Frequency f)
    {
        var (low, high) = (Math.Min(source.Ohm, load.Ohm), Math.Max(source.Ohm, load.Ohm));
        var q = Guard.Positive(SmallestQ(source, load), nameof(load));
        var (coil, capacitor) = (Coil(q * low, f), Capacitor(high / q, f));
        return new MatchingNetwork(new Ladder(source.Ohm < load.Ohm ? [coil, capacitor] : [capacitor, coil]), source, load, f, q, q);
    }

    /// <summary>Capacitor, coil, capacitor from a larger (or equal) to a smaller resistance; false where the Q is below <see cref="SmallestQ"/>.</summary>
    /// <param name="source">The larger resistance.</param>
    /// <param name="load">The smaller resistance.</param>
    /// <param name="f">Where it matches.</param>
    /// <param name="q">Q of the source side, above zero.</param>
    /// <param name="network">The network; null when false.</param>
    public static bool TryPi(Resistance source, Resistance load, Frequency f, double q, out MatchingNetwork? network)
    {
        if (source < load) throw new ArgumentException("A pi is given its larger resistance first.", nameof(source));
        var virtualOhm = source.Ohm / ((Guard.Positive(q, nameof(q)) * q) + 1);
        network = null;
        if (virtualOhm >= load.Ohm) return false;
        var loadQ = Math.Sqrt((load.Ohm / virtualOhm) - 1);
        var ladder = new Ladder([Capacitor(source.Ohm / q, f), Coil((q + loadQ) * virtualOhm, f), Capacitor(load.Ohm / loadQ, f)]);
        network = new MatchingNetwork(ladder, source, load, f, q, loadQ);
        return true;
    }

    /// <summary>Coil, capacitor, coil from a smaller (or equal) to a larger resistance; false where the Q is below <see cref="SmallestQ"/>.</summary>
    /// <param name="source">The smaller resistance.</param>
    /// <param name="load">The larger resistance.</param>
    /// <param name="f">Where it matches.</param>
    /// <param name="q">Q of the source side, above zero.</param>
    /// <param name="network">The network; null when false.</param>
    public static bool TryTee(Resistance source, Resistance load, Frequency f, double q, out MatchingNetwork? network)
    {
        if (source > load) throw new ArgumentException("A T is given its smaller resistance first.", nameof(source));
        var virtualOhm = source.Ohm * ((Guard.Positive(q, nameof(q)) * q) + 1);
        network = null;
        if (virtualOhm <= load.Ohm) return false;
        var loadQ = Math.Sqrt((virtualOhm / load.Ohm) - 1);
        var ladder = new Ladder([Coil(q * source.Ohm, f), Capacitor(virtualOhm / (q + loadQ), f), Coil(loadQ * load.Ohm, f)]);
        network = new MatchingNetwork(ladder, source, load, f, q, loadQ);
        return true;
    }

    private static LadderElement Coil(double ohm, Frequency f) => LadderElement.SeriesInductor(Inductance.FromHenry(ohm / f.RadiansPerSecond));

    private static LadderElement Capacitor(double ohm, Frequency f) => LadderElement.ShuntCapacitor(Capacitance.FromFarad(1 / (ohm * f.RadiansPerSecond)));
}
