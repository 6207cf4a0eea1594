using System.Text.Json;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Seam until plans have their own JSON form.</summary>
internal static class PlanJson
{
    public static JsonSerializerOptions Options { get; } = new(JsonSerializerDefaults.Web);
}
