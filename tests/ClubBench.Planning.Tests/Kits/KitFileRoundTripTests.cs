using System.Text.Json;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using CsCheck;
using Json.Schema;

namespace ClubBench.Planning.Tests.Kits;

public class KitFileRoundTripTests
{
    private static readonly JsonSchema Schema = ReadSchema();

    private static readonly Gen<string> Word = Gen.String[Gen.Char["abcdefghijkLMNOP 0123456789-µΩ\"\\<é"], 1, 12].Where(s => s.Trim().Length > 0);

    private static readonly Gen<double> Value = Gen.Double[1e-15, 1e9];

    private static readonly Gen<Dictionary<string, double>> Values = Gen.Dictionary(Gen.Int[0, PartValue.All.Count - 1].Select(i => PartValue.All.ElementAt(i)), Value)[0, 4];

    private static readonly Gen<Place?> Places = Gen.Select(Gen.Bool, Word, Value, Gen.Int[1, 4], (given, footprint, pitch, pieces) => given ? new Place(footprint, pitch, null, pieces) : null);

    private static readonly Gen<Part> Parts =
        Gen.Select(Word, Word, Values, Places, Gen.Enum<Provenance>(), (role, type, values, place, origin) => new Part("", role, type, values, place, origin));

    private static readonly Gen<Kit> Kits =
        from name in Word
        from mode in Gen.Enum<Mode>()
        from low in Gen.Double[1e5, 1e8]
        from width in Gen.Double[0, 1e6]
        from power in Gen.Double[1e-3, 10].Nullable()
        from parts in Parts.Array[1, 12]
        from side in Gen.Enum<MixingSide>()
        from frequency in Value
        select new Kit(
            new Guid(1, 2, 3, [4, 5, 6, 7, 8, 9, 10, 11]), 1, name, "B", mode, new FrequencyRange(Frequency.FromHertz(low), Frequency.FromHertz(low + width)), Voltage.FromVolt(12),
            power is { } watt ? Power.FromWatt(watt) : null,
            new FrequencyScheme(SchemeKind.Superhet, [new Conversion("S0", "S1", side, side == MixingSide.Same ? null : frequency)]),
            [.. parts.Chunk(4).Append([]).Select((own, i) => new StageDocument($"S{i}", "any", "", [.. own.Select((p, j) => p with { Designator = $"P{i}-{j}" })], new Dictionary<string, double>(StringComparer.Ordinal) { ["strayF"] = frequency }, new Dictionary<string, double>(StringComparer.Ordinal)))],
            [new Connection(new Port("S0", "output"), new Port("S1", "oscillator")), new Connection(Port.Antenna, new Port("S0", "input"))],
            ["S0", "S1"],
            name);

    [Fact]
    public void WriteReadWrite_AnyKit_GivesTheSameBytes() => Kits.Sample(kit =>
    {
        var first = KitFiles.TextOf(kit);

        var again = KitFiles.TextOf(KitFile.ReadDocument(KitFiles.StreamOf(first)).Value);

        Assert.Equal(first, again);
    });

    [Fact]
    public void Write_AnyKit_FollowsThePublishedSchema() => Kits.Sample(kit => Assert.True(IsValid(KitFiles.TextOf(kit))), iter: 50);

    [Theory]
    [InlineData(KitFiles.SuperhetExcerpt)]
    [InlineData(KitFiles.MixingTransmitterExcerpt)]
    public void ReadWrite_SchemesModesPlacesAndBranches_Survive(string file)
    {
        var kit = KitFile.ReadDocument(KitFiles.StreamOf(file)).Value;

        var again = KitFile.ReadDocument(KitFiles.StreamOf(KitFiles.TextOf(kit))).Value;

        Assert.True(IsValid(file));
        Assert.Equal((kit.Mode, kit.Scheme.Kind, kit.Band), (again.Mode, again.Scheme.Kind, again.Band));
        Assert.Equal(kit.Scheme.Conversions, again.Scheme.Conversions);
        Assert.Equal(kit.Connections, again.Connections);
        Assert.Equal(kit.BringUp, again.BringUp);
        Assert.Equal(kit.Stages.SelectMany(s => s.Parts).Select(p => p.Place), again.Stages.SelectMany(s => s.Parts).Select(p => p.Place));
    }

    [Fact]
    public void Schema_DemonstrationKit_IsValid()
    {
        using var file = new StreamReader(DemoKits.OpenQuernThirty());

        Assert.True(IsValid(file.ReadToEnd()));
    }

    [Theory]
    [InlineData("\"mode\": \"cw\"", "\"mode\": \"morse\"")]
    [InlineData("\"lowHz\": 3500000", "\"lowHz\": -1")]
    [InlineData("\"name\": \"Hobnail-80\",", "")]
    [InlineData("\"notes\"", "\"remarks\"")]
    public void Schema_FaultyFile_IsNot(string sound, string faulty)
    {
        var file = KitFiles.SuperhetExcerpt.Replace("\"bringUp\"", "\"notes\": \"n\", \"bringUp\"", StringComparison.Ordinal);

        Assert.True(IsValid(file));
        Assert.False(IsValid(file.Replace(sound, faulty, StringComparison.Ordinal)));
    }

    private static bool IsValid(string file)
    {
        using var document = JsonDocument.Parse(file);
        return Schema.Evaluate(document.RootElement).IsValid;
    }

    private static JsonSchema ReadSchema()
    {
        using var text = new StreamReader(KitFile.OpenSchema());
        return JsonSchema.FromText(text.ReadToEnd());
    }
}
