using System.Globalization;

namespace ClubBench.Calculation.Quantities;

/// <summary>The one place for guards: a broken contract throws and names the argument, its value and what is permitted.</summary>
public static class Guard
{
    /// <summary>Passes a finite number on; throws for NaN and infinity.</summary>
    public static double Finite(double value, string name) =>
        double.IsFinite(value) ? value : throw Refuse(value, name, "must be a finite number");

    /// <summary>Passes a finite number above zero on; throws otherwise.</summary>
    public static double Positive(double value, string name) =>
        Finite(value, name) > 0 ? value : throw Refuse(value, name, "must be greater than zero");

    /// <summary>Passes a finite number of zero or above on; throws otherwise.</summary>
    public static double NotNegative(double value, string name) =>
        Finite(value, name) >= 0 ? value : throw Refuse(value, name, "must not be negative");

    /// <summary>Passes a number within limits on (both inclusive); throws otherwise.</summary>
    public static double Within(double value, double low, double high, string name) =>
        Finite(value, name) >= low && value <= high
            ? value
            : throw Refuse(value, name, string.Create(CultureInfo.InvariantCulture, $"must be between {low} and {high}"));

    /// <summary>Passes a whole number within limits on (both inclusive); throws otherwise.</summary>
    public static int Within(int value, int low, int high, string name) =>
        value >= low && value <= high
            ? value
            : throw Refuse(value, name, string.Create(CultureInfo.InvariantCulture, $"must be between {low} and {high}"));

    internal static string Text(double si, string unit) => string.Create(CultureInfo.InvariantCulture, $"{si:G9} {unit}");

    private static ArgumentOutOfRangeException Refuse(double value, string name, string rule) =>
        new(name, value, string.Create(CultureInfo.InvariantCulture, $"{name} {rule} ({value} was given)."));
}
