using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Crystals;

/// <summary>A figure with its usual spread.</summary>
/// <param name="Low">Low end.</param>
/// <param name="Usual">Value to start from.</param>
/// <param name="High">High end.</param>
public sealed record Spread<T>(T Low, T Usual, T High);

/// <summary>
/// What crystals of a holder, overtone and frequency usually are. A starting value only: mark what is computed from it. The ends are spreads of
/// their own; never pair the largest Cm with the smallest C0.
/// </summary>
/// <param name="Holder">Holder, "HC-49/U" or the low "HC-49/S", which pulls two to three times less.</param>
/// <param name="Overtone">1 for the fundamental, 3 or 5.</param>
/// <param name="Frequency">Frequency the row is for.</param>
/// <param name="MotionalCapacitance">Cm.</param>
/// <param name="StaticCapacitance">C0.</param>
/// <param name="MotionalResistance">Rm.</param>
/// <param name="Source">Where the row comes from.</param>
/// <param name="Note">Remark; may be empty.</param>
public sealed record TypicalCrystal(
    string Holder,
    int Overtone,
    Frequency Frequency,
    Spread<Capacitance> MotionalCapacitance,
    Spread<Capacitance> StaticCapacitance,
    Spread<Resistance> MotionalResistance,
    SourceRef Source,
    string Note)
{
    /// <summary>A crystal of usual figures that is marked for a load.</summary>
    public CrystalParameters Marked(Frequency marked, Capacitance load) =>
        CrystalParameters.FromMarkedFrequency(marked, load, MotionalCapacitance.Usual, StaticCapacitance.Usual, MotionalResistance.Usual) with { Overtone = Overtone };
}

/// <summary>Typical crystals from <c>Tables/crystals-typical.csv</c>. Immutable, thread safe.</summary>
public static class TypicalCrystals
{
    /// <summary>Every row, by holder, overtone and frequency.</summary>
    public static IReadOnlyList<TypicalCrystal> All { get; } = CsvTable.Read("crystals-typical", Row);

    /// <summary>The row nearest in frequency (by ratio) for a holder and overtone, or null when the table has none of that kind.</summary>
    public static TypicalCrystal? Nearest(Frequency frequency, string holder = "HC-49/U", int overtone = 1) => All
        .Where(c => c.Holder == holder && c.Overtone == overtone)
        .MinBy(c => Math.Abs(Math.Log(c.Frequency / frequency)));

    private static TypicalCrystal Row(CsvRow r) => new(
        r.Text("holder"),
        (int)r.Number("overtone"),
        Frequency.FromMegahertz(r.Number("f_mhz")),
        Three(r, "cm_ff", ff => Capacitance.FromFarad(ff * 1e-15)),
        Three(r, "c0_pf", Capacitance.FromPicofarad),
        Three(r, "rm_ohm", Resistance.FromOhm),
        r.Source(),
        r.Text("note"));

    private static Spread<T> Three<T>(CsvRow r, string column, Func<double, T> from) =>
        new(from(r.Number(column + "_min")), from(r.Number(column + "_typ")), from(r.Number(column + "_max")));
}
