namespace ClubBench.Printing.Layout;

/// <summary>Weights of the typeface that are carried along.</summary>
public enum FontWeight
{
    /// <summary>400.</summary>
    Regular,

    /// <summary>500.</summary>
    Medium,

    /// <summary>600.</summary>
    SemiBold,

    /// <summary>700.</summary>
    Bold,
}

/// <summary>Greys of a card. A card never needs colour.</summary>
public enum Shade
{
    /// <summary>Black: everything that must be read.</summary>
    Black,

    /// <summary>Dark grey: what is untouched or struck.</summary>
    Grey,

    /// <summary>Light grey: thin rules.</summary>
    Light,

    /// <summary>White: text on the black tag.</summary>
    White,
}

/// <summary>Where a text stands on its anchor.</summary>
public enum TextSide
{
    /// <summary>Starts at the anchor.</summary>
    Start,

    /// <summary>Centred on the anchor.</summary>
    Middle,

    /// <summary>Ends at the anchor.</summary>
    End,
}

/// <summary>How a text looks.</summary>
/// <param name="Size">Size in points.</param>
/// <param name="Weight">Weight.</param>
/// <param name="Shade">Shade.</param>
/// <param name="Side">Side of the anchor.</param>
public readonly record struct TextStyle(float Size, FontWeight Weight = FontWeight.Regular, Shade Shade = Shade.Black, TextSide Side = TextSide.Start)
{
    /// <summary>Smallest size of running text on a card.</summary>
    public const float BodySize = 12;

    /// <summary>Smallest size of a value somebody works by.</summary>
    public const float KeySize = 18;

    /// <summary>Running text.</summary>
    public static TextStyle Body { get; } = new(BodySize);

    /// <summary>Running text that stands out.</summary>
    public static TextStyle Strong { get; } = new(BodySize, FontWeight.SemiBold);

    /// <summary>A value somebody works by.</summary>
    public static TextStyle Key { get; } = new(KeySize, FontWeight.SemiBold);

    /// <summary>Heading of a section.</summary>
    public static TextStyle Heading { get; } = new(13.5f, FontWeight.SemiBold);

    /// <summary>Distance from one line to the next; large values never run over two lines of text, so they stand closer.</summary>
    public float LineHeight => Size * (Size < KeySize ? 1.2f : 1.1f);

    /// <summary>Distance from the top of a line to its baseline.</summary>
    public float Ascent => Size * (Size < KeySize ? 0.96f : 0.91f);

    /// <summary>Height of a capital letter of this typeface.</summary>
    public float CapHeight => Size * 0.698f;
}
