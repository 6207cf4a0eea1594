namespace ClubBench.Calculation.Quantities;

/// <summary>Inductance index of a core (AL): inductance of one turn, growing with the square of the turns. Above zero. Immutable.</summary>
public readonly record struct InductanceFactor
{
    private InductanceFactor(double nanohenry) => NanohenryPerTurnSquared = Guard.Positive(nanohenry, nameof(nanohenry));

    /// <summary>Value in nH per turn squared (ten times smaller than "uH per 100 turns").</summary>
    public double NanohenryPerTurnSquared { get; }

    /// <summary>From nH per turn squared, above zero.</summary>
    public static InductanceFactor FromNanohenryPerTurnSquared(double nanohenry) => new(nanohenry);

    /// <summary>From uH per 100 turns, above zero: 49 uH per 100 turns is 4.9 nH per turn squared.</summary>
    public static InductanceFactor FromMicrohenryPer100Turns(double microhenry) => new(microhenry / 10);

    /// <summary>Inductance of a winding of whole or fractional turns, spread over the whole core: L = AL N^2.</summary>
    public Inductance Of(double turns) => Inductance.FromNanohenry(NanohenryPerTurnSquared * turns * turns);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(NanohenryPerTurnSquared, "nH/t2");
}
