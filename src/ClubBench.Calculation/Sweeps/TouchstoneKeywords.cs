using System.Globalization;

namespace ClubBench.Calculation.Sweeps;

/// <summary>Head of a sweep file of version 2: keywords in brackets. Source: ibis-touchstone, from memory in places.</summary>
internal sealed class TouchstoneKeywords(TouchstoneIssues issues)
{
    private static readonly string[] Versions = ["2.0", "2.1"];
    private readonly List<TouchstoneLine> _rows = [];
    private readonly Queue<string> _references = new();
    private TouchstoneLine? _options;
    private TouchstoneLine? _reference;
    private string _section = "";
    private string _order = "";
    private string _matrix = "full";
    private int? _ports;
    private int? _announced;
    private bool _noise;

    public TouchstoneHeader? Header(IReadOnlyList<TouchstoneLine> lines)
    {
        foreach (var line in lines.TakeWhile(l => l.Keyword != "end" || !l.IsKeyword)) Take(line);
        Check(lines[0].Number);
        if (issues.Any || _ports is not { } ports) return null;
        var options = _options is null ? TouchstoneOptions.Default : TouchstoneOptions.Of(_options, issues);
        if (_reference is { } line2) options = options with { References = TouchstoneOptions.ReferencesOf(line2, _references, issues) };
        return new(ports, options, PlacesOf(ports), true, _rows, _announced, _noise);
    }

    private void Take(TouchstoneLine line)
    {
        if (_section == "begin information" && line.Keyword != "end information") return;
        if (line.IsKeyword) Keyword(line);
        else if (line.IsOptions) _options ??= line;
        else if (_section == "network data") _rows.Add(line);
        else if (_section == "reference") Array.ForEach(line.Words, _references.Enqueue);
        else if (_section != "noise data") issues.Add(line.Number, TouchstoneFault.UnexpectedText, line.Text);
    }

    private void Keyword(TouchstoneLine line)
    {
        _section = line.Keyword;
        var value = line.Value.ToLowerInvariant();
        switch (line.Keyword)
        {
            case "version": Known(line, Versions.Contains(value), TouchstoneFault.UnknownVersion, "2.0, 2.1"); break;
            case "number of ports": _ports = Whole(line, 1, 2); break;
            case "number of frequencies": _announced = Whole(line, 1, int.MaxValue); break;
            case "number of noise frequencies": Whole(line, 0, int.MaxValue); break;
            case "two-port data order": Known(line, (_order = value) is "12_21" or "21_12", TouchstoneFault.BadKeywordValue, "12_21, 21_12"); break;
            case "matrix format": Known(line, (_matrix = value) is "full" or "lower" or "upper", TouchstoneFault.BadKeywordValue, "Full, Lower, Upper"); break;
            case "reference": Reference(line); break;
            case "noise data": _noise = true; break;
            case "begin information" or "end information" or "network data": break;
            case "mixed-mode order": issues.Add(line.Number, TouchstoneFault.BadKeywordValue, line.Text, "S Y Z H G"); break;
            default: issues.Add(line.Number, TouchstoneFault.UnknownKeyword, line.Text); break;
        }
    }

    private void Reference(TouchstoneLine line)
    {
        _reference = line;
        Array.ForEach((line with { Text = line.Value }).Words, _references.Enqueue);
    }

    private void Known(TouchstoneLine line, bool known, TouchstoneFault fault, string expected)
    {
        if (!known) issues.Add(line.Number, fault, line.Value, expected);
    }

    private int? Whole(TouchstoneLine line, int low, int high)
    {
        if (int.TryParse(line.Value, NumberStyles.None, CultureInfo.InvariantCulture, out var n) && n >= low && n <= high) return n;
        issues.Add(line.Number, TouchstoneFault.BadKeywordValue, line.Text, high == int.MaxValue ? $">= {low.ToString(CultureInfo.InvariantCulture)}" : "1..2");
        return null;
    }

    private void Check(int line)
    {
        if (_ports is null && !issues.Any) issues.Add(line, TouchstoneFault.KeywordMissing, "", "[Number of Ports]");
        if (_ports == 2 && _order.Length == 0) issues.Add(line, TouchstoneFault.KeywordMissing, "", "[Two-Port Data Order]");
    }

    private int[] PlacesOf(int ports) => ports == 1 ? TouchstoneHeader.OnePort : _matrix switch
    {
        "lower" => TouchstoneHeader.LowerHalf,
        "upper" => TouchstoneHeader.UpperHalf,
        _ => _order == "12_21" ? TouchstoneHeader.TwelveFirst : TouchstoneHeader.TwentyOneFirst,
    };
}
