using CsvHelper;
using System.Globalization;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Planning.Tests.KitAcceptance;

/// <summary>Every named row of kit A, as printed and with one input moved by 10 %, against an independent computation (tests/Recomputed/kit_a_transmit.py).</summary>
public class RecomputedRows
{
    public static TheoryData<string> Rows => [.. Read().Keys];

    [Theory]
    [MemberData(nameof(Rows))]
    public void BackCheck_NamedRow_EqualsIndependentComputation(string row)
    {
        var cells = Read()[row];
        var kit = cells["change"].Length == 0 ? KitA.Kit : KitA.Changed(KitA.Kit, cells["stage"], cells["change"], KitA.Number(cells["factor"]));
        var at = cells["at_hz"].Length == 0 ? (Frequency?)null : Frequency.FromHertz(KitA.Number(cells["at_hz"]));

        var computed = cells["figure"] switch
        {
            "passes-loss" => KitA.LossDb(KitA.OwnBand(kit), cells["stage"], at!.Value.Megahertz),
            "passes-return-loss" => KitA.ReturnLossDb(KitA.OwnBand(kit), cells["stage"], at!.Value.Megahertz),
            var figure => KitA.Figure(KitA.OwnBand(kit, at), cells["stage"], figure),
        };

        var expected = KitA.Number(cells["expected"]);
        Assert.InRange(computed / expected, 1 - KitA.Number(cells["tolerance_relative"]), 1 + KitA.Number(cells["tolerance_relative"]));
    }

    [Fact]
    public void MovedInputs_AllRowsWithAChange_DifferFromThePrintedRow()
    {
        var rows = Read().Values.ToList();
        var moved = rows.Where(r => r["change"].Length > 0).GroupBy(r => (r["stage"], r["change"]));

        Assert.All(moved, group => Assert.Contains(group, r =>
            rows.Any(p => p["change"].Length == 0 && p["stage"] == r["stage"] && p["figure"] == r["figure"] && p["at_hz"] == r["at_hz"]
                && Math.Abs((KitA.Number(p["expected"]) / KitA.Number(r["expected"])) - 1) > 1e-5)));
    }

    private static Dictionary<string, Dictionary<string, string>> Read()
    {
        using var csv = new CsvReader(new StreamReader(Path.Combine(AppContext.BaseDirectory, "ReferenceValues", "kit-a-transmit.csv")), CultureInfo.InvariantCulture);
        csv.Read();
        csv.ReadHeader();
        var rows = new Dictionary<string, Dictionary<string, string>>(StringComparer.Ordinal);
        while (csv.Read())
        {
            var cells = csv.HeaderRecord!.ToDictionary(h => h, h => csv.GetField(h)!, StringComparer.Ordinal);
            rows.Add(cells["case_id"], cells);
        }

        return rows;
    }
}
