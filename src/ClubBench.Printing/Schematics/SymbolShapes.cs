using ClubBench.Planning.Drawings;
using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Schematics;

/// <summary>
/// Our drawings of the symbols, after the practice of IEC 60617. Lying across; a symbol that stands is mirrored on the diagonal, so
/// that what lies below the first axis comes to lie right of it; one that rises is turned instead. Terminals, in this order, in grid units from the anchor:
/// two-terminal symbols (0,0), (4,0); transistors base or gate (0,0), collector or drain (2,-2), emitter or source (2,2), for PNP
/// collector (2,2) and emitter (2,-2); transformer (0,0), (4,0), second winding (0,2), (4,2); potentiometer wiper (2,-2);
/// amplifier inverting (0,0), other input (0,2), output (4,1), supply (2,0); mixer third port (2,2), supply (2,-1); block (0,0), (4,0), (2,-1), (2,1);
/// regulator ground (2,1); ground, supply, antenna and terminal (0,0).
/// </summary>
internal static class SymbolShapes
{
    private const string Plates = "M28 -12V12M36 -12V12";
    private const string PlateLeads = "M0 0H28M36 0H64";
    private const string Humps = "a5 5 0 0 1 10 0a5 5 0 0 1 10 0a5 5 0 0 1 10 0a5 5 0 0 1 10 0";
    private const string HumpsBelow = "a5 5 0 0 0 10 0a5 5 0 0 0 10 0a5 5 0 0 0 10 0a5 5 0 0 0 10 0";
    private const string CoilPath = "M0 0H12" + Humps + "H64";
    private const string Rectangle = "M16 -6H48V6H16Z";
    private const string TransistorCircle = "M2 0a20 20 0 1 0 40 0a20 20 0 1 0-40 0";
    private const string BlockPath = "M0 -16H64V16H0Z";

    private static readonly (int, int)[] s_two = [(0, 0), (4, 0)];
    private static readonly (int, int)[] s_one = [(0, 0)];
    private static readonly (int, int)[] s_transistor = [(0, 0), (2, -2), (2, 2)];
    private static readonly Area s_plates = new(24, -13, 16, 26);
    private static readonly Area s_adjusted = new(18, -20, 33, 37);
    private static readonly Area s_rectangle = new(16, -6, 32, 12);
    private static readonly Area s_circle = new(2, -20, 40, 40);

