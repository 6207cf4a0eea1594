using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Parts;

/// <summary>The inductance reading of a winding, measured before it goes in.</summary>
public static class WindingExpectation
{
    /// <summary>Window of a winding's reading, relative: what spreading and squeezing can still set right (common practice).</summary>
    public const double UsualWindow = 0.05;

    /// <summary>A well filled core leaves less room to spread or squeeze.</summary>
    private const double WellFilled = 0.85;

    /// <summary>Expected reading of a winding.</summary>
    /// <param name="stage">Stage key.</param>
    /// <param name="winding">The winding.</param>
    /// <param name="trim">Range of L a trimmer still absorbs, relative.</param>
    /// <param name="window">Half width of the window, relative.</param>
    public static ExpectedReading For(string stage, WindingPart winding, double trim = 0, double window = UsualWindow)
    {
        var henry = winding.Inductance.Henry;
        var half = Math.Max(window, trim);
        return new ExpectedReading(
            $"{stage}.{winding.Part.Designator}.L",
            QuantityKind.Inductance,
            henry,
            henry * (1 - half),
            henry * (1 + half),
            "set-up.coil-before-fitting",
            InstrumentClass.LcMeter,
            WindowSides.Both,
            new Dictionary<string, double>(StringComparer.Ordinal) { [winding.Part.Designator] = 1 },
            UnderTest(winding, trim));
    }

    private static WindingUnderTest UnderTest(WindingPart winding, double trim)
    {
        var room = winding.Core is Calculation.Windings.FerriteCore ? 0.02 : winding.Winding.Fill > WellFilled ? 0.04 : 0.08;
        return new WindingUnderTest(winding.Part.Designator, winding.Turns, winding.Core.Designation, room, room, trim, winding.Winding.LengthPerTurn.Metre);
    }
}
