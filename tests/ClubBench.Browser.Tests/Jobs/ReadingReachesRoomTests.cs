using System.Diagnostics;
using System.Globalization;
using ClubBench.Browser.Tests.Site;
using Microsoft.Playwright;

namespace ClubBench.Browser.Tests.Jobs;

/// <summary>The phone is under a plain-http name that is not loopback: no secure context. The room is another browser.</summary>
[Collection(HallCollection.Name)]
public sealed class ReadingReachesRoomTests(Hall hall)
{
    private const float OneSecond = 1000;

    [Fact]
    public async Task Reading_EnteredOnThePhone_StandsInTheRoomWithinASecondWithAdvice()
    {
        await using var coordinator = await hall.EnterAsync("coordinator", 1920, 1080);
        await coordinator.GoAsync("/room");
        await using var phone = await hall.EnterAsync("builder", 390, 844, underHallName: true);
        Assert.False(await phone.Page.EvaluateAsync<bool>("() => isSecureContext"));
        var bench = await BenchScreen.OfAsync(phone);
        var point = bench.PointAt(0);
        var before = await coordinator.Page.EvaluateAsync<long>("() => Math.max(0, ...[...document.querySelectorAll('[data-reading]')].map(l => Number(l.dataset.reading)))");
        var text = point.Typed(0.03);

        await bench.GoToAsync(point);
        await bench.Field(point).FillAsync(text);

        await bench.SaveAsync(point);

        var saved = Stopwatch.StartNew();
        await coordinator.Page.WaitForFunctionAsync(
            "([tag, label, before]) => [...document.querySelectorAll('[data-reading]')].some(l => Number(l.dataset.reading) > before && l.textContent.includes(tag) && l.textContent.includes(label))",
            new object[] { bench.Tag, point.Label, before },
            new() { Timeout = OneSecond, PollingInterval = 20 });
        TestContext.Current.TestOutputHelper?.WriteLine($"In the room after {saved.ElapsedMilliseconds.ToString(CultureInfo.InvariantCulture)} ms.");
        await bench.AllSentAsync();
        await Assertions.Expect(bench.Advice(point)).ToHaveAttributeAsync("data-verdict", "Good");
    }

    [Fact]
    public async Task HelpCall_FromThePhone_StandsInTheRoom()
    {
        await using var coordinator = await hall.EnterAsync("coordinator", 1920, 1080);
        await coordinator.GoAsync("/room");
        await using var phone = await hall.EnterAsync("builder", 390, 844, underHallName: true);
        var bench = await BenchScreen.OfAsync(phone);
        await bench.GoToAsync(bench.PointAt(1));

        await phone.Page.Locator("[data-part]:not([hidden]) [data-help]").ClickAsync();
        await phone.Page.GetByLabel("What is it? One line").FillAsync("no peak");
        await phone.Page.GetByRole(AriaRole.Button, new() { Name = "Call", Exact = true }).ClickAsync();

        await Assertions.Expect(coordinator.Page.Locator("[data-help-queue]")).ToContainTextAsync("no peak");
        await Assertions.Expect(phone.Page.Locator("#called")).ToBeVisibleAsync();
    }
}
