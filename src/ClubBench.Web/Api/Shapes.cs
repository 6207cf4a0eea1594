using System.Text.Json.Nodes;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;
using ClubBench.Planning.Text;

namespace ClubBench.Web.Api;

/// <summary>Figures and findings as the programming interface writes them: SI numbers with the unit in the property's name, and the words beside them.</summary>
internal static class Shapes
{
    /// <summary>A figure, for instance <c>{ "name": "loss", "valueDb": 0.22, "text": "0.2 dB", "from": "derived" }</c>.</summary>
    public static JsonObject Of(Figure figure)
    {
        var unit = UnitOf(figure.Kind);
        var shape = new JsonObject { ["name"] = figure.Name, ["value" + unit] = figure.Si };
        if (figure.ExpandedUncertaintySi is { } u) shape["expandedUncertainty" + unit] = u;
        shape["text"] = QuantityText.Format(figure);
        shape["from"] = Camel(figure.From.ToString());
        return shape;
    }

    public static JsonArray Of(IEnumerable<Figure> figures) => new([.. figures.Select(Of)]);

    /// <summary>A finding with its words.</summary>
    public static JsonObject Of(Finding finding, string? stageKind = null) => new()
    {
        ["code"] = finding.Code,
        ["severity"] = Camel(finding.Severity.ToString()),
        ["stage"] = finding.Stage,
        ["designator"] = finding.Designator,
        ["text"] = Phrases.Say(finding, stageKind),
        ["figures"] = Of(finding.Figures),
    };

    public static JsonArray Of(IEnumerable<Finding> findings, string? stageKind = null) => new([.. findings.Select(f => Of(f, stageKind))]);

    /// <summary>A value with its unit in the property's name.</summary>
    public static void Put(this JsonObject shape, string name, QuantityKind kind, double? si) => shape[name + UnitOf(kind)] = si;

    public static string Camel(string name) => char.ToLowerInvariant(name[0]) + name[1..];

    /// <summary>The SI unit of a kind as it ends a property's name.</summary>
    public static string UnitOf(QuantityKind kind) => kind switch
    {
        QuantityKind.Frequency or QuantityKind.FrequencyShift => "Hz",
        QuantityKind.Inductance => "H",
        QuantityKind.Capacitance => "F",
        QuantityKind.Resistance => "Ohm",
        QuantityKind.Voltage => "V",
        QuantityKind.PeakToPeakVoltage => "VPeakToPeak",
        QuantityKind.Current => "A",
        QuantityKind.Power => "W",
        QuantityKind.PowerLevel => "Dbm",
        QuantityKind.Decibels => "Db",
        QuantityKind.RelativeLevel => "Dbc",
        QuantityKind.Temperature => "DegreesCelsius",
        QuantityKind.TemperatureRise => "K",
        QuantityKind.Length => "M",
        QuantityKind.Duration => "S",
        QuantityKind.FluxDensity => "T",
        QuantityKind.InductanceFactor => "HPerTurn2",
        QuantityKind.Angle => "Degrees",
        _ => "",
    };
}
