using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Coils without a core, coils measured, coils under load.</summary>
internal static class CoilSheets
{
    public static IReadOnlyList<Worksheet> All { get; } =
    [
        new("air-core-coil", "windings", new("nagaoka-1909", "current sheet, corrected for round wire", SourceStatus.Published),
            [new("coil-diameter", QuantityKind.Length, 10e-3), new("turns", QuantityKind.Count, 10, 3, 1000), new("pitch", QuantityKind.Length, 1e-3), new("wire-diameter", QuantityKind.Length, 0.8e-3)], v =>
        {
            if (v["pitch"] < v["wire-diameter"]) return Conflict("worksheet-conflict.turns-overlap", "pitch", "wire-diameter");
            if (v["coil-diameter"] < 2 * v["wire-diameter"]) return Conflict("worksheet-conflict.wire-too-thick", "coil-diameter", "wire-diameter");
            var coil = new AirCoreSolenoid(v.Metre("coil-diameter"), v.Whole("turns"), v.Metre("pitch"), v.Metre("wire-diameter"));
            var own = SelfResonance.OfSolenoid(coil.Diameter, coil.CoilLength);
            return Of(Figure.Of("inductance", coil.Inductance), Figure.Of("quick-inductance", coil.Wheeler), Figure.Of("coil-length", coil.CoilLength), Figure.Of("self-capacitance", own), Figure.Of("self-resonance", SelfResonance.Of(coil.Inductance, own)));
        }),
        new("inductance-by-two-capacitors", "windings", new("gum-2008", "5.1.2, with Thomson's formula", SourceStatus.Derived),
            [
                new("larger-capacitor", QuantityKind.Capacitance, 220e-12), new("larger-resonance", QuantityKind.Frequency, 5.118e6), new("smaller-capacitor", QuantityKind.Capacitance, 100e-12), new("smaller-resonance", QuantityKind.Frequency, 7.463e6),
                new("capacitor-uncertainty", QuantityKind.Ratio, 0.01, 0, 0.5), new("frequency-uncertainty", QuantityKind.Ratio, 1e-4, 0, 0.5),
            ], TwoCapacitors),
        new("alternating-flux", "windings", new("flux-guide", "guide values, from memory", SourceStatus.FromMemory),
            [new("winding-voltage", QuantityKind.Voltage, 15.8), new("frequency", QuantityKind.Frequency, 7.1e6), new("turns", QuantityKind.Count, 16, 1, 1000), new("cross-section", QuantityKind.Number, 0.112)], v =>
        {
            var flux = FluxDensity.Alternating(v.Volt("winding-voltage"), v.Hertz("frequency"), v.Whole("turns"), Area.FromSquareCentimetre(v["cross-section"]));
            return Judged(
                Phrases.CodeOf(FluxDensity.Judge(flux, v.Hertz("frequency"))),
                Figure.Of("flux", QuantityKind.FluxDensity, flux.Tesla),
                Figure.Of("flux-guide", QuantityKind.FluxDensity, FluxDensity.GuideLimit(v.Hertz("frequency")).Tesla) with { From = Provenance.FromMemory });
        }),
        new("apparent-inductance", "windings", SourceRef.Derived("coil with its own capacitance"), [new("inductance", QuantityKind.Inductance, 5.336e-6), new("self-capacitance", QuantityKind.Capacitance, 1.5e-12), new("frequency", QuantityKind.Frequency, 7.1e6)], v =>
        {
            var own = SelfResonance.Of(v.Henry("inductance"), v.Farad("self-capacitance"));
            return SelfResonance.Apparent(v.Henry("inductance"), v.Hertz("frequency"), own) is { } seen
                ? Of(Figure.Of("self-resonance", own), Figure.Of("apparent-inductance", seen))
                : Conflict("worksheet-conflict.above-self-resonance", "inductance", "self-capacitance", "frequency");
        }),
    ];

    private static Outcome<WorksheetAnswer> TwoCapacitors(WorksheetValues v)
    {
        var found = InductanceFromResonance.FromTwo(
            new(v.Farad("larger-capacitor"), v.Hertz("larger-resonance")), new(v.Farad("smaller-capacitor"), v.Hertz("smaller-resonance")), v["frequency-uncertainty"], v["capacitor-uncertainty"]);
        return found.Inductance is { } inductance
            ? Judged(
                found.HasLargeStray ? "worksheet-verdict.stray-large" : "worksheet-verdict.stray-usual",
                Figure.Of("inductance", inductance) with { ExpandedUncertaintySi = 2 * found.InductanceUncertainty.Henry },
                Figure.Of("stray", QuantityKind.Capacitance, found.StrayPicofarad * 1e-12) with { ExpandedUncertaintySi = 2 * found.StrayUncertainty.Farad })
            : found.Refusal == ResonanceRefusal.MixedUp
                ? Conflict("worksheet-conflict.resonances-mixed-up", "larger-capacitor", "larger-resonance", "smaller-capacitor", "smaller-resonance")
                : Conflict("worksheet-conflict.stray-negative", "larger-capacitor", "larger-resonance", "smaller-capacitor", "smaller-resonance");
    }
}
