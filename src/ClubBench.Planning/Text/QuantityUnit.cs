using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Text;

/// <summary>A unit people read or type. Its SI value is <c>Times</c> x 10^<c>Exponent</c>.</summary>
/// <param name="Symbol">As written.</param>
/// <param name="Exponent">Power of ten.</param>
/// <param name="From">Smallest SI magnitude written in this unit; null where it is understood but never written.</param>
/// <param name="Spellings">Further spellings that are understood, letters only (micro is u, the ohm sign ohm, the degree sign deg).</param>
/// <param name="Times">Factor beside the power of ten, 1 for nearly all.</param>
public sealed record QuantityUnit(string Symbol, int Exponent, double? From, IReadOnlyList<string> Spellings, double Times = 1)
{
    /// <summary>SI magnitude below which this unit is written; zero keeps the unit of larger values.</summary>
    public double Below { get; init; }

    /// <summary>SI value of one of this unit.</summary>
    public double Si => Times * Math.Pow(10, Exponent);

    internal bool IsSpelt(string unit) => Spellings.Any(s => Matches(unit, s));

    // Case is forgiven except where it tells milli from mega.
    private static bool Matches(string typed, string spelling) =>
        string.Equals(typed, spelling, StringComparison.OrdinalIgnoreCase) && !(typed[0] == 'M' && spelling[0] == 'm');
}

/// <summary>The units of every kind of quantity, smallest first. The trade's own: MHz, uH, pF, dBm.</summary>
public static class QuantityUnits
{
    private static readonly Dictionary<QuantityKind, QuantityUnit[]> ByKind = new()
    {
        [QuantityKind.Number] = [Unit("", 0, 0)],
        [QuantityKind.Count] = [Unit("", 0, 0, "t", "turn", "turns", "pcs")],
        [QuantityKind.Ratio] = [Unit("%", -2, 0), Unit("ppm", -6, null)],
        [QuantityKind.Frequency] = [Unit("Hz", 0, 0), Unit("kHz", 3, 1e3, "k"), Unit("MHz", 6, 1e6, "M"), Unit("GHz", 9, 1e9)],
        [QuantityKind.FrequencyShift] = [Unit("Hz", 0, 0), Unit("kHz", 3, 1e3, "k"), Unit("MHz", 6, 1e6, "M")],
        [QuantityKind.Inductance] = [Unit("nH", -9, 0), Unit("µH", -6, 1e-7), Unit("mH", -3, 1e-3), Unit("H", 0, 1)],
        [QuantityKind.Capacitance] = [Unit("fF", -15, null) with { Below = 1e-13 }, Unit("pF", -12, 0), Unit("nF", -9, 1e-9), Unit("µF", -6, 1e-6), Unit("mF", -3, null)],
        [QuantityKind.Resistance] = [Unit("mΩ", -3, 0), Unit("Ω", 0, 0.1), Unit("kΩ", 3, 1e3), Unit("MΩ", 6, 1e6)],
        [QuantityKind.Voltage] = [Unit("µV", -6, 0), Unit("mV", -3, 1e-3), Unit("V", 0, 1)],
        [QuantityKind.PeakToPeakVoltage] = [Unit("mV p-p", -3, 0, "mVpp", "mV"), Unit("V p-p", 0, 1, "Vpp", "V")],
        [QuantityKind.Current] = [Unit("µA", -6, 0), Unit("mA", -3, 1e-3), Unit("A", 0, 1)],
        [QuantityKind.Power] = [Unit("µW", -6, 0), Unit("mW", -3, 1e-3), Unit("W", 0, 1)],
        [QuantityKind.PowerLevel] = [Unit("dBm", 0, 0)],
        [QuantityKind.Decibels] = [Unit("dB", 0, 0)],
        [QuantityKind.RelativeLevel] = [Unit("dBc", 0, 0, "dB")],
        [QuantityKind.Temperature] = [Unit("°C", 0, 0, "C")],
        [QuantityKind.TemperatureRise] = [Unit("K", 0, 0, "degC", "C")],
        [QuantityKind.Length] = [Unit("µm", -6, null), Unit("mm", -3, 0), Unit("cm", -2, null), Unit("in", 0, null, "inch") with { Times = 0.0254 }, Unit("m", 0, 1)],
        [QuantityKind.Duration] = [Unit("ns", -9, 0), Unit("µs", -6, 1e-6), Unit("ms", -3, 1e-3), Unit("s", 0, 1), Unit("min", 0, null) with { Times = 60 }],
        [QuantityKind.FluxDensity] = [Unit("µT", -6, 0), Unit("G", -4, null, "gauss"), Unit("mT", -3, 1e-3), Unit("T", 0, 1)],
        [QuantityKind.InductanceFactor] = [Unit("nH/turn²", -9, 0, "nH/t2", "nH/N2", "nH"), Unit("µH/100 turns", -10, null, "uH/100t")],
        [QuantityKind.Angle] = [Unit("°", 0, 0)],
    };

    /// <summary>Units of a kind, smallest first.</summary>
    public static IReadOnlyList<QuantityUnit> Of(QuantityKind kind) => ByKind[kind];

    internal static QuantityUnit? Find(QuantityKind kind, string unit) =>
        unit.Length == 0 ? null : ByKind[kind].FirstOrDefault(u => u.IsSpelt(unit));

    /// <summary>The unit a value is written in.</summary>
    internal static QuantityUnit For(QuantityKind kind, double si) => 
        ByKind[kind].FirstOrDefault(u => si != 0 && Math.Abs(si) < u.Below) ?? ByKind[kind].Last(u => u.From is { } from && Math.Abs(si) >= from);

    private static QuantityUnit Unit(string symbol, int exponent, double? from, params string[] spellings) =>
        new(symbol, exponent, from, [QuantityText.Plain(symbol), .. spellings]);
}
