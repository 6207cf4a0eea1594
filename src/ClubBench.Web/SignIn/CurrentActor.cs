using ClubBench.Club.Access;
using Microsoft.AspNetCore.Components.Authorization;

namespace ClubBench.Web.SignIn;

/// <summary>Who acts in this page or circuit.</summary>
public sealed class CurrentActor(AuthenticationStateProvider authentication)
{
    public async Task<Actor> GetAsync() => (await authentication.GetAuthenticationStateAsync()).User.ToActor();
}
