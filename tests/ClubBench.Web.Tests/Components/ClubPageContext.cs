using ClubBench.Club;
using ClubBench.Web.SignIn;
using ClubBench.Web.State;
using ClubBench.Web.Tests.Api;
using Microsoft.AspNetCore.Components.Authorization;
using Microsoft.Extensions.DependencyInjection;

namespace ClubBench.Web.Tests.Components;

/// <summary>Tests of pages share one invented club and take turns in it; whoever changes something makes a plan or kit of their own.</summary>
[CollectionDefinition(Name)]
public sealed class ClubPageCollection : ICollectionFixture<DemoInterface>
{
    public const string Name = "club pages";
}

/// <summary>Pages on the use cases and storage of the running application, looked at by the coordinator.</summary>
public abstract class ClubPageContext : PageContext
{
    protected ClubPageContext(DemoInterface demo)
    {
        Demo = demo;
        foreach (var useCase in ClubServices.UseCases) Services.AddSingleton(useCase, demo.Services.GetRequiredService(useCase));
        Services.AddSingleton(TimeProvider.System);
        Services.AddSingleton<AuthenticationStateProvider>(new SignedIn(demo.Coordinator));
        Services.AddScoped<CurrentActor>();
        Services.AddScoped<ClubTimes>();
    }

    protected DemoInterface Demo { get; }

    private sealed class SignedIn(ClubBench.Club.Access.Actor actor) : AuthenticationStateProvider
    {
        public override Task<AuthenticationState> GetAuthenticationStateAsync() => Task.FromResult(new AuthenticationState(actor.ToPrincipal("test")));
    }
}
