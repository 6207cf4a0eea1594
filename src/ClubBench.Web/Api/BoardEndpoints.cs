using System.Text.Json.Nodes;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Club.UseCases.Readings;
using ClubBench.Planning.Text;
using ClubBench.Web.SignIn;

namespace ClubBench.Web.Api;

/// <summary>One reading of a request.</summary>
/// <param name="Id">Made by the sender before the first try; sending it again is harmless.</param>
/// <param name="Point">Point id, "A5.L4.L".</param>
/// <param name="Typed">What was typed, with its unit; read here when no value is given.</param>
/// <param name="ValueSi">Value in the SI unit of the point; null to have the typed text read.</param>
/// <param name="Instrument">Instrument by name; null makes it a remark.</param>
/// <param name="Note">A remark.</param>
/// <param name="Replaces">Reading this one corrects.</param>
public sealed record ReadingRequest(Guid Id, string Point, string Typed, double? ValueSi = null, string? Instrument = null, string? Note = null, Guid? Replaces = null);

/// <summary>Readings of a request.</summary>
public sealed record ReadingsRequest(IReadOnlyList<ReadingRequest> Items);

/// <summary>Boards and their readings.</summary>
internal static class BoardEndpoints
{
    public static void MapBoards(this IEndpointRouteBuilder api)
    {
        api.MapGet("/boards", async (HttpContext http, ListBoards list, CancellationToken cancellation) =>
                Answers.Of(await list.Run(http.User.ToActor(), new ListBoardsInput(), cancellation), boards => new Listing<JsonObject>([.. boards.Select(Shape)])))
            .Described("ListBoards", "Boards with where they stand.",
                answer: """{ "items": [ { "id": "5c2c9a52-30cb-4e0a-8d0b-5d6f9b1c0005", "tag": "Q05", "band": "20 m", "stages": 12, "signed": 7, "isHeld": false } ] }""");

        api.MapPost("/boards/{id:guid}/readings", async (Guid id, ReadingsRequest request, HttpContext http, RecordMany record, CancellationToken cancellation) =>
                Answers.Of(
                    await record.Run(http.User.ToActor(), new RecordManyInput([.. request.Items.Select(r => new RecordInput(id, r.Id, r.Point, r.Typed, r.ValueSi, r.Instrument, r.Note ?? "", r.Replaces))]), cancellation),
                    items => new Listing<JsonObject>([.. items.Select((item, i) => Shape(item, i))])))
            .Described("RecordReadings", "Stores readings in the given order, each with the advice that follows. A refused one does not hold up the others.",
                request: """{ "items": [ { "id": "0f8fad5b-d9cb-469f-a165-70867728950e", "point": "A5.L4.L", "typed": "0,734 uH", "instrument": "M2" } ] }""",
                answer: """{ "items": [ { "id": "0f8fad5b-d9cb-469f-a165-70867728950e", "saved": true, "ordinal": 31, "verdict": "out", "steps": [ "Leave the turns. Spread them slightly." ] } ] }""");
    }

    private static JsonObject Shape(BoardSummary board) => new()
    {
        ["id"] = board.Id,
        ["tag"] = board.Tag,
        ["groupBuildId"] = board.GroupBuildId,
        ["planId"] = board.PlanId,
        ["band"] = board.BandName,
        ["stages"] = board.Stages,
        ["signed"] = board.Signed,
        ["begun"] = board.Begun,
        ["isHeld"] = board.IsHeld,
    };

    private static JsonObject Shape(RecordedItem item, int index)
    {
        var shape = new JsonObject { ["id"] = item.Id, ["saved"] = item.Recorded is not null };
        if (item.Recorded is { } recorded)
        {
            (shape["ordinal"], shape["isResend"]) = (recorded.Ordinal, recorded.IsResend);
            shape["verdict"] = Shapes.Camel(recorded.Advice.Verdict.ToString());
            shape["steps"] = new JsonArray([.. recorded.Advice.Ladder.Select(s => (JsonNode)Phrases.Say(s))]);
        }
        else
        {
            shape["errors"] = new JsonArray([.. item.Messages.Select(m => (JsonNode)new JsonObject { ["path"] = $"items[{index}].{m.Path}", ["code"] = m.Code, ["message"] = Answers.Words(m) })]);
        }

        return shape;
    }
}
