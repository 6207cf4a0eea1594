using Bunit;
using ClubBench.Planning;
using ClubBench.Planning.Plans;
using ClubBench.Planning.Text;
using ClubBench.Web.Components.Pages.Plans;

namespace ClubBench.Web.Tests.Components.Pages.Plans;

public sealed class TargetFormTests : PageContext
{
    private readonly TargetDraft _draft = TargetDraftTests.Draft();
    private Outcome<Target>? _read;

    private Target? Sent => _read is { Succeeded: true } ? _read.Value : null;

    [Theory]
    [InlineData("low", "14.0.0")]
    [InlineData("high", "")]
    [InlineData("reference", "14.06 V")]
    [InlineData("power", "-1")]
    [InlineData("pitch", "seven")]
    [InlineData("wish", "10 W")]
    public void Save_WrongNumber_IsToldAtItsFieldAndOnTopAndNothingGoesOut(string field, string typed)
    {
        var form = Form();

        form.Find($"#{field}").Input(typed);
        Save(form);

        Assert.Null(Sent);
        Assert.Equal([field], form.FindAll("input[aria-invalid=true]").Select(i => i.Id));
        var words = form.Find($"#{field}-note .error-text").TextContent;
        Assert.Equal(words, form.Find($".error-list a[href$='#{field}']").TextContent);
        Assert.Contains(' ', words);
        Assert.Equal(typed, form.Find($"#{field}").GetAttribute("value"));
    }

    [Fact]
    public void Save_AsShown_SendsTheTargetUnchanged()
    {
        var shown = _draft.Read("Ingrid").Value;
        var form = Form();

        Save(form);

        Assert.Equal(shown, Sent);
        Assert.Empty(form.FindAll(".error-text"));
        Assert.Empty(form.FindAll(".error-list"));
    }

    [Fact]
    public void Input_DecimalComma_IsEchoedAndSent()
    {
        var form = Form();

        form.Find("#reference").Input("14,055");

        Assert.Contains("14.055\u00A0MHz", form.Find("#reference-note").TextContent, StringComparison.Ordinal);
        Save(form);
        Assert.Equal(14_055_000, Sent!.Reference.Hertz);
    }

    [Fact]
    public void Tick_OfTheLimits_StandsWithTheNameOfWhoTicked()
    {
        var form = Form();
        Save(form);
        Assert.Null(Sent!.LimitsConfirmedBy);

        form.Find("label.tick input").Change(true);
        Save(form);

        Assert.Equal("Ingrid", Sent!.LimitsConfirmedBy);
    }

    [Fact]
    public void Message_OfTheUseCase_StandsAtTheFieldItMeans()
    {
        var refused = FieldMessage.Error("target.reference", "target.reference-outside");

        var form = Render<TargetForm>(p => p.Add(f => f.Draft, _draft).Add(f => f.Messages, [refused]));

        Assert.Equal(Phrases.Say(refused), form.Find("#reference-note .error-text").TextContent);
    }

    private IRenderedComponent<TargetForm> Form() => Render<TargetForm>(p => p.Add(f => f.Draft, _draft).Add(f => f.OnSave, () => _read = _draft.Read("Ingrid")));

    /// <summary>Saves as the page does: reads all fields, shows what was refused or lets the target go out.</summary>
    private void Save(IRenderedComponent<TargetForm> form)
    {
        form.Find("form").Submit();
        form.Render(p => p.Add(f => f.Messages, _read!.Messages));
    }
}
