using ClubBench.Club.UseCases.Clubs;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning.Orders;
using ClubBench.Planning.Text;
using ClubBench.Printing.Layout;
using ClubBench.Printing.Sheets;
using ClubBench.Web.Components.Pages.Orders;
using ClubBench.Web.SignIn;
using ClubBench.Web.State;

namespace ClubBench.Web.Api;

/// <summary>Files of a plan: what is printed and what is ordered. Pages link to them too.</summary>
internal static class PlanFileEndpoints
{
    private const string Pdf = "application/pdf";
    private const string Csv = "text/csv";
    private const string OrderExample = OrderSheet.Headings + "\"Core\",\"T37-6\",\"\",\"\",21,3,24,0\r\n\"Capacitor\",\"NP0\",\"360 pF\",\"100 V\",14,2,0,16\r\n";
    private const string Spreadsheet = "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet";

    public static void MapPlanFiles(this IEndpointRouteBuilder api)
    {
        api.MapGet("/plans/{id:guid}/cards.pdf", CardsAsync)
            .Described("PrintCards", "Build cards of a plan as one PDF; with stage, one card.")
            .Produces(StatusCodes.Status200OK, contentType: Pdf);

        api.MapGet("/plans/{id:guid}/parts-order.csv", (Guid id, int? boards, PartsOrderOf order, HttpContext http) => CsvAsync(new PartsOrderOfInput(null, id, boards), order, http))
            .Described("OrderPartsAsCsv", "Parts for all boards of a plan, with spares, less stock; with boards, for that many.", answer: OrderExample, answerType: Csv)
            .Produces(StatusCodes.Status200OK, contentType: Csv);

        api.MapGet("/plans/{id:guid}/parts-order.xlsx", (Guid id, int? boards, PartsOrderOf order, HttpContext http) => SpreadsheetAsync(new PartsOrderOfInput(null, id, boards), order, http))
            .Described("OrderPartsAsSpreadsheet", "The same order as a spreadsheet.")
            .Produces(StatusCodes.Status200OK, contentType: Spreadsheet);

        api.MapGet("/group-builds/{id:guid}/parts-order.csv", (Guid id, PartsOrderOf order, HttpContext http) => CsvAsync(new PartsOrderOfInput(id), order, http))
            .Described("OrderPartsOfGroupBuildAsCsv", "Parts for all boards of a group build, whatever plan they follow.", answer: OrderExample, answerType: Csv)
            .Produces(StatusCodes.Status200OK, contentType: Csv);

        api.MapGet("/group-builds/{id:guid}/parts-order.xlsx", (Guid id, PartsOrderOf order, HttpContext http) => SpreadsheetAsync(new PartsOrderOfInput(id), order, http))
            .Described("OrderPartsOfGroupBuildAsSpreadsheet", "The same order as a spreadsheet.")
            .Produces(StatusCodes.Status200OK, contentType: Spreadsheet);
    }

    private static Task<IResult> CsvAsync(PartsOrderOfInput input, PartsOrderOf order, HttpContext http) => OrderAsync(input, order, http, OrderSheet.Csv, Csv, "parts-order.csv");

    private static Task<IResult> SpreadsheetAsync(PartsOrderOfInput input, PartsOrderOf order, HttpContext http) => OrderAsync(input, order, http, OrderSheet.Xlsx, Spreadsheet, "parts-order.xlsx");

    private static async Task<IResult> OrderAsync(PartsOrderOfInput input, PartsOrderOf order, HttpContext http, Func<PartsOrder, byte[]> write, string type, string name)
    {
        var found = await order.Run(http.User.ToActor(), input, http.RequestAborted);
        return found.Succeeded ? Results.File(write(found.Value), type, name) : Answers.Problem(found.Messages);
    }

    private static async Task<IResult> CardsAsync(Guid id, string? stage, HttpContext http, OpenPlan openPlan, OpenCards openCards, AboutClub aboutClub, ClubTimes times, CancellationToken cancellation)
    {
        var actor = http.User.ToActor();
        var plan = await openPlan.Run(actor, new OpenPlanInput(id), cancellation);
        if (!plan.Succeeded) return Answers.Problem(plan.Messages);
        var cards = await openCards.Run(actor, new OpenCardsInput(id, stage), cancellation);
        if (!cards.Succeeded) return Answers.Problem(cards.Messages);
        var club = await aboutClub.Run(actor, new AboutClubInput(), cancellation);
        if (!club.Succeeded) return Answers.Problem(club.Messages);
        await times.LoadAsync(actor, cancellation);
        var print = new CardPrint(club.Value, QuantityText.Format(plan.Value.Plan.Inputs.Kit.Band), DateOnly.FromDateTime(times.Now), $"{http.Request.Scheme}://{http.Request.Host}");
        return Results.File(CardSet.Pdf([.. cards.Value.Select(print.Of)]), Pdf, stage is null ? "cards.pdf" : $"card-{stage}.pdf");
    }

    /// <summary>What all cards of one print share.</summary>
    private sealed record CardPrint(ClubProfile Club, string FromBand, DateOnly Date, string Server)
    {
        public PrintedCard Of(OpenedCard card) => new(
            card.Content,
            new CardContext(
                Club.Name, card.KitName, card.BoardIssue, FromBand, card.BandName, "", null, null, card.Number, card.PlanRevision, Date, $"{Server}/c/{card.Id}", PaperSize.A4,
                Club.Instruments.ToDictionary(i => i.Key, i => string.Join(", ", i.Value))));
    }
}
