using System.Globalization;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Text;
using CsvHelper;

namespace ClubBench.Planning.Kits;

/// <summary>Invented kits and drawers for demonstrations and tests.</summary>
public static class DemoKits
{
    private const string Folder = "ClubBench.Planning.Kits.Demo.";

    private static readonly Lazy<Kit> Quern = new(() => Read(OpenQuernThirty()));
    private static readonly Lazy<Shelf> Drawers = new(ReadDrawers);

    /// <summary>A direct-conversion telegraphy transceiver for 30 m, 1.1 W. Throws where the file in the assembly is faulty.</summary>
    public static Kit QuernThirty => Quern.Value;

    /// <summary>The demonstration club's drawers.</summary>
    public static Shelf DrawerStock => Drawers.Value;

    /// <summary>The kit file of <see cref="QuernThirty"/>, to be offered for download.</summary>
    public static Stream OpenQuernThirty() => Embedded.Open(Folder + "quern-30.kit.json");

    private static Kit Read(Stream file)
    {
        using (file) return KitFile.Read(file).Value;
    }

    private static Shelf ReadDrawers()
    {
        using var csv = new CsvReader(new StreamReader(Embedded.Open(Folder + "drawer-stock.csv")), CultureInfo.InvariantCulture);
        csv.Read();
        csv.ReadHeader();
        var lines = new List<StockLine>();
        while (csv.Read()) lines.Add(Line(csv));
        return new Shelf(lines);
    }

    private static StockLine Line(CsvReader row)
    {
        var kind = Enum.GetValues<PartClass>().Single(c => Placeholders.Dashed(c.ToString()) == row.GetField("class"));
        return new StockLine(kind, row.GetField("type")!, Value(kind, row.GetField("value")!), row.GetField<double>("quantity"), row.GetField("lot")!, row.GetField("may_be_tuned") == "yes", Measured(row.GetField("measured")!));
    }

    /// <summary>"name=value;name=value" by the names of part values, SI; nothing where the lot was not measured.</summary>
    private static Dictionary<string, double>? Measured(string text) =>
        text.Length == 0 ? null : text.Split(';').Select(t => t.Split('=')).ToDictionary(t => t[0], t => double.Parse(t[1], CultureInfo.InvariantCulture), StringComparer.Ordinal);

    private static double? Value(PartClass kind, string text) =>
        text.Length == 0 ? null : QuantityText.Parse(text, kind switch
        {
            PartClass.Winding => QuantityKind.Length,
            PartClass.Crystal => QuantityKind.Frequency,
            _ => QuantityKind.Capacitance,
        }).Value.Si;
}
