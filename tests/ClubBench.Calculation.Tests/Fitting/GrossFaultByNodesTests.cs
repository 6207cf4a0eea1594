using System.Numerics;
using ClubBench.Calculation.Fitting;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Sweeps;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Fitting;

/// <summary>What every explanation leaves, asked of the nodes of a filter with five arms.</summary>
public class GrossFaultByNodesTests
{
    private static readonly ParallelPair Pair = new(2, Capacitance.FromPicofarad(560), Capacitance.FromPicofarad(157.46));

    [Fact]
    [Evidence(typeof(GrossFaultSearch), EvidenceKind.ClosedFormLimit)]
    public void Of_NominalBoardWithoutNoise_LeavesNothing()
    {
        var search = GrossFaultSearch.Of(Boards.Question(Boards.Shown(F7.ToLadder(150, 1000))), [Pair]);

        Assert.Equal(GrossFaultKind.None, search.Explanations[0].Kind);
        Assert.Equal(0, search.Explanations[0].Rms, 1e-12);
        Assert.True(search.Explanations[1].Rms > 0.01);
    }

    [Fact]
    [Evidence(typeof(GrossFaultSearch), EvidenceKind.IndependentRecomputation)]
    public void Of_EveryExplanation_LeavesWhatTheNodesSay()
    {
        var sweep = Boards.Shown(Boards.Built(Boards.Example), 0.002);

        var explanations = GrossFaultSearch.Of(Boards.Question(sweep), [Pair]).Explanations;

        Assert.Equal(1 + (2 * 5) + 2, explanations.Count);
        Assert.All(explanations, e => Assert.Equal(Rms(sweep, e), e.Rms, 1e-9));
    }

    private static double Rms(Sweep sweep, GrossFault fault) => Math.Sqrt(sweep.Points.Average(p =>
    {
        var w = 2 * Math.PI * p.Frequency.Hertz;
        var circuit = new NodalCircuit(3).Element(1, 0, 50).Element(3, 0, 50);
        for (var arm = 0; arm < 5; arm++)
        {
            var node = 1 + (arm / 2);
            circuit.Element(node, arm % 2 == 0 ? 0 : node + 1, Ohm(arm, w, fault));
        }

        var volts = circuit.Voltages(1, 1 / 50.0);
        return 0.5 * (Square((2 * volts[1]) - 1 - p.S11) + Square((2 * volts[3]) - p.S21!.Value));
    }));

    private static double Square(Complex left) => left.Magnitude * left.Magnitude;

    private static Complex Ohm(int arm, double w, GrossFault fault)
    {
        var (isCoil, isFaulty) = (arm % 2 == 1, arm == fault.Arm);
        var sound = isCoil ? w * F7.Coils[arm / 2].Henry * new Complex(1 / 150.0, 1) : new Complex(1 / 1000.0, -1) / (w * F7.Capacitors[arm / 2].Farad);
        return (isFaulty ? fault.Kind : GrossFaultKind.None, isCoil) switch
        {
            (GrossFaultKind.Open, true) => 1e6,
            (GrossFaultKind.Open, _) => 1e9,
            (GrossFaultKind.Shorted, true) => 0.01,
            (GrossFaultKind.Shorted, _) => 0.05,
            (GrossFaultKind.OnlyFirstOfPair, _) => sound * 717.46 / 560,
            (GrossFaultKind.OnlySecondOfPair, _) => sound * 717.46 / 157.46,
            _ => sound,
        };
    }
}
