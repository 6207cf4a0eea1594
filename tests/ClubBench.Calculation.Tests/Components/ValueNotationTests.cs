using System.Globalization;
using ClubBench.Calculation.Components;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Components;

public class ValueNotationTests
{
    public static TheoryData<ReferenceRow> Texts => ReferenceTable.Theory("value-notation");

    public static TheoryData<ReferenceRow> Formats => ReferenceTable.Theory("value-format");

    public static TheoryData<ReferenceRow> Markings => ReferenceTable.Theory("markings");

    [Theory]
    [MemberData(nameof(Texts))]
    [Evidence(typeof(ValueNotation), EvidenceKind.PublishedValue)]
    public void Parse_Text_GivesValueOrRefusal(ReferenceRow row)
    {
        var read = ValueNotation.Parse(row["text"], Enum.Parse<PartKind>(row["kind"]));

        Assert.Equal(row["refusal"], read.Refusal.ToString());
        Assert.Equal(row.Has("value") ? row.Number("value") : null, read.Si);
    }

    // Arabic-Indic, Devanagari and full-width digits: read as numbers by a looser pattern, but not by the number reader behind it.
    [Theory]
    [InlineData("\u0664n\u0667")]
    [InlineData("4n\u0667")]
    [InlineData("\u096A.7 nF")]
    [InlineData("\uFF14.7 nF")]
    public void Parse_DigitsOfOtherScripts_IsRefused(string text) => Assert.Equal(ValueRefusal.NotANumber, ValueNotation.Parse(text, PartKind.Capacitor).Refusal);

    [Theory]
    [InlineData("\u0661\u0660\u0664")]
    [InlineData("10\u0664")]
    public void MarkingParse_DigitsOfOtherScripts_IsRefused(string text) => Assert.Equal(ValueRefusal.NotANumber, PartMarking.Parse(text, PartKind.Capacitor).Refusal);

    [Theory]
    [InlineData("4n7")]
    [InlineData("4.7 nF")]
    public void Parse_PlainDigits_IsRead(string text) => Assert.Equal(4.7e-9, ValueNotation.Parse(text, PartKind.Capacitor).Si);

    [Theory]
    [MemberData(nameof(Formats))]
    public void Format_Value_GivesTheText(ReferenceRow row) =>
        Assert.Equal(row["text"], ValueNotation.Format(row.Number("value"), Enum.Parse<PartKind>(row["kind"])));

