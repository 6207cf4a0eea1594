using System.Numerics;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Sweeps;
using CsCheck;

namespace ClubBench.Calculation.Tests.Sweeps;

public class TouchstoneReaderTests
{
    public static TheoryData<ReferenceRow> Cases => ReferenceTable.Theory("touchstone");

    [Theory]
    [MemberData(nameof(Cases))]
    [Evidence(typeof(TouchstoneReader), EvidenceKind.ClosedFormLimit)]
    public void Read_Case_HasTheParametersOfTheTable(ReferenceRow row)
    {
        var result = TouchstoneReader.Read(row["text"].Replace(" / ", "\n", StringComparison.Ordinal), "sweep" + row["extension"]);

        Assert.Empty(result.Issues);
        var point = Assert.Single(result.Sweep!.Points);
        Assert.Equal(row.Number("frequency_hz"), point.Frequency.Hertz, 1e-3);
        foreach (var (name, value) in new[] { ("s11", point.S11), ("s21", point.S21), ("s12", point.S12), ("s22", point.S22) })
        {
            Assert.Equal(row.Has(name + "_re"), value is not null);
            if (value is not { } s) continue;
            Assert.Equal(row.Number(name + "_re"), s.Real, row.Number("tolerance"));
            Assert.Equal(row.Number(name + "_im"), s.Imaginary, row.Number("tolerance"));
        }
    }

    [Theory]
    [InlineData("", ".s1p", 1, TouchstoneFault.NoRows)]
    [InlineData("# MHz", ".s1p", 1, TouchstoneFault.NoRows)]
    [InlineData("# MHz\n1 0 0", ".txt", 1, TouchstoneFault.PortsUnknown)]
    [InlineData("! head\n1 0 0", ".s1p", 2, TouchstoneFault.OptionLineMissing)]
    [InlineData("# MHz XX", ".s1p", 1, TouchstoneFault.UnknownOption)]
    [InlineData("# MHz 2", ".s1p", 1, TouchstoneFault.UnknownOption)]
    [InlineData("# MHz S RI R", ".s1p", 1, TouchstoneFault.BadReference)]
    [InlineData("# MHz S RI R -50", ".s1p", 1, TouchstoneFault.BadReference)]
    [InlineData("# MHz S RI R 0", ".s1p", 1, TouchstoneFault.BadReference)]
    [InlineData("# MHz H RI\n1 0 0", ".s1p", 1, TouchstoneFault.ParametersNeedTwoPorts)]
    [InlineData("# MHz\n[Number of Ports] 1\n1 0 0", ".s1p", 2, TouchstoneFault.UnknownVersion)]
    [InlineData("[Version] 3.0\n# MHz\n[Number of Ports] 1\n[Network Data]\n1 0 0", ".ts", 1, TouchstoneFault.UnknownVersion)]
    [InlineData("[Version] 2.0\n# MHz\n[Ports] 1\n[Network Data]\n1 0 0", ".ts", 3, TouchstoneFault.UnknownKeyword)]
    [InlineData("[Version] 2.0\n# MHz\n[Number of Ports] 4\n[Network Data]\n1 0 0", ".ts", 3, TouchstoneFault.BadKeywordValue)]
    [InlineData("[Version] 2.0\n# MHz\n[Network Data]\n1 0 0", ".ts", 1, TouchstoneFault.KeywordMissing)]
    [InlineData("[Version] 2.0\n# MHz\n[Number of Ports] 2\n[Network Data]\n1 0 0 0 0 0 0 0 0", ".ts", 1, TouchstoneFault.KeywordMissing)]
    [InlineData("[Version] 2.0\n# MHz\n[Number of Ports] 2\n[Two-Port Data Order] 11_22\n[Network Data]\n1 0 0 0 0 0 0 0 0", ".ts", 4, TouchstoneFault.BadKeywordValue)]
    [InlineData("[Version] 2.0\n# MHz\n[Number of Ports] 1\n[Mixed-Mode Order] D1,2\n[Network Data]\n1 0 0", ".ts", 4, TouchstoneFault.BadKeywordValue)]
    [InlineData("[Version] 2.0\n# MHz\n[Number of Ports] 1\nwords\n[Network Data]\n1 0 0", ".ts", 4, TouchstoneFault.UnexpectedText)]
    [InlineData("[Version] 2.0\n# MHz\n[Number of Ports] 1\n[Number of Frequencies] 3\n[Network Data]\n1 0 0\n2 0 0", ".ts", 7, TouchstoneFault.WrongRowCount)]
    [InlineData("# MHz RI\n1 0 0\n2 0 x", ".s1p", 3, TouchstoneFault.NotANumber)]
    [InlineData("# MHz RI\n1 0 NaN", ".s1p", 2, TouchstoneFault.NotANumber)]
    [InlineData("# MHz RI\n1 0 1e999", ".s1p", 2, TouchstoneFault.NotANumber)]
    [InlineData("# MHz RI\n1,0 0 0\n2.0 0 0", ".s1p", 2, TouchstoneFault.MixedDecimalSigns)]
    [InlineData("# MHz RI\n1 0 0 0 0 0 0 0 0\n2 0 0 0 0 0 0", ".s2p", 3, TouchstoneFault.WrongNumberCount)]
    [InlineData("# MHz RI\n0 0 0", ".s1p", 2, TouchstoneFault.FrequencyNotAboveZero)]
    [InlineData("# GHz RI\n1e300 0 0", ".s1p", 2, TouchstoneFault.FrequencyNotAboveZero)]
    [InlineData("# MHz RI\n1 0 0\n2 0 0\n2 0 0", ".s1p", 4, TouchstoneFault.FrequencyNotIncreasing)]
    [InlineData("# MHz RI\n2 0 0 0 0 0 0 0 0\n1 0 0 0 0 0 0 0 0", ".s2p", 3, TouchstoneFault.FrequencyNotIncreasing)]
    [InlineData("# MHz Y RI\n1 -1 0", ".s1p", 2, TouchstoneFault.ImpossibleValues)]
    [InlineData("# MHz S DB\n1 1e5 0", ".s1p", 2, TouchstoneFault.ImpossibleValues)]
    public void Read_Fault_IsToldWithItsLine(string text, string extension, int line, TouchstoneFault fault)
    {
        var result = TouchstoneReader.Read(text, "sweep" + extension);

        Assert.Null(result.Sweep);
        Assert.Contains(result.Issues, i => i.Line == line && i.Fault == fault);
    }

