namespace ClubBench.Web.SignIn;

/// <summary>Names of the ways in.</summary>
public static class SignInSchemes
{
    /// <summary>Chooses by the request: a bearer token for programs, else the cookie.</summary>
    public const string Either = "either";

    public const string Cookie = "cookie";

    public const string ApiToken = "api-token";

    /// <summary>Name of the cookie.</summary>
    public const string CookieName = "clubbench";
}
