using ClubBench.Club.Access;
using ClubBench.Club.UseCases.SignIn;
using ClubBench.Planning;
using Microsoft.AspNetCore.Authentication;
using Microsoft.AspNetCore.Mvc;

namespace ClubBench.Web.SignIn;

/// <summary>The ways in. Forms carry an antiforgery token; links are taken out of the address bar by a redirect.</summary>
internal static class Entries
{
    public static void MapEntries(this WebApplication app)
    {
        var door = app.MapGroup("").AllowAnonymous().ExcludeFromDescription();
        door.MapGet("/sign-in/{token}", FollowLink).RequireEntryLimit();
        door.MapGet("/join/{token}", FollowLink).RequireEntryLimit();
        door.MapPost("/join", Join).RequireEntryLimit();
        door.MapPost("/join/back", Rejoin).RequireEntryLimit();
        door.MapPost("/sign-in", SignInByName).RequireEntryLimit();
        door.MapPost("/setup", SetUp).RequireEntryLimit();
    }

    public static void MapSignOut(this WebApplication app) => app.MapPost("/sign-out", async (HttpContext context, [FromForm] string? to) =>
    {
        await context.SignOutAsync(SignInSchemes.Cookie);
        return Results.LocalRedirect("/sign-in");
    }).AllowAnonymous().ExcludeFromDescription();

    /// <summary>A personal link signs in at once; a night's link first asks for a name.</summary>
    private static async Task<IResult> FollowLink(HttpContext context, string token, RedeemLink redeem, KeptToken kept, CancellationToken cancellation)
    {
        var outcome = await redeem.Run(Actor.Visitor, new RedeemLinkInput(token), cancellation);
        if (outcome.Succeeded) return await Door.EnterAsync(context, outcome.Value);
        if (outcome.Messages[0].Path != "displayName") return Door.Refuse("/sign-in", outcome.Messages[0].Code);
        kept.Keep(context, token);
        return Results.LocalRedirect("/join");
    }

    private static async Task<IResult> Join(
        HttpContext context, [FromForm] string? code, [FromForm] string name, JoinByCode join, RedeemLink redeem, KeptToken kept, CancellationToken cancellation)
    {
        var isByLink = string.IsNullOrWhiteSpace(code);
        var outcome = isByLink
            ? await redeem.Run(Actor.Visitor, new RedeemLinkInput(kept.Of(context) ?? "", name), cancellation)
            : await join.Run(Actor.Visitor, new JoinByCodeInput(code!, name), cancellation);
        return await AnswerAsync(context, outcome, isByLink && kept.Of(context) is not null ? "/join" : "/sign-in");
    }

    private static async Task<IResult> Rejoin(HttpContext context, [FromForm] string code, [FromForm] string board, RejoinBoard rejoin, CancellationToken cancellation) =>
        await AnswerAsync(context, await rejoin.Run(Actor.Visitor, new RejoinBoardInput(code, board), cancellation), "/sign-in");

    private static async Task<IResult> SignInByName(
        HttpContext context, [FromForm] string name, [FromForm] string password, [FromForm] string? to, SignInByPassword signIn, CancellationToken cancellation) =>
        await AnswerAsync(context, await signIn.Run(Actor.Visitor, new SignInByPasswordInput(name, password), cancellation), "/sign-in", to);

    private static async Task<IResult> SetUp(
        HttpContext context, [FromForm] string club, [FromForm] string name, [FromForm] string password, [FromForm] string? zone,
        FirstSetUp setUp, KeptToken kept, SetUpDoor door, CancellationToken cancellation)
    {
        if (!door.IsOpen || kept.Of(context) is not { } token) return Results.NotFound();
        var outcome = await setUp.Run(Actor.Visitor, new FirstSetUpInput(token, club, name, password, string.IsNullOrWhiteSpace(zone) ? "Etc/UTC" : zone), cancellation);
        if (outcome.Succeeded) door.Close();
        return outcome.Messages.Any(m => m.Code == "set-up.token-void") ? Results.NotFound() : await AnswerAsync(context, outcome, "/setup");
    }

    private static async Task<IResult> AnswerAsync(HttpContext context, Outcome<Actor> outcome, string page, string? to = null) =>
        outcome.Succeeded ? await Door.EnterAsync(context, outcome.Value, to) : Door.Refuse(page, outcome.Messages[0].Code);
}
