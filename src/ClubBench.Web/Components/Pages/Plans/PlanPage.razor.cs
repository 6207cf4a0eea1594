using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning.Plans;
using ClubBench.Planning.Text;
using Microsoft.AspNetCore.Components;

namespace ClubBench.Web.Components.Pages.Plans;

/// <summary>A plan. Choosing computes at once: who may plan gets a new revision, everybody else looks at what it would do.</summary>
public partial class PlanPage
{
    private OpenedPlan? _opened;
    private Plan? _shown;
    private PlanDifference? _moves;
    private string _chosen = "";
    private IReadOnlyList<Choice>? _before;
    private (string Stage, IReadOnlyList<Alternative> Alternatives) _found = ("", []);
    private bool _busy;

    [Parameter]
    public Guid Id { get; set; }

    [SupplyParameterFromQuery]
    public string? Stage { get; set; }

    [Inject]
    public required OpenPlan Open { get; set; }

    [Inject]
    public required ChangePlan Change { get; set; }

    [Inject]
    public required PreviewPlan Preview { get; set; }

    [Inject]
    public required IssuePlan Issue { get; set; }

    private bool MayIssue => _opened is { State: not PlanState.Issued, Plan.OpenItems.Count: 0 } && !_busy;

    /// <summary>Why the plan cannot be issued now; empty where it can.</summary>
    private string Missing => _opened switch
    {
        { State: PlanState.Issued } => L["plan.is-issued"],
        { Plan.OpenItems: { Count: > 0 } items } => L["plan.missing", items.Count, string.Join(", ", items.Select(i => i.Stage.Length > 0 ? $"{i.Stage} {Phrases.Say(i)}" : Phrases.Say(i)))],
        _ => "",
    };

    protected override async Task LoadAsync()
    {
        if (_opened?.Id != Id) await ReopenAsync();
        if (_opened is not null) Place.Open(_opened.KitId, Id);
    }

    private async Task ReopenAsync() => (_opened, _shown) = (Take(await Open.Run(Actor, new OpenPlanInput(Id))) ?? _opened, null);

    private string AddressOf(string stage) => $"/plans/{Id}?stage={Uri.EscapeDataString(stage)}#stage";

    /// <summary>A stage has one choice: the newest replaces the one before.</summary>
    private Task ChooseAsync(string alternative)
    {
        if (_opened is not { Plan: var plan }) return Task.CompletedTask;
        var stage = StageOf(plan);
        _chosen = stage;
        var choice = FoundHere.FirstOrDefault(a => a.Id == alternative) is { } found && OpenNow(plan).Alternatives.All(a => a.Id != alternative)
            ? ThoroughSearches.Freeze(stage, found, Actor.DisplayName)
            : new Choice(stage, alternative, By: Actor.DisplayName);
        return ApplyAsync([.. plan.Inputs.Choices.Where(c => c.Stage != stage), choice], plan.Inputs.Choices);
    }

    /// <summary>What a thorough search found for the open stage.</summary>
    private IReadOnlyList<Alternative> FoundHere => _opened is { Plan: var plan } && _found.Stage == StageOf(plan) ? _found.Alternatives : [];

    private void OnFound(SearchStatus search) => _found = (search.Stage, search.Found);

    private Task UndoAsync() => _before is { } before ? ApplyAsync(before, null) : Task.CompletedTask;

    private async Task ApplyAsync(IReadOnlyList<Choice> choices, IReadOnlyList<Choice>? before)
    {
        if (_busy || _opened is not { } opened) return;
        _busy = true;
        var old = _shown ?? opened.Plan;
        if (May(Right.PlanKits))
        {
            if (Take(await Change.Run(Actor, new ChangePlanInput(Id, opened.Version, Choices: choices))) is not null) await ReopenAsync();
        }
        else
        {
            _shown = Take(await Preview.Run(Actor, new PreviewPlanInput(opened.KitId, opened.Plan.Inputs.Target, choices, opened.Plan.Inputs.Kit.Revision))) ?? _shown;
        }

        if (Refused.Count == 0) (_moves, _before) = (PlanDifference.Between(old, _shown ?? _opened.Plan, _chosen), before);
        _busy = false;
    }

    /// <summary>A dashed button does nothing; what is missing stands beside it.</summary>
    private async Task IssueAsync()
    {
        if (!MayIssue || _opened is not { } opened) return;
        _busy = true;
        if (Take(await Issue.Run(Actor, new IssuePlanInput(Id, opened.Version))) is not null) await ReopenAsync();
        _busy = false;
    }

    private StagePlan OpenNow(Plan plan) => PlanSheet.OpenStage(_shown ?? plan, Stage);

    private string StageOf(Plan plan) => OpenNow(plan).Stage;
}
