using ClubBench.Planning.Text;

namespace ClubBench.Web.Bench;

/// <summary>How a point to measure is called: by the part it belongs to, or by its stage kind's own word.</summary>
public static class PointName
{
    /// <summary>Within its stage: "L4", "loss at the club's frequency".</summary>
    public static string Short(string point, string stageKind)
    {
        var parts = point.Split('.');
        return parts.Length > 2 ? parts[1] : Phrases.Say($"point.{parts[^1]}", stageKind);
    }

    /// <summary>Key of the stage a point belongs to.</summary>
    public static string StageOf(string point) => point.Split('.')[0];
}
