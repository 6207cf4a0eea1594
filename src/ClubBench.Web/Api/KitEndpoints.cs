using System.Text.Json.Nodes;
using ClubBench.Club.UseCases.Kits;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;
using ClubBench.Planning.Text;
using ClubBench.Web.SignIn;

namespace ClubBench.Web.Api;

/// <summary>Kits: list, take in, back-check, bands at a glance.</summary>
internal static class KitEndpoints
{
    private const string KitExample = """{ "id": "5f0f4b1e-2f5c-4f8e-9d0a-6f7c3c1e0a30", "revision": 1, "name": "Quern-30", "mode": "cw", "bandLowHz": 10100000, "bandHighHz": 10150000, "stages": 12, "plans": 2 }""";

    public static void MapKits(this IEndpointRouteBuilder api)
    {
        api.MapGet("/kits", async (HttpContext http, ListKits list, CancellationToken cancellation) =>
                Answers.Of(await list.Run(http.User.ToActor(), new ListKitsInput(), cancellation), kits => new Listing<JsonObject>([.. kits.Select(Shape)])))
            .Described("ListKits", "Kits of the club, each in its newest revision.", answer: $$"""{ "items": [ {{KitExample}} ] }""");

        api.MapPost("/kits", async (HttpContext http, ImportKit import, CancellationToken cancellation) =>
                Answers.Made(await import.Run(http.User.ToActor(), new ImportKitInput(http.Request.Body), cancellation), k => $"/api/v1/kits/{k.KitId}", k => new { id = k.KitId, k.Revision, k.Name }))
            .Described("ImportKit", "Takes in a kit file. A faulty one changes nothing and gets a message for each fault.",
                request: """{ "formatVersion": 1, "name": "Quern-30", "mode": "cw", "stages": [] }""",
                answer: """{ "id": "5f0f4b1e-2f5c-4f8e-9d0a-6f7c3c1e0a30", "revision": 1, "name": "Quern-30" }""")
            .Produces(StatusCodes.Status201Created);

        api.MapGet("/kits/{id:guid}/back-check", async (Guid id, HttpContext http, OpenKit open, CancellationToken cancellation) =>
                Answers.Of(await open.Run(http.User.ToActor(), new OpenKitInput(id), cancellation), k => Shape(k.BackCheck)))
            .Described("BackCheckKit", "The kit computed on its own band: what the papers say, what comes out, off by how much.",
                answer: """{ "stages": [ { "stage": "A5", "verdict": "agrees", "rows": [ { "name": "loss", "verdict": "agrees", "computed": { "name": "loss", "valueDb": 0.22, "text": "0.2 dB", "from": "derived" } } ] } ] }""");

        api.MapGet("/kits/{id:guid}/bands", async (Guid id, HttpContext http, SurveyBands survey, CancellationToken cancellation) =>
                Answers.Of(await survey.Run(http.User.ToActor(), new SurveyBandsInput(id), cancellation), Shape))
            .Described("SurveyBands", "Every band for one kit: the action per stage and the judgement.",
                answer: """{ "items": [ { "band": "20 m", "isOwnBand": false, "verdict": "withCare", "reasons": [ "A small move up." ], "stages": [ { "stage": "A5", "action": "change", "changes": 7 } ] } ] }""");
    }

    private static JsonObject Shape(KitSummary kit)
    {
        var shape = new JsonObject { ["id"] = kit.Id, ["revision"] = kit.Revision, ["name"] = kit.Name, ["boardIssue"] = kit.BoardIssue, ["mode"] = Shapes.Camel(kit.Mode.ToString()) };
        shape.Put("bandLow", QuantityKind.Frequency, kit.Band.Low.Hertz);
        shape.Put("bandHigh", QuantityKind.Frequency, kit.Band.High.Hertz);
        (shape["stages"], shape["plans"]) = (kit.Stages, kit.Plans);
        return shape;
    }

    private static JsonObject Shape(BackCheck check) => new()
    {
        ["kitId"] = check.Kit.Id,
        ["stages"] = new JsonArray([.. check.Stages.Select(s => Shape(s, check.Kit.Stage(s.Stage).Kind))]),
    };

    private static JsonObject Shape(StageCheck check, string kind) => new()
    {
        ["stage"] = check.Stage,
        ["verdict"] = Shapes.Camel(check.Verdict.ToString()),
        ["rows"] = new JsonArray([.. check.Rows.Select(Shape)]),
        ["findings"] = Shapes.Of(check.Findings, kind),
    };

    private static JsonObject Shape(CheckRow row) => new()
    {
        ["name"] = row.Name,
        ["designator"] = row.Designator,
        ["stated"] = row.Stated is { } stated ? Shapes.Of(stated) : null,
        ["computed"] = Shapes.Of(row.Computed),
        ["offBy"] = row.OffBy is { } off ? Shapes.Of(off) : null,
        ["verdict"] = Shapes.Camel(row.Verdict.ToString()),
    };

    private static Listing<JsonObject> Shape(BandSurvey survey) => new([.. survey.Columns.Select(c => new JsonObject
    {
        ["band"] = c.Target.BandName,
        ["isOwnBand"] = c.IsOwnBand,
        ["verdict"] = Shapes.Camel(c.Judgement.Verdict.ToString()),
        ["reasons"] = new JsonArray([.. c.Judgement.Reasons.Select(r => (JsonNode)Phrases.Say(r))]),
        ["openItems"] = new JsonArray([.. c.OpenItems.Select(i => (JsonNode)new JsonObject { ["code"] = i.Code, ["stage"] = i.Stage, ["text"] = Phrases.Say(i) })]),
        ["stages"] = new JsonArray([.. c.Cells.Select(s => (JsonNode)new JsonObject { ["stage"] = s.Stage, ["action"] = Shapes.Camel(s.Action.ToString()), ["changes"] = s.Changes })]),
    })]);
}
