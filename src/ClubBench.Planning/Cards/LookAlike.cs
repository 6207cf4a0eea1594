using System.Globalization;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Cards;

/// <summary>A marking on a card that is easily read as another value.</summary>
/// <param name="Marking">What stands on the part ("330").</param>
/// <param name="Value">What it means.</param>
/// <param name="Other">Marking of the part of the same card it is mistaken for; null where its own digits look like a value.</param>
/// <param name="OtherValue">What it is taken for.</param>
public sealed record LookAlike(string Marking, Capacitance Value, string? Other, Capacitance OtherValue)
{
    /// <summary>
    /// Every look-alike among the capacitors of a card: two of the same figures with another number of zeros, larger first, and one whose marking
    /// ends in a zero, so that its digits are ten times its value. Empty where nothing is easily mistaken.
    /// </summary>
    public static IReadOnlyList<LookAlike> Of(CardContent card)
    {
        var marked = card.Fit.Where(r => IsCapacitor(card, r)).SelectMany(r => CapacitorPart.Pieces(r.Part).Zip(r.MarkingOnPart)).Distinct().OrderByDescending(m => m.First.Farad).ToList();
        var pairs = marked.SelectMany((a, i) => marked.Skip(i + 1).Where(b => HaveSameFigures(a.First, b.First)).Select(b => new LookAlike(a.Second, a.First, b.Second, b.First))).ToList();
        var alone = marked.Where(m => pairs.All(p => p.Marking != m.Second && p.Other != m.Second));
        return [.. pairs, .. alone.Select(m => new LookAlike(m.Second, m.First, null, AsDigits(m.Second))).Where(l => l.Marking.EndsWith('0') && l.OtherValue.Farad > l.Value.Farad)];
    }

    private static bool IsCapacitor(CardContent card, FittingRow row) =>
        StageKindList.Find(card.Kind)?.Description.Role(row.Part.Role)?.Class == PartClass.Capacitor && row.Part.Value(PartValue.Capacitance) is not null;

    /// <summary>330 pF and 33 pF: one is the other with zeros behind it.</summary>
    private static bool HaveSameFigures(Capacitance a, Capacitance b)
    {
        var decades = Math.Log10(a / b);
        return Math.Round(decades) > 0 && Math.Abs(decades - Math.Round(decades)) < 1e-3;
    }

    /// <summary>The value somebody reads who takes the digits for picofarad; zero where there are not only digits.</summary>
    private static Capacitance AsDigits(string marking) =>
        int.TryParse(marking, NumberStyles.None, CultureInfo.InvariantCulture, out var picofarad) ? Capacitance.FromPicofarad(picofarad) : default;
}
