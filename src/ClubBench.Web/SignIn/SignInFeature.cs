using ClubBench.Club.Persistence;
using Microsoft.AspNetCore.Authentication;
using Microsoft.AspNetCore.Authentication.Cookies;
using Microsoft.AspNetCore.Authorization;
using Microsoft.AspNetCore.DataProtection;

namespace ClubBench.Web.SignIn;

/// <summary>Coming in: set-up link, sign-in link, join code, the cookie they lead to, and bearer tokens for programs.</summary>
public static class SignInFeature
{
    /// <summary>A night and the way home.</summary>
    private static readonly TimeSpan CookieLife = TimeSpan.FromHours(12);

    public static void AddSignIn(this WebApplicationBuilder builder)
    {
        var services = builder.Services;
        services.AddDataProtection().SetApplicationName("ClubBench").PersistKeysToDbContext<ClubContext>();
        services.AddAuthentication(SignInSchemes.Either)
            .AddPolicyScheme(SignInSchemes.Either, null, o => o.ForwardDefaultSelector = c => c.Request.Headers.ContainsKey("Authorization") ? SignInSchemes.ApiToken : SignInSchemes.Cookie)
            .AddCookie(SignInSchemes.Cookie, Cookie)
            .AddScheme<AuthenticationSchemeOptions, ApiTokenHandler>(SignInSchemes.ApiToken, null);
        services.AddAuthorizationBuilder().SetFallbackPolicy(new AuthorizationPolicyBuilder().RequireAuthenticatedUser().Build());
        services.AddScoped<CurrentActor>();
        services.AddEntryLimits();
        services.AddSingleton<KeptToken>();
        services.AddSingleton<SetUpDoor>();
        services.AddHostedService<SetUpNotice>();
    }

    public static void MapSignIn(this WebApplication app)
    {
        app.MapEntries();
        app.MapSignOut();
    }

    private static void Cookie(CookieAuthenticationOptions options)
    {
        options.Cookie.Name = SignInSchemes.CookieName;
        options.Cookie.HttpOnly = true;
        options.Cookie.SameSite = SameSiteMode.Lax;
        options.Cookie.SecurePolicy = CookieSecurePolicy.SameAsRequest;
        options.ExpireTimeSpan = CookieLife;
        options.SlidingExpiration = true;
        options.LoginPath = "/sign-in";
        options.AccessDeniedPath = "/sign-in";
        options.ReturnUrlParameter = "to";
        options.Events.OnRedirectToLogin = context => AnswerOr(context, StatusCodes.Status401Unauthorized);
        options.Events.OnRedirectToAccessDenied = context => AnswerOr(context, StatusCodes.Status403Forbidden);
    }

    /// <summary>People are led to the sign-in page; scripts and programs get the plain status.</summary>
    private static Task AnswerOr(RedirectContext<CookieAuthenticationOptions> context, int status)
    {
        var isPage = HttpMethods.IsGet(context.Request.Method) && context.Request.Headers.Accept.ToString().Contains("text/html", StringComparison.OrdinalIgnoreCase);
        if (isPage) context.Response.Redirect(context.RedirectUri);
        else context.Response.StatusCode = status;
        return Task.CompletedTask;
    }
}
