using System.Numerics;
using MathNet.Numerics.LinearAlgebra;

namespace ClubBench.Calculation.Tests;

/// <summary>
/// A linear circuit at one frequency as the admittance matrix of its nodes, node 0 being ground. It knows no formula of any method: what a method
/// says of a circuit is asked of its nodes a second time.
/// </summary>
internal sealed class NodalCircuit(int nodes)
{
    private readonly Matrix<Complex> _siemens = Matrix<Complex>.Build.Dense(nodes, nodes);

    /// <summary>An element between two nodes by its impedance in ohm.</summary>
    public NodalCircuit Element(int from, int to, Complex ohm) => CurrentSource(from, to, from, to, 1 / ohm);

    /// <summary>A current of so many siemens times the voltage between two nodes, flowing inside the source from one node to another.</summary>
    public NodalCircuit CurrentSource(int from, int to, int plus, int minus, Complex siemens)
    {
        foreach (var (row, flow) in new[] { (from, 1), (to, -1) })
            foreach (var (column, sign) in new[] { (plus, 1), (minus, -1) })
                if (row > 0 && column > 0) _siemens[row - 1, column - 1] += flow * sign * siemens;
        return this;
    }

    /// <summary>Voltages of all nodes, ground first, while a current flows into one of them.</summary>
    public Complex[] Voltages(int into, Complex ampere) => [Complex.Zero, .. _siemens.Inverse().Column(into - 1) * ampere];

    /// <summary>Impedance seen between a node and ground.</summary>
    public Complex ImpedanceAt(int node) => Voltages(node, 1)[node];

    /// <summary>Impedances of a coil and a capacitor.</summary>
    public static Complex Coil(double radiansPerSecond, double henry) => new(0, radiansPerSecond * henry);

    public static Complex Capacitor(double radiansPerSecond, double farad) => new(0, -1 / (radiansPerSecond * farad));
}
