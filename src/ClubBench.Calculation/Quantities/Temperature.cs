namespace ClubBench.Calculation.Quantities;

/// <summary>A temperature on the Celsius scale. Not a difference: see <see cref="TemperatureRise"/>. Above absolute zero. Immutable.</summary>
public readonly record struct Temperature
{
    private Temperature(double celsius) => Celsius = Guard.Within(celsius, -273.15, 1e4, nameof(celsius));

    /// <summary>Value in degrees Celsius.</summary>
    public double Celsius { get; }

    /// <summary>Value in kelvin.</summary>
    public double Kelvin => Celsius + 273.15;

    /// <summary>From a value in degrees Celsius.</summary>
    public static Temperature FromCelsius(double celsius) => new(celsius);

    /// <summary>A temperature raised by a difference.</summary>
    public static Temperature operator +(Temperature a, TemperatureRise rise) => new(a.Celsius + rise.Kelvin);

    /// <summary>How much warmer one temperature is than another.</summary>
    public static TemperatureRise operator -(Temperature a, Temperature b) => TemperatureRise.FromKelvin(a.Celsius - b.Celsius);

    /// <inheritdoc/>
    public override string ToString() => Guard.Text(Celsius, "degC");
}
