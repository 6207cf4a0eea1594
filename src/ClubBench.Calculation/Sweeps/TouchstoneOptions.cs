using System.Globalization;
using System.Numerics;

namespace ClubBench.Calculation.Sweeps;

/// <summary>How a complex number is written.</summary>
internal enum ComplexForm
{
    /// <summary>Size and angle in degrees.</summary>
    MA,

    /// <summary>Size in dB and angle in degrees.</summary>
    DB,

    /// <summary>Real and imaginary part.</summary>
    RI,
}

/// <summary>The option line. Source: ibis-touchstone.</summary>
/// <param name="UnitHertz">Hertz of one unit of the frequency column.</param>
/// <param name="Kind">Parameters stated.</param>
/// <param name="Form">How they are written.</param>
/// <param name="References">One resistance, or one per port, ohm.</param>
internal sealed record TouchstoneOptions(double UnitHertz, ParameterKind Kind, ComplexForm Form, IReadOnlyList<double> References)
{
    private static readonly Dictionary<string, double> Units = new(StringComparer.OrdinalIgnoreCase) { ["Hz"] = 1, ["kHz"] = 1e3, ["MHz"] = 1e6, ["GHz"] = 1e9 };

    public static TouchstoneOptions Default => new(1e9, ParameterKind.S, ComplexForm.MA, [50]);

    /// <summary>Words in any order; what is missing has its default.</summary>
    public static TouchstoneOptions Of(TouchstoneLine line, TouchstoneIssues issues)
    {
        var options = Default;
        var words = new Queue<string>((line with { Text = line.Text[1..] }).Words);
        while (words.TryDequeue(out var word))
        {
            if (Units.TryGetValue(word, out var unit)) options = options with { UnitHertz = unit };
            else if (IsName<ParameterKind>(word, out var kind)) options = options with { Kind = kind };
            else if (IsName<ComplexForm>(word, out var form)) options = options with { Form = form };
            else if (string.Equals(word, "R", StringComparison.OrdinalIgnoreCase)) options = options with { References = ReferencesOf(line, words, issues) };
            else issues.Add(line.Number, TouchstoneFault.UnknownOption, word);
        }

        return options;
    }

    public Complex Value(double first, double second) => Form switch
    {
        ComplexForm.RI => new(first, second),
        ComplexForm.MA => Complex.FromPolarCoordinates(first, second * Math.PI / 180),
        _ => Complex.FromPolarCoordinates(Math.Pow(10, first / 20), second * Math.PI / 180),
    };

    /// <summary>Resistances above zero in a row of words, as many as there are; a fault where there is none.</summary>
    public static IReadOnlyList<double> ReferencesOf(TouchstoneLine line, Queue<string> words, TouchstoneIssues issues)
    {
        var ohms = new List<double>();
        while (words.TryPeek(out var next) && TouchstoneText.Number(next) is { } ohm)
        {
            if (ohm is <= 0 or > 1e9) issues.Add(line.Number, TouchstoneFault.BadReference, words.Peek(), "R > 0");
            ohms.Add(ohm);
            words.Dequeue();
        }

        if (ohms.Count is 1 or 2) return ohms;
        issues.Add(line.Number, TouchstoneFault.BadReference, ohms.Count.ToString(CultureInfo.InvariantCulture), "1..2");
        return Default.References;
    }

    // Names only: a digit would name a member by its number.
    private static bool IsName<T>(string word, out T value)
        where T : struct, Enum => Enum.TryParse(word, ignoreCase: true, out value) && char.IsLetter(word[0]) && !word.Contains(',', StringComparison.Ordinal);
}
