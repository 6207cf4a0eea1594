using System.Text.Json;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Kits;

/// <summary>
/// The exchange form of a kit: JSON with a format version, numbers in SI units with the unit in the property name. Old versions stay readable.
/// Its published schema is <c>kit-file-1.schema.json</c>.
/// </summary>
public static class KitFile
{
    /// <summary>The version that is written.</summary>
    public const int FormatVersion = 1;

    /// <summary>Largest file that is read, byte.</summary>
    public const int LargestBytes = 10 * 1024 * 1024;

    /// <summary>Deepest nesting that is read, levels.</summary>
    public const int DeepestLevel = 32;

    private const int MostMessages = 200;

    private static readonly Dictionary<int, Func<JsonField, Kit>> Readers = new() { [1] = KitFileVersion1.Read };

    /// <summary>Reads a kit and checks it. Never throws for a faulty file: the messages name every fault found, each with its field path.</summary>
    public static Outcome<Kit> Read(Stream stream) => Read(stream, kit => KitValidation.Check(kit));

    /// <summary>Writes a kit. The same kit always gives the same bytes.</summary>
    public static void Write(Kit kit, Stream stream) => KitFileWriter.Write(kit, stream);

    /// <summary>The published JSON Schema (2020-12) of the version that is written.</summary>
    public static Stream OpenSchema() => Embedded.Open("ClubBench.Planning.Kits.kit-file-1.schema.json");

    /// <summary>Reads with other checks than those of the registered stage kinds.</summary>
    internal static Outcome<Kit> Read(Stream stream, Func<string, IStageKind?> kinds) => Read(stream, kit => KitValidation.Check(kit, kinds));

    /// <summary>Reads the document alone: its form and its inner references, nothing about stage kinds.</summary>
    internal static Outcome<Kit> ReadDocument(Stream stream) => Read(stream, KitValidation.CheckReferences);

    private static Outcome<Kit> Read(Stream stream, Func<Kit, IEnumerable<FieldMessage>> check)
    {
        var text = JsonText.Read(stream);
        if (!text.Succeeded) return Outcome<Kit>.Failure(text.Messages);
        using var document = JsonDocument.Parse(text.Value, new JsonDocumentOptions { MaxDepth = DeepestLevel });
        var messages = new List<FieldMessage>();
        var root = JsonField.Root(document.RootElement, messages);
        if (ReaderFor(root, messages) is not { } read) return Outcome<Kit>.Failure(messages);
        var kit = read(root);
        var faulty = messages.Select(m => m.Path).ToHashSet(StringComparer.Ordinal);
        messages.AddRange(check(kit).Where(m => !faulty.Contains(m.Path)));
        return Outcome<Kit>.From(() => kit, [.. messages.Take(MostMessages)]);
    }

    private static Func<JsonField, Kit>? ReaderFor(JsonField root, List<FieldMessage> messages)
    {
        if (!root.IsObject) root.Fail("kit.not-an-object");
        var version = root["formatVersion"].WholeNumber();
        if (messages.Count == 0 && !Readers.ContainsKey(version))
            root["formatVersion"].Fail("kit.version-unknown", ("version", Invariant(version)), ("known", string.Join(", ", Readers.Keys.Select(Invariant))));
        return messages.Count == 0 ? Readers[version] : null;
    }

    private static string Invariant(int number) => number.ToString(System.Globalization.CultureInfo.InvariantCulture);
}
