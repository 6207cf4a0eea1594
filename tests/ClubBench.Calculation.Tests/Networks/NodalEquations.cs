using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using MathNet.Numerics.LinearAlgebra;
using Complex = System.Numerics.Complex;

namespace ClubBench.Calculation.Tests;

/// <summary>A ladder solved by its nodal equations, as a second way to its transmission. All coils have one Q and all capacitors another.</summary>
internal static class NodalEquations
{
    public static Complex Transmission(Ladder ladder, Frequency f, Resistance source, Resistance load, double coilQ, double capacitorQ)
    {
        var nodes = ladder.Elements.Count(e => e.Position == LadderPosition.Series) + 1;
        var y = Matrix<Complex>.Build.Dense(nodes, nodes);
        var node = 0;
        foreach (var element in ladder.Elements)
        {
            var admittance = Admittance(element, 2 * Math.PI * f.Hertz, 1 / coilQ, 1 / capacitorQ);
            y[node, node] += admittance;
            if (element.Position == LadderPosition.Shunt) continue;
            y[node + 1, node + 1] += admittance;
            y[node, node + 1] -= admittance;
            y[node + 1, node] -= admittance;
            node++;
        }

        y[0, 0] += 1 / source.Ohm;
        y[nodes - 1, nodes - 1] += 1 / load.Ohm;
        var current = Vector<Complex>.Build.Dense(nodes, i => i == 0 ? 1 / source.Ohm : Complex.Zero);
        return 2 * Math.Sqrt(source.Ohm / load.Ohm) * y.Solve(current)[nodes - 1];
    }

    private static Complex Admittance(LadderElement e, double w, double coilLoss, double capacitorLoss)
    {
        Complex? coil = e.Inductance is { } l ? w * l.Henry * new Complex(coilLoss, 1) : null;
        Complex? capacitor = e.Capacitance is { } c ? new Complex(capacitorLoss, -1) / (w * c.Farad) : null;
        return (coil, capacitor, e.Position) switch
        {
            ({ } a, { } b, LadderPosition.Series) => (1 / a) + (1 / b),
            ({ } a, { } b, _) => 1 / (a + b),
            _ => 1 / (coil ?? capacitor!.Value),
        };
    }
}
