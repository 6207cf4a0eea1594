using ClubBench.Calculation.Windings;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.Parts;

/// <summary>Whether a part fits its place on the board.</summary>
public static class Places
{
    /// <summary>True where nothing speaks against it: nobody measured the place, or body and number of pieces fit.</summary>
    public static bool Fits(Part? part)
    {
        if (part?.Place is not { } place) return true;
        var pieces = part.Value(PartValue.ParallelCapacitance) is null ? 1 : 2;
        var body = Cores.FindToroid(part.Type)?.OuterDiameter.Metre;
        return pieces <= Math.Max(place.Pieces, 2) && (body is null || place.LargestM is null || body <= place.LargestM);
    }
}
