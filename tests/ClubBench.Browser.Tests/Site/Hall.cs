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

    /// <summary>A person with a fresh browser, signed in by the link printed for the role; null for a stranger.</summary>
    public async Task<Visitor> EnterAsync(string? role, int width = 1280, int height = 800, bool dark = false, bool underHallName = false)
    {
        var context = await _browser!.NewContextAsync(new()
        {
            ViewportSize = new() { Width = width, Height = height },
            ColorScheme = dark ? ColorScheme.Dark : ColorScheme.Light,
            BaseURL = (underHallName ? Site.HallAddress : Site.Address).ToString(),
            Locale = "en-GB",
        });
        var visitor = new Visitor(context, await context.NewPageAsync());
        if (role is not null) await visitor.GoAsync(Site.LinkOf(role).PathAndQuery);
        return visitor;
    }
}