    [Fact]
    public void Read_SeveralFaults_AreAllToldWithWhatWasFound()
    {
        var result = TouchstoneReader.Read("# MHz RI\n1 0 0 0 0 0 0 0 0\n3 0 0 0 0 0 0\n2 a 0 0 0 0 0 0 0\n", "board.s2p");

        Assert.Equal([new TouchstoneIssue(3, TouchstoneFault.WrongNumberCount, "7", "9"), new TouchstoneIssue(4, TouchstoneFault.NotANumber, "a")], result.Issues);
    }

    [Fact]
    public void Read_NoiseBlockOfVersion1_IsSkippedAndSaid()
    {
        var result = TouchstoneReader.Read("# MHz RI\n1 0.1 0 0.5 0 0.5 0 0 0\n2 0.1 0 0.5 0 0.5 0 0 0\n1 0.5 0.1 20 0.3\n2 0.6 0.1 20 0.3", "board.s2p");

        Assert.Equal(2, result.Sweep!.Points.Length);
        Assert.Equal([TouchstoneRemark.NoiseSkipped], result.Remarks);
    }

    [Fact]
    public void Read_ReverseZeroThroughout_IsNotMeasured()
    {
        var result = TouchstoneReader.Read("# MHz RI\n1 0.1 0 0.5 0 0 0 0 0\n2 0.1 0 0.5 0 0 0 0 0", "board.s2p");

        Assert.All(result.Sweep!.Points, p => Assert.True(p is { S21: not null, S12: null, S22: null }));
        Assert.Contains(TouchstoneRemark.ReverseNotMeasured, result.Remarks);
    }

