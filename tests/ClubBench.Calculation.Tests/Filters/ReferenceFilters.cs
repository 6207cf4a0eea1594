using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Filters;

/// <summary>Filters that several tests share. Values in pF and uH, 50 ohm.</summary>
internal static class ReferenceFilters
{
    public static readonly Resistance FiftyOhm = Resistance.FromOhm(50);

    /// <summary>Chebyshev 5, 20 dB return loss, edge 8.0 MHz: exact values.</summary>
    public static LowPassDesign F7 => LowPassPrototype.Chebyshev(5, PassBandRipple.FromReflection(0.1)).Denormalise(Frequency.FromMegahertz(8.0), FiftyOhm);

    /// <summary>Chebyshev 7, 0.01 dB ripple, edge 15.5 MHz: exact values.</summary>
    public static LowPassDesign F14 => LowPassPrototype.Chebyshev(7, PassBandRipple.FromRipple(Decibels.FromDb(0.01))).Denormalise(Frequency.FromMegahertz(15.5), FiftyOhm);

    /// <summary>Kit A on 30 m.</summary>
    public static LowPassDesign Seven30 => Of([270, 510, 510, 270], [0.900, 1.024, 0.900]);

    /// <summary>Kit A converted to 20 m.</summary>
    public static LowPassDesign Seven20 => Of([200, 360, 360, 200], [0.675, 0.768, 0.675]);

    /// <summary>Kit A converted to 40 m.</summary>
    public static LowPassDesign Seven40 => Of([390, 750, 750, 390], [1.254, 1.416, 1.254]);

    public static LowPassDesign Of(double[] picofarad, double[] microhenry) => new(
        LowPassForm.ShuntCapacitorFirst,
        [.. picofarad.Select(Capacitance.FromPicofarad)],
        [.. microhenry.Select(Inductance.FromMicrohenry)],
        FiftyOhm,
        FiftyOhm);
}
