using System.Globalization;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Tests.Text;

public class ReadingTextTests
{
    private static readonly CultureInfo Culture = CultureInfo.InvariantCulture;

    [Theory]
    [InlineData(0, 1e-3, "0\u00A0mA")]
    [InlineData(0, 2, "0\u00A0A")]
    [InlineData(164e-3, 204e-3, "164\u00A0mA")]
    public void Expected_Current_StandsInTheUnitOfItsWindow(double nominal, double high, string written) =>
        Assert.Equal(written, ReadingText.Expected(Reading(QuantityKind.Current, nominal, 0, high, WindowSides.AtMost), Culture));

    [Fact]
    public void Window_NarrowFrequencies_AreWrittenApart() =>
        Assert.Equal("7.0162\u20137.0204\u00A0MHz", ReadingText.Window(Reading(QuantityKind.Frequency, 7.0183e6, 7.0162e6, 7.0204e6, WindowSides.Both), Culture));

    [Theory]
    [InlineData(WindowSides.AtMost, "0.545\u00A0dB")]
    [InlineData(WindowSides.AtLeast, "0.100\u00A0dB")]
    [InlineData(WindowSides.Both, "0.100\u20130.545\u00A0dB")]
    public void Window_OneSided_TellsTheEndThatCounts(WindowSides sides, string written) =>
        Assert.Equal(written, ReadingText.Window(Reading(QuantityKind.Decibels, 0.245, 0.1, 0.545, sides), Culture));

    private static ExpectedReading Reading(QuantityKind kind, double nominal, double low, double high, WindowSides sides) =>
        new("A4.point", kind, nominal, low, high, "set-up.meter-in-supply", InstrumentClass.Multimeter, sides, new Dictionary<string, double>());
}
