using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Crystals;

/// <summary>
/// A crystal or ceramic resonator as its equivalent circuit: a series arm Lm-Cm-Rm with C0 across it. Immutable.
/// Method: Butterworth-Van Dyke equivalent circuit. Valid: near one resonance; other modes of the plate are left out.
/// Source: iec-60122-1 (names of the four elements), from memory; the formulas are derived.
/// </summary>
/// <param name="SeriesResonance">Resonance of the motional arm, fs.</param>
/// <param name="MotionalCapacitance">Cm, above zero; some 10..30 fF for a quartz fundamental.</param>
/// <param name="StaticCapacitance">C0 with its holder, above zero.</param>
/// <param name="MotionalResistance">Rm; zero means not stated, and then nothing that depends on loss is given.</param>
public sealed partial record CrystalParameters(
    Frequency SeriesResonance, Capacitance MotionalCapacitance, Capacitance StaticCapacitance, Resistance MotionalResistance)
{
    /// <summary>C0/Cm of a bare AT plate on its fundamental, (pi/(2 k))^2/2 with coupling k = 0.088, rounded down. Source: vig-quartz-tutorial.</summary>
    public const double LowestQuartzRatio = 150;

    /// <summary>Cm, above zero.</summary>
    public Capacitance MotionalCapacitance { get; init; } = AboveZero(MotionalCapacitance, nameof(MotionalCapacitance));

    /// <summary>C0, above zero.</summary>
    public Capacitance StaticCapacitance { get; init; } = AboveZero(StaticCapacitance, nameof(StaticCapacitance));

    /// <summary>Quartz unless said otherwise.</summary>
    public ResonatorKind Kind { get; init; } = ResonatorKind.Quartz;

    /// <summary>Overtone the crystal works on: 1 for the fundamental, 3, 5, ...</summary>
    public int Overtone { get; init; } = 1;

    /// <summary>Lm = 1/(ws^2 Cm).</summary>
    public Inductance MotionalInductance =>
        Inductance.FromHenry(1 / (Squared(SeriesResonance.RadiansPerSecond) * MotionalCapacitance.Farad));

    /// <summary>Antiresonance without loss, fp = fs sqrt(1 + Cm/C0).</summary>
    public Frequency ParallelResonance => SeriesResonance * Math.Sqrt(1 + (MotionalCapacitance / StaticCapacitance));

    /// <summary>Ratio C0/Cm; about 200..300 for a quartz fundamental.</summary>
    public double CapacitanceRatio => StaticCapacitance / MotionalCapacitance;

    /// <summary>Unloaded Q = 1/(ws Cm Rm), or null while Rm is not stated.</summary>
    public double? UnloadedQ => MotionalResistance.Ohm > 0
        ? 1 / (SeriesResonance.RadiansPerSecond * MotionalCapacitance.Farad * MotionalResistance.Ohm)
        : null;

    /// <summary>Figure of merit M = Q Cm/C0, or null while Rm is not stated; below 2 the crystal is nowhere inductive.</summary>
    public double? FigureOfMerit => UnloadedQ / CapacitanceRatio;

    /// <summary>
    /// The crystal behind a frequency marked for a load capacitance. <paramref name="marked"/> is what the can says;
    /// <paramref name="load"/> the load it is meant for (30 pF is usual). The result holds the lower series resonance.
    /// Method: fs = fL/sqrt(1 + Cm/(C0 + CL)), exact without loss. Source: iec-60444-4 (load concept, from memory), formula derived.
    /// </summary>
    public static CrystalParameters FromMarkedFrequency(
        Frequency marked, Capacitance load, Capacitance motional, Capacitance shunt, Resistance loss) =>
        new(marked / Pulling(motional, shunt + load), motional, shunt, loss);

    /// <summary>
    /// Frequency with a load capacitance across the crystal, fs sqrt(1 + Cm/(C0 + CL)); exact without loss. Zero load gives fp.
    /// Net inductive loads belong to the oscillator loop, which knows its coil.
    /// </summary>
    public Frequency LoadedFrequency(Capacitance load) => SeriesResonance * Pulling(MotionalCapacitance, StaticCapacitance + load);

    /// <summary>Slope of the loaded frequency in Hz/pF, negative: more load, lower frequency.</summary>
    public double LoadedSlopeHertzPerPicofarad(Capacitance load)
    {
        var total = (StaticCapacitance + load).Farad;
        var perFarad = -Squared(SeriesResonance.Hertz) * MotionalCapacitance.Farad / (2 * LoadedFrequency(load).Hertz * total * total);
        return perFarad * 1e-12;
    }

    /// <summary>Series resistance seen with a load capacitance, Rm (1 + C0/CL)^2. The load must be above zero.</summary>
    public Resistance EffectiveResistance(Capacitance load) =>
        MotionalResistance * Squared(1 + (StaticCapacitance / AboveZero(load, nameof(load))));

    /// <summary>Everything wrong or unusual about these parameters; empty for an ordinary crystal.</summary>
    public IReadOnlyList<CrystalIssue> Issues()
    {
        var issues = new List<CrystalIssue>();
        if (FigureOfMerit < 2) issues.Add(CrystalIssue.NeverInductive);
        if (Kind == ResonatorKind.Quartz && CapacitanceRatio < LowestQuartzRatio * Overtone * Overtone) issues.Add(CrystalIssue.RatioBelowQuartzLimit);
        if (Kind == ResonatorKind.Quartz && UnloadedQ is < 5_000 or > 300_000) issues.Add(CrystalIssue.UnusualQ);
        return issues;
    }

    /// <summary>
    /// The same plate on its n-th overtone: about n times the frequency, Cm/n^2, C0 and Lm unchanged; pulls n^2 times less.
    /// <paramref name="overtone"/> is odd, 3 or above. Source: derived.
    /// </summary>
    public CrystalParameters OnOvertone(int overtone)
    {
        if (overtone < 3 || overtone % 2 == 0) throw new ArgumentOutOfRangeException(nameof(overtone), overtone, "An overtone is an odd number from 3 on.");
        return this with
        {
            SeriesResonance = SeriesResonance * overtone,
            MotionalCapacitance = MotionalCapacitance / (overtone * overtone),
            Overtone = overtone,
        };
    }

    private static double Pulling(Capacitance motional, Capacitance shunt) => Math.Sqrt(1 + (motional / shunt));

    private static double Squared(double x) => x * x;

    private static Capacitance AboveZero(Capacitance c, string name) => Capacitance.FromFarad(Guard.Positive(c.Farad, name));
}
