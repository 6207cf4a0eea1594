namespace ClubBench.Calculation.Oscillators;

/// <summary>
/// Reactances around a pulled-crystal loop in SI units: crystal with its static capacitance, then series inductor with variable capacitor
/// (node stray across both), then the capacitance of the sustaining circuit. The loop oscillates where they add up to zero.
/// </summary>
internal readonly struct LoopReactance(PulledCrystalLoop loop, double variableF)
{
    private readonly double seriesRad = loop.Crystal.SeriesResonance.RadiansPerSecond;
    private readonly double staticF = (loop.Crystal.StaticCapacitance.Farad * loop.CrystalCount) + loop.HolderCapacitance.Farad;
    private readonly double motionalF = loop.Crystal.MotionalCapacitance.Farad * loop.CrystalCount;
    private readonly double inductanceH = loop.SeriesInductance.Henry;
    private readonly double selfF = loop.InductorSelfCapacitance.Farad;
    private readonly double nodeF = loop.NodeStray.Farad;
    private readonly double acrossF = variableF + loop.StrayAcrossVariable.Farad;
    private readonly double oscillatorF = loop.OscillatorCapacitance.Farad;

    private double MotionalH => 1 / (seriesRad * seriesRad * motionalF);

    /// <summary>Antiresonance of crystal and static capacitance: the upper end of the bracket, a pole of the sum.</summary>
    public double ParallelResonanceHz => seriesRad / (2 * Math.PI) * Math.Sqrt(1 + (motionalF / staticF));

    /// <summary>Loop resonance with the crystal replaced by its static capacitance; null without an inductor.</summary>
    public double? InductorResonanceHz
    {
        get
        {
            if (inductanceH == 0) return null;
            var ends = (1 / oscillatorF) + (1 / staticF);
            var around = (1 / acrossF) + (ends / (1 + (ends * nodeF)));
            return Math.Sqrt(around / (inductanceH * (1 + (around * selfF)))) / (2 * Math.PI);
        }
    }

    /// <summary>Self-resonance of the inductor; null while it has none.</summary>
    public double? SelfResonanceHz => inductanceH * selfF > 0 ? 1 / (2 * Math.PI * Math.Sqrt(inductanceH * selfF)) : null;

    /// <summary>Resonance of the node stray with the inductive branch; null while there is none.</summary>
    public double? NodeResonanceHz
    {
        get
        {
            if (nodeF == 0 || inductanceH == 0) return null;
            var k = 1 + (acrossF / nodeF);
            return Math.Sqrt(k / ((inductanceH * acrossF) + (inductanceH * selfF * k))) / (2 * Math.PI);
        }
    }

    /// <summary>Sum of reactances in ohm; rises with frequency between its poles (Foster's reactance theorem).</summary>
    public double Sum(double frequencyHz)
    {
        var w = 2 * Math.PI * frequencyHz;
        var (motional, shunt) = CrystalArms(w);
        return (motional * shunt / (motional + shunt)) + Branch(w).Loaded - (1 / (w * oscillatorF));
    }

    /// <summary>Derivatives of each reactance with respect to angular frequency: weights of the energy each element stores.</summary>
    public StoredEnergy EnergyAt(double frequencyHz)
    {
        var w = 2 * Math.PI * frequencyHz;
        var (motional, shunt) = CrystalArms(w);
        var (series, loaded) = Branch(w);
        var shared = shunt / (motional + shunt);
        var bypassed = motional / (motional + shunt);
        var gain = loaded / series * (loaded / series);
        var detuning = 1 - (w * w * inductanceH * selfF);
        return new StoredEnergy(
            Motional: shared * shared * MotionalH * (1 + (seriesRad / w * (seriesRad / w))),
            Static: bypassed * bypassed / (w * w * staticF),
            Inductor: gain * inductanceH * (1 + (w * w * inductanceH * selfF)) / (detuning * detuning),
            Variable: gain / (w * w * acrossF),
            Node: loaded * loaded * nodeF,
            Oscillator: 1 / (w * w * oscillatorF),
            InductorReactance: gain * w * inductanceH / (detuning * detuning));
    }

    /// <summary>Factor by which the motional resistance appears in the loop, (X0/(Xm + X0))^2.</summary>
    public double ResistanceFactor(double frequencyHz)
    {
        var (motional, shunt) = CrystalArms(2 * Math.PI * frequencyHz);
        return shunt / (motional + shunt) * (shunt / (motional + shunt));
    }

    // Written as a product of differences: w Lm - 1/(w Cm) would subtract two numbers near a megohm and lose the pulling.
    private (double Motional, double Shunt) CrystalArms(double w) => (MotionalH * (w - seriesRad) * (w + seriesRad) / w, -1 / (w * staticF));

    private (double Series, double Loaded) Branch(double w)
    {
        var series = (w * inductanceH / (1 - (w * w * inductanceH * selfF))) - (1 / (w * acrossF));
        return (series, series / (1 - (series * w * nodeF)));
    }
}

/// <summary>Energy weights (henry) of the loop elements at one frequency, and the inductor's effective reactance in ohm.</summary>
internal readonly record struct StoredEnergy(
    double Motional, double Static, double Inductor, double Variable, double Node, double Oscillator, double InductorReactance)
{
    public double Total => Motional + Static + Inductor + Variable + Node + Oscillator;
}
