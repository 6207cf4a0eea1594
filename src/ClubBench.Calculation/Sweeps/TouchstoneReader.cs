using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Sweeps;

/// <summary>Reads sweep files of one and two ports.</summary>
/// <remarks>
/// Method: the Touchstone format, version 1 with one or two references and version 2; parameters of every kind become scattering parameters.
/// Valid: a file with a fault gives no sweep but every fault with its line; noise figures are skipped.
/// Source: ibis-touchstone 2.0 and the resolution of 2.1; keyword rules in places from memory.
/// </remarks>
public static class TouchstoneReader
{
    private const double MostPowerOut = 1.02;

    /// <summary>Reads a file.</summary>
    /// <param name="text">Content; a byte order mark and any line ends are welcome.</param>
    /// <param name="fileName">Name with its extension, which tells the ports in version 1.</param>
    public static TouchstoneResult Read(string text, string fileName)
    {
        var issues = new TouchstoneIssues();
        var (lines, commas) = TouchstoneText.Lines(text, issues);
        var header = lines.Count > 0 && lines[0].Keyword == "version" ? new TouchstoneKeywords(issues).Header(lines) : TouchstoneHeader.OfVersion1(lines, fileName, issues);
        if (header is { Ports: 1, Options.Kind: ParameterKind.H or ParameterKind.G }) issues.Add(1, TouchstoneFault.ParametersNeedTwoPorts, header.Options.Kind.ToString(), "S Y Z");
        if (header is null || issues.Any) return Refused(issues);
        var rows = new TouchstoneRows(header, issues);
        var points = rows.Read();
        return issues.Any ? Refused(issues) : Told(header, points, commas, rows.NoiseSkipped);
    }

    private static TouchstoneResult Told(TouchstoneHeader header, IReadOnlyList<SweepPoint> points, bool commas, bool noise)
    {
        var half = header.Ports == 2 && points.All(p => p.S12 == 0 && p.S22 == 0);
        var kept = half ? points.Select(p => p with { S12 = null, S22 = null }) : points;
        var sweep = new Sweep([.. kept], Resistance.FromOhm(header.Reference1), Resistance.FromOhm(header.Reference2));
        var power = sweep.Points.Max(p => p.LargestPowerOut);
        return new(sweep, [], [.. RemarksOf(commas, half, noise, power)], Decibels.FromPowerRatio(Math.Max(power, 1e-30)));
    }

    private static IEnumerable<TouchstoneRemark> RemarksOf(bool commas, bool half, bool noise, double power)
    {
        if (commas) yield return TouchstoneRemark.DecimalCommas;
        if (half) yield return TouchstoneRemark.ReverseNotMeasured;
        if (noise) yield return TouchstoneRemark.NoiseSkipped;
        if (power > MostPowerOut) yield return TouchstoneRemark.ShowsGain;
    }

    private static TouchstoneResult Refused(TouchstoneIssues issues) => new(null, issues.All, [], null);
}
