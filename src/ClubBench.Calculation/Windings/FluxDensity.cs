using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Windings;

/// <summary>Judgement of a core's load.</summary>
public enum CoreLoad
{
    /// <summary>Inside the guide value.</summary>
    Good,

    /// <summary>Beyond it: measure or feel after a minute of key-down, power off first: cores and wire may be hot enough to burn.</summary>
    Check,

    /// <summary>Far beyond it: a larger core or more turns.</summary>
    Refuse,
}

/// <summary>Flux in a core from alternating voltage and from direct current.</summary>
public static class FluxDensity
{
    private const double BiasToCheck = 0.20;
    private const double BiasToRefuse = 0.50;

    private static readonly IReadOnlyList<(double Mhz, double Gauss)> Guide =
        CsvTable.Read("flux-guide", r => (r.Number("frequency_mhz"), r.Number("limit_gauss")));

    private static readonly Dictionary<string, double> SaturationGauss =
        CsvTable.Read("ferrite-saturation", r => (Mix: r.Text("mix"), Gauss: r.Number("saturation_gauss"))).ToDictionary(r => r.Mix, r => r.Gauss, StringComparer.Ordinal);

    /// <summary>
    /// Peak alternating flux density of a winding: sqrt(2) E/(2 pi f N A). The voltage is the one across this winding: sqrt(P Rp) on a resonant
    /// circuit, I X on the series coil of a filter, sqrt(P R) on a transformer. Source: derived (law of induction).
    /// </summary>
    /// <param name="rms">RMS voltage across the winding, zero or above.</param>
    /// <param name="frequency">Frequency.</param>
    /// <param name="turns">Turns, one or more.</param>
    /// <param name="area">Effective cross section.</param>
    public static MagneticFluxDensity Alternating(Voltage rms, Frequency frequency, int turns, Area area) =>
        MagneticFluxDensity.FromTesla(
            Math.Sqrt(2) * Guard.NotNegative(rms.Volt, nameof(rms)) / (frequency.RadiansPerSecond * Guard.Within(turns, 1, 10_000, nameof(turns)) * area.SquareMetre));

    /// <summary>
    /// Guide value of alternating flux density, a heating rule for powder and ferrite alike. Method: log-log between the listed points, root of
    /// frequency above the last, the first value below it. Source: flux-guide, from memory.
    /// </summary>
    public static MagneticFluxDensity GuideLimit(Frequency frequency)
    {
        var mhz = frequency.Megahertz;
        if (mhz <= Guide[0].Mhz) return MagneticFluxDensity.FromGauss(Guide[0].Gauss);
        if (mhz >= Guide[^1].Mhz) return MagneticFluxDensity.FromGauss(Guide[^1].Gauss * Math.Sqrt(Guide[^1].Mhz / mhz));
        var i = 1;
        while (Guide[i].Mhz < mhz) i++;
        var ((f1, g1), (f2, g2)) = (Guide[i - 1], Guide[i]);
        return MagneticFluxDensity.FromGauss(g1 * Math.Pow(g2 / g1, Math.Log(mhz / f1) / Math.Log(f2 / f1)));
    }

    /// <summary>Up to the guide value good, up to twice check, beyond refuse. Source: common practice.</summary>
    public static CoreLoad Judge(MagneticFluxDensity alternating, Frequency frequency) => (alternating / GuideLimit(frequency)) switch
    {
        <= 1 => CoreLoad.Good,
        <= 2 => CoreLoad.Check,
        _ => CoreLoad.Refuse,
    };

    /// <summary>Flux density that a direct current sets up: mu0 mu_i N I/l, of the sum of all windings with sign. Source: derived.</summary>
    public static MagneticFluxDensity Bias(ToroidCore core, int turns, Current direct) =>
        MagneticFluxDensity.FromTesla(Copper.VacuumPermeability * core.InitialPermeability * turns * Math.Abs(direct.Ampere) / core.PathLength.Metre);

    /// <summary>Saturation flux density of a ferrite mix at room temperature, or null where none is listed. Source: table ferrite-saturation.</summary>
    public static MagneticFluxDensity? Saturation(string mix) =>
        SaturationGauss.TryGetValue(mix, out var gauss) ? MagneticFluxDensity.FromGauss(gauss) : null;

    /// <summary>Share of saturation that a direct current takes (0.26 = 26 %), or null for a mix without a listed value.</summary>
    public static double? BiasShare(ToroidCore core, int turns, Current direct) =>
        Saturation(core.Mix) is { } saturation ? Bias(core, turns, direct) / saturation : null;

    /// <summary>Below 20 % of saturation good, from 20 % check, from 50 % refuse. Source: common practice.</summary>
    public static CoreLoad JudgeBias(double shareOfSaturation) => shareOfSaturation switch
    {
        < BiasToCheck => CoreLoad.Good,
        < BiasToRefuse => CoreLoad.Check,
        _ => CoreLoad.Refuse,
    };

    /// <summary>Temperature rise of a powder core in still air: (P[mW]/A[cm2])^0.833 kelvin. Source: iron-powder-catalogue, from memory.</summary>
    public static TemperatureRise TemperatureRise(ToroidCore core, Power dissipated) =>
        Quantities.TemperatureRise.FromKelvin(Math.Pow(dissipated.Milliwatt / Surface(core).SquareCentimetre, 0.833));

    /// <summary>Outer surface of a ring: both faces, outer and inner wall.</summary>
    public static Area Surface(ToroidCore core)
    {
        var (od, id, h) = (core.OuterDiameter.Metre, core.InnerDiameter.Metre, core.Height.Metre);
        return Area.FromSquareMetre((Math.PI / 2 * ((od * od) - (id * id))) + (Math.PI * h * (od + id)));
    }
}
