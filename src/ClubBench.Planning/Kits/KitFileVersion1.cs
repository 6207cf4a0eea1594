using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Kits;

/// <summary>Reads version 1 of the kit file. Faults go to the field's list; the kit returned has stand-ins where they were.</summary>
internal static class KitFileVersion1
{
    public static Kit Read(JsonField file)
    {
        file.Knows("$schema", "formatVersion", "id", "revision", "name", "boardIssue", "mode", "band", "supplyVoltageV", "outputPowerW", "scheme", "stages", "connections", "bringUp", "notes");
        return new Kit(
            Id(file["id"]),
            Revision(file["revision"]),
            file["name"].Text(),
            file["boardIssue"].OptionalText(),
            file["mode"].Word<Mode>(),
            Band(file["band"].Knows("lowHz", "highHz")),
            Voltage.FromVolt(file["supplyVoltageV"].Positive()),
            file["outputPowerW"].OptionalPositive() is { } watt ? Power.FromWatt(watt) : null,
            Scheme(file["scheme"].Knows("kind", "conversions")),
            [.. file["stages"].Items().Select(Stage)],
            [.. file["connections"].Items().Select(Connection)],
            [.. file["bringUp"].Items().Select(i => i.Text())],
            file["notes"].OptionalText());
    }

    private static Guid Id(JsonField field)
    {
        var text = field.Text();
        if (Guid.TryParseExact(text, "D", out var id)) return id;
        if (text.Length > 0) field.Fail("kit.id-malformed");
        return Guid.Empty;
    }

    private static int Revision(JsonField field)
    {
        var revision = field.WholeNumber();
        if (field.IsGiven && revision < 1) field.Fail("kit.not-positive");
        return revision;
    }

    private static FrequencyRange Band(JsonField band)
    {
        var (low, high) = (band["lowHz"].Positive(), band["highHz"].Positive());
        if (high < low && band["highHz"].IsGiven) band.Fail("kit.band-reversed");
        return new FrequencyRange(Frequency.FromHertz(low), Frequency.FromHertz(Math.Max(low, high)));
    }

    private static FrequencyScheme Scheme(JsonField scheme) =>
        new(scheme["kind"].Word<SchemeKind>(), scheme["conversions"].IsGiven ? [.. scheme["conversions"].Items().Select(Conversion)] : []);

    private static Conversion Conversion(JsonField conversion)
    {
        conversion.Knows("mixer", "oscillator", "side", "intermediateFrequencyHz");
        return new Conversion(conversion["mixer"].Text(), conversion["oscillator"].Text(), conversion["side"].Word<MixingSide>(), conversion["intermediateFrequencyHz"].OptionalPositive());
    }

    private static StageDocument Stage(JsonField stage)
    {
        stage.Knows("key", "kind", "variant", "parts", "settings", "stated");
        return new StageDocument(
            stage["key"].Text(),
            stage["kind"].Text(),
            stage["variant"].OptionalText(),
            [.. stage["parts"].Items().Select(Part)],
            Numbers(stage["settings"]),
            Numbers(stage["stated"]));
    }

    private static Part Part(JsonField part)
    {
        part.Knows("designator", "role", "type", "values", "place", "from");
        return new Part(
            part["designator"].Text(),
            part["role"].Text(),
            part["type"].OptionalText(),
            Numbers(part["values"]),
            part["place"].IsGiven ? Place(part["place"]) : null,
            part["from"].IsGiven ? part["from"].Word<Provenance>() : Provenance.Published);
    }

    private static Place Place(JsonField place)
    {
        place.Knows("footprint", "pitchM", "largestM", "pieces");
        var pieces = place["pieces"].IsGiven ? place["pieces"].WholeNumber() : 1;
        if (place["pieces"].IsGiven && pieces < 1) place["pieces"].Fail("kit.not-positive");
        return new Place(place["footprint"].Text(), place["pitchM"].OptionalPositive(), place["largestM"].OptionalPositive(), pieces);
    }

    private static Connection Connection(JsonField connection)
    {
        connection.Knows("from", "to");
        return new Connection(Port(connection["from"]), Port(connection["to"]));
    }

    private static Port Port(JsonField field)
    {
        var text = field.Text();
        var parts = text.Split('.');
        if (parts.Length == 2 && parts.All(p => p.Length > 0)) return new Port(parts[0], parts[1]);
        if (text.Length > 0 && !KitTerminals.Names.Contains(text, StringComparer.Ordinal))
            field.Fail("kit.port-malformed", ("port", text), ("terminals", string.Join(", ", KitTerminals.Names)));
        return new Port("", text);
    }

    private static Dictionary<string, double> Numbers(JsonField values)
    {
        var numbers = new Dictionary<string, double>(StringComparer.Ordinal);
        if (!values.IsGiven) return numbers;
        if (!values.IsObject) values.Fail("kit.not-an-object");
        foreach (var field in values.Properties())
            if (numbers.ContainsKey(field.Name)) field.Fail("kit.property-twice");
            else if (field.OptionalNumber() is { } si) numbers[field.Name] = si;
            else if (!field.IsGiven) field.Fail("kit.not-a-number");
        return numbers;
    }
}
