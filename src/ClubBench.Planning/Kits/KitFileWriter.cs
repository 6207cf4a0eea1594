using System.Buffers;
using System.Text;
using System.Text.Encodings.Web;
using System.Text.Json;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Kits;

/// <summary>Writes the kit file: one line per part and connection, so that people can compare two revisions.</summary>
internal static class KitFileWriter
{
    private static readonly JsonWriterOptions Spread = new() { Indented = true, NewLine = "\n", Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };
    private static readonly JsonWriterOptions OneLine = new() { Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    public static void Write(Kit kit, Stream stream)
    {
        using (var json = new Utf8JsonWriter(stream, Spread))
        {
            json.WriteStartObject();
            Head(json, kit);
            Scheme(json, kit.Scheme);
            json.WriteStartArray("stages");
            foreach (var stage in kit.Stages) Stage(json, stage);
            json.WriteEndArray();
            List(json, "connections", kit.Connections, Connection);
            json.WriteStartArray("bringUp");
            foreach (var key in kit.BringUp) json.WriteStringValue(key);
            json.WriteEndArray();
            if (kit.Notes.Length > 0) json.WriteString("notes", kit.Notes);
            json.WriteEndObject();
        }

        stream.WriteByte((byte)'\n');
    }

    private static void Head(Utf8JsonWriter json, Kit kit)
    {
        json.WriteNumber("formatVersion", KitFile.FormatVersion);
        json.WriteString("id", kit.Id);
        json.WriteNumber("revision", kit.Revision);
        json.WriteString("name", kit.Name);
        if (kit.BoardIssue.Length > 0) json.WriteString("boardIssue", kit.BoardIssue);
        json.WriteString("mode", Word(kit.Mode));
        json.WriteStartObject("band");
        json.WriteNumber("lowHz", kit.Band.Low.Hertz);
        json.WriteNumber("highHz", kit.Band.High.Hertz);
        json.WriteEndObject();
        json.WriteNumber("supplyVoltageV", kit.SupplyVoltage.Volt);
        if (kit.OutputPower is { } power) json.WriteNumber("outputPowerW", power.Watt);
    }

    private static void Scheme(Utf8JsonWriter json, FrequencyScheme scheme)
    {
        json.WriteStartObject("scheme");
        json.WriteString("kind", Word(scheme.Kind));
        List(json, "conversions", scheme.Conversions, Conversion);
        json.WriteEndObject();
    }

    private static void Conversion(Utf8JsonWriter json, Conversion conversion)
    {
        json.WriteString("mixer", conversion.Mixer);
        json.WriteString("oscillator", conversion.Oscillator);
        json.WriteString("side", Word(conversion.Side));
        Optional(json, "intermediateFrequencyHz", conversion.IntermediateFrequencyHz);
    }

    private static void Stage(Utf8JsonWriter json, StageDocument stage)
    {
        json.WriteStartObject();
        json.WriteString("key", stage.Key);
        json.WriteString("kind", stage.Kind);
        if (stage.Variant.Length > 0) json.WriteString("variant", stage.Variant);
        List(json, "parts", stage.Parts, Part);
        Numbers(json, "settings", stage.SettingsSi);
        Numbers(json, "stated", stage.StatedSi);
        json.WriteEndObject();
    }

    private static void Part(Utf8JsonWriter json, Part part)
    {
        json.WriteString("designator", part.Designator);
        json.WriteString("role", part.Role);
        if (part.Type.Length > 0) json.WriteString("type", part.Type);
        Numbers(json, "values", part.ValuesSi);
        if (part.Place is { } place) Place(json, place);
        if (part.From != Figures.Provenance.Published) json.WriteString("from", Word(part.From));
    }

    private static void Place(Utf8JsonWriter json, Place place)
    {
        json.WriteStartObject("place");
        json.WriteString("footprint", place.Footprint);
        Optional(json, "pitchM", place.PitchM);
        Optional(json, "largestM", place.LargestM);
        if (place.Pieces != 1) json.WriteNumber("pieces", place.Pieces);
        json.WriteEndObject();
    }

    private static void Connection(Utf8JsonWriter json, Connection connection)
    {
        json.WriteString("from", connection.From.ToString());
        json.WriteString("to", connection.To.ToString());
    }

    private static void Numbers(Utf8JsonWriter json, string name, IReadOnlyDictionary<string, double> values)
    {
        if (values.Count == 0) return;
        json.WriteStartObject(name);
        foreach (var (key, si) in values) json.WriteNumber(key, si);
        json.WriteEndObject();
    }

    private static void Optional(Utf8JsonWriter json, string name, double? si)
    {
        if (si is { } value) json.WriteNumber(name, value);
    }

    // Every item stands on its own line, indented like the list around it.
    private static void List<T>(Utf8JsonWriter json, string name, IReadOnlyList<T> items, Action<Utf8JsonWriter, T> write)
    {
        json.WriteStartArray(name);
        foreach (var item in items)
        {
            var line = new ArrayBufferWriter<byte>();
            line.Write(Encoding.UTF8.GetBytes("\n" + new string(' ', 2 * json.CurrentDepth)));
            using (var inner = new Utf8JsonWriter(line, OneLine))
            {
                inner.WriteStartObject();
                write(inner, item);
                inner.WriteEndObject();
            }

            json.WriteRawValue(line.WrittenSpan, skipInputValidation: true);
        }

        json.WriteEndArray();
    }

    private static string Word<T>(T member)
        where T : struct, Enum => Placeholders.Dashed(member.ToString());
}