    private static readonly Dictionary<SymbolKind, Shape> s_shapes = new()
    {
        [SymbolKind.Capacitor] = new(PlateLeads, Plates, "", s_plates, s_two),
        [SymbolKind.Trimmer] = new(PlateLeads + "M18 16L46 -16M41.5 -20L50.5 -12", Plates, "", s_adjusted, s_two),
        [SymbolKind.VariableCapacitor] = new(PlateLeads + "M18 16L44 -14", Plates, "M48 -18L44.6 -8.4L38.6 -13.6Z", s_adjusted, s_two),
        [SymbolKind.Electrolytic] = new(PlateLeads + "M15 -10h8M19 -14v8", Plates, "", s_plates, s_two),
        [SymbolKind.Resistor] = new("M0 0H16M48 0H64" + Rectangle, "", "", s_rectangle, s_two),
        [SymbolKind.Potentiometer] = new("M0 0H16M48 0H64M32 -32V-12" + Rectangle, "", "M32 -6L28.5 -14H35.5Z", s_rectangle, (0, 0), (4, 0), (2, -2)),
        [SymbolKind.Coil] = new(CoilPath, "", "", new(12, -6, 40, 7), s_two),
        [SymbolKind.ToroidCoil] = new(CoilPath + "M29 -15a3 3 0 1 0 6 0a3 3 0 1 0-6 0", "M12 -9H52", "", new(12, -19, 40, 20), s_two),
        [SymbolKind.Choke] = new(CoilPath, "M12 -9H52", "", new(12, -11, 40, 12), s_two),
        [SymbolKind.Transformer] = new("M0 0H12" + HumpsBelow + "H64M0 32H12" + Humps + "H64", "M12 16H52", "", new(12, -1, 40, 34), (0, 0), (4, 0), (0, 2), (4, 2)),
        [SymbolKind.Bead] = new("M0 0H64M24 -6H40V6H24Z", "", "", new(24, -6, 16, 12), s_two),
        [SymbolKind.Crystal] = new("M0 0H20M44 0H64M25 -13H39V13H25Z", "M20 -9V9M44 -9V9", "", new(20, -13, 24, 26), s_two),
        [SymbolKind.Diode] = new("M0 0H64M24 -9V9L40 0Z", "M40 -9V9", "", new(24, -9, 17, 18), s_two),
        [SymbolKind.ZenerDiode] = new("M0 0H64M24 -9V9L40 0Z", "M34 -9H40V9", "", new(24, -9, 17, 18), s_two),
        [SymbolKind.TransistorNpn] = new("M0 0H14M14 -5L32 -16V-32M14 5L32 16V32" + TransistorCircle, "M14 -11V11", "M31 15.4L21.4 13.6L25 7.6Z", s_circle, s_transistor),
        [SymbolKind.TransistorPnp] = new("M0 0H14M14 -5L32 -16V-32M14 5L32 16V32" + TransistorCircle, "M14 -11V11", "M15.5 -5.9L25 -7.4L21.4 -13.6Z", s_circle, (0, 0), (2, 2), (2, -2)),
        [SymbolKind.Mosfet] = new("M0 0H10M16 -10H32V-32M16 10H32V32M16 0H32V10" + TransistorCircle, "M10 -10V10M16 -13v6M16 -3v6M16 7v6", "M17 0L25 -4V4Z", s_circle, s_transistor),
        [SymbolKind.Jfet] = new("M0 0H7M14 -8H32V-32M14 8H32V32" + TransistorCircle, "M14 -12V12", "M13 0L5 -4V4Z", s_circle, s_transistor),
        [SymbolKind.Amplifier] = new("M0 0H8M0 32H8M60 16H64M8 -14V46L60 16ZM12 0h8M12 32h8M16 28v8", "", "", new(8, -14, 52, 60), (0, 0), (0, 2), (4, 1), (2, 0)),
        [SymbolKind.Block] = new(BlockPath, "", "", new(0, -16, 64, 32), (0, 0), (4, 0), (2, -1), (2, 1)),
        [SymbolKind.Mixer] = new("M0 0H16M48 0H64M32 16V32M16 0a16 16 0 1 0 32 0a16 16 0 1 0-32 0M20.7 -11.3L43.3 11.3M43.3 -11.3L20.7 11.3", "", "", new(16, -16, 32, 32), (0, 0), (4, 0), (2, 2), (2, -1)),
        [SymbolKind.Ground] = new("M0 0V8", "M-9 8H9M-5.5 12H5.5M-2 16H2", "", new(-10, 4, 20, 14), s_one),
        [SymbolKind.Supply] = new("M0 0V-10", "", "M0 -19L-4.5 -9H4.5Z", new(-5, -19, 10, 15), s_one),
        [SymbolKind.Antenna] = new("M0 0V-32M0 -14L-12 -32H12L0 -14", "", "", new(-12, -32, 24, 18), s_one),
        [SymbolKind.Fuse] = new("M0 0H64" + Rectangle, "", "", s_rectangle, s_two),
        [SymbolKind.Switch] = new("M0 0H18M46 0H64M20 -2L42 -13M18 0a2 2 0 1 0 4 0a2 2 0 1 0-4 0M42 0a2 2 0 1 0 4 0a2 2 0 1 0-4 0", "", "", new(18, -14, 28, 17), s_two),
        [SymbolKind.Regulator] = new(BlockPath, "", "", new(0, -16, 64, 32), (0, 0), (4, 0), (2, 1)),
        [SymbolKind.Terminal] = new("", "", "", new(-1, -1, 2, 2), s_one),
    };

    /// <summary>The shape of a kind.</summary>
    public static Shape Of(SymbolKind kind) => s_shapes[kind];

    /// <summary>Symbols that never lie down: their direction means something.</summary>
    public static bool KeepsUpright(SymbolKind kind) => kind is SymbolKind.Ground or SymbolKind.Supply or SymbolKind.Antenna or SymbolKind.Terminal;

    /// <summary>Symbols whose name stands inside.</summary>
    public static bool IsNamedInside(SymbolKind kind) => kind is SymbolKind.Block or SymbolKind.Regulator;
}
