using ClubBench.Browser.Tests.Site;
using Microsoft.Playwright;

namespace ClubBench.Browser.Tests.Jobs;

/// <summary>The hall's Wi-Fi goes away while somebody works.</summary>
[Collection(HallCollection.Name)]
public sealed class NetworkAwayTests(Hall hall)
{
    [Fact]
    public async Task Typing_NetworkCutAndPageReloaded_LosesNothing()
    {
        await using var phone = await hall.EnterAsync("builder", 390, 844, underHallName: true);
        var bench = await BenchScreen.OfAsync(phone);
        var point = bench.PointAt(0);
        await bench.GoToAsync(point);
        await bench.Field(point).PressSequentiallyAsync("0,7");
        await phone.SetOfflineAsync(true);
        await bench.Field(point).PressSequentiallyAsync("34");

        await phone.SetOfflineAsync(false);
        await phone.Page.ReloadAsync();
        await phone.SettledAsync();

        Assert.Equal("0,734", await bench.Field(point).InputValueAsync());
        await Assertions.Expect(bench.Form(point).Locator("[data-kept]")).ToContainTextAsync("not saved yet");
        await bench.Field(point).FillAsync("");
    }

    [Fact]
    public async Task Readings_TakenWithoutNetwork_AreCountedInWordsAndSentAfterwards()
    {
        await using var phone = await hall.EnterAsync("builder", 390, 844, underHallName: true);
        var bench = await BenchScreen.OfAsync(phone);
        var (first, second) = (bench.PointAt(0), bench.PointAt(1));
        await phone.SetOfflineAsync(true);

        await bench.TypeAndSaveAsync(first, first.Typed(0.01));
        await bench.TypeAndSaveAsync(second, second.Typed(-0.01));

        await Assertions.Expect(bench.Sync).ToContainTextAsync("2 readings wait on this phone. Keep going.");
        Assert.Equal(2, await bench.WaitingAsync());
        await phone.SetOfflineAsync(false);
        await bench.AllSentAsync();
        await Assertions.Expect(bench.Sync).ToContainTextAsync("Saved");
        await Assertions.Expect(bench.Advice(second)).ToHaveAttributeAsync("data-verdict", "Good");
    }

    [Fact]
    public async Task Readings_WaitingWhenThePageIsReloaded_AreSentByTheNextPage()
    {
        await using var phone = await hall.EnterAsync("builder", 390, 844, underHallName: true);
        var bench = await BenchScreen.OfAsync(phone);
        var point = bench.PointAt(0);
        phone.NetworkMayFail = true;
        await phone.Page.RouteAsync("**/entries", route => route.AbortAsync());
        await bench.TypeAndSaveAsync(point, point.Typed(0.02));
        Assert.Equal(1, await bench.WaitingAsync());

        await phone.Page.UnrouteAllAsync();
        await phone.Page.ReloadAsync();
        await phone.SettledAsync();

        await bench.AllSentAsync();
    }
}
