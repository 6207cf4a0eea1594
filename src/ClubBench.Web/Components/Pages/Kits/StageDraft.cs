using System.Globalization;
using ClubBench.Planning;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Text;

namespace ClubBench.Web.Components.Pages.Kits;

/// <summary>One value of one part while somebody types it.</summary>
public sealed class ValueDraft(string part, string name, QuantityKind kind, string? unit, bool needed, string shown, double? si)
{
    private string? _typed;

    public string Id => $"{part}-{name}";

    public string Part => part;

    public string Name => name;

    public QuantityKind Kind => kind;

    public string? Unit => unit;

    public bool Needed => needed;

    /// <summary>The value with all its digits while nobody has typed over what is shown of it.</summary>
    public double? Untouched => Typed == shown ? si : null;

    public string Typed
    {
        get => _typed ?? shown;
        set => _typed = value;
    }
}

/// <summary>A stage while somebody edits its values. Fields come from the kind's roles, so every kind is edited alike.</summary>
public sealed class StageDraft
{
    private readonly List<ValueDraft> _fields;

    public StageDraft(Kit kit, string key)
    {
        Kit = kit;
        Stage = kit.Stage(key);
        var description = StageKindList.Get(Stage.Kind).Description;
        _fields = [.. Stage.Parts.SelectMany(p => FieldsOf(p, description.Role(p.Role)))];
    }

    public Kit Kit { get; }

    public StageDocument Stage { get; }

    public IEnumerable<ValueDraft> FieldsOf(Part part) => _fields.Where(f => f.Part == part.Designator);

    /// <summary>Id of the field a message belongs to.</summary>
    public string? FieldOf(FieldMessage message) => _fields.FirstOrDefault(f => f.Id == message.Path)?.Id;

    /// <summary>The stage with the typed values, or a message for each that cannot be read. An empty field takes an optional value away.</summary>
    public Outcome<StageDocument> Read()
    {
        var messages = new List<FieldMessage>();
        var parts = Stage.Parts.Select(p => p.With(FieldsOf(p).Select(f => (f.Name, Read(f, messages))).ToList())).ToList();
        return Outcome<StageDocument>.From(() => Stage with { Parts = parts }, messages);
    }

    private static double? Read(ValueDraft field, List<FieldMessage> messages)
    {
        if (field.Untouched is { } si) return si;
        if (field.Typed.Trim().Length == 0 && !field.Needed) return null;
        var read = QuantityText.Parse(field.Typed, field.Kind, field.Unit, path: field.Id);
        messages.AddRange(read.Messages);
        return read.Succeeded ? read.Value.Si : null;
    }

    private static IEnumerable<ValueDraft> FieldsOf(Part part, PartRole? role) =>
        part.ValuesSi.Keys.Union(role?.Values ?? [], StringComparer.Ordinal).Select(name =>
        {
            var kind = KindOf(name);
            var written = part.Value(name) is { } si ? QuantityText.Entry(kind, si) : new QuantityParts("", QuantityUnits.Of(kind)[0].Symbol);
            return new ValueDraft(part.Designator, name, kind, written.Unit.Length == 0 ? null : written.Unit, role?.Values.Contains(name, StringComparer.Ordinal) ?? false, written.Number, part.Value(name));
        });

    /// <summary>The unit at the end of a value's name says what it measures.</summary>
    private static QuantityKind KindOf(string name) => name switch
    {
        PartValue.Turns or PartValue.LinkTurns => QuantityKind.Count,
        PartValue.InductanceFactor => QuantityKind.InductanceFactor,
        _ when name.EndsWith("Relative", StringComparison.Ordinal) => QuantityKind.Ratio,
        _ when name.EndsWith("Hz", StringComparison.Ordinal) => QuantityKind.Frequency,
        _ when name.EndsWith("Ohm", StringComparison.Ordinal) => QuantityKind.Resistance,
        _ when name.EndsWith('F') => QuantityKind.Capacitance,
        _ when name.EndsWith('H') => QuantityKind.Inductance,
        _ when name.EndsWith('V') => QuantityKind.Voltage,
        _ when name.EndsWith('A') => QuantityKind.Current,
        _ when name.EndsWith('M') => QuantityKind.Length,
        _ => QuantityKind.Number,
    };
}
