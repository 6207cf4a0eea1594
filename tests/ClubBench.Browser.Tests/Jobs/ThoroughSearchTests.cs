using ClubBench.Browser.Tests.Site;
using Microsoft.Playwright;

namespace ClubBench.Browser.Tests.Jobs;

/// <summary>A coordinator lets the program look through everything for one stage.</summary>
[Collection(HallCollection.Name)]
public sealed class ThoroughSearchTests(Hall hall)
{
    /// <summary>As long as a search may run; nothing here is about how long it takes.</summary>
    private const float AsLongAsItTakes = 130_000;

    [Fact]
    public async Task Search_OfAStage_RunsAndOffersWhatItFoundAmongTheChoices()
    {
        await using var coordinator = await hall.EnterAsync("coordinator");
        var (search, page) = await OpenAsync(coordinator, "A5");
        var choices = page.Locator("table.choices tbody tr");
        var before = await choices.CountAsync();
        var revision = await page.Locator("header.strip").TextContentAsync();

        await search.Button("Search thoroughly").ClickAsync();

        await Assertions.Expect(search.Status).ToContainTextAsync("percent looked through");
        await Assertions.Expect(page.GetByRole(AriaRole.Progressbar)).ToHaveAttributeAsync("aria-label", "Thorough search for A5");
        await Assertions.Expect(search.Status).ToContainTextAsync("found: they stand among the choices", new() { Timeout = AsLongAsItTakes });
        await Assertions.Expect(search.Button("Search thoroughly")).ToBeVisibleAsync();
        await Assertions.Expect(choices.Nth(before)).ToBeVisibleAsync();
        Assert.Equal(revision, await page.Locator("header.strip").TextContentAsync());
    }

    [Fact]
    public async Task Search_Stopped_LeavesPlanAndChoicesAsTheyWere()
    {
        await using var coordinator = await hall.EnterAsync("coordinator");
        var (search, page) = await OpenAsync(coordinator, "A5");
        var choices = await page.Locator("table.choices").InnerTextAsync();
        var strip = await page.Locator("header.strip").TextContentAsync();
        await search.Button("Search thoroughly").ClickAsync();

        await search.Button("Stop searching").ClickAsync();

        await Assertions.Expect(search.Status).ToHaveTextAsync("Stopped. The plan stays as it was.");
        await Assertions.Expect(search.Button("Search thoroughly")).ToBeVisibleAsync();
        Assert.Equal(choices, await page.Locator("table.choices").InnerTextAsync());
        Assert.Equal(strip, await page.Locator("header.strip").TextContentAsync());
    }

    private static async Task<(SearchBar Search, IPage Page)> OpenAsync(Visitor visitor, string stage)
    {
        await visitor.GoAsync("/plans");
        var plan = await visitor.Page.GetByRole(AriaRole.Link, new() { Name = "Quern-30 on 40 m" }).First.GetAttributeAsync("href");
        await visitor.GoAsync($"{plan}?stage={stage}");
        return (new SearchBar(visitor.Page.Locator("#choices")), visitor.Page);
    }

    private sealed record SearchBar(ILocator Place)
    {
        public ILocator Status => Place.Locator("[role=status]").Last;

        public ILocator Button(string name) => Place.GetByRole(AriaRole.Button, new() { Name = name });
    }
}
