using ClubBench.Calculation.Components;
using CsCheck;

namespace ClubBench.Calculation.Tests.Components;

public class PreferredValuesTests
{
    public static TheoryData<ReferenceRow> Nearest => ReferenceTable.Theory("preferred-values");

    [Theory]
    [MemberData(nameof(Nearest))]
    [Evidence(typeof(PreferredValues), EvidenceKind.PublishedValue)]
    public void Nearest_BothSenses_MatchTheTable(ReferenceRow row)
    {
        var series = Enum.Parse<ESeries>(row["series"]);

        Assert.Equal(row.Number("linear"), PreferredValues.Nearest(row.Number("value"), series, logarithmic: false));
        Assert.Equal(row.Number("logarithmic"), PreferredValues.Nearest(row.Number("value"), series));
    }

    [Theory]
    [InlineData(ESeries.E3, 3)]
    [InlineData(ESeries.E6, 6)]
    [InlineData(ESeries.E12, 12)]
    [InlineData(ESeries.E24, 24)]
    [InlineData(ESeries.E48, 48)]
    [InlineData(ESeries.E96, 96)]
    [InlineData(ESeries.E192, 192)]
    public void Mantissas_EachSeries_AreAsManyAsTheNameSaysAndAscend(ESeries series, int count)
    {
        var members = PreferredValues.Mantissas(series);

        Assert.Equal(count, members.Count);
        Assert.Equal(members.Distinct().Order(), members);
    }

    [Fact]
    [Evidence(typeof(PreferredValues), EvidenceKind.PublishedValue)]
    public void Mantissas_E192_HasTheExceptionOfTheStandard()
    {
        Assert.Contains(920, PreferredValues.Mantissas(ESeries.E192));
        Assert.DoesNotContain(919, PreferredValues.Mantissas(ESeries.E192));
    }

    [Fact]
    public void Mantissas_E24_DifferFromTheRoundedPowersInEightPlaces()
    {
        var printed = PreferredValues.Mantissas(ESeries.E24);
        var odd = printed.Where((m, i) => m != (int)Math.Round(10 * Math.Pow(10, i / 24.0)));

        Assert.Equal([27, 30, 33, 36, 39, 43, 47, 82], odd);
    }

    [Fact]
    [Evidence(typeof(PreferredValues), EvidenceKind.PublishedValue)]
    public void Mantissas_E96_MiddleOfTheDecade_MatchesThePrintedList() =>
        Assert.Equal([287, 294, 301, 309, 316], PreferredValues.Mantissas(ESeries.E96).Skip(44).Take(5));

    [Fact]
    [Evidence(typeof(PreferredValues), EvidenceKind.Identity)]
    public void Mantissas_CoarserSeries_AreContainedInTheFiner()
    {
        Assert.Equal([10, 22, 47], PreferredValues.Mantissas(ESeries.E3));
        Assert.Subset(PreferredValues.Mantissas(ESeries.E24).ToHashSet(), PreferredValues.Mantissas(ESeries.E12).ToHashSet());
        Assert.Subset(PreferredValues.Mantissas(ESeries.E192).ToHashSet(), PreferredValues.Mantissas(ESeries.E48).ToHashSet());
    }

    [Fact]
    [Evidence(typeof(PreferredValues), EvidenceKind.Identity)]
    public void Nearest_AnyValue_IsNoFurtherThanBothNeighbours() =>
        Gen.Select(Gen.Double[1e-13, 1e9], Gen.Enum<ESeries>()).Sample((value, series) =>
        {
            var (below, above) = PreferredValues.Neighbours(value, series);
            var nearest = PreferredValues.Nearest(value, series);
            return below <= value * (1 + 1e-9) && value <= above * (1 + 1e-9)
                && Math.Abs(Math.Log(nearest / value)) <= Math.Min(Math.Log(value / below), Math.Log(above / value)) + 1e-9;
        });

    [Fact]
    [Evidence(typeof(PreferredValues), EvidenceKind.RoundTrip)]
    public void Nearest_OfAMember_IsThatMemberExactly() =>
        Gen.Select(Gen.Int[0, 23], Gen.Int[-12, 6]).Sample((i, decade) =>
        {
            var member = double.Parse($"{PreferredValues.Mantissas(ESeries.E24)[i]}E{decade}", System.Globalization.CultureInfo.InvariantCulture);
            return PreferredValues.Nearest(member, ESeries.E24) == member && PreferredValues.NextUp(member, ESeries.E24) == member;
        });

    [Fact]
    public void Within_TenPercentAroundHundred_GivesTheMembersInside() =>
        Assert.Equal([91e-12, 100e-12, 110e-12], PreferredValues.Within(100e-12, 0.1, ESeries.E24));

    [Fact]
    public void Within_BetweenTwoMembers_IsEmpty() => Assert.Empty(PreferredValues.Within(2.7, 0.1, ESeries.E3));

    [Theory]
    [InlineData(0)]
    [InlineData(-1)]
    [InlineData(double.NaN)]
    public void Nearest_NotAPositiveNumber_Throws(double value) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => PreferredValues.Nearest(value, ESeries.E24));
}
