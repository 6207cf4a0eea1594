namespace ClubBench.Calculation.Quantities;

/// <summary>A thermal resistance, stored in kelvin per watt. Zero or above, finite. Immutable.</summary>
public readonly record struct ThermalResistance : IComparable<ThermalResistance>
{
    private ThermalResistance(double kelvinPerWatt) => KelvinPerWatt = Guard.NotNegative(kelvinPerWatt, nameof(kelvinPerWatt));

    /// <summary>Value in K/W.</summary>
    public double KelvinPerWatt { get; }

    /// <summary>From a value in K/W. Zero or above, finite.</summary>
    public static ThermalResistance FromKelvinPerWatt(double kelvinPerWatt) => new(kelvinPerWatt);

    /// <summary>Sum of two.</summary>
    public static ThermalResistance operator +(ThermalResistance a, ThermalResistance b) => new(a.KelvinPerWatt + b.KelvinPerWatt);

    /// <summary>Difference of two; throws where the result would leave the permitted range.</summary>
    public static ThermalResistance operator -(ThermalResistance a, ThermalResistance b) => new(a.KelvinPerWatt - b.KelvinPerWatt);

    /// <summary>Scaled by a pure number.</summary>
    public static ThermalResistance operator *(ThermalResistance a, double k) => new(a.KelvinPerWatt * k);

    /// <summary>Scaled by a pure number.</summary>
    public static ThermalResistance operator *(double k, ThermalResistance a) => new(a.KelvinPerWatt * k);

    /// <summary>Divided by a pure number.</summary>
    public static ThermalResistance operator /(ThermalResistance a, double k) => new(a.KelvinPerWatt / k);

    /// <summary>Ratio of two, a pure number.</summary>
    public static double operator /(ThermalResistance a, ThermalResistance b) => a.KelvinPerWatt / b.KelvinPerWatt;

    /// <summary>Compares the values.</summary>
    public static bool operator <(ThermalResistance a, ThermalResistance b) => a.KelvinPerWatt < b.KelvinPerWatt;

    /// <summary>Compares the values.</summary>
    public static bool operator >(ThermalResistance a, ThermalResistance b) => a.KelvinPerWatt > b.KelvinPerWatt;

    /// <summary>Compares the values.</summary>
    public static bool operator <=(ThermalResistance a, ThermalResistance b) => a.KelvinPerWatt <= b.KelvinPerWatt;

    /// <summary>Compares the values.</summary>
    public static bool operator >=(ThermalResistance a, ThermalResistance b) => a.KelvinPerWatt >= b.KelvinPerWatt;

    /// <inheritdoc/>
    public int CompareTo(ThermalResistance other) => KelvinPerWatt.CompareTo(other.KelvinPerWatt);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(KelvinPerWatt, "K/W");
}
