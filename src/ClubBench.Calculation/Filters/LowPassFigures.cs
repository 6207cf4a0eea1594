using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Filters;

/// <summary>Attenuation of one harmonic, the smaller of both band ends.</summary>
/// <param name="Harmonic">2 for the second, and so on.</param>
/// <param name="Attenuation">Transducer loss reached.</param>
/// <param name="Margin">How far above the wanted value, negative below it.</param>
public sealed record HarmonicFigure(int Harmonic, Decibels Attenuation, Decibels Margin);

/// <summary>What one filter reaches of a requirement.</summary>
/// <param name="WorstReturnLoss">Smallest return loss in the band.</param>
/// <param name="WorstPassLoss">Largest loss in the band.</param>
/// <param name="Harmonics">One entry per wanted harmonic, same order.</param>
/// <param name="Margin">Smallest of all margins; below zero where something is not met.</param>
public sealed record LowPassFigures(Decibels WorstReturnLoss, Decibels WorstPassLoss, IReadOnlyList<HarmonicFigure> Harmonics, Decibels Margin)
{
    /// <summary>Analyses a filter against a requirement; no Q given means lossless.</summary>
    /// <remarks>Method: chain matrix at evenly spaced pass-band frequencies and at the harmonics of both band ends. Source: derived.</remarks>
    public static LowPassFigures Of(LowPassDesign design, LowPassRequirement requirement, double? coilQ = null, double? capacitorQ = null, int passPoints = 17) =>
        Of(design.ToLadder(coilQ, capacitorQ), design.Source, design.Load, requirement, passPoints);

    /// <summary>Analyses any ladder between two resistances above zero against a requirement.</summary>
    /// <remarks>Method: as above. Source: derived.</remarks>
    public static LowPassFigures Of(Ladder ladder, Resistance source, Resistance load, LowPassRequirement requirement, int passPoints = 17)
    {
        var pass = ladder.Sweep(requirement.Band.Points(passPoints), source, load);
        var harmonics = requirement.Harmonics.Select(h => Harmonic(ladder, source, load, requirement.Band, h)).ToList();
        var returnLoss = pass.Min(p => p.ReturnLoss);
        var margin = harmonics.Select(h => h.Margin).Append(returnLoss - requirement.ReturnLoss).Min();
        return new LowPassFigures(returnLoss, pass.Max(p => p.Loss), harmonics, margin);
    }

    private static HarmonicFigure Harmonic(Ladder ladder, Resistance source, Resistance load, FrequencyRange band, HarmonicRequirement wanted)
    {
        var (low, high) = (At(band.Low), At(band.High));
        var worse = low < high ? low : high;
        return new HarmonicFigure(wanted.Harmonic, worse, worse - wanted.Attenuation);

        Decibels At(Frequency f) => ladder.Loss(f.Harmonic(wanted.Harmonic), source, load);
    }
}
