using ClubBench.Club.UseCases.Kits;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using Microsoft.AspNetCore.Components;

namespace ClubBench.Web.Components.Pages.Plans;

/// <summary>Makes a plan for a kit, or moves an existing plan elsewhere.</summary>
public partial class TargetPage
{
    private const string WhichKit = "/bands";

    private Kit? _kit;
    private OpenedPlan? _plan;
    private TargetDraft? _draft;
    private IReadOnlyList<FieldMessage> _messages = [];
    private string _name = "";

    [Parameter]
    public Guid? Id { get; set; }

    [SupplyParameterFromQuery(Name = "kit")]
    public Guid? KitId { get; set; }

    [SupplyParameterFromQuery]
    public string? Band { get; set; }

    [Inject]
    public required OpenKit Open { get; set; }

    [Inject]
    public required OpenPlan OpenPlan { get; set; }

    [Inject]
    public required CreatePlan Create { get; set; }

    [Inject]
    public required ChangePlan Change { get; set; }

    private string Back => Id is { } id ? $"/plans/{id}" : $"/kits/{KitId}/bands";

    protected override async Task LoadAsync()
    {
        if (_draft is not null) return;
        if (Id is { } id) _plan = Take(await OpenPlan.Run(Actor, new OpenPlanInput(id)));
        else if (KitId is { } kit) _kit = Take(await Open.Run(Actor, new OpenKitInput(kit)))?.Kit;
        else Navigation.NavigateTo(WhichKit);
        _kit ??= _plan?.Plan.Inputs.Kit;
        if (_plan is not null) _draft = TargetDraft.Of(_plan.Plan.Inputs.Target);
        else if (_kit is not null) TakeBand(Band ?? "20 m");
        if (_plan is null && _kit is not null) _name = $"{_kit.Name}, {Band}";
    }

    /// <summary>A new band brings its own segment, calling frequency and limits; what was said of site and region stays.</summary>
    private void TakeBand(string? band)
    {
        var (region, site) = (_draft?.Region ?? Calculation.Bands.ItuRegion.Region1, _draft?.Site ?? Calculation.Noise.NoiseSite.Residential);
        if (band is not null && _kit is not null && TargetDefaults.On(band, _kit, region, site) is { } target) _draft = TargetDraft.Of(target);
    }

    private async Task SaveAsync()
    {
        var target = _draft!.Read(Actor.DisplayName);
        _messages = target.Messages;
        if (!target.Succeeded) return;
        var saved = _plan is null
            ? await Create.Run(Actor, new CreatePlanInput(_kit!.Id, _name, target.Value))
            : await Change.Run(Actor, new ChangePlanInput(_plan.Id, _plan.Version, Target: target.Value));
        _messages = saved.Messages;
        if (saved.Succeeded) Navigation.NavigateTo($"/plans/{saved.Value.PlanId}");
    }
}
