using System.Text.Encodings.Web;
using ClubBench.Club.Access;
using ClubBench.Club.UseCases.SignIn;
using Microsoft.AspNetCore.Authentication;
using Microsoft.Extensions.Options;

namespace ClubBench.Web.SignIn;

/// <summary>Lets a program in by the bearer token a coordinator made for it.</summary>
internal sealed class ApiTokenHandler(IOptionsMonitor<AuthenticationSchemeOptions> options, ILoggerFactory logger, UrlEncoder encoder, FindByToken findByToken)
    : AuthenticationHandler<AuthenticationSchemeOptions>(options, logger, encoder)
{
    private const string Prefix = "Bearer ";

    protected override async Task<AuthenticateResult> HandleAuthenticateAsync()
    {
        var header = Request.Headers.Authorization.ToString();
        if (!header.StartsWith(Prefix, StringComparison.OrdinalIgnoreCase)) return AuthenticateResult.NoResult();
        var found = await findByToken.Run(Actor.Visitor, new FindByTokenInput(header[Prefix.Length..].Trim()), Context.RequestAborted);
        return found.Succeeded
            ? AuthenticateResult.Success(new AuthenticationTicket(found.Value.ToPrincipal(Scheme.Name), Scheme.Name))
            : AuthenticateResult.Fail("The token is not known or was taken back.");
    }
}
