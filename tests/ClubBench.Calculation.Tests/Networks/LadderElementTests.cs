using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Networks;

public class LadderElementTests
{
    private static readonly Gen<LadderElement> Arms = Gen.Select(
        Gen.Double[0.05, 20], Gen.Double[5, 2000], Gen.Double[20, 300], Gen.Double[100, 2000], Gen.Int[0, 5],
        (uh, pf, coilQ, capacitorQ, kind) => Arm(kind, Inductance.FromMicrohenry(uh), Capacitance.FromPicofarad(pf), coilQ, capacitorQ));

    [Fact]
    [Evidence(typeof(LadderElement), EvidenceKind.ClosedFormLimit)]
    public void Impedance_SinglePart_IsItsReactanceWithTheReactanceOverQ()
    {
        var f = Frequency.FromHertz(1e6 / (2 * Math.PI));

        var coil = LadderElement.SeriesInductor(Inductance.FromMicrohenry(100), 50).Impedance(f);
        var capacitor = LadderElement.ShuntCapacitor(Capacitance.FromNanofarad(10), 500).Impedance(f);

        Assert.Equal((2, 100), (Math.Round(coil.Real, 9), Math.Round(coil.Imaginary, 9)));
        Assert.Equal((0.2, -100), (Math.Round(capacitor.Real, 9), Math.Round(capacitor.Imaginary, 9)));
    }

    [Fact]
    [Evidence(typeof(LadderElement), EvidenceKind.Identity)]
    public void Scaled_PartsUpAndFrequencyDown_KeepsTheImpedance() =>
        Gen.Select(Arms, Gen.Double[1, 60], Gen.Double[0.2, 5]).Sample((arm, mhz, k) =>
        {
            var f = Frequency.FromMegahertz(mhz);
            var z = arm.Impedance(f);
            return (arm.Scaled(k, k).Impedance(f / k) - z).Magnitude < 1e-9 * z.Magnitude && z.Real > 0;
        });

    [Fact]
    [Evidence(typeof(LadderElement), EvidenceKind.RoundTrip)]
    public void Scaled_ThereAndBack_IsTheSameArm() =>
        Gen.Select(Arms, Gen.Double[0.2, 5], Gen.Double[0.2, 5], Gen.Double[1, 60]).Sample((arm, coil, capacitor, mhz) =>
        {
            var z = arm.Impedance(Frequency.FromMegahertz(mhz));
            return (arm.Scaled(coil, capacitor).Scaled(1 / coil, 1 / capacitor).Impedance(Frequency.FromMegahertz(mhz)) - z).Magnitude < 1e-6 * z.Magnitude;
        });

    private static LadderElement Arm(int kind, Inductance l, Capacitance c, double coilQ, double capacitorQ) => kind switch
    {
        0 => LadderElement.SeriesInductor(l, coilQ),
        1 => LadderElement.ShuntInductor(l, coilQ),
        2 => LadderElement.SeriesCapacitor(c, capacitorQ),
        3 => LadderElement.ShuntCapacitor(c, capacitorQ),
        4 => LadderElement.SeriesTrap(l, c, coilQ, capacitorQ),
        _ => LadderElement.ShuntTrap(l, c, coilQ, capacitorQ),
    };
}
