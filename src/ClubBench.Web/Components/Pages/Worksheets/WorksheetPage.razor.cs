using ClubBench.Planning;
using ClubBench.Planning.Text;
using ClubBench.Planning.Worksheets;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.WebUtilities;

namespace ClubBench.Web.Components.Pages.Worksheets;

/// <summary>One method on its own page: fields from its inputs, results with working and source.</summary>
public partial class WorksheetPage
{
    private readonly Dictionary<string, string> _typed = new(StringComparer.Ordinal);
    private Worksheet? _sheet;
    private IReadOnlyList<FieldMessage> _messages = [];
    private WorksheetAnswer? _answer;

    private bool _isAsked;
    private bool _isRead;

    [Parameter]
    public string? Method { get; set; }

    [Inject]
    public required NavigationManager Navigation { get; set; }

    /// <summary>Nobody is told that a number is unfinished while still typing it.</summary>
    private IReadOnlyList<FieldMessage> Told => _isAsked || _isRead ? _messages : [];

    protected override void OnParametersSet()
    {
        if (_sheet?.Id == Method) return;
        (_sheet, _isAsked) = (WorksheetList.Find(Method ?? ""), false);
        _typed.Clear();
        var given = QueryHelpers.ParseQuery(new Uri(Navigation.Uri).Query);
        foreach (var input in _sheet?.Inputs ?? []) _typed[input.Name] = given.TryGetValue(input.Name, out var text) ? text.ToString() : QuantityText.Entry(input.Kind, input.DefaultSi).Number;
        if (_sheet is not null) Compute();
    }

    private void Take(string input, string typed)
    {
        (_typed[input], _isAsked) = (typed, false);
        Compute();
    }

    /// <summary>What is wrong is listed, and the address then holds the inputs for others to open.</summary>
    private void Ask()
    {
        Compute();
        _isAsked = true;
        Navigation.NavigateTo(QueryHelpers.AddQueryString($"/worksheets/{_sheet!.Id}", _typed.ToDictionary(t => t.Key, t => (string?)t.Value, StringComparer.Ordinal)), replace: true);
    }

    private void Compute()
    {
        var read = _sheet!.Inputs.Select(i => (i.Name, Read: QuantityText.Parse(_typed[i.Name], i.Kind, Unit(i), mayBeNegative: true, path: i.Name))).ToList();
        (_messages, _answer) = ([.. read.SelectMany(r => r.Read.Messages)], null);
        _isRead = _messages.Count == 0;
        if (!_isRead) return;
        var computed = _sheet.Run(read.ToDictionary(r => r.Name, r => r.Read.Value.Si, StringComparer.Ordinal));
        (_messages, _answer) = (computed.Messages, computed.Succeeded ? computed.Value : null);
    }

    /// <summary>A bare number is taken in the unit the default is written in.</summary>
    private static string? Unit(WorksheetInput input) => QuantityText.Entry(input.Kind, input.DefaultSi).Unit is { Length: > 0 } unit ? unit : null;

    private static string InputName(WorksheetInput input) => Phrases.Say($"worksheet-input.{input.Name}");

    private static string Title(Worksheet sheet) => Phrases.Say($"worksheet.{sheet.Id}");
}