    [Theory]
    [InlineData("en-US")]
    [InlineData("de-DE")]
    [InlineData("")]
    [Evidence(typeof(ValueNotation), EvidenceKind.Identity)]
    public void Parse_AnyCulture_ReadsCommaAsDecimalMark(string culture)
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);

            Assert.Equal(4.7e-9, ValueNotation.Parse("4,7n", PartKind.Capacitor).Si);
            Assert.Equal("4n7", ValueNotation.Format(Capacitance.FromNanofarad(4.7)));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    [Evidence(typeof(ValueNotation), EvidenceKind.RoundTrip)]
    public void Parse_OfWhatFormatWrote_GivesTheValueToThreeDigits() =>
        Gen.Select(Gen.Double[-12, 0], Gen.Enum<PartKind>()).Sample((exponent, kind) =>
        {
            var value = Math.Pow(10, kind == PartKind.Resistor ? exponent + 9 : exponent);
            var read = ValueNotation.Parse(ValueNotation.Format(value, kind), kind);
            return read.IsUnderstood && Math.Abs((read.Si!.Value / value) - 1) <= 0.0051;
        });

    [Fact]
    public void Parse_ROnACoil_WarnsThatItWasReadAsMicrohenry()
    {
        Assert.True(ValueNotation.Parse("2R2", PartKind.Inductor).WasReadAsMicrohenry);
        Assert.False(ValueNotation.Parse("2u2", PartKind.Inductor).WasReadAsMicrohenry);
        Assert.False(ValueNotation.Parse("2R2", PartKind.Resistor).WasReadAsMicrohenry);
    }

    [Fact]
    [Evidence(typeof(ValueNotation), EvidenceKind.Identity)]
    public void Parse_AnyTextOfPrintableCharacters_NeverThrows() =>
        Gen.Select(Gen.String[Gen.Char[' ', '~'], 0, 12], Gen.Enum<PartKind>())
            .Sample((text, kind) => ValueNotation.Parse(text, kind).IsUnderstood == ValueNotation.Parse(text, kind).Si.HasValue);

    [Theory]
    [MemberData(nameof(Markings))]
    [Evidence(typeof(PartMarking), EvidenceKind.PublishedValue)]
    [Evidence(typeof(PartMarking), EvidenceKind.RoundTrip)]
    public void Marking_BothWays_Agree(ReferenceRow row)
    {
        var (kind, value) = (Enum.Parse<PartKind>(row["kind"]), row.Number("value"));
        var written = kind switch
        {
            PartKind.Capacitor => PartMarking.Of(Capacitance.FromFarad(value)),
            PartKind.Resistor => PartMarking.Of(Resistance.FromOhm(value)),
            _ => PartMarking.Of(Inductance.FromHenry(value)),
        };

        Assert.Equal(row["marking"], written);
        Assert.Equal(value, PartMarking.Parse(row["marking"], kind).Si!.Value, value * 1e-12);
    }

    [Fact]
    public void MarkingParse_ToleranceLetterBehindTheCode_IsKept()
    {
        var read = PartMarking.Parse("104K", PartKind.Capacitor);

        Assert.Equal((100e-9, 'K'), (read.Si, read.ToleranceLetter));
    }

    [Fact]
    [Evidence(typeof(PartMarking), EvidenceKind.RoundTrip)]
    public void MarkingParse_EveryTwoFigureCapacitor_ComesBack() =>
        Gen.Select(Gen.Int[0, 23], Gen.Int[-1, 6]).Sample((member, zeros) =>
        {
            var value = Capacitance.FromPicofarad(PreferredValues.Mantissas(ESeries.E24)[member] * Math.Pow(10, zeros));
            return Math.Abs((PartMarking.Parse(PartMarking.Of(value), PartKind.Capacitor).Si!.Value / value.Farad) - 1) < 1e-9;
        });

    [Fact]
    public void ToleranceLetter_BelowTenPicofarad_MeansPicofarad()
    {
        Assert.Equal(0.25 / 4.7, ToleranceLetter.Read('C', Capacitance.FromPicofarad(4.7))!.Value.Above, 12);
        Assert.Equal(0.02, ToleranceLetter.Read('G', Capacitance.FromPicofarad(470))!.Value.Above, 12);
    }

    [Fact]
    public void ToleranceLetter_LopsidedAndUnknown_AreToldApart()
    {
        Assert.Equal((-0.2, 0.8), (ToleranceLetter.Read('Z')!.Value.Below, ToleranceLetter.Read('Z')!.Value.Above));
        Assert.Null(ToleranceLetter.Read('X'));
    }

    [Fact]
    [Evidence(typeof(PartMarking), EvidenceKind.IndependentRecomputation)]
    public void MarkingParse_EveryThreeFigures_IsTheFirstTwoWithThatManyNoughtsBehind()
    {
        for (var code = 100; code < 1000; code++)
        {
            var text = code.ToString(CultureInfo.InvariantCulture);
            var picofarad = decimal.Parse(text[..2] + new string('0', text[2] - '0'), CultureInfo.InvariantCulture);

            Assert.Equal(1, PartMarking.Parse(text, PartKind.Capacitor).Si!.Value * 1e12 / (double)picofarad, 12);
            Assert.Equal((double)picofarad, PartMarking.Parse(text, PartKind.Resistor).Si!.Value, 1e-6);
        }
    }
}
