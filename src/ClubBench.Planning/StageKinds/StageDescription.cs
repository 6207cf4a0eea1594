using ClubBench.Planning.Figures;

namespace ClubBench.Planning.StageKinds;

/// <summary>What a stage depends on.</summary>
[Flags]
public enum DependsOn
{
    /// <summary>Same on any band.</summary>
    Nothing = 0,

    /// <summary>The signal frequency.</summary>
    SignalFrequency = 1,

    /// <summary>The local oscillator's frequency.</summary>
    OscillatorFrequency = 2,

    /// <summary>The intermediate frequency.</summary>
    IntermediateFrequency = 4,

    /// <summary>Audio only.</summary>
    AudioFrequency = 8,
}

/// <summary>Sort of part, for ordering, bags and places. Not the role it plays.</summary>
public enum PartClass
{
    /// <summary>Anything else.</summary>
    Other,

    /// <summary>Fixed capacitor.</summary>
    Capacitor,

    /// <summary>Trimmer capacitor.</summary>
    Trimmer,

    /// <summary>Variable capacitor.</summary>
    VariableCapacitor,

    /// <summary>Fixed resistor.</summary>
    Resistor,

    /// <summary>Variable resistor.</summary>
    Potentiometer,

    /// <summary>Winding on a toroid or other core.</summary>
    Winding,

    /// <summary>Ready-made choke.</summary>
    MouldedChoke,

    /// <summary>Crystal or resonator.</summary>
    Crystal,

    /// <summary>Transistor.</summary>
    Transistor,

    /// <summary>Diode of any sort.</summary>
    Diode,

    /// <summary>Integrated circuit.</summary>
    IntegratedCircuit,

    /// <summary>Fuse, switch, socket, relay.</summary>
    Hardware,
}

/// <summary>How badly a role is needed.</summary>
public enum RoleNeed
{
    /// <summary>The stage cannot be read without it.</summary>
    Required,

    /// <summary>Nearly always there; its absence is remarked.</summary>
    Usual,

    /// <summary>May be there.</summary>
    Optional,
}

/// <summary>Which way signals run through a port.</summary>
public enum PortDirection
{
    /// <summary>Into the stage.</summary>
    In,

    /// <summary>Out of the stage.</summary>
    Out,

    /// <summary>Either way.</summary>
    Both,
}

/// <summary>A terminal of a stage kind.</summary>
/// <param name="Name">Name used in connections.</param>
/// <param name="Direction">Which way signals run.</param>
/// <param name="NominalOhm">Impedance assumed when nobody presents one.</param>
/// <param name="IsOscillatorInput">Whether a mixer's oscillator comes in here.</param>
public sealed record PortDescription(string Name, PortDirection Direction, double NominalOhm = 50, bool IsOscillatorInput = false);

/// <summary>A way through a stage, from port to port.</summary>
/// <param name="From">Port a signal enters; empty where the stage generates it.</param>
/// <param name="To">Port it leaves.</param>
/// <param name="OnReceive">Used when receiving.</param>
/// <param name="OnTransmit">Used when transmitting.</param>
public sealed record Passage(string From, string To, bool OnReceive, bool OnTransmit);

/// <summary>A role parts play in a stage kind.</summary>
/// <param name="Name">Role name used in kit files.</param>
/// <param name="Class">Sort of part.</param>
/// <param name="Need">How badly it is needed.</param>
/// <param name="Values">Values it must carry (names of <c>PartValue</c>).</param>
/// <param name="Most">How many parts may play it.</param>
/// <param name="IsTuned">Whether only low-loss parts may go here (never a bypass-grade ceramic).</param>
public sealed record PartRole(string Name, PartClass Class, RoleNeed Need, IReadOnlyList<string> Values, int Most = 1, bool IsTuned = false);

/// <summary>A figure of the circuit that is not a part.</summary>
/// <param name="Name">Setting name with its unit, used in kit files.</param>
/// <param name="Kind">What it measures.</param>
/// <param name="Default">Value assumed where the papers say nothing; SI.</param>
public sealed record SettingDescription(string Name, QuantityKind Kind, double Default);

/// <summary>Everything generic code needs to know of a stage kind.</summary>
/// <param name="Id">Id used in kit files.</param>
/// <param name="DependsOn">What it depends on.</param>
/// <param name="Ports">Its terminals.</param>
/// <param name="Passages">The ways through it.</param>
/// <param name="Roles">Roles of its parts.</param>
/// <param name="Settings">Its settings.</param>
/// <param name="Stated">Names of the figures a kit's papers may state.</param>
public sealed record StageDescription(
    string Id,
    DependsOn DependsOn,
    IReadOnlyList<PortDescription> Ports,
    IReadOnlyList<Passage> Passages,
    IReadOnlyList<PartRole> Roles,
    IReadOnlyList<SettingDescription> Settings,
    IReadOnlyList<string> Stated)
{
    /// <summary>The role with this name, or null.</summary>
    public PartRole? Role(string name) => Roles.FirstOrDefault(r => r.Name == name);

    /// <summary>The port with this name, or null.</summary>
    public PortDescription? Port(string name) => Ports.FirstOrDefault(p => p.Name == name);
}
