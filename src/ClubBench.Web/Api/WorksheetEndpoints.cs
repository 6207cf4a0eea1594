using System.Text.Json;
using System.Text.Json.Nodes;
using ClubBench.Planning;
using ClubBench.Planning.Text;
using ClubBench.Planning.Worksheets;

namespace ClubBench.Web.Api;

/// <summary>Worksheets: one calculation method each.</summary>
internal static class WorksheetEndpoints
{
    public static void MapWorksheets(this IEndpointRouteBuilder api)
    {
        api.MapGet("/worksheets", () => Results.Json(new Listing<JsonObject>([.. WorksheetList.All.Select(Shape)]), ApiJson.Options))
            .Described("ListWorksheets", "Calculation methods with what they ask for.",
                answer: """{ "items": [ { "method": "resonance", "title": "Resonance", "inputs": [ { "name": "inductanceH", "default": 2.304e-6 } ] } ] }""");

        api.MapPost("/worksheets/{method}", (string method, JsonElement body) => Run(method, body))
            .Described("RunWorksheet", "Runs one method on the values given.",
                request: """{ "inductanceH": 2.2e-6, "capacitanceF": 5.6e-11 }""",
                answer: """{ "figures": [ { "name": "resonance", "valueHz": 14339000, "text": "14.339 MHz", "from": "derived" } ] }""");
    }

    private static IResult Run(string method, JsonElement body)
    {
        if (WorksheetList.Find(method) is not { } sheet) return Answers.Problem([FieldMessage.Error("method", "not-found")]);
        if (body.ValueKind != JsonValueKind.Object) return Answers.Problem([FieldMessage.Error("", "field.needed")]);
        var values = sheet.Inputs.Select(i => (i.Name, Si: NumberOf(body, Property(i)))).Where(v => v.Si is not null).ToDictionary(v => v.Name, v => v.Si!.Value, StringComparer.Ordinal);
        return Answers.Of(Named(sheet, sheet.Run(values)), a => new { figures = Shapes.Of(a.Figures), verdict = a.VerdictCode is { } code ? new { code, text = Phrases.Say(code) } : null });
    }

    /// <summary>Faults name the property as the request does, with its unit.</summary>
    private static Outcome<T> Named<T>(Worksheet sheet, Outcome<T> outcome)
        where T : notnull => outcome.Succeeded
            ? outcome
            : Outcome<T>.Failure(outcome.Messages.Select(m => sheet.Inputs.FirstOrDefault(i => i.Name == m.Path) is { } input ? m with { Path = Property(input) } : m));

    private static JsonObject Shape(Worksheet sheet) => new()
    {
        ["method"] = sheet.Id,
        ["title"] = Phrases.Say($"worksheet.{sheet.Id}"),
        ["group"] = sheet.Group,
        ["inputs"] = new JsonArray([.. sheet.Inputs.Select(i => (JsonNode)new JsonObject { ["name"] = Property(i), ["default"] = i.DefaultSi })]),
    };

    private static string Property(WorksheetInput input)
    {
        var words = input.Name.Split('-');
        return words[0] + string.Concat(words.Skip(1).Select(w => char.ToUpperInvariant(w[0]) + w[1..])) + Shapes.UnitOf(input.Kind);
    }

    private static double? NumberOf(JsonElement body, string property) =>
        body.TryGetProperty(property, out var value) && value.ValueKind == JsonValueKind.Number ? value.GetDouble() : null;
}
