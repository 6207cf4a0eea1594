using System.Numerics;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Crystals;

// What follows from the impedance of the equivalent circuit. Source: derived.
public sealed partial record CrystalParameters
{
    private const double LeastNetInMotional = 10;

    /// <summary>Impedance in ohm at a frequency, C0 across the motional arm. A crystal that states no resistance has a pole at fp: a milliohm stands in for it.</summary>
    public Complex Impedance(Frequency f)
    {
        var motional = new Complex(Math.Max(MotionalResistance.Ohm, 1e-3), MotionalReactanceOhm(f));
        return 1 / ((1 / motional) + new Complex(0, f.RadiansPerSecond * StaticCapacitance.Farad));
    }

    /// <summary>
    /// Frequency at which the crystal is a pure resistance near series resonance: what a pi-network in phase measures, fs/(2 Q M) above fs to first
    /// order. Null where the crystal states no resistance, is nowhere inductive, or is so lossy that there is none below fp. Method: exact zero of the reactance, C0 taken at the result.
    /// </summary>
    public Frequency? ZeroPhaseResonance
    {
        get
        {
            if (FigureOfMerit is not { } merit || merit <= 2.001) return null;
            var (r, zero) = (MotionalResistance.Ohm, SeriesResonance);
            for (var i = 0; i < 20; i++)
            {
                var b = zero.RadiansPerSecond * StaticCapacitance.Farad;
                zero = AtMotionalReactance(2 * b * r * r / (1 + Math.Sqrt(Math.Max(0, 1 - (4 * b * b * r * r)))));
            }

            return zero <= ParallelResonance ? zero : null;
        }
    }

    /// <summary>
    /// Loaded frequency for any net reactive load, given as the capacitance it amounts to in pF: above zero a capacitor, below zero an inductor stronger
    /// than C0, which pulls below fs. Null for inductive loads that cancel C0: see <see cref="WeakestInductiveLoadPicofarad"/>.
    /// </summary>
    public Frequency? FrequencyWithNetLoad(double netLoadPicofarad)
    {
        Guard.Finite(netLoadPicofarad, nameof(netLoadPicofarad));
        if (netLoadPicofarad < 0 && netLoadPicofarad >= WeakestInductiveLoadPicofarad) return null;
        var share = MotionalCapacitance.Picofarad / (StaticCapacitance.Picofarad + netLoadPicofarad);
        return 1 + share > 0 ? SeriesResonance * Math.Sqrt(1 + share) : null;
    }

    /// <summary>Inductive loads, as capacitance below zero in pF, must lie below this, -(C0 + 10 Cm), or they cancel C0 and nothing is controlled by the crystal.</summary>
    public double WeakestInductiveLoadPicofarad => -(StaticCapacitance.Picofarad + (LeastNetInMotional * MotionalCapacitance.Picofarad));

    /// <summary>The crystal from both resonances and Cm: C0 = Cm/((fp/fs)^2 - 1); null when the parallel resonance is not the higher one.</summary>
    public static CrystalParameters? FromResonances(Frequency series, Frequency parallel, Capacitance motional, Resistance loss)
    {
        var excess = (parallel.Hertz - series.Hertz) * (parallel.Hertz + series.Hertz) / (series.Hertz * series.Hertz);
        return excess > 0 ? new(series, motional, motional / excess, loss) : null;
    }

    private double MotionalReactanceOhm(Frequency f)
    {
        var (w, ws) = (f.RadiansPerSecond, SeriesResonance.RadiansPerSecond);
        return MotionalInductance.Henry * (w - ws) * (w + ws) / w;
    }

    private Frequency AtMotionalReactance(double ohm)
    {
        // As a shift, so that the smallest one is not lost in the rounding of the whole frequency.
        var (half, fs) = (ohm / (4 * Math.PI * MotionalInductance.Henry), SeriesResonance.Hertz);
        return Frequency.FromHertz(fs + half + (half * half / (Math.Sqrt((half * half) + (fs * fs)) + fs)));
    }
}
