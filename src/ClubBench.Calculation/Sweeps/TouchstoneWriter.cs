using System.Globalization;
using System.Numerics;
using System.Text;

namespace ClubBench.Calculation.Sweeps;

/// <summary>Writes sweep files of version 1: MHz, scattering parameters, real and imaginary part.</summary>
/// <remarks>
/// Method: the Touchstone format; every number with all its digits, so that reading gives the same sweep. What was not measured is written as zero.
/// Valid: one and two ports; two different references take the syntax of version 1.1.
/// Source: ibis-touchstone.
/// </remarks>
public static class TouchstoneWriter
{
    /// <summary>The text of the file, to be saved with <see cref="ExtensionOf"/>.</summary>
    /// <param name="sweep">What to write.</param>
    /// <param name="comment">Lines for the head of the file; may be empty.</param>
    public static string Write(Sweep sweep, string comment = "")
    {
        var text = new StringBuilder();
        foreach (var line in comment.ReplaceLineEndings("\n").Split('\n').Where(l => l.Length > 0)) text.Append("! ").Append(line).Append('\n');
        text.Append("# MHz S RI R ").Append(Number(sweep.Reference1.Ohm));
        if (sweep.Ports == 2 && sweep.Reference1 != sweep.Reference2) text.Append(' ').Append(Number(sweep.Reference2.Ohm));
        text.Append('\n');
        foreach (var point in sweep.Points) text.AppendJoin(' ', Row(point)).Append('\n');
        return text.ToString();
    }

    /// <summary>.s1p or .s2p: version 1 tells its ports there.</summary>
    public static string ExtensionOf(Sweep sweep) => sweep.Ports == 1 ? ".s1p" : ".s2p";

    private static IEnumerable<string> Row(SweepPoint p)
    {
        Complex[] values = p.S21 is { } s21 ? [p.S11, s21, p.S12 ?? 0, p.S22 ?? 0] : [p.S11];
        return values.SelectMany(v => new[] { v.Real, v.Imaginary }).Prepend(p.Frequency.Megahertz).Select(Number);
    }

    private static string Number(double value) => value.ToString("R", CultureInfo.InvariantCulture);
}
