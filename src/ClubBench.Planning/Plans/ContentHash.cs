using System.Buffers;
using System.Security.Cryptography;
using System.Text.Json;

namespace ClubBench.Planning.Plans;

/// <summary>Tells whether two cards or plans hold the same. Method: SHA-256 (FIPS 180-4) over JSON with its properties in ordinal order.</summary>
public static class ContentHash
{
    /// <summary>The hash, 64 small hexadecimal digits. The order of entries in dictionaries plays no part; that of lists does.</summary>
    public static string Of(object content) => Convert.ToHexStringLower(SHA256.HashData(CanonicalBytes(content)));

    /// <summary>The same content always gives the same UTF-8 bytes.</summary>
    public static byte[] CanonicalBytes(object content)
    {
        var element = JsonSerializer.SerializeToElement(content, content.GetType(), PlanJson.Options);
        var bytes = new ArrayBufferWriter<byte>();
        using (var writer = new Utf8JsonWriter(bytes)) Write(writer, element);
        return bytes.WrittenSpan.ToArray();
    }

    private static void Write(Utf8JsonWriter writer, JsonElement element)
    {
        switch (element.ValueKind)
        {
            case JsonValueKind.Object:
                writer.WriteStartObject();
                foreach (var property in element.EnumerateObject().OrderBy(p => p.Name, StringComparer.Ordinal))
                {
                    writer.WritePropertyName(property.Name);
                    Write(writer, property.Value);
                }

                writer.WriteEndObject();
                break;
            case JsonValueKind.Array:
                writer.WriteStartArray();
                foreach (var item in element.EnumerateArray()) Write(writer, item);
                writer.WriteEndArray();
                break;
            default:
                element.WriteTo(writer);
                break;
        }
    }
}
