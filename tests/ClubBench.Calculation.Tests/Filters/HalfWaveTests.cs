using System.Numerics;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using CsCheck;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Filters;

public class HalfWaveTests
{
    public static TheoryData<ReferenceRow> Parts => ReferenceTable.Theory("half_wave_parts");

    [Theory]
    [MemberData(nameof(Parts))]
    public void HalfWave_Case_HasThePartsOfTheTable(ReferenceRow row)
    {
        var filter = LowPassDesign.HalfWave(Frequency.FromMegahertz(row.Number("design_mhz")), FiftyOhm);
        var tolerance = row.Number("relative_tolerance");

        Assert.All([filter.Capacitors[0], filter.Capacitors[2]], c => Assert.Equal(row.Number("outer_pf"), c.Picofarad, c.Picofarad * tolerance));
        Assert.Equal(row.Number("middle_pf"), filter.Capacitors[1].Picofarad, row.Number("middle_pf") * tolerance);
        Assert.All(filter.Coils, l => Assert.Equal(row.Number("coil_uh"), l.Microhenry, row.Number("coil_uh") * tolerance));
    }

    [Fact]
    public void HalfWave_AtTheDesignFrequency_RepeatsAnyLoad() => Gen.Select(Gen.Double[1, 500], Gen.Double[-500, 500], Gen.Double[1.8, 30]).Sample((ohm, reactance, mhz) =>
    {
        var (load, design) = (new Complex(ohm, reactance), Frequency.FromMegahertz(mhz));

        var seen = LowPassDesign.HalfWave(design, FiftyOhm).ToLadder().At(design).InputImpedance(load);

        return (seen - load).Magnitude < 1e-9 * load.Magnitude;
    });

    [Fact]
    public void HalfWave_CutOffOfConstantK_LosesWhatItsChainMatrixSays()
    {
        // Each section is [-1, j 1.414; 0, -1] there: both together are a reactance of 2.828 in the line, and 1 + (2.828 / 2)^2 is 3.
        var design = Frequency.FromMegahertz(7);

        var loss = LowPassDesign.HalfWave(design, FiftyOhm).ToLadder().Loss(design * Math.Sqrt(2), FiftyOhm, FiftyOhm);

        Assert.Equal(10 * Math.Log10(3), loss.Db, 1e-9);
    }
}
