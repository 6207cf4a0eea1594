using Bunit;
using ClubBench.Planning;
using ClubBench.Planning.Figures;
using ClubBench.Web.Components.Controls;

namespace ClubBench.Web.Tests.Components.Controls;

public sealed class QuantityFieldTests : PageContext
{
    private QuantityEntry? _heard;

    private IRenderedComponent<QuantityField> Field(string typed = "", bool showRefusal = false, FieldMessage? message = null) => Render<QuantityField>(p => p
        .Add(f => f.Id, "c15").Add(f => f.Label, "C15").Add(f => f.Kind, QuantityKind.Capacitance).Add(f => f.DefaultUnit, "pF")
        .Add(f => f.Typed, typed).Add(f => f.ShowRefusal, showRefusal).Add(f => f.Message, message).Add(f => f.OnChanged, e => _heard = e));

    [Theory]
    [InlineData("2n2", 2.2e-9)]
    [InlineData("270", 270e-12)]
    [InlineData("0,5 nF", 0.5e-9)]
    public void Input_TradeNotation_IsUnderstood(string typed, double farad)
    {
        Field().Find("input").Input(typed);

        Assert.Equal(farad, _heard!.Si!.Value, 1e-18);
        Assert.Equal(typed, _heard.Typed);
    }

    [Fact]
    public void Render_TypedValue_IsEchoedWithItsUnit()
    {
        Assert.Contains("2.2\u00A0nF", Field("2n2").Find("#c15-note").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Render_TwoDecimalMarks_AreRefusedWhileTyping()
    {
        var field = Field("14.05,2");

        Assert.Equal("true", field.Find("input").GetAttribute("aria-invalid"));
        Assert.Contains("Two decimal marks", field.Find(".error-text").TextContent, StringComparison.Ordinal);
        Assert.Equal("14.05,2", field.Find("input").GetAttribute("value"));
    }

    [Fact]
    public void Render_UnfinishedText_IsRefusedOnlyAfterSaving()
    {
        Assert.Empty(Field("2x").FindAll(".error-text"));
        Assert.NotEmpty(Field("2x", showRefusal: true).FindAll(".error-text"));
    }

    [Fact]
    public void Render_Field_HasAVisibleLabelAndNoNumberType()
    {
        var field = Field();

        Assert.Equal("c15", field.Find("label").GetAttribute("for"));
        Assert.Equal("text", field.Find("input").GetAttribute("type"));
        Assert.Null(field.Find("input").GetAttribute("placeholder"));
    }
}
