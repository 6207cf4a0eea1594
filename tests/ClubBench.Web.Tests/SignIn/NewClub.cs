using ClubBench.Club.Access;
using ClubBench.Club.UseCases.SignIn;
using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;
using Microsoft.Extensions.DependencyInjection;

namespace ClubBench.Web.Tests.SignIn;

/// <summary>The application on an empty database of its own.</summary>
public sealed class NewClub : WebApplicationFactory<Program>
{
    private readonly string _folder = Directory.CreateTempSubdirectory("clubbench-test-").FullName;

    /// <summary>The link a first start would print; made again, so that the printed one is void.</summary>
    public async Task<string> SetUpTokenAsync() =>
        (await Services.GetRequiredService<OfferSetUp>().Run(Actor.Host, new OfferSetUpInput())).Value.Token!;

    /// <summary>A client that follows no redirect and keeps cookies.</summary>
    public HttpClient Browser() => CreateClient(new WebApplicationFactoryClientOptions { AllowAutoRedirect = false, HandleCookies = true });

    protected override void ConfigureWebHost(IWebHostBuilder builder) => builder.UseSetting("ClubBench:DataFolder", _folder);

    protected override void Dispose(bool disposing)
    {
        base.Dispose(disposing);
        Microsoft.Data.Sqlite.SqliteConnection.ClearAllPools();
        if (Directory.Exists(_folder)) Directory.Delete(_folder, recursive: true);
    }
}
