using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Sweeps;

namespace ClubBench.Calculation.Fitting;

/// <summary>Which parameters of a sweep the fit looks at.</summary>
public enum FittedData
{
    /// <summary>Reflection and transmission; reflection alone for one port.</summary>
    All,

    /// <summary>Reflection at the input only.</summary>
    Reflection,

    /// <summary>Transmission only: a filter and its mirror image look the same.</summary>
    Transmission,
}

/// <summary>Question to the fit: a board's sweep and the filter it should be.</summary>
/// <param name="Nominal">The filter as planned, values only.</param>
/// <param name="CoilQ">Unloaded Q expected of the coils, above zero; fitted with a wide margin.</param>
/// <param name="CapacitorQ">Unloaded Q of the capacitors, above zero; not fitted.</param>
/// <param name="Measured">The sweep, in its references; for one port the far end carries the load.</param>
public sealed record SweepFitInput(Ladder Nominal, double CoilQ, double CapacitorQ, Sweep Measured)
{
    /// <summary>Which parameters are looked at.</summary>
    public FittedData Data { get; init; }

    /// <summary>Termination of the far end in a one-port sweep; the reference where not told.</summary>
    public Resistance? OnePortLoad { get; init; }

    /// <summary>Standard deviation of the noise in each real and imaginary part, 0.0001 to 0.1; null takes it from the residual, at most 0.005.</summary>
    public double? Noise { get; init; }

    /// <summary>Expected spread (standard deviation) of a coil, as a share, 0.001 to 1.</summary>
    public double CoilSpread { get; init; } = 0.10;

    /// <summary>Expected spread of a capacitor, as a share, 0.001 to 1; 0.2 where a wrong part is suspected.</summary>
    public double CapacitorSpread { get; init; } = 0.05;

    internal bool UsesReflection => Data != FittedData.Transmission || Measured.Ports == 1;

    internal bool UsesTransmission => Data != FittedData.Reflection && Measured.Ports == 2;

    internal Resistance Source => Measured.Reference1;

    internal Resistance Load => Measured.Ports == 2 ? Measured.Reference2 : OnePortLoad ?? Measured.Reference1;
}
