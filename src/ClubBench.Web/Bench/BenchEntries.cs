using System.Text.Json;
using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Club.UseCases.Readings;
using ClubBench.Planning;
using ClubBench.Web.Api;
using ClubBench.Web.Texts;
using Microsoft.Extensions.Localization;

namespace ClubBench.Web.Bench;

/// <summary>One entry of a phone's outbox.</summary>
public sealed record BenchEntryItem(
    Guid Id,
    string Type,
    string? Stage = null,
    string? Point = null,
    double? Si = null,
    string? Typed = null,
    string? Instrument = null,
    string? Designator = null,
    int? Turns = null,
    string? To = null,
    bool Safety = false,
    string? Symptom = null);

/// <summary>What a phone sends.</summary>
public sealed record BenchEntriesRequest(IReadOnlyList<JsonElement> Items);

/// <summary>What became of one entry: words or advice, or why it was refused. Either way the phone may forget it.</summary>
public sealed record BenchEntryAnswer(Guid Id, string? Refused = null, string? Words = null, BenchAdvice? Advice = null);

/// <summary>Takes the outbox of a phone in, entry by entry and in its order. A refused entry never holds up the others.</summary>
public sealed class BenchEntries(Record record, RecordFitted fitted, MoveStage move, CallForHelp help, IStringLocalizer<NightTexts> texts)
{
    private static readonly JsonSerializerOptions FromPhone = new(JsonSerializerDefaults.Web);

    public async Task<IReadOnlyList<BenchEntryAnswer>> TakeAsync(Actor actor, Guid board, BenchWords words, BenchEntriesRequest request, CancellationToken cancellation)
    {
        var answers = new List<BenchEntryAnswer>();
        foreach (var item in request.Items)
            if (Read(item) is { } entry) answers.Add(await TakeAsync(actor, board, words, entry, cancellation));
            else if (item.ValueKind == JsonValueKind.Object && item.TryGetProperty("id", out var id) && id.TryGetGuid(out var known)) answers.Add(new BenchEntryAnswer(known, Refused: texts["bench.refused.unreadable"]));
        return answers;
    }

    private Task<BenchEntryAnswer> TakeAsync(Actor actor, Guid board, BenchWords words, BenchEntryItem e, CancellationToken cancellation) => e.Type switch
    {
        "reading" => ReadingAsync(actor, board, words, e, cancellation),
        "fitted" => AnswerAsync(e, fitted.Run(actor, new RecordFittedInput(e.Id, board, e.Stage ?? "", e.Designator ?? "", e.Turns), cancellation), texts["bench.fitted", e.Turns ?? 0, e.Designator ?? ""]),
        "move" when Enum.TryParse<StageProgress>(e.To, out var to) => AnswerAsync(e, move.Run(actor, new MoveStageInput(board, e.Stage ?? "", to), cancellation), texts["bench.moved"]),
        "help" => AnswerAsync(e, help.Run(actor, new CallForHelpInput(e.Id, board, e.Stage ?? "", Symptom(e)), cancellation), texts["bench.help-done"]),
        _ => Task.FromResult(new BenchEntryAnswer(e.Id, Refused: texts["bench.refused.unreadable"])),
    };

    private async Task<BenchEntryAnswer> ReadingAsync(Actor actor, Guid board, BenchWords words, BenchEntryItem e, CancellationToken cancellation)
    {
        var outcome = await record.Run(actor, new RecordInput(board, e.Id, e.Point ?? "", e.Typed ?? "", e.Si, e.Instrument), cancellation);
        return outcome.Succeeded ? new BenchEntryAnswer(e.Id, Advice: words.Advice(outcome.Value.Advice, outcome.Value.StageKind)) : Refusal(e, outcome.Messages);
    }

    private async Task<BenchEntryAnswer> AnswerAsync<T>(BenchEntryItem e, Task<Outcome<T>> run, string done)
        where T : notnull
    {
        var outcome = await run;
        return outcome.Succeeded ? new BenchEntryAnswer(e.Id, Words: done) : Refusal(e, outcome.Messages);
    }

    private BenchEntryAnswer Refusal(BenchEntryItem e, IReadOnlyList<FieldMessage> messages) =>
        new(e.Id, Refused: messages.Any(m => m.Code.StartsWith("refused.", StringComparison.Ordinal)) ? texts["bench.refused.right"] : texts["bench.refused.other", messages.Count > 0 ? Answers.Words(messages[0]) : ""]);

    /// <summary>A call for safety says so first, in words.</summary>
    private string Symptom(BenchEntryItem e) => e.Safety ? $"{texts["bench.help.power-off"]} {e.Symptom}".Trim() : e.Symptom ?? "";

    private static BenchEntryItem? Read(JsonElement item)
    {
        try
        {
            return item.Deserialize<BenchEntryItem>(FromPhone);
        }
        catch (JsonException)
        {
            return null;
        }
    }
}
