using ClubBench.Planning;
using ClubBench.Planning.Text;
using ClubBench.Planning.Worksheets;
using Microsoft.AspNetCore.Components;

namespace ClubBench.Web.Components.Pages.Worksheets;

/// <summary>One method on its own page: fields from its inputs, results with working and source.</summary>
public partial class WorksheetPage
{
    private readonly Dictionary<string, string> _typed = new(StringComparer.Ordinal);
    private Worksheet? _sheet;
    private IReadOnlyList<FieldMessage> _messages = [];
    private WorksheetAnswer? _answer;

    [Parameter]
    public string? Method { get; set; }

    protected override void OnParametersSet()
    {
        if (_sheet?.Id == Method) return;
        (_sheet, _messages, _answer) = (WorksheetList.Find(Method ?? ""), [], null);
        _typed.Clear();
        foreach (var input in _sheet?.Inputs ?? []) _typed[input.Name] = QuantityText.Split(input.Kind, input.DefaultSi).Number;
    }

    private void Compute()
    {
        var read = _sheet!.Inputs.Select(i => (i.Name, Read: QuantityText.Parse(_typed[i.Name], i.Kind, Unit(i), mayBeNegative: true, path: i.Name))).ToList();
        _messages = [.. read.SelectMany(r => r.Read.Messages)];
        _answer = null;
        if (_messages.Count > 0) return;
        var computed = _sheet.Run(read.ToDictionary(r => r.Name, r => r.Read.Value.Si, StringComparer.Ordinal));
        (_messages, _answer) = (computed.Messages, computed.Succeeded ? computed.Value : null);
    }

    /// <summary>A bare number is taken in the unit the default is written in.</summary>
    private static string? Unit(WorksheetInput input) => QuantityText.Split(input.Kind, input.DefaultSi).Unit is { Length: > 0 } unit ? unit : null;

    private static string InputName(WorksheetInput input) => Phrases.Say($"worksheet-input.{input.Name}");

    private static string Title(Worksheet sheet) => Phrases.Say($"worksheet.{sheet.Id}");
}
