namespace ClubBench.Planning.Kits;

/// <summary>A terminal of a stage, or of the kit as a whole (<see cref="Antenna"/>, <see cref="Phones"/>, <see cref="Microphone"/>, <see cref="Key"/>, <see cref="SupplyInput"/>).</summary>
/// <param name="Stage">Stage key; empty for a terminal of the kit.</param>
/// <param name="Name">Port name of the stage kind, or terminal name.</param>
public readonly record struct Port(string Stage, string Name)
{
    /// <summary>The antenna socket.</summary>
    public static Port Antenna => new("", "antenna");

    /// <summary>The phones socket.</summary>
    public static Port Phones => new("", "phones");

    /// <summary>The microphone socket.</summary>
    public static Port Microphone => new("", "microphone");

    /// <summary>The Morse key socket.</summary>
    public static Port Key => new("", "key");

    /// <summary>The supply socket.</summary>
    public static Port SupplyInput => new("", "supply");

    /// <summary>Whether this is a terminal of the kit, not of a stage.</summary>
    public bool IsTerminal => Stage.Length == 0;

    /// <inheritdoc/>
    public override string ToString() => IsTerminal ? Name : $"{Stage}.{Name}";
}

/// <summary>A wire between two ports. Signals may run both ways where the stages allow it.</summary>
/// <param name="From">One end, usually the source.</param>
/// <param name="To">The other end.</param>
public sealed record Connection(Port From, Port To);
