using ClubBench.Printing.Sheets;

namespace ClubBench.Printing.Tests.Sheets;

public class PlacesTests
{
    [Theory]
    [InlineData("C15,C18", "C15, C18")]
    [InlineData("C15,C16", "C15, C16")]
    [InlineData("C18,C15,C16,C17", "C15–C18")]
    [InlineData("C1,C2,C3,L4,L6,C10", "C1–C3, C10, L4, L6")]
    [InlineData("VC", "VC")]
    public void Text_Places_JoinsThreeInARow(string places, string expected) => Assert.Equal(expected, Places.Text(places.Split(',')));
}
