namespace ClubBench.Calculation.Oscillators;

/// <summary>How far the crystal still rules a pulled oscillator, and how far the series inductor has taken its place.</summary>
public enum CrystalControlState
{
    /// <summary>Not evaluated.</summary>
    Unknown,

    /// <summary>The crystal rules: drift and range are those of a crystal oscillator.</summary>
    CrystalControlled,

    /// <summary>Usable with a stable inductor and a warm-up.</summary>
    Stretched,

    /// <summary>Drifts and retunes like an LC oscillator: take less inductance.</summary>
    TakingOver,

    /// <summary>The inductor sets the frequency; no crystal oscillator any more.</summary>
    InductorControlled,
}

/// <summary>Why a pulled-crystal loop has no usable frequency.</summary>
public enum LoopRefusal
{
    /// <summary>Not refused.</summary>
    None,

    /// <summary>The largest value of the variable capacitor does not exceed the smallest.</summary>
    VariableHasNoSwing,

    /// <summary>The series inductor is at or above its own resonance with its self-capacitance.</summary>
    InductorAboveSelfResonance,

    /// <summary>Stray capacitance between crystal and inductor resonates with the inductor below the crystal frequency.</summary>
    NodeStrayResonance,

    /// <summary>The inductor is far too large: no solution near the crystal frequency.</summary>
    InductorFarTooLarge,
}
