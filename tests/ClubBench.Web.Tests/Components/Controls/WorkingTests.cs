using Bunit;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Web.Components.Controls;

namespace ClubBench.Web.Tests.Components.Controls;

public sealed class WorkingTests : PageContext
{
    private static readonly Figure Given = Figure.Stated("bandwidth", QuantityKind.FrequencyShift, 12_000);

    [Fact]
    public void Figure_WithoutWorking_IsPlainText()
    {
        var figure = Render<FigureText>(p => p.Add(f => f.Figure, Given));

        Assert.Empty(figure.FindAll("button"));
        Assert.Contains("12", figure.Markup, StringComparison.Ordinal);
    }

    [Fact]
    public void Figure_WithWorking_OpensItByButton()
    {
        var computed = Figure.Of("bandwidth", QuantityKind.FrequencyShift, 12_000, new Working("resonance", [Given with { Name = "resonance", Si = 10_111_000, Kind = QuantityKind.Frequency }], SourceRef.CommonPractice("subtraction")));
        var scope = Render<WorkingScope>(p => p.AddChildContent<FigureText>(f => f.Add(x => x.Figure, computed)));

        scope.Find("button.figure-button").Click();

        var panel = scope.Find("section").TextContent;
        Assert.Contains("10.111", panel, StringComparison.Ordinal);
        Assert.Contains("subtraction", panel, StringComparison.Ordinal);
        scope.Find("section button.quiet").Click();
        Assert.Empty(scope.FindAll("section"));
    }
}
