using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;
using System.Text.Json.Serialization.Metadata;

namespace ClubBench.Planning.Plans;

/// <summary>
/// How kits, plans, cards, readings and advice are written as JSON: quantities as SI numbers with the unit at the end of the property name
/// (<c>supplyVoltageV</c>), words of enumerations in small letters with dashes, nothing for what is not known.
/// </summary>
public static class PlanJson
{
    /// <summary>The options. Read-only, shared by storage, interface and exports.</summary>
    public static JsonSerializerOptions Options { get; } = Make();

    private static JsonSerializerOptions Make()
    {
        var options = new JsonSerializerOptions
        {
            PropertyNamingPolicy = JsonNamingPolicy.CamelCase,
            DefaultIgnoreCondition = JsonIgnoreCondition.WhenWritingNull,
            IgnoreReadOnlyProperties = true,
            Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
            RespectRequiredConstructorParameters = true,
            RespectNullableAnnotations = true,
            TypeInfoResolver = new DefaultJsonTypeInfoResolver { Modifiers = { NameUnits, AllowAbsence } },
        };
        options.Converters.Add(new JsonStringEnumConverter(JsonNamingPolicy.KebabCaseLower));
        options.Converters.Add(new FrequencyRangeConverter());
        foreach (var converter in QuantityJson.Converters) options.Converters.Add(converter);
        options.MakeReadOnly();
        return options;
    }

    // What may be null may be left out; all else must be there.
    private static void AllowAbsence(JsonTypeInfo type)
    {
        foreach (var property in type.Properties)
            if (property.AssociatedParameter is { IsNullable: true }) property.IsRequired = false;
    }

    private static void NameUnits(JsonTypeInfo type)
    {
        foreach (var property in type.Properties)
            if (QuantityJson.UnitOf(property.PropertyType) is { } unit) property.Name += unit;
    }
}
