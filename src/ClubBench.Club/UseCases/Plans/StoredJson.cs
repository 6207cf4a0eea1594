using System.Security.Cryptography;
using System.Text;
using System.Text.Json;
using ClubBench.Planning.Plans;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Plans, cards and advice as they are stored: numbers in SI units, the same text for the same content.</summary>
internal static class StoredJson
{
    public static string Write<T>(T value) => JsonSerializer.Serialize(value, PlanJson.Options);

    public static T Read<T>(string json) =>
        JsonSerializer.Deserialize<T>(json, PlanJson.Options) ?? throw new InvalidOperationException($"A stored {typeof(T).Name} is empty.");

    /// <summary>Hash by which equal content is recognised.</summary>
    public static string HashOf(string json) => Convert.ToHexString(SHA256.HashData(Encoding.UTF8.GetBytes(json)));
}
