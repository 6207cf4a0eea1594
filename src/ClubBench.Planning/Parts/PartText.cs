using System.Globalization;
using ClubBench.Calculation.Components;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Parts;

/// <summary>How a part is written: beside a symbol, in a table, in an order.</summary>
public static class PartText
{
    /// <summary>Value of a part in short: "180 + 22 pF", "15 t T37-6", "14.060 MHz", "10-60 pF", "33 ohm", "36 V Zener 1 W", or its type.</summary>
    public static string Short(Part part, PartClass @class, CultureInfo culture) => @class switch
    {
        PartClass.Capacitor when part.Value(PartValue.Capacitance) is not null => Capacitors(part, culture),
        PartClass.Trimmer or PartClass.VariableCapacitor when part.Value(PartValue.MaximumCapacitance) is { } most =>
            string.Create(culture, $"{(part.Value(PartValue.MinimumCapacitance) ?? 0) * 1e12:0.#}\u2013{most * 1e12:0.#} pF"),
        PartClass.Winding when part.Value(PartValue.Turns) is { } turns => Winding(part, turns, culture),
        PartClass.MouldedChoke when part.Value(PartValue.Inductance) is { } henry => QuantityText.Format(QuantityKind.Inductance, henry, null, culture),
        PartClass.Crystal when part.Value(PartValue.Frequency) is { } hertz => string.Create(culture, $"{hertz / 1e6:0.000###} MHz"),
        PartClass.Resistor or PartClass.Potentiometer when part.Value(PartValue.Resistance) is { } ohm => QuantityText.Format(QuantityKind.Resistance, ohm, null, culture),
        PartClass.Diode when part.Value(PartValue.Voltage) is { } volt => $"{QuantityText.Format(QuantityKind.Voltage, volt, null, culture)} {part.Type}",
        PartClass.Hardware when part.Value(PartValue.RatedCurrent) is { } ampere => QuantityText.Format(QuantityKind.Current, ampere, null, culture),
        _ => part.Type,
    };

    /// <summary>What stands on the part itself, piece by piece; empty where the parts of this class carry nothing readable.</summary>
    public static IReadOnlyList<string> Markings(Part part, PartClass @class) => @class switch
    {
        PartClass.Capacitor when part.Value(PartValue.Capacitance) is not null => [.. CapacitorPart.Pieces(part).Select(PartMarking.Of)],
        PartClass.Winding when Calculation.Windings.Cores.Find(part.Type) is Calculation.Windings.IronPowderCore core => [PaintOf(core)],
        PartClass.Crystal or PartClass.Transistor or PartClass.Diode or PartClass.IntegratedCircuit => [part.Type],
        _ => [],
    };

    /// <summary>Paint of a core by which builders tell it: a clear second face is not named.</summary>
    public static string PaintOf(Calculation.Windings.IronPowderCore core) => core.Colour.Replace("/clear", "", StringComparison.Ordinal);

    private static string Capacitors(Part part, CultureInfo culture)
    {
        var pieces = CapacitorPart.Pieces(part);
        if (pieces.Count == 1) return QuantityText.Format(QuantityKind.Capacitance, pieces[0].Farad, null, culture);
        return string.Create(culture, $"{pieces[0].Picofarad:0.#} + {pieces[1].Picofarad:0.#} pF");
    }

    private static string Winding(Part part, double turns, CultureInfo culture) =>
        part.Value(PartValue.LinkTurns) is { } link
            ? string.Create(culture, $"{turns:0} t + {link:0} t {part.Type}")
            : string.Create(culture, $"{turns:0} t {part.Type}");
}
