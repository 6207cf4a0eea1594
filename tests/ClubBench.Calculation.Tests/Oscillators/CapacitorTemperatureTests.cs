using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Windings;

namespace ClubBench.Calculation.Tests.Oscillators;

public class CapacitorTemperatureTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("temperature-coefficients");

    [Theory]
    [MemberData(nameof(Rows))]
    public void Coefficient_ReferenceRow_IsThatOfTheTable(ReferenceRow row)
    {
        if (row["part"] == "capacitor")
        {
            var type = CapacitorTemperature.All.Single(t => t.Type == row["type"]);
            Assert.Equal((row.Number("low"), row.Number("usual"), row.Number("high")), (type.PpmPerKelvin.Low, type.PpmPerKelvin.Usual, type.PpmPerKelvin.High));
        }
        else
        {
            var cores = Cores.IronPowder.Where(c => c.Mix == row["type"]).ToList();
            Assert.NotEmpty(cores);
            Assert.All(cores, c => Assert.Equal(row.Number("usual"), c.TemperatureCoefficientPpmPerKelvin));
        }
    }

    [Fact]
    [Evidence(typeof(CapacitorTemperature), EvidenceKind.ClosedFormLimit)]
    public void Compensating_CoilOf95_NeedsTheSharesOfTheBudget()
    {
        var types = CapacitorTemperature.Compensating(95, 0);

        Assert.Equal(0.6333, types.Single(t => t.Type.Type == "N150").Share, 1e-4);
        Assert.Equal(0.1267, types.Single(t => t.Type.Type == "N750").Share, 1e-4);
        Assert.DoesNotContain(types, t => t.Type.PpmPerKelvin.Usual >= 0);
        Assert.Equal(types.OrderByDescending(t => t.Share), types);
    }

    [Fact]
    [Evidence(typeof(CapacitorTemperature), EvidenceKind.RoundTrip)]
    public void Compensating_AnyType_LeavesNoDriftAtItsShare() => Assert.All(
        CapacitorTemperature.Compensating(120, 30),
        t => Assert.Equal(0, TemperatureBudget.PpmPerKelvin(120, [new(PulledCrystals.Pf(100 * t.Share), t.Type.PpmPerKelvin.Usual), new(PulledCrystals.Pf(100 * (1 - t.Share)), 30)]), 1e-9));

    [Fact]
    public void Compensating_CoilThatFalls_NeedsATypeThatRises() =>
        Assert.Equal(["silver mica"], CapacitorTemperature.Compensating(-40, 0).Select(t => t.Type.Type));
}
