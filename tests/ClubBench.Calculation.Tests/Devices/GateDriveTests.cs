using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Devices;

public class GateDriveTests
{
    public static TheoryData<ReferenceRow> Cases => ReferenceTable.Theory("gate-drive");

    [Theory]
    [MemberData(nameof(Cases))]
    [Evidence(typeof(GateDrive), EvidenceKind.ClosedFormLimit)]
    public void Drive_Case_TakesTheCurrentAndPowerOfTheTable(ReferenceRow row)
    {
        var (f, volt) = (Frequency.FromMegahertz(row.Number("frequency_mhz")), Voltage.FromVolt(row.Number("volt")));
        Current Peak() => GateDrive.PeakCurrent(f, Capacitance.FromPicofarad(row.Number("capacitance_pf")), volt);

        var value = row["quantity"] switch
        {
            "peak_ma" => Peak().Milliampere,
            "average_ma" => GateDrive.AverageCurrent(row.Number("charge_nc") * 1e-9, f).Milliampere,
            "switching_mw" => GateDrive.SwitchingPower(row.Number("charge_nc") * 1e-9, f, volt).Watt * 1e3,
            _ => GateDrive.LossIn(Resistance.FromOhm(row.Number("ohm")), Peak()).Watt * 1e3,
        };

        Assert.Equal(row.Number("expected"), value, row.Number("expected") * row.Number("relative_tolerance"));
    }

    [Fact]
    [Evidence(typeof(GateDrive), EvidenceKind.Identity)]
    public void Drive_AnOctaveUp_Doubles()
    {
        var (f, c, v) = (Frequency.FromMegahertz(7.1), Capacitance.FromPicofarad(180), Voltage.FromVolt(6));

        Assert.Equal(2 * GateDrive.PeakCurrent(f, c, v).Ampere, GateDrive.PeakCurrent(f * 2, c, v).Ampere, 1e-12);
        Assert.Equal(2 * GateDrive.SwitchingPower(8.3e-9, f, v).Watt, GateDrive.SwitchingPower(8.3e-9, f * 2, v).Watt, 1e-12);
        Assert.Equal(2 * GateDrive.OutputCapacitanceLoss(c, v, f).Watt, GateDrive.OutputCapacitanceLoss(c, v, f * 2).Watt, 1e-12);
    }

    // Charge and current of a sampled sine on a capacitor; heat of a sampled current in the gate resistance.
    [Fact]
    [Evidence(typeof(GateDrive), EvidenceKind.IndependentRecomputation)]
    public void Drive_SampledSine_HasThatPeakAndHeat()
    {
        const int steps = 100_000;
        var (f, c, v, r) = (Frequency.FromMegahertz(7.1), 180e-12, 6.0, 5.0);
        var h = 1 / f.Hertz / steps;
        var currents = Enumerable.Range(0, steps).Select(i => c * v * (Math.Sin(2 * Math.PI * (i + 1) / steps) - Math.Sin(2 * Math.PI * i / steps)) / h).ToList();

        var peak = GateDrive.PeakCurrent(f, Capacitance.FromFarad(c), Voltage.FromVolt(v));

        Assert.Equal(currents.Max(), peak.Ampere, 1e-6);
        Assert.Equal(currents.Average(i => i * i * r), GateDrive.LossIn(Resistance.FromOhm(r), peak).Watt, 1e-6);
    }

    [Theory]
    [InlineData(0, 204)]
    [InlineData(4, 300)]
    public void EffectiveInput_Gain_CountsTheReverseCapacitanceAgain(double gain, double picofarad) =>
        Assert.Equal(picofarad, GateDrive.EffectiveInput(Capacitance.FromPicofarad(180), Capacitance.FromPicofarad(24), gain).Picofarad, 1e-9);

    [Fact]
    public void ConductionLoss_TwiceTheCurrent_IsFourTimes()
    {
        var closed = Resistance.FromOhm(0.54);

        Assert.Equal(4 * GateDrive.ConductionLoss(closed, Current.FromAmpere(0.5)).Watt, GateDrive.ConductionLoss(closed, Current.FromAmpere(1)).Watt, 1e-12);
    }
}
