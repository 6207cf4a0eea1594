namespace ClubBench.Calculation.Quantities;

/// <summary>A capacitance, stored in farad. Zero or above, finite. Immutable.</summary>
public readonly record struct Capacitance : IComparable<Capacitance>
{
    private Capacitance(double farad) => Farad = Guard.NotNegative(farad, nameof(farad));

    /// <summary>Value in F.</summary>
    public double Farad { get; }

    /// <summary>Value in picofarad.</summary>
    public double Picofarad => Farad / 1e-12;

    /// <summary>Value in nanofarad.</summary>
    public double Nanofarad => Farad / 1e-9;

    /// <summary>Value in microfarad.</summary>
    public double Microfarad => Farad / 1e-6;

    /// <summary>From a value in F. Zero or above, finite.</summary>
    public static Capacitance FromFarad(double farad) => new(farad);

    /// <summary>From a value in picofarad. Zero or above, finite.</summary>
    public static Capacitance FromPicofarad(double picofarad) => new(picofarad * 1e-12);

    /// <summary>From a value in nanofarad. Zero or above, finite.</summary>
    public static Capacitance FromNanofarad(double nanofarad) => new(nanofarad * 1e-9);

    /// <summary>From a value in microfarad. Zero or above, finite.</summary>
    public static Capacitance FromMicrofarad(double microfarad) => new(microfarad * 1e-6);

    /// <summary>Sum of two.</summary>
    public static Capacitance operator +(Capacitance a, Capacitance b) => new(a.Farad + b.Farad);

    /// <summary>Difference of two; throws where the result would leave the permitted range.</summary>
    public static Capacitance operator -(Capacitance a, Capacitance b) => new(a.Farad - b.Farad);

    /// <summary>Scaled by a pure number.</summary>
    public static Capacitance operator *(Capacitance a, double k) => new(a.Farad * k);

    /// <summary>Scaled by a pure number.</summary>
    public static Capacitance operator *(double k, Capacitance a) => new(a.Farad * k);

    /// <summary>Divided by a pure number.</summary>
    public static Capacitance operator /(Capacitance a, double k) => new(a.Farad / k);

    /// <summary>Ratio of two, a pure number.</summary>
    public static double operator /(Capacitance a, Capacitance b) => a.Farad / b.Farad;

    /// <summary>Compares the values.</summary>
    public static bool operator <(Capacitance a, Capacitance b) => a.Farad < b.Farad;

    /// <summary>Compares the values.</summary>
    public static bool operator >(Capacitance a, Capacitance b) => a.Farad > b.Farad;

    /// <summary>Compares the values.</summary>
    public static bool operator <=(Capacitance a, Capacitance b) => a.Farad <= b.Farad;

    /// <summary>Compares the values.</summary>
    public static bool operator >=(Capacitance a, Capacitance b) => a.Farad >= b.Farad;

    /// <inheritdoc/>
    public int CompareTo(Capacitance other) => Farad.CompareTo(other.Farad);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(Farad, "F");
}
