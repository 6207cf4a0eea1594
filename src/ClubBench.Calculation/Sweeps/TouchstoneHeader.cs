using System.Globalization;

namespace ClubBench.Calculation.Sweeps;

/// <summary>Everything a sweep file says before and about its rows.</summary>
/// <param name="Ports">1 or 2.</param>
/// <param name="Options">The option line.</param>
/// <param name="Places">Which parameter each pair of numbers in a row is: 0 for 11, 1 for 12, 2 for 21, 3 for 22.</param>
/// <param name="IsVersion2">Whether parameters are in ohm and siemens and noise has its own keyword.</param>
/// <param name="Rows">Lines of the data.</param>
/// <param name="AnnouncedRows">Rows the file announces; null where it does not.</param>
/// <param name="NoiseSkipped">Whether a block of noise figures was left out.</param>
internal sealed record TouchstoneHeader(
    int Ports, TouchstoneOptions Options, IReadOnlyList<int> Places, bool IsVersion2, IReadOnlyList<TouchstoneLine> Rows, int? AnnouncedRows, bool NoiseSkipped)
{
    public static readonly int[] OnePort = [0];
    public static readonly int[] TwentyOneFirst = [0, 2, 1, 3];
    public static readonly int[] TwelveFirst = [0, 1, 2, 3];
    public static readonly int[] LowerHalf = [0, 2, 3];
    public static readonly int[] UpperHalf = [0, 1, 3];

    public double Reference1 => Options.References[0];

    public double Reference2 => Options.References[^1];

    /// <summary>A file of version 1: an option line, then rows; the ports are in the file's name.</summary>
    public static TouchstoneHeader? OfVersion1(IReadOnlyList<TouchstoneLine> lines, string fileName, TouchstoneIssues issues)
    {
        foreach (var keyword in lines.Where(l => l.IsKeyword)) issues.Add(keyword.Number, TouchstoneFault.UnknownVersion, keyword.Text, "[Version] 2.0");
        var ports = PortsOf(fileName);
        if (ports is null) issues.Add(1, TouchstoneFault.PortsUnknown, fileName, ".s1p .s2p");
        if (lines.Count == 0) issues.Add(1, TouchstoneFault.NoRows);
        else if (!lines[0].IsOptions) issues.Add(lines[0].Number, TouchstoneFault.OptionLineMissing, lines[0].Text, "#");
        if (issues.Any || ports is not { } n) return null;
        var options = TouchstoneOptions.Of(lines[0], issues);
        return new(n, options, n == 1 ? OnePort : TwentyOneFirst, false, [.. lines.Where(l => !l.IsOptions)], null, false);
    }

    private static int? PortsOf(string fileName) =>
        fileName.EndsWith(".s1p", StringComparison.OrdinalIgnoreCase) ? 1
        : fileName.EndsWith(".s2p", StringComparison.OrdinalIgnoreCase) ? 2
        : null;
}
