using ClubBench.Calculation.Bands;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Web.State;

/// <summary>How the tag of a band looks, on the phone as in the room. The name always stands on it; the look only helps across a hall.</summary>
internal static class BandLook
{
    private static readonly Frequency Border = Frequency.FromMegahertz(10);

    /// <summary>"filled" for bands above 10 MHz, "outlined" for those below and for a name no table has.</summary>
    public static string Of(string bandName) => AmateurBands.All.Any(s => s.Band == bandName && s.Range.Low > Border) ? "filled" : "outlined";
}
