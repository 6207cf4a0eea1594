namespace ClubBench.Printing.Layout;

/// <summary>A sheet of paper, in points of 1/72 inch.</summary>
/// <param name="Name">Name on the box of paper.</param>
/// <param name="Width">Width in points.</param>
/// <param name="Height">Height in points.</param>
public sealed record PaperSize(string Name, float Width, float Height)
{
    /// <summary>ISO 216 A4, 210 mm by 297 mm.</summary>
    public static PaperSize A4 { get; } = new("A4", Millimetres(210), Millimetres(297));

    /// <summary>ANSI Letter, 8.5 inch by 11 inch.</summary>
    public static PaperSize Letter { get; } = new("Letter", 612, 792);

    /// <summary>Points in so many millimetres.</summary>
    public static float Millimetres(float mm) => mm * 72 / 25.4f;
}

/// <summary>A rectangle on the page in points, measured from the upper left corner.</summary>
/// <param name="X">Left edge.</param>
/// <param name="Y">Upper edge.</param>
/// <param name="Width">Width.</param>
/// <param name="Height">Height.</param>
public readonly record struct Area(float X, float Y, float Width, float Height)
{
    /// <summary>Right edge.</summary>
    public float Right => X + Width;

    /// <summary>Lower edge.</summary>
    public float Bottom => Y + Height;

    /// <summary>Middle of the height.</summary>
    public float Middle => Y + (Height / 2);

    /// <summary>The same area, smaller by a margin on every side.</summary>
    public Area Inset(float margin) => new(X + margin, Y + margin, Width - (2 * margin), Height - (2 * margin));
}
