using System.Text.Json;
using System.Text.Json.Serialization;

namespace ClubBench.Web.Api;

/// <summary>How the programming interface writes: SI numbers, the unit in the property's name, enumerations as words.</summary>
internal static class ApiJson
{
    public static JsonSerializerOptions Options { get; } = new(JsonSerializerDefaults.Web)
    {
        Converters = { new JsonStringEnumConverter(JsonNamingPolicy.CamelCase) },
        DefaultIgnoreCondition = JsonIgnoreCondition.Never,
        MaxDepth = 64,
    };
}
