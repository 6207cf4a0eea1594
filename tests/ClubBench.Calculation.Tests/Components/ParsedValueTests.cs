using ClubBench.Calculation.Components;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Components;

public class ParsedValueTests
{
    [Fact]
    [Evidence(typeof(ParsedValue), EvidenceKind.PublishedValue)]
    public void Conversions_ExamplesOfTheStandard_CarryTheirUnits()
    {
        // iec-60062, letter and digit code: n332, p59, R332, 3K32 and 1M0 stand in its tables of examples.
        Assert.Equal(332, ValueNotation.Parse("n332", PartKind.Capacitor).ToCapacitance().Picofarad, 9);
        Assert.Equal(0.59, ValueNotation.Parse("p59", PartKind.Capacitor).ToCapacitance().Picofarad, 12);
        Assert.Equal(0.332, ValueNotation.Parse("R332", PartKind.Resistor).ToResistance().Ohm, 12);
        Assert.Equal(3.32, ValueNotation.Parse("3K32", PartKind.Resistor).ToResistance().Kiloohm, 12);
        Assert.Equal(1000, ValueNotation.Parse("1M0", PartKind.Resistor).ToResistance().Kiloohm, 9);
    }

    [Fact]
    [Evidence(typeof(ParsedValue), EvidenceKind.RoundTrip)]
    public void Conversions_OfWhatWasWritten_ReturnThePart() =>
        Gen.Select(Gen.Int[100, 999], Gen.Int[0, 4]).Sample((figures, zeros) =>
        {
            var value = figures * Math.Pow(10, zeros);
            var (c, l, r) = (Capacitance.FromPicofarad(value), Inductance.FromNanohenry(value), Resistance.FromOhm(value));
            return Same(ValueNotation.Parse(ValueNotation.Format(c), PartKind.Capacitor).ToCapacitance() / c)
                && Same(ValueNotation.Parse(ValueNotation.Format(l), PartKind.Inductor).ToInductance() / l)
                && Same(ValueNotation.Parse(ValueNotation.Format(r), PartKind.Resistor).ToResistance() / r);
        });

    [Theory]
    [InlineData(PartKind.Capacitor)]
    [InlineData(PartKind.Inductor)]
    [InlineData(PartKind.Resistor)]
    [Evidence(typeof(ParsedValue), EvidenceKind.Identity)]
    public void Conversions_OneValueOfAKind_HaveExactlyOneThatAnswers(PartKind kind)
    {
        var value = new ParsedValue(kind, 1e-6, ValueRefusal.None);
        Action[] all = [() => value.ToCapacitance(), () => value.ToInductance(), () => value.ToResistance()];

        Assert.Equal(2, all.Count(convert => Record.Exception(convert) is InvalidOperationException));
    }

    private static bool Same(double ratio) => Math.Abs(ratio - 1) < 1e-9;
}
