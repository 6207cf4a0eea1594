using System.Numerics;
using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.Plans;

/// <summary>Where a stage finds itself: band, neighbours, supply and what the club has learnt. Stages know nothing else of each other.</summary>
/// <param name="Band">The band segment the rig works on.</param>
/// <param name="Reference">The frequency the club meets on; offsets are quoted there.</param>
/// <param name="DesignFrequency">Middle of the band the kit was designed for; figures its papers give hold there.</param>
/// <param name="AtPort">Frequencies at each port, where they differ from the band.</param>
/// <param name="Neighbour">Impedance a port is connected to, ohm.</param>
/// <param name="SupplyVoltage">Supply of the rig.</param>
/// <param name="WantedPower">Output wanted at the antenna; null for a receiver.</param>
/// <param name="Mode">Mode of operation.</param>
/// <param name="Pitch">Audio pitch a station is heard at.</param>
/// <param name="Limits">The emission limit set chosen.</param>
/// <param name="WishMargin">Margin that ranks alternatives; never makes a Change.</param>
/// <param name="Learnt">What readings of all boards have taught.</param>
public sealed record Surroundings(
    FrequencyRange Band,
    Frequency Reference,
    Frequency DesignFrequency,
    IReadOnlyDictionary<string, FrequencyRange> AtPort,
    Func<string, Frequency, Complex> Neighbour,
    Voltage SupplyVoltage,
    Power? WantedPower,
    Mode Mode,
    Frequency Pitch,
    EmissionLimitSet Limits,
    Decibels WishMargin,
    LearntValues Learnt)
{
    /// <summary>Frequencies at a port.</summary>
    public FrequencyRange At(string port) => AtPort.TryGetValue(port, out var range) ? range : Band;
}

/// <summary>What the readings of all boards have taught about parts.</summary>
/// <param name="InductanceFactors">Inductance index by core designation: value and expanded uncertainty in nH per turn squared.</param>
public sealed record LearntValues(IReadOnlyDictionary<string, LearntInductanceFactor> InductanceFactors)
{
    /// <summary>Nothing learnt yet.</summary>
    public static LearntValues None { get; } = new(new Dictionary<string, LearntInductanceFactor>());
}

/// <summary>A learnt inductance index.</summary>
/// <param name="NanohenryPerTurnSquared">Mean.</param>
/// <param name="ExpandedUncertainty">Expanded uncertainty, k = 2.</param>
/// <param name="Boards">How many boards it rests on.</param>
public sealed record LearntInductanceFactor(double NanohenryPerTurnSquared, double ExpandedUncertainty, int Boards);
