using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Worksheets;

/// <summary>One input of a worksheet.</summary>
/// <param name="Name">Name; its label is the text "worksheet-input.&lt;name&gt;".</param>
/// <param name="Kind">What it measures.</param>
/// <param name="DefaultSi">Value the worksheet opens with, SI.</param>
/// <param name="MayBeZero">Whether zero is taken; a negative value never is.</param>
public sealed record WorksheetInput(string Name, QuantityKind Kind, double DefaultSi, bool MayBeZero = false);

/// <summary>One calculation method on its own page.</summary>
/// <param name="Id">Stable id; title and method are the texts "worksheet.&lt;id&gt;" and "method.&lt;id&gt;".</param>
/// <param name="Group">Subject it stands under ("worksheet-group.&lt;group&gt;").</param>
/// <param name="Source">Where the method comes from.</param>
/// <param name="Inputs">Its inputs, in the order they are asked.</param>
/// <param name="Compute">The method: input values by name to figures; null where these inputs have no solution.</param>
public sealed record Worksheet(
    string Id, string Group, SourceRef Source, IReadOnlyList<WorksheetInput> Inputs, Func<IReadOnlyDictionary<string, double>, IReadOnlyList<Figure>?> Compute)
{
    /// <summary>Computes. What is not given takes its default; every input that cannot be is named, and so are inputs that no circuit can fulfil together.</summary>
    public Outcome<IReadOnlyList<Figure>> Run(IReadOnlyDictionary<string, double> givenSi)
    {
        var values = Inputs.ToDictionary(i => i.Name, i => givenSi.GetValueOrDefault(i.Name, i.DefaultSi), StringComparer.Ordinal);
        var faults = Inputs.Where(i => !Takes(i, values[i.Name])).Select(i => FieldMessage.Error(i.Name, i.MayBeZero ? "worksheet-message.negative" : "worksheet-message.not-positive")).ToList();
        if (faults.Count > 0) return Outcome<IReadOnlyList<Figure>>.Failure(faults);
        return Solved(values) is { } figures
            ? Outcome<IReadOnlyList<Figure>>.Success([.. figures.Select(f => f with { Working = WorkingOf(values) })])
            : Outcome<IReadOnlyList<Figure>>.Failure(FieldMessage.Error("", "worksheet-message.no-solution"));
    }

    private static bool Takes(WorksheetInput input, double si) => double.IsFinite(si) && (si > 0 || (si == 0 && input.MayBeZero));

    // The calculations guard what a form cannot know, such as a supply below the saturation voltage.
    private IReadOnlyList<Figure>? Solved(Dictionary<string, double> values)
    {
        try
        {
            return Compute(values) is { } figures && figures.All(f => double.IsFinite(f.Si)) ? figures : null;
        }
        catch (ArgumentException)
        {
            return null;
        }
    }

    private Working WorkingOf(Dictionary<string, double> values) => new(Id, [.. Inputs.Select(i => new Figure(i.Name, i.Kind, values[i.Name], From: Provenance.Unknown))], Source);
}
