using ClubBench.Calculation.Tables;
using ClubBench.Calculation.Windings;

namespace ClubBench.Calculation.Tests.Windings;

public class CoresTests
{
    public static TheoryData<ReferenceRow> Expected => ReferenceTable.Theory("expected-inductance-factor");

    [Theory]
    [MemberData(nameof(Expected))]
    public void ExpectedInductanceFactor_SizeAndPermeability_GiveIt(ReferenceRow row) =>
        Assert.Equal(1, Cores.FindToroid(row["core"])!.ExpectedInductanceFactor.NanohenryPerTurnSquared / row.Number("expected_nh"), 0.0015);

    [Fact]
    public void Toroids_Every_HasAPlausibleIndexOrARemark() =>
        Assert.All(Cores.Toroids, c => Assert.True(c.HasPlausibleInductanceFactor, c.Designation));

    [Fact]
    public void HasPlausibleInductanceFactor_SlippedDecimalPoint_IsNoticed()
    {
        var core = (FerriteCore)Cores.Find("FT23-61")!;
        var slipped = core with { InductanceFactor = ClubBench.Calculation.Quantities.InductanceFactor.FromNanohenryPerTurnSquared(248) };

        Assert.True(core.HasPlausibleInductanceFactor);
        Assert.False(slipped.HasPlausibleInductanceFactor);
    }

    [Fact]
    public void Find_CaseAndBlanks_DoNotMatter()
    {
        Assert.Equal("T50-6", Cores.Find("t50 -6")!.Designation);
        Assert.Null(Cores.Find("T51-6"));
        Assert.Null(Cores.FindToroid("BN-43-202"));
    }

    [Fact]
    public void Lists_Every_IsSortedAndNamesASourceThatResolves()
    {
        Core[] all = [.. Cores.IronPowder, .. Cores.Ferrite];

        Assert.Equal(42, Cores.IronPowder.Count);
        Assert.Equal(18, Cores.Ferrite.Count);
        Assert.All(all, c => Assert.NotNull(Sources.Find(c.Source.SourceId)));
        Assert.Equal(Cores.IronPowder.OrderBy(c => c.Designation, StringComparer.Ordinal), Cores.IronPowder);
    }

    [Fact]
    public void Toroids_OfOneSize_ShareTheirDimensions() =>
        Assert.All(Cores.Toroids.GroupBy(c => c.Designation.Split('-')[0], StringComparer.Ordinal), size =>
            Assert.Single(size.Select(c => (c.OuterDiameter, c.InnerDiameter, c.Height)).Distinct()));

    [Fact]
    public void IronPowder_OfOneMix_ShareColourAndPermeability() =>
        Assert.All(Cores.IronPowder.GroupBy(c => c.Mix, StringComparer.Ordinal), mix => Assert.Single(mix.Select(c => (c.Colour, c.InitialPermeability)).Distinct()));
}
