using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;
using ClubBench.Web.Bench;

namespace ClubBench.Web.Tests.Bench;

public sealed class BenchUnitsTests
{
    [Theory]
    [InlineData(QuantityKind.Inductance, 0.675e-6, "µH", "nH")]
    [InlineData(QuantityKind.Frequency, 14.05e6, "MHz", "kHz")]
    [InlineData(QuantityKind.Capacitance, 202e-12, "pF", "nF")]
    [InlineData(QuantityKind.Current, 0.164, "mA", "µA")]
    public void Switch_OfAnExpectedValue_OffersItsUnitFirstAndTheNeighbour(QuantityKind kind, double nominalSi, string first, string second)
    {
        var units = BenchUnits.Switch(kind, nominalSi);

        Assert.Equal([first, second], units.Select(u => u.Text));
    }

    [Fact]
    public void Spellings_OfEveryKind_ReadAsTheServerReadsThem()
    {
        foreach (var kind in Enum.GetValues<QuantityKind>())
            foreach (var spelling in BenchUnits.Spellings(kind))
            {
                var read = QuantityText.Parse("2" + spelling.Spelling, kind);

                Assert.True(read.Succeeded, $"{kind}: 2{spelling.Spelling}");
                Assert.Equal(1, read.Value.Si / (2 * spelling.Factor), 1e-12);
            }
    }
}
