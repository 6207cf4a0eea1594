using System.Text.Json.Nodes;
using ClubBench.Calculation.Bands;
using ClubBench.Calculation.Quantities;
using ClubBench.Club.UseCases.Kits;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning;
using ClubBench.Planning.Plans;
using ClubBench.Web.SignIn;

namespace ClubBench.Web.Api;

/// <summary>What a program says to plan a move.</summary>
/// <param name="KitId">The kit.</param>
/// <param name="Band">Band name of the table, "20 m".</param>
/// <param name="Name">Name of the plan; empty for kit and band.</param>
/// <param name="OutputPowerW">Power wanted at the antenna; empty for the kit's own.</param>
public sealed record PlanRequest(Guid KitId, string Band, string? Name = null, double? OutputPowerW = null);

/// <summary>Plans: list, make, look into.</summary>
internal static class PlanEndpoints
{
    private const string SummaryExample = """{ "id": "a3f1c1de-8f0b-4a6e-8f3d-6a5d5d7a2020", "name": "Quern-30 to 20 m", "band": "20 m", "revision": 4, "state": "issued", "openItems": 0, "verdict": "withCare" }""";

    public static void MapPlans(this IEndpointRouteBuilder api)
    {
        api.MapGet("/plans", async (HttpContext http, ListPlans list, CancellationToken cancellation) =>
                Answers.Of(await list.Run(http.User.ToActor(), new ListPlansInput(), cancellation), plans => new Listing<JsonObject>([.. plans.Select(Shape)])))
            .Described("ListPlans", "Plans in their newest revision.", answer: $$"""{ "items": [ {{SummaryExample}} ] }""");

        api.MapPost("/plans", MakeAsync)
            .Described("MakePlan", "Plans a move of a kit to another band and stores it as a draft.",
                request: """{ "kitId": "5f0f4b1e-2f5c-4f8e-9d0a-6f7c3c1e0a30", "band": "20 m", "outputPowerW": 1.5 }""",
                answer: """{ "id": "a3f1c1de-8f0b-4a6e-8f3d-6a5d5d7a2020", "revision": 1 }""")
            .Produces(StatusCodes.Status201Created);

        api.MapGet("/plans/{id:guid}", async (Guid id, HttpContext http, OpenPlan open, CancellationToken cancellation) =>
                Answers.Of(await open.Run(http.User.ToActor(), new OpenPlanInput(id), cancellation), PlanShape.Of))
            .Described("OpenPlan", "A plan: what changes stage by stage and why, budgets, what is open, the judgement.",
                answer: """{ "name": "Quern-30 to 20 m", "stages": [ { "stage": "A5", "action": "change", "changes": [ { "designator": "L3" } ] } ], "openItems": [] }""");
        api.MapPlanFiles();

    }

    private static async Task<IResult> MakeAsync(PlanRequest request, HttpContext http, OpenKit openKit, CreatePlan create, CancellationToken cancellation)
    {
        var actor = http.User.ToActor();
        var kit = await openKit.Run(actor, new OpenKitInput(request.KitId), cancellation);
        if (!kit.Succeeded) return Answers.Problem(kit.Messages);
        if (TargetDefaults.On(request.Band, kit.Value.Kit, ItuRegion.Region1) is not { } target)
            return Answers.Problem([FieldMessage.Error("band", "target.band-unknown", ("band", request.Band))]);
        if (request.OutputPowerW is { } watt)
        {
            if (!double.IsFinite(watt) || watt <= 0) return Answers.Problem([FieldMessage.Error("outputPowerW", "field.not-positive")]);
            target = target with { WantedPower = Power.FromWatt(watt) };
        }

        var name = string.IsNullOrWhiteSpace(request.Name) ? $"{kit.Value.Kit.Name}, {request.Band}" : request.Name;
        return Answers.Made(await create.Run(actor, new CreatePlanInput(request.KitId, name, target), cancellation), p => $"/api/v1/plans/{p.PlanId}", p => new { id = p.PlanId, p.Revision });
    }

    private static JsonObject Shape(PlanSummary plan) => new()
    {
        ["id"] = plan.Id,
        ["name"] = plan.Name,
        ["kitId"] = plan.KitId,
        ["kit"] = plan.KitName,
        ["band"] = plan.BandName,
        ["revision"] = plan.Revision,
        ["state"] = Shapes.Camel(plan.State.ToString()),
        ["openItems"] = plan.OpenItems,
        ["verdict"] = Shapes.Camel(plan.Judgement.ToString()),
        ["boards"] = plan.Boards,
    };
}
