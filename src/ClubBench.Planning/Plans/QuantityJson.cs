using System.Text.Json;
using System.Text.Json.Serialization;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Planning.Plans;

/// <summary>Quantities as plain numbers in SI units (dB and dBm for gains and levels).</summary>
internal static class QuantityJson
{
    private static readonly Dictionary<Type, (string Unit, JsonConverter Converter)> ByType = new()
    {
        [typeof(Frequency)] = ("Hz", new QuantityConverter<Frequency>(Frequency.FromHertz, f => f.Hertz)),
        [typeof(Inductance)] = ("H", new QuantityConverter<Inductance>(Inductance.FromHenry, l => l.Henry)),
        [typeof(Capacitance)] = ("F", new QuantityConverter<Capacitance>(Capacitance.FromFarad, c => c.Farad)),
        [typeof(Resistance)] = ("Ohm", new QuantityConverter<Resistance>(Resistance.FromOhm, r => r.Ohm)),
        [typeof(Voltage)] = ("V", new QuantityConverter<Voltage>(Voltage.FromVolt, v => v.Volt)),
        [typeof(Current)] = ("A", new QuantityConverter<Current>(Current.FromAmpere, i => i.Ampere)),
        [typeof(Power)] = ("W", new QuantityConverter<Power>(Power.FromWatt, p => p.Watt)),
        [typeof(PowerLevel)] = ("Dbm", new QuantityConverter<PowerLevel>(PowerLevel.FromDbm, p => p.Dbm)),
        [typeof(Decibels)] = ("Db", new QuantityConverter<Decibels>(Decibels.FromDb, d => d.Db)),
        [typeof(Temperature)] = ("Celsius", new QuantityConverter<Temperature>(Temperature.FromCelsius, t => t.Celsius)),
        [typeof(TemperatureRise)] = ("K", new QuantityConverter<TemperatureRise>(TemperatureRise.FromKelvin, t => t.Kelvin)),
        [typeof(Length)] = ("M", new QuantityConverter<Length>(Length.FromMetre, l => l.Metre)),
        [typeof(Duration)] = ("S", new QuantityConverter<Duration>(Duration.FromSecond, d => d.Second)),
        [typeof(MagneticFluxDensity)] = ("T", new QuantityConverter<MagneticFluxDensity>(MagneticFluxDensity.FromTesla, b => b.Tesla)),
    };

    public static IEnumerable<JsonConverter> Converters => ByType.Values.Select(v => v.Converter);

    /// <summary>Ending of the property name; null for a type that is no quantity.</summary>
    public static string? UnitOf(Type type) => ByType.TryGetValue(Nullable.GetUnderlyingType(type) ?? type, out var known) ? known.Unit : null;
}

/// <summary>One quantity as a number. A number the quantity cannot have is refused as faulty JSON.</summary>
internal sealed class QuantityConverter<T>(Func<double, T> from, Func<T, double> to) : JsonConverter<T>
    where T : struct
{
    public override T Read(ref Utf8JsonReader reader, Type typeToConvert, JsonSerializerOptions options)
    {
        var si = reader.GetDouble();
        try
        {
            return from(si);
        }
        catch (ArgumentException fault)
        {
            throw new JsonException(fault.Message, fault);
        }
    }

    public override void Write(Utf8JsonWriter writer, T value, JsonSerializerOptions options) => writer.WriteNumberValue(to(value));
}

/// <summary>A run of frequencies as <c>lowHz</c> and <c>highHz</c>.</summary>
internal sealed class FrequencyRangeConverter : JsonConverter<FrequencyRange>
{
    private sealed record Ends(double LowHz, double HighHz);

    public override FrequencyRange Read(ref Utf8JsonReader reader, Type typeToConvert, JsonSerializerOptions options)
    {
        var ends = JsonSerializer.Deserialize<Ends>(ref reader, options) ?? throw new JsonException("A run of frequencies has two ends.");
        try
        {
            return new FrequencyRange(Frequency.FromHertz(ends.LowHz), Frequency.FromHertz(ends.HighHz));
        }
        catch (ArgumentException fault)
        {
            throw new JsonException(fault.Message, fault);
        }
    }

    public override void Write(Utf8JsonWriter writer, FrequencyRange value, JsonSerializerOptions options) =>
        JsonSerializer.Serialize(writer, new Ends(value.Low.Hertz, value.High.Hertz), options);
}
