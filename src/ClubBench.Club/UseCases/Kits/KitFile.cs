using System.Text.Json;
using ClubBench.Planning;
using ClubBench.Planning.Kits;

namespace ClubBench.Club.UseCases.Kits;

/// <summary>Seam until kits have their own file form.</summary>
internal static class KitFile
{
    public static Outcome<Kit> Read(Stream file) => Outcome<Kit>.Success(JsonSerializer.Deserialize<Kit>(file, Plans.PlanJson.Options)!);

    public static void Write(Kit kit, Stream file) => JsonSerializer.Serialize(file, kit, Plans.PlanJson.Options);
}
