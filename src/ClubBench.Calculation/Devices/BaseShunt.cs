using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Devices;

/// <summary>Base shunt that gives a stage a wanted gain, or how much is missing. Immutable.</summary>
/// <param name="Value">The resistor; null where even none does not reach the gain, or where 1 ohm still gives more.</param>
/// <param name="Gain">Gain with it; with no resistor, or with 1 ohm, where there is none.</param>
/// <param name="Missing">Wanted gain less reached gain; zero when solved, below zero when the stage cannot be tamed this way.</param>
public sealed record BaseShunt(Resistance? Value, Decibels Gain, Decibels Missing)
{
    private const double LowestOhm = 1;
    private const double HighestOhm = 1e5;

    /// <summary>Solves for the resistor from base to ground.</summary>
    /// <remarks>
    /// Method: bisection on the logarithm of the resistance between 1 ohm and 100 kohm; the gain rises with it.
    /// Valid: as <see cref="HybridPi"/>; never above what a class C base needs as its return for direct current.
    /// Source: derived.
    /// </remarks>
    /// <param name="model">The transistor.</param>
    /// <param name="f">Operating frequency.</param>
    /// <param name="source">Driving resistance.</param>
    /// <param name="load">Collector load.</param>
    /// <param name="wanted">Wanted transducer gain.</param>
    /// <param name="around">Other resistors around the transistor; its base shunt is replaced.</param>
    public static BaseShunt For(HybridPi model, Frequency f, Resistance source, Resistance load, Decibels wanted, StageResistors? around = null)
    {
        var others = around ?? StageResistors.None;
        var (most, least) = (GainWith(null), GainWith(Resistance.FromOhm(LowestOhm)));
        if (most < wanted) return new BaseShunt(null, most, wanted - most);
        if (least > wanted) return new BaseShunt(null, least, wanted - least);
        var found = Bisect(r => GainWith(r) < wanted);
        return new BaseShunt(found, GainWith(found), Decibels.Zero);

        Decibels GainWith(Resistance? shunt) => model.At(f, others with { BaseShunt = shunt }).TransducerGain(source, load);
    }

    private static Resistance Bisect(Func<Resistance, bool> tooLow)
    {
        var (low, high) = (Math.Log(LowestOhm), Math.Log(HighestOhm));
        while (high - low > 1e-10)
        {
            var middle = 0.5 * (low + high);
            (low, high) = tooLow(Resistance.FromOhm(Math.Exp(middle))) ? (middle, high) : (low, middle);
        }

        return Resistance.FromOhm(Math.Exp(low));
    }
}
