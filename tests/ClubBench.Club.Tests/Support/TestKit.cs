using System.Text;
using System.Text.Json.Nodes;
using ClubBench.Planning.Kits;

namespace ClubBench.Club.Tests.Support;

/// <summary>The transmitting half of the demonstration kit: small, so that plans are quick.</summary>
public static class TestKit
{
    private static readonly HashSet<string> Kept = ["A1", "A2", "A3", "A4", "A5"];

    public static Kit Transmitter { get; } = Read(Json());

    public static string Json()
    {
        using var stream = DemoKits.OpenQuernThirty();
        var root = JsonNode.Parse(stream)!.AsObject();
        root["stages"] = Only(root["stages"]!, s => Kept.Contains((string)s!["key"]!));
        root["bringUp"] = Only(root["bringUp"]!, s => Kept.Contains((string)s!));
        root["connections"] = Only(root["connections"]!, c => IsKept(c!["from"]!) && IsKept(c["to"]!));
        root["scheme"]!["conversions"] = new JsonArray();
        return root.ToJsonString();
    }

    public static Stream File() => new MemoryStream(Encoding.UTF8.GetBytes(Json()));

    private static bool IsKept(JsonNode port) => (string)port! == "antenna" || Kept.Contains(((string)port!).Split('.')[0]);

    private static JsonArray Only(JsonNode array, Func<JsonNode?, bool> keep) => new([.. array.AsArray().Where(keep).Select(n => n!.DeepClone())]);

    private static Kit Read(string json)
    {
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(json));
        return KitFile.Read(stream).Value;
    }
}
