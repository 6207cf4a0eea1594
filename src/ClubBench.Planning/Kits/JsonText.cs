using System.Globalization;
using System.Text.Json;

namespace ClubBench.Planning.Kits;

/// <summary>Reads JSON from an untrusted stream within the limits of size and depth.</summary>
internal static class JsonText
{
    /// <summary>The bytes, known to be valid JSON within the limits; or one message that names the limit or the place of the fault.</summary>
    public static Outcome<ReadOnlyMemory<byte>> Read(Stream stream)
    {
        if (WithinSize(stream) is not { } bytes) return Refused("kit.too-large", ("limit", $"{Invariant(KitFile.LargestBytes / (1024 * 1024))} MB"));
        var text = WithoutByteOrderMark(bytes);
        try
        {
            return IsWithinDepth(text.Span) ? Outcome<ReadOnlyMemory<byte>>.Success(text) : Refused("kit.too-deep", ("limit", Invariant(KitFile.DeepestLevel)));
        }
        catch (JsonException fault)
        {
            return Refused("kit.not-json", ("line", Invariant((fault.LineNumber ?? 0) + 1)), ("column", Invariant((fault.BytePositionInLine ?? 0) + 1)));
        }
    }

    private static byte[]? WithinSize(Stream stream)
    {
        using var kept = new MemoryStream();
        var buffer = new byte[81920];
        for (int count; (count = stream.Read(buffer, 0, buffer.Length)) > 0;)
        {
            if (kept.Length + count > KitFile.LargestBytes) return null;
            kept.Write(buffer, 0, count);
        }

        return kept.ToArray();
    }

    // The reader is let one level deeper than the limit, so that too deep is told apart from malformed.
    private static bool IsWithinDepth(ReadOnlySpan<byte> text)
    {
        var reader = new Utf8JsonReader(text, new JsonReaderOptions { MaxDepth = KitFile.DeepestLevel + 1 });
        while (reader.Read())
            if (reader.TokenType is JsonTokenType.StartArray or JsonTokenType.StartObject && reader.CurrentDepth >= KitFile.DeepestLevel) return false;
        return true;
    }

    private static ReadOnlyMemory<byte> WithoutByteOrderMark(byte[] bytes) =>
        bytes.AsMemory(bytes.AsSpan().StartsWith((ReadOnlySpan<byte>)[0xEF, 0xBB, 0xBF]) ? 3 : 0);

    private static Outcome<ReadOnlyMemory<byte>> Refused(string code, params (string Name, string Value)[] arguments) =>
        Outcome<ReadOnlyMemory<byte>>.Failure(FieldMessage.Error("", code, arguments));

    private static string Invariant(long number) => number.ToString(CultureInfo.InvariantCulture);
}
