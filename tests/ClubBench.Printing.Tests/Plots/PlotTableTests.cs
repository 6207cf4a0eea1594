using ClubBench.Printing.Plots;
using ClubBench.Printing.Tests.Samples;

namespace ClubBench.Printing.Tests.Plots;

public class PlotTableTests
{
    private static readonly PlotTable s_table = PlotTable.Of(SamplePlots.Response);

    [Fact]
    public void Of_Plot_HasOneColumnPerCurve() => Assert.All(s_table.Rows, r => Assert.Equal(3, r.Count));

    [Fact]
    public void Of_MarkedFrequency_ShowsTheCurvesValueThere()
    {
        var row = s_table.Rows.Single(r => r[0] == "28.10\u00A0MHz");

        Assert.Equal(SamplePlots.Gain(28.1e6, 18.5e6).ToString("0.0", System.Globalization.CultureInfo.CurrentCulture).Replace('-', '\u2212'), row[2].Split('\u00A0')[0]);
    }

    [Fact]
    public void Of_BeyondACurve_LeavesTheCellEmpty() => Assert.Equal("", s_table.Rows[^1][1]);
}
