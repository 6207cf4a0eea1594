using ClubBench.Printing.Drawings;
using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Windings;

/// <summary>Draws a wound ring core as it lies in the hand: exactly as many passes as turns, a gap below, tails hanging down.</summary>
public static class WindingSketch
{
    /// <summary>Class of every pass, so that a page (or a test) can count them.</summary>
    internal const string PassClass = "pass";

    private const float Size = 120;
    private const float Outer = 40;
    private const float Inner = 19;
    private const float Over = 4;
    private const float CentreY = 50;
    private const float TailEnd = 112;

    /// <summary>Share of the ring left free between the ends (common practice: about 30 degrees keep the ends apart).</summary>
    private const float GapShare = 30f / 360;

    /// <summary>Full wire width as long as the passes leave room for it.</summary>
    private const float WireWidth = 3.2f;

    /// <summary>The sketch.</summary>
    /// <param name="turns">Passes through the hole, at least 1.</param>
    /// <param name="core">Core designation, for the title.</param>
    /// <param name="colour">Paint colour in words; empty where the core is bare.</param>
    public static Drawing Of(int turns, string core, string colour)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(turns, 1);
        var svg = new SvgDocument();
        DrawCore(svg, colour);
        var angles = Angles(turns);
        var width = Math.Min(WireWidth, 0.62f * 2 * MathF.PI * Inner * (1 - GapShare) / turns);
        foreach (var angle in angles) DrawPass(svg, angle, width);
        DrawTail(svg, angles[0], width);
        if (turns > 1) DrawTail(svg, angles[^1], width);
        var title = Texts.Say("winding.title", turns, core);
        var description = colour.Length == 0 ? Texts.Say("winding.bare", turns) : Texts.Say("winding.painted", turns, colour);
        return svg.Finish(new Area(0, 0, Size, Size - 4), title, description);
    }

    /// <summary>Angles of the passes in degrees, clockwise from the gap at the bottom.</summary>
    private static List<float> Angles(int turns)
    {
        const float half = 360 * GapShare / 2;
        var step = turns == 1 ? 0 : (360 - (2 * half)) / (turns - 1);
        return [.. Enumerable.Range(0, turns).Select(i => 90 + half + (i * step))];
    }

    private static void DrawCore(SvgDocument svg, string colour)
    {
        var x = Size / 2;
        var ring = SvgDocument.Invariant($"M{x - Outer} {CentreY}a{Outer} {Outer} 0 1 0 {2 * Outer} 0a{Outer} {Outer} 0 1 0 {-2 * Outer} 0M{x - Inner} {CentreY}a{Inner} {Inner} 0 1 1 {2 * Inner} 0a{Inner} {Inner} 0 1 1 {-2 * Inner} 0Z");
        svg.Stroke(ring, Colour.Ink, 1.5f, fill: CorePaint.Of(colour));
    }

    /// <summary>One pass: the wire seen on the face of the core, from the hole to the rim.</summary>
    private static void DrawPass(SvgDocument svg, float angle, float width)
    {
        var (x1, y1) = Point(angle, Inner - Over);
        var (x2, y2) = Point(angle, Outer + Over);
        svg.Line(x1, y1, x2, y2, Colour.Wire, width, cssClass: PassClass);
    }

    private static void DrawTail(SvgDocument svg, float angle, float width)
    {
        var (x, y) = Point(angle, Outer + Over);
        svg.Stroke(SvgDocument.Invariant($"M{x} {y}C{x} {y + 6} {x} {y + 8} {x} {TailEnd}"), Colour.Wire, width);
    }

    private static (float X, float Y) Point(float angle, float radius) =>
        ((Size / 2) + (radius * MathF.Cos(angle * MathF.PI / 180)), CentreY + (radius * MathF.Sin(angle * MathF.PI / 180)));
}
