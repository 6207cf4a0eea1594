using Microsoft.AspNetCore.Hosting.Server;
using Microsoft.AspNetCore.Hosting.Server.Features;

namespace ClubBench.Web.SignIn;

/// <summary>Where this server is reached.</summary>
internal static class Addresses
{
    /// <summary>The first address listened on, without a slash at its end.</summary>
    public static string Of(IServiceProvider services)
    {
        var first = services.GetRequiredService<IServer>().Features.Get<IServerAddressesFeature>()?.Addresses.FirstOrDefault() ?? "http://localhost";
        return first.Replace("0.0.0.0", "localhost", StringComparison.Ordinal).Replace("[::]", "localhost", StringComparison.Ordinal).TrimEnd('/');
    }
}
