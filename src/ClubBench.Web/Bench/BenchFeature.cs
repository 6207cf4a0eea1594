using ClubBench.Club.UseCases.Boards;
using ClubBench.Web.SignIn;
using ClubBench.Web.Texts;
using Microsoft.AspNetCore.Antiforgery;
using Microsoft.AspNetCore.Http.HttpResults;
using Microsoft.Extensions.Localization;

namespace ClubBench.Web.Bench;

/// <summary>The builder's page of a board: one document without a circuit, and the two addresses its script uses.</summary>
public static class BenchFeature
{
    private const int MostEntries = 200;

    public static void AddBench(this WebApplicationBuilder builder)
    {
        builder.Services.AddScoped<BenchModels>();
        builder.Services.AddScoped<BenchEntries>();
    }

    public static void MapBench(this WebApplication app)
    {
        var bench = app.MapGroup("/bench").ExcludeFromDescription();
        bench.MapGet("", OwnBoardAsync);
        bench.MapGet("/{tag}", PageAsync);
        bench.MapGet("/{tag}/changes", ChangesAsync);
        bench.MapPost("/{tag}/entries", EntriesAsync);
    }

    /// <summary>Leads a builder to the board; without one, to the page that waits for it.</summary>
    private static async Task<IResult> OwnBoardAsync(HttpContext http, ListBoards list, CancellationToken cancellation)
    {
        var own = await list.Run(http.User.ToActor(), new ListBoardsInput(OwnOnly: true), cancellation);
        return own is { Succeeded: true, Value: [var first, ..] } ? Results.LocalRedirect($"/bench/{Uri.EscapeDataString(first.Tag)}") : new RazorComponentResult<NoBoardPage>();
    }

    private static async Task<IResult> PageAsync(string tag, HttpContext http, BenchModels models, IAntiforgery antiforgery, CancellationToken cancellation)
    {
        if (await models.OpenAsync(http.User.ToActor(), tag, cancellation) is not { } board) return Results.NotFound();
        return new RazorComponentResult<BenchPage>(new { Model = models.Model(board, TokenOf(http, antiforgery)) });
    }

    private static async Task<IResult> ChangesAsync(string tag, HttpContext http, BenchModels models, IAntiforgery antiforgery, CancellationToken cancellation)
    {
        if (await models.OpenAsync(http.User.ToActor(), tag, cancellation) is not { } board) return Results.NotFound();
        var stages = board.Stages.Select(StageScreens.Of).Select(s => new { key = s.Key, glyph = s.Look.Glyph, words = models.Words.State(s) });
        return Results.Json(new { token = TokenOf(http, antiforgery), call = models.CallWords(board), stages });
    }

    private static async Task<IResult> EntriesAsync(
        string tag, BenchEntriesRequest request, HttpContext http, BenchModels models, BenchEntries entries, IAntiforgery antiforgery, IStringLocalizer<NightTexts> texts, CancellationToken cancellation)
    {
        if (!await antiforgery.IsRequestValidAsync(http)) return Results.Problem(texts["bench.refused.token"], statusCode: StatusCodes.Status400BadRequest);
        if (request.Items.Count > MostEntries) return Results.Problem(texts["bench.refused.many"], statusCode: StatusCodes.Status413PayloadTooLarge);
        var actor = http.User.ToActor();
        if (await models.FindAsync(actor, tag, cancellation) is not { } board) return Results.NotFound();
        return Results.Json(new { items = await entries.TakeAsync(actor, board.Id, models.Words, request, cancellation) });
    }

    private static string TokenOf(HttpContext http, IAntiforgery antiforgery) => antiforgery.GetAndStoreTokens(http).RequestToken!;
}
