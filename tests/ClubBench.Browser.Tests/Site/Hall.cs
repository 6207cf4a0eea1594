using System.Collections.Concurrent;
using Microsoft.Playwright;

namespace ClubBench.Browser.Tests.Site;

/// <summary>All browser tests share one hall and take turns in it.</summary>
[CollectionDefinition(Name)]
public sealed class HallCollection : ICollectionFixture<Hall>
{
    public const string Name = "hall";
}

/// <summary>One demo site and one browser for all tests; every person in a test has a browser context of their own.</summary>
public sealed class Hall : IAsyncLifetime
{
    private readonly ConcurrentDictionary<(string Role, Uri Address), Entrance> _entrances = new();
    private IPlaywright? _playwright;
    private IBrowser? _browser;
    private DemoSite? _site;

    public DemoSite Site => _site ?? throw new InvalidOperationException("The site has not started.");

    public async ValueTask InitializeAsync()
    {
        var path = await SystemBrowser.PathAsync();
        _site = await DemoSite.StartAsync();
        _playwright = await Playwright.CreateAsync();
        _browser = await _playwright.Chromium.LaunchAsync(new()
        {
            ExecutablePath = path,
            Args = ["--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync", "--host-resolver-rules=MAP hall.test 127.0.0.1"],
        });
    }

    public async ValueTask DisposeAsync()
    {
        if (_browser is not null) await _browser.CloseAsync();
        _playwright?.Dispose();
        if (_site is not null) await _site.DisposeAsync();
    }

    /// <summary>A person with a fresh browser, come in by the link printed for the role.</summary>
    public async Task<Visitor> FollowLinkAsync(string role)
    {
        var (_, visitor) = await OpenAsync(Site.Address, 1280, 800, dark: false);
        await visitor.GoAsync(Site.LinkOf(role).PathAndQuery);
        return visitor;
    }

    /// <summary>
    /// A person with a fresh browser, signed in and at the place of the role; null for a stranger. The link is followed once for each role, and later
    /// persons get its cookies, because the door slows down whoever comes in too often.
    /// </summary>
    public async Task<Visitor> EnterAsync(string? role, int width = 1280, int height = 800, bool dark = false, bool underHallName = false)
    {
        var address = underHallName ? Site.HallAddress : Site.Address;
        var (context, visitor) = await OpenAsync(address, width, height, dark);
        if (role is null) return visitor;
        if (_entrances.TryGetValue((role, address), out var entrance))
        {
            await context.AddCookiesAsync(entrance.Cookies);
            await visitor.GoAsync(entrance.Place);
            return visitor;
        }

        await visitor.GoAsync(Site.LinkOf(role).PathAndQuery);
        var cookies = (await context.CookiesAsync()).Select(c => new Cookie { Name = c.Name, Value = c.Value, Domain = c.Domain, Path = c.Path, HttpOnly = c.HttpOnly, Secure = c.Secure, SameSite = c.SameSite, Expires = c.Expires });
        _entrances[(role, address)] = new Entrance([.. cookies], new Uri(visitor.Page.Url).AbsolutePath);
        return visitor;
    }

    private async Task<(IBrowserContext Context, Visitor Visitor)> OpenAsync(Uri address, int width, int height, bool dark)
    {
        var context = await _browser!.NewContextAsync(new()
        {
            ViewportSize = new() { Width = width, Height = height },
            ColorScheme = dark ? ColorScheme.Dark : ColorScheme.Light,
            BaseURL = address.ToString(),
            Locale = "en-GB",
        });
        return (context, new Visitor(context, await context.NewPageAsync()));
    }

    /// <summary>What a role got at the door, and where it was led.</summary>
    private sealed record Entrance(IReadOnlyList<Cookie> Cookies, string Place);
}
