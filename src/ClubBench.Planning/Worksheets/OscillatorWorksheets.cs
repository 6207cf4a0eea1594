using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Pulled crystal oscillators: what every worksheet on them asks, and the loop it describes.</summary>
internal static class OscillatorWorksheets
{
    internal static readonly SourceRef Loop = SourceRef.Derived("zero of the loop reactance");

    internal static readonly WorksheetInput SeriesInductance = new("series-inductance", QuantityKind.Inductance, 10e-6, 0);

    internal static readonly IReadOnlyList<WorksheetInput> Parts =
    [
        new("crystal-frequency", QuantityKind.Frequency, 10.12e6, 1e3, 200e6),
        new("load-capacitance", QuantityKind.Capacitance, 30e-12),
        new("motional-capacitance", QuantityKind.Capacitance, 20e-15),
        new("static-capacitance", QuantityKind.Capacitance, 4.5e-12),
        new("crystals", QuantityKind.Count, 2, 1, 8),
        new("coil-capacitance", QuantityKind.Capacitance, 1.5e-12, 0),
        new("tuning-least", QuantityKind.Capacitance, 12e-12),
        new("tuning-most", QuantityKind.Capacitance, 150e-12),
        new("upper-capacitor", QuantityKind.Capacitance, 150e-12),
        new("lower-capacitor", QuantityKind.Capacitance, 150e-12),
    ];

    public static IReadOnlyList<Worksheet> All { get; } = [PulledCrystalRangeSheet.Sheet, SeriesInductorSheet.Sheet, ReceiveOffsetSheet.Sheet];

    internal static FeedbackPair Pair(WorksheetValues v) => new(v.Farad("upper-capacitor"), v.Farad("lower-capacitor"));

    internal static PulledCrystalLoop LoopOf(WorksheetValues v, Inductance series) => new(
        CrystalParameters.FromMarkedFrequency(v.Hertz("crystal-frequency"), v.Farad("load-capacitance"), v.Farad("motional-capacitance"), v.Farad("static-capacitance"), default),
        v.Farad("tuning-least"), v.Farad("tuning-most"), series, Pair(v).OscillatorCapacitance)
    {
        CrystalCount = v.Whole("crystals"), InductorSelfCapacitance = v.Farad("coil-capacitance"),
    };

    /// <summary>What of the inputs makes a loop unusable; null where it is usable.</summary>
    internal static Outcome<WorksheetAnswer>? Refused(LoopRefusal refusal) => refusal switch
    {
        LoopRefusal.None => null,
        LoopRefusal.VariableHasNoSwing => Conflict("worksheet-conflict.no-swing", "tuning-least", "tuning-most"),
        LoopRefusal.InductorAboveSelfResonance => Conflict("worksheet-conflict.above-self-resonance", SeriesInductance.Name, "coil-capacitance"),
        _ => Conflict("worksheet-conflict.inductor-too-large", SeriesInductance.Name),
    };

    internal static IEnumerable<Figure> Dial(PulledCrystalRange range) =>
    [
        Figure.Of("lowest-frequency", range.Low) with { Digits = 7 },
        Figure.Of("highest-frequency", range.High) with { Digits = 7 },
        Figure.Of("dial-span", QuantityKind.Frequency, range.SpanHertz) with { Digits = 3 },
    ];
}
