using System.Text.Json.Nodes;
using Microsoft.AspNetCore.OpenApi;
using Microsoft.OpenApi;

namespace ClubBench.Web.Api;

/// <summary>One example request and answer of an operation, shown in the description of the interface.</summary>
/// <param name="Request">Example body as JSON; null where there is none.</param>
/// <param name="Answer">Example answer, JSON unless another type is named; null where it is a file of bytes.</param>
/// <param name="AnswerType">Media type of the answer.</param>
internal sealed record ApiExample(string? Request, string? Answer, string AnswerType);

internal static class ApiExamples
{
    private const string Json = "application/json";

    /// <summary>Adds summary and example to an operation.</summary>
    public static RouteHandlerBuilder Described(this RouteHandlerBuilder builder, string name, string summary, string? request = null, string? answer = null, string answerType = Json) =>
        builder.WithName(name).WithSummary(summary).WithMetadata(new ApiExample(request, answer, answerType));

    /// <summary>Puts the examples into the document.</summary>
    public static Task Fill(OpenApiOperation operation, OpenApiOperationTransformerContext context, CancellationToken cancellation)
    {
        if (context.Description.ActionDescriptor.EndpointMetadata.OfType<ApiExample>().FirstOrDefault() is not { } example) return Task.CompletedTask;
        if (example.Request is { } request)
        {
            var body = operation.RequestBody as OpenApiRequestBody ?? new OpenApiRequestBody();
            operation.RequestBody = body;
            body.Content ??= new Dictionary<string, OpenApiMediaType>();
            Put(body.Content, Json, JsonNode.Parse(request));
        }

        if (example.Answer is { } answer)
        {
            operation.Responses ??= [];
            if (operation.Responses.FirstOrDefault(r => r.Key.StartsWith('2')).Value is not OpenApiResponse response) operation.Responses["200"] = response = new OpenApiResponse { Description = "OK" };
            response.Content ??= new Dictionary<string, OpenApiMediaType>();
            Put(response.Content, example.AnswerType, example.AnswerType == Json ? JsonNode.Parse(answer) : JsonValue.Create(answer));
        }

        return Task.CompletedTask;
    }

    private static void Put(IDictionary<string, OpenApiMediaType> content, string type, JsonNode? example)
    {
        if (!content.TryGetValue(type, out var media)) content[type] = media = new OpenApiMediaType();
        media.Example = example;
    }
}
