using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Fitting;

/// <summary>Finds the parts of a filter from its sweep.</summary>
/// <remarks>
/// Method: least squares on complex residuals with the expected spreads of the parts, then with a common Q and one delay per port as well; what the sweep cannot show keeps
/// its spread.
/// Where only the transmission is known, each deviating part is weighed against its mirror image by two fits of one fault each.
/// Valid: low-pass filters, parts up to 60 % off; a short or an open is no deviation, look for gross faults first. Sweep 0.1 to 4 times the cut-off, 100 to 200 points, half of them above the band; refused above 0.3 or below 2 times.
/// Source: levenberg-marquardt; spreads and noise are common practice.
/// </remarks>
public static class SweepDiagnosis
{
    private const int FewestPoints = 20;
    private const double UsualNoise = 0.003;
    private const double GreatestNoise = 0.005;
    private const double LeastNoise = 1e-4;
    private const double Undecided = 4;
    private const double Fixed = 1e-6;

    /// <summary>Fits the sweep.</summary>
    public static SweepFit Of(SweepFitInput input)
    {
        Check(input);
        var wanted = Wanted(input);
        if (RefusalBefore(input, wanted) is var refusal and not FitRefusal.None) return new(refusal, [], null, 0, 0, 0, 0, wanted);
        var model = new FitModel(input);
        var noise = input.Noise ?? Math.Clamp(Rest(model, UsualNoise).Rms, LeastNoise, GreatestNoise);
        var rest = Rest(model, noise);
        return rest.Rms > 3 * noise
            ? new(FitRefusal.ModelDoesNotFit, [], null, rest.Point[model.QAt + 1], rest.Point[model.QAt + 2], rest.Rms, noise, wanted)
            : new(
                FitRefusal.None,
                PartsOf(input, model, rest, noise),
                input.CoilQ * Math.Exp(rest.Point[model.QAt]),
                rest.Point[model.QAt + 1],
                rest.Point[model.QAt + 2],
                rest.Rms,
                noise,
                wanted);
    }

    private static FitRest Rest(FitModel model, double noise) => Rest(model, [.. model.Parameters.Select(p => p.Spread)], noise);

    // First the parts alone: far from the truth a low Q and a long delay are tempting and lead astray.
    private static FitRest Rest(FitModel model, double[] spreads, double noise)
    {
        double[] parts = [.. spreads.Select((s, i) => i < model.QAt ? s : Fixed)];
        var start = new LevenbergMarquardt(model, parts, noise).Solve();
        return new LevenbergMarquardt(model, spreads, noise).Solve(start.Point);
    }

    private static List<FittedPart> PartsOf(SweepFitInput input, FitModel model, FitRest rest, double noise)
    {
        var parts = Enumerable.Range(0, model.QAt).Select(i => new FittedPart(
            model.Parameters[i].Arm, model.Parameters[i].Part == ArmParameter.Coil, Math.Exp(rest.Point[i]), rest.Deviations[i], rest.Deviations[i] / model.Parameters[i].Spread)).ToList();
        return input.UsesReflection ? parts : [.. parts.Select(p => p.Deviates ? p with { MirrorArm = MirrorOf(input, model, p, noise) } : p)];
    }

    // The other arm of a symmetrical filter, where it explains the transmission as well by itself.
    private static int? MirrorOf(SweepFitInput input, FitModel model, FittedPart part, double noise)
    {
        var mirror = input.Nominal.Elements.Length - 1 - part.Arm;
        if (mirror == part.Arm) return null;
        return AlternativeCost(mirror) is { } other && AlternativeCost(part.Arm) is { } own && other - own < Undecided ? mirror : null;

        double? AlternativeCost(int arm)
        {
            var at = Enumerable.Range(0, model.QAt).FirstOrDefault(i => model.Parameters[i].Arm == arm && model.Parameters[i].Part == ArmParameter.Coil == part.IsCoil, -1);
            if (at < 0) return null;
            double[] spreads = [.. model.Parameters.Select((p, i) => i == at || i >= model.QAt ? p.Spread : Fixed)];
            return Rest(model, spreads, noise).Cost;
        }
    }

    private static FitRefusal RefusalBefore(SweepFitInput input, FrequencyRange? wanted)
    {
        var (points, range) = (input.Measured.Points, input.Measured.Range);
        if (points.Length < FewestPoints) return FitRefusal.TooFewPoints;
        if (wanted is not { } w || range.Low > w.Low * 3 || range.High < w.High * 0.5) return FitRefusal.CoversTooLittle;
        var flatReflection = !input.UsesReflection || points.All(p => p.S11.Imaginary == 0);
        var flatTransmission = !input.UsesTransmission || points.All(p => p.S21!.Value.Imaginary == 0);
        return flatReflection && flatTransmission ? FitRefusal.AnglesMissing : FitRefusal.None;
    }

    // From a hundredth of the highest frequency the search ends there; a sweep that ends below the cut-off needs a start nearer to it.
    private static FrequencyRange? Wanted(SweepFitInput input)
    {
        var highest = input.Measured.Range.High;
        var cutOff = input.Nominal.CutOff3dB(highest / 100, input.Source, input.Load) ?? input.Nominal.CutOff3dB(highest / 10, input.Source, input.Load);
        return cutOff is { } f ? new(f * 0.1, f * 4) : null;
    }

    private static void Check(SweepFitInput input)
    {
        Guard.Positive(input.CoilQ, nameof(input.CoilQ));
        Guard.Positive(input.CapacitorQ, nameof(input.CapacitorQ));
        Guard.Within(input.CoilSpread, 0.001, 1, nameof(input.CoilSpread));
        Guard.Within(input.CapacitorSpread, 0.001, 1, nameof(input.CapacitorSpread));
        if (input.Noise is { } noise) Guard.Within(noise, 1e-4, 0.1, nameof(input.Noise));
    }
}
