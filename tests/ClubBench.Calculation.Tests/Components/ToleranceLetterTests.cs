using ClubBench.Calculation.Components;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Components;

public class ToleranceLetterTests
{
    // iec-60062, tolerance letters: B to G and J, K, M, in per cent.
    [Theory]
    [InlineData('B', 0.1)]
    [InlineData('C', 0.25)]
    [InlineData('D', 0.5)]
    [InlineData('F', 1)]
    [InlineData('G', 2)]
    [InlineData('J', 5)]
    [InlineData('K', 10)]
    [InlineData('M', 20)]
    [Evidence(typeof(ToleranceLetter), EvidenceKind.PublishedValue)]
    public void Read_LetterOfTheStandard_IsItsPercentage(char letter, double percent) =>
        Assert.Equal(new RelativeLimits(-percent / 100, percent / 100), ToleranceLetter.Read(letter));

    [Fact]
    [Evidence(typeof(ToleranceLetter), EvidenceKind.Identity)]
    public void Read_SmallCapacitors_LeaveTheSamePicofaradWhateverTheValue() =>
        Gen.Select(Gen.Double[0.5, 9.9], Gen.Double[0.5, 9.9], Gen.Int[0, 4]).Sample((a, b, i) =>
            Math.Abs((a * Above("BCDFG"[i], a)) - (b * Above("BCDFG"[i], b))) < 1e-12);

    [Fact]
    [Evidence(typeof(ToleranceLetter), EvidenceKind.RoundTrip)]
    public void Read_LetterBehindAMarking_LimitsThePartThatWasMarked()
    {
        var marked = Capacitance.FromNanofarad(100);

        var read = PartMarking.Parse(PartMarking.Of(marked) + "K", PartKind.Capacitor);
        var limits = ToleranceLetter.Read(read.ToleranceLetter!.Value, read.ToCapacitance())!.Value;

        Assert.Equal(90, (read.ToCapacitance() * (1 + limits.Below)).Nanofarad, 9);
        Assert.Equal(110, (read.ToCapacitance() * (1 + limits.Above)).Nanofarad, 9);
    }

    private static double Above(char letter, double picofarad) => ToleranceLetter.Read(letter, Capacitance.FromPicofarad(picofarad))!.Value.Above;
}
