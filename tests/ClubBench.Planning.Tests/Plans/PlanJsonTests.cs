using System.Text.Json;
using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.Tests.Plans;

public class PlanJsonTests
{
    private static readonly Plan Plan = DemoPlan.TwentyMetres;

    [Fact]
    public void Plan_OfTheDemonstrationKit_SurvivesARoundTrip() => Survives(Plan);

    [Fact]
    public void Cards_OfAPlan_SurviveARoundTrip() => Assert.All(Plan.Stages, s => Survives(s.Card));

    [Fact]
    public void LimitSets_ByContent_SurviveARoundTrip() => Assert.All(EmissionLimitSet.All, Survives);

    [Fact]
    public void ReadingAndAdvice_SurviveARoundTrip()
    {
        Survives(new Reading("A5.L4.L", QuantityKind.Inductance, 0.734e-6, "0,734", "M2", 7));
        Survives(new Advice(ReadingVerdict.Out, [new Step("advice.spread", [Figure.Stated("value", QuantityKind.Inductance, 0.7e-6)])], null, [], "one-turn-rule"));
        Survives(new LearntValues(new Dictionary<string, LearntInductanceFactor>(StringComparer.Ordinal) { ["T37-6"] = new(3.14, 0.05, 7) }));
        Survives(DemoKits.DrawerStock);
    }

    [Fact]
    public void Quantities_AreSiNumbersWithTheUnitInTheName()
    {
        var json = JsonSerializer.SerializeToElement(Plan.Inputs, PlanJson.Options);

        Assert.Equal(12, json.GetProperty("kit").GetProperty("supplyVoltageV").GetDouble());
        Assert.Equal(10.111e6, json.GetProperty("kit").GetProperty("band").GetProperty("lowHz").GetDouble());
        Assert.Equal(10, json.GetProperty("target").GetProperty("wishMarginDb").GetDouble());
        Assert.Equal("quick", json.GetProperty("effort").GetString());
    }

    [Theory]
    [InlineData("{\"lowHz\":2,\"highHz\":1}")]
    [InlineData("{\"lowHz\":-2,\"highHz\":1}")]
    [InlineData("{\"lowHz\":2}")]
    [InlineData("null")]
    public void FrequencyRange_Impossible_IsFaultyJson(string json) =>
        Assert.ThrowsAny<JsonException>(() => JsonSerializer.Deserialize<FrequencyRange>(json, PlanJson.Options));

    [Fact]
    public void ContentHash_SameContent_IsTheSameWhateverTheOrderOfItsDictionaries()
    {
        var (a, b) = (Part(("turns", 15), ("wireDiameterM", 0.4e-3)), Part(("wireDiameterM", 0.4e-3), ("turns", 15)));

        Assert.Equal(ContentHash.Of(a), ContentHash.Of(b));
        Assert.NotEqual(ContentHash.Of(a), ContentHash.Of(Part(("turns", 16), ("wireDiameterM", 0.4e-3))));
        Assert.Matches("^[0-9a-f]{64}$", ContentHash.Of(a));
    }

    [Fact]
    public void ContentHash_AfterARoundTrip_IsUnchanged()
    {
        var again = JsonSerializer.Deserialize<Plan>(JsonSerializer.Serialize(Plan, PlanJson.Options), PlanJson.Options)!;

        Assert.Equal(ContentHash.Of(Plan), ContentHash.Of(again));
    }

    private static void Survives<T>(T value)
    {
        var first = JsonSerializer.Serialize(value, PlanJson.Options);

        var again = JsonSerializer.Serialize(JsonSerializer.Deserialize<T>(first, PlanJson.Options), PlanJson.Options);

        Assert.Equal(first, again);
        Assert.True(first.Length > 20, first);
    }

    private static Part Part(params (string Name, double Si)[] values) =>
        new("L4", "series-winding", "T50-6", values.ToDictionary(v => v.Name, v => v.Si, StringComparer.Ordinal));
}
