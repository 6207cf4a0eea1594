using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Crystals;

/// <summary>Power a crystal turns into heat. Source: derived; the limit is common practice.</summary>
public static class CrystalDrive
{
    /// <summary>Above this a HF crystal in a full-size holder drifts and ages. Source: common practice.</summary>
    public static Power UsualLimit { get; } = Power.FromMilliwatt(0.5);

    /// <summary>Drive power I^2 R from the RMS loop current and the effective resistance.</summary>
    public static Power Of(Current rms, Resistance effective) => Power.FromWatt(rms.Ampere * rms.Ampere * effective.Ohm);
}
