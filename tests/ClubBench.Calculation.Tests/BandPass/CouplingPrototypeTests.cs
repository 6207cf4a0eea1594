using ClubBench.Calculation.BandPass;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.BandPass;

public class CouplingPrototypeTests
{
    public static TheoryData<ReferenceRow> Cases => ReferenceTable.Theory("coupling-prototype");

    [Theory]
    [MemberData(nameof(Cases))]
    [Evidence(typeof(CouplingPrototype), EvidenceKind.PublishedValue)]
    public void Shape_PublishedCase_HasTheCouplingsOfTheTable(ReferenceRow row)
    {
        var prototype = Prototypes.Of(row);

        Assert.Equal(row.Number("end_q"), prototype.EndQ, row.Number("tolerance"));
        Assert.Equal(row.Number("coupling"), prototype.Coupling, row.Number("tolerance"));
        Assert.Equal(row.Number("half_power_ratio"), prototype.HalfPowerRatio, row.Number("tolerance"));
    }

    [Theory]
    [InlineData(2, 1.0)]
    [InlineData(2, 0.1)]
    [InlineData(3, 1.0)]
    [InlineData(3, 0.1)]
    [Evidence(typeof(CouplingPrototype), EvidenceKind.ClosedFormLimit)]
    public void Chebyshev_RippleTowardsNothing_IsButterworth(int order, double share)
    {
        var vanishing = CouplingPrototype.Chebyshev(order, PassBandRipple.FromRipple(Decibels.FromDb(0.001 * share)));
        var flat = CouplingPrototype.Butterworth(order);

        Assert.Equal(flat.EndQ, vanishing.EndQ, 0.2 * Math.Pow(share, 1.0 / order));
        Assert.Equal(flat.Coupling, vanishing.Coupling, 0.05 * Math.Pow(share, 1.0 / order));
    }

    [Fact]
    [Evidence(typeof(CouplingPrototype), EvidenceKind.Identity)]
    public void MidbandLoss_TwiceTheQ_IsHalfInDecibels()
    {
        var prototype = CouplingPrototype.Butterworth(3);
        var (center, width) = (Frequency.FromMegahertz(7.1), Frequency.FromKilohertz(300));

        var (one, two) = (prototype.MidbandLoss(center, width, 200), prototype.MidbandLoss(center, width, 400));

        Assert.Equal(one.Db, 2 * two.Db, 1e-9);
    }

    [Theory]
    [InlineData(1)]
    [InlineData(4)]
    public void Butterworth_OrderWithoutATable_IsRefused(int order) => Assert.Throws<ArgumentOutOfRangeException>(() => CouplingPrototype.Butterworth(order));
}

/// <summary>The prototype a reference row names.</summary>
internal static class Prototypes
{
    public static CouplingPrototype Of(ReferenceRow row) => row.Has("ripple_db")
        ? CouplingPrototype.Chebyshev((int)row.Number("order"), PassBandRipple.FromRipple(Decibels.FromDb(row.Number("ripple_db"))))
        : CouplingPrototype.Butterworth((int)row.Number("order"));
}
