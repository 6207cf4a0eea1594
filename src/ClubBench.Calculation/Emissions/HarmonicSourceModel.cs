using System.Numerics;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Emissions;

/// <summary>What a stage looks like to its filter at the harmonics.</summary>
public enum HarmonicSourceModel
{
    /// <summary>The design resistance: the raw level is one of available power.</summary>
    Matched,

    /// <summary>A current source: the raw level is one of current at the filter input.</summary>
    Current,

    /// <summary>A voltage source: the raw level is one of voltage at the filter input.</summary>
    Voltage,
}

/// <summary>How much a filter takes off a harmonic, more than off the carrier, under different models of the stage driving it.</summary>
public static class HarmonicSuppression
{
    /// <summary>Suppression of a harmonic under one model, positive; at most 300 dB.</summary>
    /// <remarks>Method: ratio of the chain matrix transfers at harmonic and carrier. Valid: lumped ladder, real terminations. Source: derived.</remarks>
    public static Decibels Of(Ladder filter, Frequency carrier, int harmonic, Resistance source, Resistance load, HarmonicSourceModel model)
    {
        Guard.Within(harmonic, 2, 100, nameof(harmonic));
        var (fundamental, wanted) = (filter.At(carrier), filter.At(carrier.Harmonic(harmonic)));
        var ratio = Transfer(wanted, source, load, model) / Transfer(fundamental, source, load, model);
        return Decibels.FromAmplitudeRatio(1 / Math.Max(ratio, 1e-15));
    }

    /// <summary>Smallest and largest suppression under the three models: the span a stage of unknown impedance may land in.</summary>
    public static (Decibels Least, Decibels Most) Span(Ladder filter, Frequency carrier, int harmonic, Resistance source, Resistance load)
    {
        var all = Enum.GetValues<HarmonicSourceModel>().Select(m => Of(filter, carrier, harmonic, source, load, m)).Order().ToList();
        return (all[0], all[^1]);
    }

    private static double Transfer(TwoPort chain, Resistance source, Resistance load, HarmonicSourceModel model) => model switch
    {
        HarmonicSourceModel.Current => (1 / ((chain.C * load.Ohm) + chain.D)).Magnitude,
        HarmonicSourceModel.Voltage => (1 / (chain.A + (chain.B / load.Ohm))).Magnitude,
        _ => Complex.Abs(chain.S21(source, load)),
    };
}
