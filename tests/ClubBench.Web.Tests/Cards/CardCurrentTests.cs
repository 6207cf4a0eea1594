using System.Net;
using ClubBench.Club.Persistence;
using ClubBench.Web.Tests.Api;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace ClubBench.Web.Tests.Cards;

/// <summary>The page behind the code on a printed card.</summary>
public sealed class CardCurrentTests(DemoInterface demo) : IClassFixture<DemoInterface>
{
    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Fact]
    public async Task Page_OfACurrentCard_TellsAStrangerSoAndTheNextStep()
    {
        await using var db = demo.Services.GetRequiredService<ClubStore>().Open(Guid.Empty);
        var card = await db.Cards.IgnoreQueryFilters().FirstAsync(Cancellation);

        var page = await demo.Stranger.GetStringAsync($"/c/{card.Id}", Cancellation);

        Assert.Contains("This card is current.", page, StringComparison.Ordinal);
        Assert.Contains("/sign-in?to=%2Fbench", page, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Page_OfNoCard_SaysWhatToDo()
    {
        using var answer = await demo.Stranger.GetAsync($"/c/{Guid.NewGuid()}", Cancellation);

        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        Assert.Contains("Ask a mentor", await answer.Content.ReadAsStringAsync(Cancellation), StringComparison.Ordinal);
    }
}
