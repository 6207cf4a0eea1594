using ClubBench.Club.UseCases.Kits;
using ClubBench.Planning;
using ClubBench.Planning.Kits;
using Microsoft.AspNetCore.Components;

namespace ClubBench.Web.Components.Pages.Kits;

/// <summary>Edits the values of a stage's parts; saving makes the next revision of the kit.</summary>
public partial class StageEditor
{
    private StageDraft? _draft;
    private IReadOnlyList<FieldMessage> _messages = [];

    [Parameter]
    public Guid Id { get; set; }

    [Parameter]
    public string Key { get; set; } = "";

    [Inject]
    public required OpenKit Open { get; set; }

    [Inject]
    public required ImportKit Import { get; set; }

    protected override async Task LoadAsync()
    {
        if (_draft is null && Take(await Open.Run(Actor, new OpenKitInput(Id))) is { Kit: var kit } && kit.Stages.Any(s => s.Key == Key)) _draft = new StageDraft(kit, Key);
    }

    /// <summary>The kit file is the one door for kits: what is edited passes the same checks as what is imported.</summary>
    private async Task SaveAsync()
    {
        var stage = _draft!.Read();
        _messages = stage.Messages;
        if (!stage.Succeeded) return;
        using var file = new MemoryStream();
        KitFile.Write(_draft.Kit.With(stage.Value), file);
        file.Position = 0;
        var saved = await Import.Run(Actor, new ImportKitInput(file));
        _messages = saved.Succeeded ? [] : saved.Messages;
        if (saved.Succeeded) Navigation.NavigateTo($"/kits/{Id}?stage={Uri.EscapeDataString(Key)}");
    }
}
