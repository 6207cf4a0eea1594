using ClubBench.Club.Access;
using Microsoft.AspNetCore.Authentication;

namespace ClubBench.Web.SignIn;

/// <summary>Lets somebody in and shows the way to their place.</summary>
internal static class Door
{
    /// <summary>Sets the cookie, which outlives a closed browser for the evening, and leads on: to the page asked for, else to where the person works.</summary>
    public static async Task<IResult> EnterAsync(HttpContext context, Actor actor, string? to = null)
    {
        KeptToken.Forget(context);
        await context.SignInAsync(SignInSchemes.Cookie, actor.ToPrincipal(SignInSchemes.Cookie), new AuthenticationProperties { IsPersistent = true });
        return Results.LocalRedirect(IsHere(to) ? to! : HomeOf(actor));
    }

    /// <summary>Where a person of this role works.</summary>
    public static string HomeOf(Actor actor) => actor.Role switch
    {
        Role.Coordinator => "/kits",
        Role.Mentor => "/boards",
        _ => actor.BoardTags.Count > 0 ? $"/bench/{Uri.EscapeDataString(actor.BoardTags[0])}" : "/bench",
    };

    /// <summary>Back to the door, saying what was wrong.</summary>
    public static IResult Refuse(string page, string code) => Results.LocalRedirect($"{page}?problem={Uri.EscapeDataString(code)}");

    private static bool IsHere(string? to) => to is { Length: > 1 } && to[0] == '/' && to[1] is not ('/' or '\\');
}
