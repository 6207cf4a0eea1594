using System.Globalization;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Tests.Text;

public class QuantityTextParseTests
{
    [Theory]
    [InlineData("en-GB")]
    [InlineData("de-DE")]
    [InlineData("fi-FI")]
    [InlineData("tr-TR")]
    public void Parse_WhatPeopleType_MeansTheSameUnderEveryCulture(string culture)
    {
        var before = CultureInfo.CurrentCulture;
        CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
        try
        {
            var wrong = TypedQuantities.All.Where(r => !Holds(r)).Select(r => $"{r.Kind} '{r.Text}'");

            Assert.Empty(wrong);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void Parse_TheTable_HoldsAHundredInputs() => Assert.True(TypedQuantities.All.Count >= 100);

    [Theory]
    [InlineData("en-GB", "0.734\u00A0µH")]
    [InlineData("de-DE", "0,734\u00A0µH")]
    public void Parse_Understood_EchoesInTheCulturesMark(string culture, string echo)
    {
        var read = QuantityText.Parse("734 nH", QuantityKind.Inductance, culture: CultureInfo.GetCultureInfo(culture));

        Assert.Equal(echo, read.Value.Echo);
    }

    [Fact]
    public void Parse_CommaThreeDigits_IsADecimalMarkNotThousands()
    {
        var read = QuantityText.Parse("1,000 pF", QuantityKind.Capacitance, culture: CultureInfo.InvariantCulture);

        Assert.Equal(1e-12, read.Value.Si);
        Assert.Equal("1\u00A0pF", read.Value.Echo);
    }

    [Fact]
    public void Parse_ManyDigits_EchoesThemAll()
    {
        var read = QuantityText.Parse("14.05234 MHz", QuantityKind.Frequency, culture: CultureInfo.InvariantCulture);

        Assert.Equal("14.05234\u00A0MHz", read.Value.Echo);
    }

    [Fact]
    public void Parse_OffsetOfAMeter_MayBeNegativeWhereAllowed()
    {
        Assert.Equal(-20e-9, QuantityText.Parse("-20 nH", QuantityKind.Inductance, mayBeNegative: true).Value.Si);
        Assert.False(QuantityText.Parse("-20 nH", QuantityKind.Inductance).Succeeded);
    }

    [Fact]
    public void Parse_Refused_NamesFieldTextAndUnits()
    {
        var message = QuantityText.Parse("7 V", QuantityKind.Frequency, path: "stages[0].band").Messages.Single();

        Assert.Equal("stages[0].band", message.Path);
        Assert.Equal("7 V", message.Arguments["typed"]);
        Assert.Contains("MHz", message.Arguments["units"], StringComparison.Ordinal);
    }

    private static bool Holds(TypedQuantities.Row row)
    {
        var read = QuantityText.Parse(row.Text, row.Kind, row.DefaultUnit);
        return row.Si is { } si
            ? read.Succeeded && Math.Abs(read.Value.Si - si) <= 1e-12 * Math.Abs(si) && read.Value.Typed == row.Text
            : !read.Succeeded && read.Messages.Single().Code == row.Code;
    }

    [Theory]
    [InlineData("0")]
    [InlineData("0 pF")]
    public void Parse_ZeroOfAPart_IsTakenOnlyWhereAnythingMayStand(string text)
    {
        Assert.Equal("quantity.zero", Assert.Single(QuantityText.Parse(text, QuantityKind.Capacitance, "pF").Messages).Code);
        Assert.Equal(0, QuantityText.Parse(text, QuantityKind.Capacitance, "pF", mayBeNegative: true).Value.Si);
    }
}
