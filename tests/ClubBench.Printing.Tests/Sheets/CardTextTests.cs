using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using ClubBench.Printing.Sheets;

namespace ClubBench.Printing.Tests.Sheets;

public class CardTextTests
{
    [Theory]
    [InlineData(0, 1e-3, "0\u00A0mA")]
    [InlineData(0, 2, "0\u00A0A")]
    [InlineData(164e-3, 204e-3, "164\u00A0mA")]
    public void ExpectedOf_Current_StandsInTheUnitOfItsWindow(double nominal, double high, string written) =>
        Assert.Equal(written, CardText.ExpectedOf(new ExpectedReading("A4.key-up", QuantityKind.Current, nominal, 0, high, "set-up.meter-in-supply", InstrumentClass.Multimeter, WindowSides.AtMost, new Dictionary<string, double>())));
}
