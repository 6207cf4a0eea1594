using ClubBench.Club.Access;
using ClubBench.Planning;
using ClubBench.Web.SignIn;
using ClubBench.Web.State;
using Microsoft.AspNetCore.Components;

namespace ClubBench.Web.Components;

/// <summary>A page that shows what the club keeps: knows who looks at it, asks use cases and keeps what they refused.</summary>
public abstract class NotebookPage : ComponentBase
{
    [Inject]
    protected CurrentActor Current { get; set; } = default!;

    [Inject]
    protected OpenPlace Place { get; set; } = default!;

    [Inject]
    protected ClubTimes Times { get; set; } = default!;

    [Inject]
    protected NavigationManager Navigation { get; set; } = default!;

    /// <summary>Who looks at the page.</summary>
    protected Actor Actor { get; private set; } = Actor.Visitor;

    /// <summary>What the last use case refused.</summary>
    protected IReadOnlyList<FieldMessage> Refused { get; private set; } = [];

    /// <summary>Whether the page may offer something; the use case asks again.</summary>
    protected bool May(Right right) => Roles.RightsOf(Actor.Role).Contains(right);

    protected sealed override async Task OnParametersSetAsync()
    {
        Actor = await Current.GetAsync();
        await Times.LoadAsync(Actor);
        await LoadAsync();
    }

    /// <summary>Asks for what the page shows; runs again when the address changes.</summary>
    protected abstract Task LoadAsync();

    /// <summary>The value of a success; a refusal is kept for the page to show.</summary>
    protected T? Take<T>(Outcome<T> outcome)
        where T : class
    {
        Refused = outcome.Succeeded ? [] : outcome.Messages;
        return outcome.Succeeded ? outcome.Value : null;
    }
}
