using System.Text.Json.Serialization;
using ClubBench.Planning;
using ClubBench.Planning.Text;
using Microsoft.AspNetCore.Mvc;

namespace ClubBench.Web.Api;

/// <summary>A list of the programming interface.</summary>
public sealed record Listing<T>(IReadOnlyList<T> Items);

/// <summary>What is wrong with one field.</summary>
/// <param name="Path">Field path; empty for the whole request.</param>
/// <param name="Code">Stable code.</param>
/// <param name="Message">What is wrong and what would be right.</param>
/// <param name="Severity">Error, warning or advice.</param>
public sealed record FieldProblem(string Path, string Code, string Message, [property: JsonConverter(typeof(JsonStringEnumConverter))] MessageSeverity Severity);

/// <summary>Outcomes of use cases as HTTP answers; refusals as problem details (RFC 9457) with field paths.</summary>
internal static class Answers
{
    /// <summary>The value shaped for the answer, or the problem.</summary>
    public static IResult Of<T, TShape>(Outcome<T> outcome, Func<T, TShape> shape)
        where T : notnull => outcome.Succeeded ? Results.Json(shape(outcome.Value), ApiJson.Options) : Problem(outcome.Messages);

    /// <summary>201 with the address of what was made, or the problem.</summary>
    public static IResult Made<T, TShape>(Outcome<T> outcome, Func<T, string> address, Func<T, TShape> shape)
        where T : notnull => outcome.Succeeded ? new MadeResult<TShape>(address(outcome.Value), shape(outcome.Value)) : Problem(outcome.Messages);

    /// <summary>The messages as problem details.</summary>
    public static IResult Problem(IReadOnlyList<FieldMessage> messages)
    {
        var status = StatusOf(messages);
        return Results.Problem(new ProblemDetails
        {
            Status = status,
            Title = Title(status),
            Detail = messages.Count > 0 ? Words(messages[0]) : null,
            Extensions = { ["errors"] = messages.Select(m => new FieldProblem(m.Path, m.Code, Words(m), m.Severity)).ToList() },
        });
    }

    /// <summary>A message in words; the code where nobody has written words for it.</summary>
    public static string Words(FieldMessage message) => Phrases.Has(message.Code) ? Phrases.Say(message) : message.Code;

    private static int StatusOf(IReadOnlyList<FieldMessage> messages) => messages.FirstOrDefault(m => m.Severity == MessageSeverity.Error)?.Code switch
    {
        { } c when c.StartsWith("refused.", StringComparison.Ordinal) => StatusCodes.Status403Forbidden,
        { } c when c.StartsWith("conflict.", StringComparison.Ordinal) => StatusCodes.Status409Conflict,
        "not-found" => StatusCodes.Status404NotFound,
        _ => StatusCodes.Status400BadRequest,
    };

    private static string Title(int status) => status switch
    {
        StatusCodes.Status403Forbidden => "Not allowed",
        StatusCodes.Status404NotFound => "Not found",
        StatusCodes.Status409Conflict => "Somebody saved in between",
        _ => "The request needs another look",
    };
}

/// <summary>201 with body and address.</summary>
internal sealed class MadeResult<T>(string address, T value) : IResult
{
    public Task ExecuteAsync(HttpContext httpContext)
    {
        httpContext.Response.StatusCode = StatusCodes.Status201Created;
        httpContext.Response.Headers.Location = address;
        return httpContext.Response.WriteAsJsonAsync(value, ApiJson.Options);
    }
}
