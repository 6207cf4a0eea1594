using System.Globalization;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Worksheets;

/// <summary>One input of a worksheet.</summary>
/// <param name="Name">Name; its label is the text "worksheet-input.&lt;name&gt;".</param>
/// <param name="Kind">What it measures; a count is a whole number.</param>
/// <param name="DefaultSi">Value the worksheet opens with, SI.</param>
/// <param name="Smallest">Smallest value taken, SI; null for anything above zero.</param>
/// <param name="Largest">Largest value taken, SI; null for no limit.</param>
public sealed record WorksheetInput(string Name, QuantityKind Kind, double DefaultSi, double? Smallest = null, double? Largest = null)
{
    /// <summary>What is wrong with a value for this input; null where it can be taken.</summary>
    internal FieldMessage? Fault(double si)
    {
        if (double.IsNaN(si) || si < (Smallest ?? 0) || (Smallest is null && si == 0)) return TooSmall();
        if (double.IsInfinity(si) || si > Largest) return FieldMessage.Error(Name, "worksheet-message.too-large", ("largest", Written(Largest ?? double.MaxValue)));
        return Kind == QuantityKind.Count && si != Math.Floor(si) ? FieldMessage.Error(Name, "worksheet-message.not-whole") : null;
    }

    private FieldMessage TooSmall() => Smallest switch
    {
        null => FieldMessage.Error(Name, "worksheet-message.not-positive"),
        0 => FieldMessage.Error(Name, "worksheet-message.negative"),
        { } smallest => FieldMessage.Error(Name, "worksheet-message.too-small", ("smallest", Written(smallest))),
    };

    private string Written(double si) => QuantityText.Format(Kind, si, culture: CultureInfo.CurrentCulture);
}

/// <summary>One calculation method on its own page.</summary>
/// <param name="Id">Stable id; title and method are the texts "worksheet.&lt;id&gt;" and "method.&lt;id&gt;".</param>
/// <param name="Group">Subject it stands under ("worksheet-group.&lt;group&gt;").</param>
/// <param name="Source">Where the method comes from.</param>
/// <param name="Inputs">Its inputs, in the order they are asked.</param>
/// <param name="Compute">The method: input values to an answer, or to the inputs that contradict each other.</param>
public sealed record Worksheet(
    string Id, string Group, SourceRef Source, IReadOnlyList<WorksheetInput> Inputs, Func<WorksheetValues, Outcome<WorksheetAnswer>> Compute)
{
    /// <summary>Computes. What is not given takes its default; every input that cannot be taken is named, and so are inputs that contradict each other.</summary>
    public Outcome<WorksheetAnswer> Run(IReadOnlyDictionary<string, double> givenSi)
    {
        var values = Inputs.ToDictionary(i => i.Name, i => givenSi.GetValueOrDefault(i.Name, i.DefaultSi), StringComparer.Ordinal);
        var faults = Inputs.Select(i => i.Fault(values[i.Name])).OfType<FieldMessage>().ToList();
        return faults.Count > 0 ? Outcome<WorksheetAnswer>.Failure(faults) : Computed(values).Then(a => WithWorking(a, values));
    }

    // Values far from anything that can be built may leave the range of numbers or of a calculation's own guards.
    private Outcome<WorksheetAnswer> Computed(Dictionary<string, double> values)
    {
        try
        {
            var outcome = Compute(new WorksheetValues(values));
            return !outcome.Succeeded || outcome.Value.Figures.All(f => double.IsFinite(f.Si)) ? outcome : OutOfReach();
        }
        catch (Exception e) when (e is ArgumentException or InvalidOperationException)
        {
            return OutOfReach();
        }
    }

    private Outcome<WorksheetAnswer> OutOfReach() => WorksheetAnswer.Conflict("worksheet-message.out-of-reach", [.. Inputs.Select(i => i.Name)]);

    private WorksheetAnswer WithWorking(WorksheetAnswer answer, Dictionary<string, double> values)
    {
        var source = answer.Source ?? Source;
        var working = new Working(Id, [.. Inputs.Select(i => new Figure(i.Name, i.Kind, values[i.Name], From: Provenance.Unknown))], source);
        return answer with { Figures = [.. answer.Figures.Select(f => f with { Working = working })], Source = source };
    }
}
