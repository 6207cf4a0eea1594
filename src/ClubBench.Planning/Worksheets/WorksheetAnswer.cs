using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Worksheets;

/// <summary>What a worksheet found.</summary>
/// <param name="Figures">Computed figures; after <see cref="Worksheet.Run"/> each carries its working.</param>
/// <param name="VerdictCode">Text code of the judgement; null where the method judges nothing.</param>
public sealed record WorksheetAnswer(IReadOnlyList<Figure> Figures, string? VerdictCode = null)
{
    /// <summary>Where the figures come from; null for the source of the worksheet.</summary>
    public SourceRef? Source { get; init; }

    internal static Outcome<WorksheetAnswer> Of(params IReadOnlyList<Figure> figures) => Outcome<WorksheetAnswer>.Success(new(figures));

    internal static Outcome<WorksheetAnswer> Judged(string verdictCode, params IReadOnlyList<Figure> figures) =>
        Outcome<WorksheetAnswer>.Success(new(figures, verdictCode));

    /// <summary>Inputs that contradict each other: the same message at each of them.</summary>
    internal static Outcome<WorksheetAnswer> Conflict(string code, params IReadOnlyList<string> inputs) =>
        Outcome<WorksheetAnswer>.Failure(inputs.Select(i => FieldMessage.Error(i, code)));
}
