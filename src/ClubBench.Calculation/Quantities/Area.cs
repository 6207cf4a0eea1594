namespace ClubBench.Calculation.Quantities;

/// <summary>An area, stored in square metre. Above zero, finite. Immutable.</summary>
public readonly record struct Area
{
    private Area(double squareMetre) => SquareMetre = Guard.Positive(squareMetre, nameof(squareMetre));

    /// <summary>Value in m2.</summary>
    public double SquareMetre { get; }

    /// <summary>Value in cm2.</summary>
    public double SquareCentimetre => SquareMetre / 1e-4;

    /// <summary>From a value in m2, above zero.</summary>
    public static Area FromSquareMetre(double squareMetre) => new(squareMetre);

    /// <summary>From a value in cm2, above zero.</summary>
    public static Area FromSquareCentimetre(double squareCentimetre) => new(squareCentimetre * 1e-4);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(SquareMetre, "m2");
}
