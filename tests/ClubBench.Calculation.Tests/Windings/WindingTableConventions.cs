using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Calculation.Windings;

namespace ClubBench.Calculation.Tests.Windings;

public class WindingTableConventions
{
    [Theory]
    [InlineData("iron-powder-cores")]
    [InlineData("ferrite-cores")]
    [InlineData("ferrite-permeability")]
    [InlineData("ferrite-saturation")]
    [InlineData("flux-guide")]
    [InlineData("toroid-q")]
    [InlineData("moulded-choke-self-resonance")]
    [InlineData("wire")]
    public void EmbeddedTable_EveryRow_EndsInASourceThatResolves(string name)
    {
        using var stream = typeof(Sources).Assembly.GetManifestResourceStream($"ClubBench.Calculation.Tables.{name}.csv")!;
        using var csv = new CsvHelper.CsvReader(new StreamReader(stream), System.Globalization.CultureInfo.InvariantCulture);
        csv.Read();
        csv.ReadHeader();
        var ids = new List<string>();
        while (csv.Read()) ids.Add(csv.GetField("source_id")!);

        Assert.Equal(["source_id", "locator", "status", "note"], csv.HeaderRecord![^4..]);
        Assert.NotEmpty(ids);
        Assert.All(ids.Distinct(StringComparer.Ordinal), id => Assert.NotNull(Sources.Find(id)));
    }

    [Theory]
    [InlineData("43")]
    [InlineData("61")]
    public void Permeability_LossPart_RisesWithFrequencyBelowItsPeak(string mix)
    {
        var range = FerritePermeability.RangeOf(mix)!.Value;
        var lossy = new[] { 0.1, 0.5, 1, 2, 3.5, 5 }.Select(mhz => FerritePermeability.At(mix, Frequency.FromMegahertz(mhz))!.Value.Lossy).ToList();

        Assert.True(range.Contains(Frequency.FromMegahertz(10)));
        Assert.Equal(lossy.Order(), lossy);
    }

    [Fact]
    public void Wires_EachSystem_HasEverySizeOnce() =>
        Assert.All(Wires.All.GroupBy(w => (w.System, w.Size)), g => Assert.Single(g));
}
