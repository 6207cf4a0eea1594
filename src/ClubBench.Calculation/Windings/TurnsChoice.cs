using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Windings;

/// <summary>A whole number of turns and what it gives.</summary>
/// <param name="Turns">Passes through the hole.</param>
/// <param name="Inductance">Inductance of that winding.</param>
/// <param name="Error">Relative error against the wanted inductance; positive is too large.</param>
public sealed record WholeTurns(int Turns, Inductance Inductance, double Error)
{
    /// <summary>Relative change of inductance by one turn more: (1 + 1/N)^2 - 1.</summary>
    public double StepUp => (2.0 / Turns) + (1.0 / ((double)Turns * Turns));
}

/// <summary>The whole numbers of turns around a wanted inductance. Immutable.</summary>
/// <param name="ExactTurns">Turns the law asks for, not whole.</param>
/// <param name="Best">The neighbour with the smaller inductance error; at least one turn.</param>
/// <param name="Other">The neighbour on the other side; null where it would be no turn at all.</param>
public sealed record TurnsChoice(double ExactTurns, WholeTurns Best, WholeTurns? Other)
{
    /// <summary>
    /// Turns for an inductance above zero on a core with this index. Method: N = sqrt(L/AL), both whole neighbours.
    /// Valid: a winding spread over the whole ring, below a third of its self-resonance; below 5 turns lead length moves it by 10 %.
    /// Source: common practice (definition of the inductance index).
    /// </summary>
    public static TurnsChoice For(InductanceFactor index, Inductance wanted)
    {
        Guard.Positive(wanted.Henry, nameof(wanted));
        var exact = Math.Sqrt(wanted.Nanohenry / index.NanohenryPerTurnSquared);
        var below = (int)Math.Floor(exact);
        var up = At(index, below + 1, wanted);
        if (below < 1) return new(exact, up, null);
        var down = At(index, below, wanted);
        return Math.Abs(down.Error) <= Math.Abs(up.Error) ? new(exact, down, up) : new(exact, up, down);
    }

    /// <summary>
    /// Turns to start with so that, at the smallest index the tolerance allows, turns only need to come off: ceil(sqrt(L/(AL (1 - tol)))).
    /// </summary>
    /// <param name="index">Inductance index of the core.</param>
    /// <param name="relativeTolerance">Relative tolerance of the index, 0 to below 1.</param>
    /// <param name="wanted">Wanted inductance, above zero.</param>
    public static int StartingLong(InductanceFactor index, double relativeTolerance, Inductance wanted)
    {
        Guard.Within(relativeTolerance, 0, 0.9, nameof(relativeTolerance));
        return (int)Math.Ceiling(Math.Sqrt(wanted.Nanohenry / (index.NanohenryPerTurnSquared * (1 - relativeTolerance))));
    }

    /// <summary>Capacitance that makes a whole number of turns resonate where the wanted inductance would with this one: C L/L(N).</summary>
    public static Capacitance MakesExact(Capacitance designed, WholeTurns turns) => designed / (1 + turns.Error);

    private static WholeTurns At(InductanceFactor index, int turns, Inductance wanted) =>
        new(turns, index.Of(turns), (index.Of(turns) / wanted) - 1);
}
