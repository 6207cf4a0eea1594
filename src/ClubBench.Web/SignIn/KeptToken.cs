using Microsoft.AspNetCore.DataProtection;

namespace ClubBench.Web.SignIn;

/// <summary>Takes a token out of the address bar: it waits in a short-lived cookie of its own until the form that needs it comes back.</summary>
internal sealed class KeptToken(IDataProtectionProvider protection)
{
    private const string Cookie = "clubbench-door";
    private static readonly TimeSpan Life = TimeSpan.FromHours(1);
    private readonly ITimeLimitedDataProtector _protector = protection.CreateProtector("door token").ToTimeLimitedDataProtector();

    public void Keep(HttpContext context, string token) => context.Response.Cookies.Append(
        Cookie,
        _protector.Protect(token, Life),
        new CookieOptions { HttpOnly = true, SameSite = SameSiteMode.Lax, Secure = context.Request.IsHttps, MaxAge = Life, IsEssential = true });

    /// <summary>The token, or null when there is none or it is too old.</summary>
    public string? Of(HttpContext context)
    {
        if (context.Request.Cookies[Cookie] is not { Length: > 0 } value) return null;
        try
        {
            return _protector.Unprotect(value);
        }
        catch (System.Security.Cryptography.CryptographicException)
        {
            return null;
        }
    }

    public static void Forget(HttpContext context) => context.Response.Cookies.Delete(Cookie);
}