    [Theory]
    [InlineData("0.99", false, 0.0)]
    [InlineData("1.0174", true, 0.15)]
    public void Read_MoreOutThanIn_IsToldInDecibels(string s21, bool told, double db)
    {
        var result = TouchstoneReader.Read($"# MHz RI\n1 0 0 {s21} 0 0.5 0 0 0", "board.s2p");

        Assert.Equal(told, result.Remarks.Contains(TouchstoneRemark.ShowsGain));
        if (told) Assert.Equal(db, result.Gain!.Value.Db, 0.005);
    }

    [Theory]
    [InlineData("\n")]
    [InlineData("\r")]
    [InlineData("\r\n")]
    public void Read_AnyLineEndTabsAndByteOrderMark_AreWelcome(string end)
    {
        var result = TouchstoneReader.Read("\uFEFF!x" + end + "#\tMHz\tS\tRI" + end + end + " 1\t0.5\t0 " + end, "board.s1p");

        Assert.Equal(0.5, Assert.Single(result.Sweep!.Points).S11.Real);
    }

    [Fact]
    public void Read_DecimalCommasThroughout_AreTakenAndSaid()
    {
        var result = TouchstoneReader.Read("# MHz S RI R 50 ! a comment, with one.\n7,1 0,5 -0,25", "board.s1p");

        Assert.Equal([TouchstoneRemark.DecimalCommas], result.Remarks);
        Assert.Equal(new Complex(0.5, -0.25), Assert.Single(result.Sweep!.Points).S11);
    }

    [Fact]
    public void Read_TwoReferences_AreOnePerPort()
    {
        var sweep = TouchstoneReader.Read("# MHz S RI R 50 75\n1 0 0 1 0 1 0 0 0.1", "board.s2p").Sweep!;

        Assert.Equal((50.0, 75.0), (sweep.Reference1.Ohm, sweep.Reference2.Ohm));
    }

    [Fact]
    public void Read_SecondOptionLine_IsIgnored() =>
        Assert.Equal(1e6, TouchstoneReader.Read("# MHz RI\n# kHz RI\n1 0 0.1", "board.s1p").Sweep!.Points[0].Frequency.Hertz);

    [Fact]
    public void Read_AnyTextWhatever_GivesFiniteValuesOrFaults()
    {
        var word = Gen.OneOf(
            Gen.Double.Select(d => d.ToString("R", System.Globalization.CultureInfo.InvariantCulture)),
            Gen.Int[0, 9].Select(i => i.ToString(System.Globalization.CultureInfo.InvariantCulture)),
            Gen.Int[0, Words.Length - 1].Select(i => Words[i]),
            Gen.String[0, 4]);
        var file = word.Array[0, 9].Select(w => string.Join(' ', w)).Array[0, 8].Select(l => string.Join('\n', l));
        Gen.Select(file, Gen.Int[0, 3], Gen.Int[0, 2]).Sample(
            (text, head, extension) =>
            {
                var result = TouchstoneReader.Read(Heads[head] + text, Extensions[extension]);
                return result.Sweep is { } sweep ? sweep.Points.All(p => double.IsFinite(p.LargestPowerOut)) : result.Issues.Count > 0;
            },
            iter: 20_000);
    }

    private static readonly string[] Words = ["#", "[Version] 2.0\n", "[Network Data]\n", "[End]\n", "[", "]", "R", "MHz", "!", "\n", ",", ".", "1", "1e308", "-1", "NaN", "[Number of Ports] 2", "[Reference]"];
    private static readonly string[] Heads = ["", "# MHz S RI R 50\n", "# Y DB R 50 75\n", "[Version] 2.0\n# MHz G MA\n[Number of Ports] 2\n[Two-Port Data Order] 12_21\n[Network Data]\n"];
    private static readonly string[] Extensions = ["a.s1p", "a.s2p", "a"];
}
