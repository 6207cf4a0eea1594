using ClubBench.Club.Entities;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;
using ClubBench.Planning.Text;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Readings;

/// <summary>What is checked before a reading is taken in. All issues are collected.</summary>
internal static class ReadingCheck
{
    private const int LongestText = 100;
    private const int LongestNote = 500;

    /// <summary>The reading as it will be stored, or what is wrong with it.</summary>
    public static async Task<Outcome<StoredReading>> OfAsync(Work work, ArchivedPlan plan, RecordInput input, CancellationToken cancellation)
    {
        if (plan.Plan.Stages.SelectMany(s => s.Expected).FirstOrDefault(e => e.Point == input.Point) is not { } expected)
            return Outcome<StoredReading>.Failure(FieldMessage.Error("point", "reading.point-unknown", ("point", input.Point)));
        var messages = Texts(input).ToList();
        var value = Value(input, expected.Kind);
        messages.AddRange(value.Messages);
        if (input.Instrument is { } name && !await work.Db.Instruments.AnyAsync(i => i.Name == name, cancellation)) messages.Add(FieldMessage.Error("instrument", "reading.instrument-unknown", ("name", name)));
        if (input.Replaces is { } earlier && !await work.Db.Readings.AnyAsync(r => r.BoardId == input.BoardId && r.Id == earlier && r.Point == input.Point, cancellation))
            messages.Add(FieldMessage.Error("replaces", "reading.replaces-unknown"));
        return messages.Any(m => m.Severity == MessageSeverity.Error)
            ? Outcome<StoredReading>.Failure(messages)
            : Outcome<StoredReading>.Success(Stored(work, plan, input, expected.Stage, expected.Kind, value.Value));
    }

    private static IEnumerable<FieldMessage> Texts(RecordInput input)
    {
        if (input.Id == Guid.Empty) yield return FieldMessage.Error("id", "field.needed");
        if (input.TypedText.Length > LongestText) yield return FieldMessage.Error("typedText", "field.too-long");
        if (input.Note.Length > LongestNote) yield return FieldMessage.Error("note", "field.too-long");
    }

    private static Outcome<double> Value(RecordInput input, QuantityKind kind)
    {
        if (input.ValueSi is not { } si) return QuantityText.Parse(input.TypedText, kind, path: "typedText").Then(q => q.Si);
        return double.IsFinite(si) ? Outcome<double>.Success(si) : Outcome<double>.Failure(FieldMessage.Error("valueSi", "field.not-a-number"));
    }

    private static StoredReading Stored(Work work, ArchivedPlan plan, RecordInput input, string stage, QuantityKind kind, double valueSi) => new()
    {
        Id = input.Id,
        BoardId = input.BoardId,
        Stage = stage,
        Point = input.Point,
        Kind = kind,
        ValueSi = valueSi,
        TypedText = input.TypedText,
        Instrument = input.Instrument,
        Note = input.Note,
        Replaces = input.Replaces,
        PlanRevision = plan.Revision,
        AtUtc = work.NowUtc,
        By = work.Actor.PersonId,
    };
}
