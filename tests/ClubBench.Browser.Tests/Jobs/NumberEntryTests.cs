using System.Text.RegularExpressions;
using ClubBench.Browser.Tests.Site;
using Microsoft.Playwright;

namespace ClubBench.Browser.Tests.Jobs;

/// <summary>What the phone says to typed numbers before anything is saved.</summary>
[Collection(HallCollection.Name)]
public sealed class NumberEntryTests(Hall hall)
{
    [Fact]
    public async Task Entry_WithTwoMarks_IsRefusedWithWhatWouldBeRight()
    {
        await using var phone = await hall.EnterAsync("builder", 390, 844);
        var bench = await BenchScreen.OfAsync(phone);
        var point = bench.PointAt(0);

        await bench.TypeAndSaveAsync(point, "14.05,2");

        await Assertions.Expect(bench.Form(point).Locator("output")).ToHaveTextAsync("Two decimal marks. Type 14.052 or 14,052.");
        Assert.Equal(0, await bench.WaitingAsync());
        Assert.StartsWith("Error:", await phone.Page.TitleAsync(), StringComparison.Ordinal);
        await bench.Field(point).FillAsync("");
    }

    [Fact]
    public async Task Entry_TenTimesTooLarge_AsksBeforeItSaves()
    {
        await using var phone = await hall.EnterAsync("builder", 390, 844);
        var bench = await BenchScreen.OfAsync(phone);
        var point = bench.PointAt(0);

        await bench.TypeAndSaveAsync(point, point.Slipped(10));

        await Assertions.Expect(bench.Advice(point)).ToContainTextAsync("10 times what it should be");
        Assert.Equal(0, await bench.WaitingAsync());
        await bench.Advice(point).GetByRole(AriaRole.Button, new() { NameRegex = new("Did you mean", RegexOptions.None, TimeSpan.FromSeconds(1)) }).ClickAsync();
        await bench.AllSentAsync();
        await Assertions.Expect(bench.Advice(point)).ToHaveAttributeAsync("data-verdict", "Good");
    }

    [Fact]
    public async Task Reading_ByKeyboardOnly_IsSaved()
    {
        await using var phone = await hall.EnterAsync("builder", 1280, 800);
        var bench = await BenchScreen.OfAsync(phone);
        var point = bench.PointAt(0);
        await bench.GoToAsync(point);
        var keyboard = phone.Page.Keyboard;

        for (var i = 0; i < 40 && !await bench.Field(point).EvaluateAsync<bool>("f => f === document.activeElement"); i++) await keyboard.PressAsync("Tab");
        await keyboard.TypeAsync(point.Typed());
        await keyboard.PressAsync("Enter");

        await bench.AllSentAsync();
        await Assertions.Expect(bench.Advice(point)).ToHaveAttributeAsync("data-verdict", "Good");
    }

    [Theory]
    [InlineData(320)]
    [InlineData(390)]
    public async Task Targets_OnAPhone_AreAtLeast48PixelsAndNothingScrollsSideways(int width)
    {
        await using var phone = await hall.EnterAsync("builder", width, 700);
        var bench = await BenchScreen.OfAsync(phone);
        await bench.GoToAsync(bench.PointAt(0));

        var small = await phone.Page.EvaluateAsync<string[]>(
            """
            () => [...document.querySelectorAll('button, a[href], input:not([type=radio]):not([type=checkbox]), select, summary, label:has(input)')]
              .filter(e => e.offsetParent !== null && !e.closest('[hidden]'))
              .map(e => ({ e, r: e.getBoundingClientRect() })).filter(x => x.r.width > 0 && (x.r.height < 47.5 || x.r.width < 47.5))
              .map(x => `${x.e.tagName} ${x.e.textContent.trim().slice(0, 20)} ${x.r.width}x${x.r.height}`)
            """);

        Assert.Empty(small);
        Assert.True(await phone.Page.EvaluateAsync<bool>("() => document.documentElement.scrollWidth <= innerWidth"));
    }
}
