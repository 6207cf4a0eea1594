using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Text;
using ClubBench.Printing.Layout;
using ClubBench.Printing.Sheets;
using ClubBench.Web.SignIn;

namespace ClubBench.Web.Api;

/// <summary>Files of a plan.</summary>
internal static class PlanFileEndpoints
{
    public static void MapPlanFiles(this IEndpointRouteBuilder api) =>
        api.MapGet("/plans/{id:guid}/cards.pdf", CardsAsync)
            .Described("PrintCards", "Build cards of a plan as one PDF; with stage, one card.")
            .Produces(StatusCodes.Status200OK, contentType: "application/pdf");

    private static async Task<IResult> CardsAsync(Guid id, string? stage, HttpContext http, OpenPlan openPlan, OpenCards openCards, TimeProvider clock, CancellationToken cancellation)
    {
        var actor = http.User.ToActor();
        var plan = await openPlan.Run(actor, new OpenPlanInput(id), cancellation);
        if (!plan.Succeeded) return Answers.Problem(plan.Messages);
        var cards = await openCards.Run(actor, new OpenCardsInput(id, stage), cancellation);
        if (!cards.Succeeded) return Answers.Problem(cards.Messages);
        var today = DateOnly.FromDateTime(clock.GetLocalNow().DateTime);
        var fromBand = QuantityText.Format(plan.Value.Plan.Inputs.Kit.Band);
        var address = $"{http.Request.Scheme}://{http.Request.Host}/c/";
        return Results.File(CardSet.Pdf([.. cards.Value.Select(c => Printed(c, fromBand, today, address))]), "application/pdf", stage is null ? "cards.pdf" : $"card-{stage}.pdf");
    }

    private static PrintedCard Printed(OpenedCard card, string fromBand, DateOnly today, string address) => new(
        card.Content,
        new CardContext("", card.KitName, card.BoardIssue, fromBand, card.BandName, "", null, null, card.Number, card.PlanRevision, today, address + card.Id, PaperSize.A4, new Dictionary<InstrumentClass, string>()));
}
