using System.Globalization;
using System.Security.Claims;
using ClubBench.Club.Access;

namespace ClubBench.Web.SignIn;

/// <summary>The acting person as claims of the sign-in cookie, and back. Use cases look the membership up again on every run; the claims only say who asks.</summary>
public static class ActorClaims
{
    private const string Club = "club";
    private const string Board = "board";
    private const string Night = "night";

    public static ClaimsPrincipal ToPrincipal(this Actor actor, string scheme)
    {
        List<Claim> claims =
        [
            new(ClaimTypes.NameIdentifier, actor.PersonId.ToString()),
            new(ClaimTypes.Name, actor.DisplayName),
            new(ClaimTypes.Role, actor.Role.ToString()),
            new(Club, actor.ClubId.ToString()),
            .. actor.BoardTags.Select(tag => new Claim(Board, tag)),
        ];
        if (actor.NightId is { } night) claims.Add(new Claim(Night, night.ToString()));
        return new ClaimsPrincipal(new ClaimsIdentity(claims, scheme));
    }

    /// <summary>Who asks; a visitor when nobody is signed in or the claims do not read.</summary>
    public static Actor ToActor(this ClaimsPrincipal? user)
    {
        if (user?.Identity?.IsAuthenticated != true) return Actor.Visitor;
        if (Id(user, ClaimTypes.NameIdentifier) is not { } person || Id(user, Club) is not { } club) return Actor.Visitor;
        if (!Enum.TryParse<Role>(user.FindFirstValue(ClaimTypes.Role), out var role)) return Actor.Visitor;
        return new Actor(person, club, role, user.FindFirstValue(ClaimTypes.Name) ?? "", [.. user.FindAll(Board).Select(c => c.Value)], Id(user, Night));
    }

    private static Guid? Id(ClaimsPrincipal user, string claim) =>
        Guid.TryParse(user.FindFirstValue(claim), CultureInfo.InvariantCulture, out var id) ? id : null;
}
