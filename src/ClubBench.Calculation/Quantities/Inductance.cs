namespace ClubBench.Calculation.Quantities;

/// <summary>An inductance, stored in henry. Zero or above, finite. Immutable.</summary>
public readonly record struct Inductance : IComparable<Inductance>
{
    private Inductance(double henry) => Henry = Guard.NotNegative(henry, nameof(henry));

    /// <summary>Value in H.</summary>
    public double Henry { get; }

    /// <summary>Value in microhenry.</summary>
    public double Microhenry => Henry / 1e-6;

    /// <summary>Value in nanohenry.</summary>
    public double Nanohenry => Henry / 1e-9;

    /// <summary>From a value in H. Zero or above, finite.</summary>
    public static Inductance FromHenry(double henry) => new(henry);

    /// <summary>From a value in microhenry. Zero or above, finite.</summary>
    public static Inductance FromMicrohenry(double microhenry) => new(microhenry * 1e-6);

    /// <summary>From a value in nanohenry. Zero or above, finite.</summary>
    public static Inductance FromNanohenry(double nanohenry) => new(nanohenry * 1e-9);

    /// <summary>Sum of two.</summary>
    public static Inductance operator +(Inductance a, Inductance b) => new(a.Henry + b.Henry);

    /// <summary>Difference of two; throws where the result would leave the permitted range.</summary>
    public static Inductance operator -(Inductance a, Inductance b) => new(a.Henry - b.Henry);

    /// <summary>Scaled by a pure number.</summary>
    public static Inductance operator *(Inductance a, double k) => new(a.Henry * k);

    /// <summary>Scaled by a pure number.</summary>
    public static Inductance operator *(double k, Inductance a) => new(a.Henry * k);

    /// <summary>Divided by a pure number.</summary>
    public static Inductance operator /(Inductance a, double k) => new(a.Henry / k);

    /// <summary>Ratio of two, a pure number.</summary>
    public static double operator /(Inductance a, Inductance b) => a.Henry / b.Henry;

    /// <summary>Compares the values.</summary>
    public static bool operator <(Inductance a, Inductance b) => a.Henry < b.Henry;

    /// <summary>Compares the values.</summary>
    public static bool operator >(Inductance a, Inductance b) => a.Henry > b.Henry;

    /// <summary>Compares the values.</summary>
    public static bool operator <=(Inductance a, Inductance b) => a.Henry <= b.Henry;

    /// <summary>Compares the values.</summary>
    public static bool operator >=(Inductance a, Inductance b) => a.Henry >= b.Henry;

    /// <inheritdoc/>
    public int CompareTo(Inductance other) => Henry.CompareTo(other.Henry);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(Henry, "H");
}
