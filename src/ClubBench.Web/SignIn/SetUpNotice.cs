using ClubBench.Club.Access;
using ClubBench.Club.UseCases.SignIn;

namespace ClubBench.Web.SignIn;

/// <summary>Whether the page of the first start is there at all. It goes with the first coordinator.</summary>
public sealed class SetUpDoor
{
    private volatile bool _isOpen;

    public bool IsOpen => _isOpen;

    public void Open() => _isOpen = true;

    public void Close() => _isOpen = false;
}

/// <summary>On a start without any account: prints the one-time link that founds the club. Nobody else can print it, and nothing else is offered.</summary>
internal sealed class SetUpNotice(OfferSetUp offer, SetUpDoor door, IHostApplicationLifetime life, IServiceProvider services) : IHostedService
{
    public Task StartAsync(CancellationToken cancellationToken)
    {
        life.ApplicationStarted.Register(() => _ = PrintAsync());
        return Task.CompletedTask;
    }

    public Task StopAsync(CancellationToken cancellationToken) => Task.CompletedTask;

    private async Task PrintAsync()
    {
        var outcome = await offer.Run(Actor.Host, new OfferSetUpInput());
        if (outcome is not { Succeeded: true, Value.Token: { } token }) return;
        door.Open();
        Console.WriteLine($"No club yet. Set it up within the hour: {Addresses.Of(services)}/setup?token={token}");
    }
}
