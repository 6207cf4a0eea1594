namespace ClubBench.Planning.Drawings;

/// <summary>Symbols after IEC 60617, drawn by Printing. Sizes in grid units; the anchor is the first terminal.</summary>
public enum SymbolKind
{
    /// <summary>Capacitor.</summary>
    Capacitor,

    /// <summary>Capacitor with a bar-ended adjusting stroke.</summary>
    Trimmer,

    /// <summary>Capacitor with an arrow.</summary>
    VariableCapacitor,

    /// <summary>Polarised capacitor.</summary>
    Electrolytic,

    /// <summary>Resistor.</summary>
    Resistor,

    /// <summary>Potentiometer.</summary>
    Potentiometer,

    /// <summary>Coil without core.</summary>
    Coil,

    /// <summary>Coil on a ring core.</summary>
    ToroidCoil,

    /// <summary>Coil with a second winding.</summary>
    Transformer,

    /// <summary>Moulded choke.</summary>
    Choke,

    /// <summary>Ferrite bead.</summary>
    Bead,

    /// <summary>Crystal.</summary>
    Crystal,

    /// <summary>Diode.</summary>
    Diode,

    /// <summary>Zener diode.</summary>
    ZenerDiode,

    /// <summary>NPN transistor.</summary>
    TransistorNpn,

    /// <summary>PNP transistor.</summary>
    TransistorPnp,

    /// <summary>N-channel MOSFET.</summary>
    Mosfet,

    /// <summary>N-channel junction FET.</summary>
    Jfet,

    /// <summary>Operational amplifier.</summary>
    Amplifier,

    /// <summary>Box with a name: integrated circuit or block.</summary>
    Block,

    /// <summary>Mixer circle with a cross.</summary>
    Mixer,

    /// <summary>Ground.</summary>
    Ground,

    /// <summary>Supply rail arrow.</summary>
    Supply,

    /// <summary>Antenna.</summary>
    Antenna,

    /// <summary>Fuse.</summary>
    Fuse,

    /// <summary>Switch.</summary>
    Switch,

    /// <summary>Regulator block.</summary>
    Regulator,

    /// <summary>A labelled end that leads to another stage.</summary>
    Terminal,
}

/// <summary>How a symbol lies.</summary>
public enum Orientation
{
    /// <summary>First terminal left, second right.</summary>
    Across,

    /// <summary>First terminal above, second below.</summary>
    Down,

    /// <summary>First terminal below, second above: a diode that conducts upwards.</summary>
    Up,
}

/// <summary>Whether a part changes.</summary>
public enum Marking
{
    /// <summary>Stays: thin, grey.</summary>
    Untouched,

    /// <summary>Changes: bold, new value bold, old value struck.</summary>
    Changed,

    /// <summary>Goes in where nothing was.</summary>
    Added,

    /// <summary>Leaves the board.</summary>
    Removed,
}

/// <summary>One symbol. Two-terminal symbols span four grid units from their anchor.</summary>
/// <param name="Kind">Which symbol.</param>
/// <param name="X">Grid column of the anchor (first terminal).</param>
/// <param name="Y">Grid row of the anchor.</param>
/// <param name="Orientation">How it lies.</param>
/// <param name="Designator">Name on the board; empty for ground, supply and terminals.</param>
/// <param name="Value">Value as written beside it (the new one where it changes).</param>
/// <param name="OldValue">Old value, struck; null where nothing changes.</param>
/// <param name="Marking">Whether it changes.</param>
public sealed record Symbol(SymbolKind Kind, int X, int Y, Orientation Orientation, string Designator, string Value, string? OldValue, Marking Marking);

/// <summary>A straight wire between two grid points.</summary>
/// <param name="X1">From column.</param>
/// <param name="Y1">From row.</param>
/// <param name="X2">To column.</param>
/// <param name="Y2">To row.</param>
public sealed record Wire(int X1, int Y1, int X2, int Y2);

/// <summary>A lettered test point.</summary>
/// <param name="Letter">Its letter.</param>
/// <param name="X">Column.</param>
/// <param name="Y">Row.</param>
public sealed record TestPoint(string Letter, int X, int Y);

/// <summary>An abstract schematic on a grid. Printing renders it, for screen and paper alike.</summary>
/// <param name="Symbols">Symbols.</param>
/// <param name="Wires">Wires; a dot is drawn where three or more ends meet.</param>
/// <param name="TestPoints">Test points.</param>
public sealed record Schematic(IReadOnlyList<Symbol> Symbols, IReadOnlyList<Wire> Wires, IReadOnlyList<TestPoint> TestPoints)
{
    /// <summary>Nothing to draw.</summary>
    public static Schematic Empty { get; } = new([], [], []);
}
