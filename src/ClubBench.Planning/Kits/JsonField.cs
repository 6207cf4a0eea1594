using System.Text.Json;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Kits;

/// <summary>
/// One field of a document being read. Faults go to the common list with the field's path and a stand-in value is returned, so that reading goes on
/// and every fault is found. What is missing below a missing field is not told again.
/// </summary>
internal sealed class JsonField
{
    private readonly JsonElement? _value;
    private readonly List<FieldMessage> _messages;
    private readonly bool _isBelowAFault;

    private JsonField(JsonElement? value, string path, string name, List<FieldMessage> messages, bool isBelowAFault) =>
        (_value, Path, Name, _messages, _isBelowAFault) = (value, path, name, messages, isBelowAFault);

    public string Path { get; }

    public string Name { get; }

    public bool IsGiven => _value is { ValueKind: not JsonValueKind.Null };

    public bool IsObject => _value is { ValueKind: JsonValueKind.Object };

    public JsonField this[string name] =>
        new(IsObject && _value!.Value.TryGetProperty(name, out var child) ? child : null, Path.Length == 0 ? name : $"{Path}.{name}", name, _messages, !IsObject);

    public static JsonField Root(JsonElement root, List<FieldMessage> messages) => new(root, "", "", messages, false);

    public void Fail(string code, params (string Name, string Value)[] arguments)
    {
        if (!_isBelowAFault) _messages.Add(FieldMessage.Error(Path, code, [("name", Name), .. arguments]));
    }

    /// <summary>Whether this is an object with known properties only, each of them once. Its absence or other form is a fault.</summary>
    public JsonField Knows(params ReadOnlySpan<string> names)
    {
        if (!IsObject) Fail(IsGiven ? "kit.not-an-object" : "kit.missing");
        var seen = new HashSet<string>(StringComparer.Ordinal);
        foreach (var field in Properties())
            if (!seen.Add(field.Name)) field.Fail("kit.property-twice");
            else if (!names.Contains(field.Name)) field.Fail("kit.property-unknown");
        return this;
    }

    public IEnumerable<JsonField> Properties() =>
        IsObject ? _value!.Value.EnumerateObject().Select(p => new JsonField(p.Value, Path.Length == 0 ? p.Name : $"{Path}.{p.Name}", p.Name, _messages, false)) : [];

    public IReadOnlyList<JsonField> Items()
    {
        if (_value is { ValueKind: JsonValueKind.Array } list) return [.. list.EnumerateArray().Select((v, i) => new JsonField(v, $"{Path}[{i}]", Name, _messages, false))];
        Fail(IsGiven ? "kit.not-a-list" : "kit.missing");
        return [];
    }

    public string Text()
    {
        var text = OptionalText();
        if (text.Length == 0 && (!IsGiven || _value is { ValueKind: JsonValueKind.String })) Fail(IsGiven ? "kit.empty" : "kit.missing");
        return text;
    }

    public string OptionalText()
    {
        if (_value is { ValueKind: JsonValueKind.String } text) return text.GetString()!;
        if (IsGiven) Fail("kit.not-a-text");
        return "";
    }

    public int WholeNumber()
    {
        if (_value is { ValueKind: JsonValueKind.Number } number && number.TryGetInt32(out var whole)) return whole;
        Fail(IsGiven ? "kit.not-whole" : "kit.missing");
        return 0;
    }

    /// <summary>A number in the unit its name ends in, or text with a unit. Null where it is missing or faulty.</summary>
    public double? OptionalNumber()
    {
        if (!IsGiven) return null;
        if (_value is { ValueKind: JsonValueKind.Number } number && number.TryGetDouble(out var value) && double.IsFinite(value)) return value;
        if (_value is not { ValueKind: JsonValueKind.String } text || UnitSuffix.KindOf(Name) is not { } kind)
        {
            Fail("kit.not-a-number");
            return null;
        }

        var parsed = QuantityText.Parse(text.GetString(), kind, mayBeNegative: true, path: Path);
        _messages.AddRange(parsed.Messages);
        return parsed.Succeeded ? parsed.Value.Si : null;
    }

    /// <summary>A number above zero; the stand-in is one.</summary>
    public double Positive()
    {
        if (OptionalPositive() is { } value) return value;
        if (!IsGiven) Fail("kit.missing");
        return 1;
    }

    public double? OptionalPositive()
    {
        var value = OptionalNumber();
        if (value is null or > 0) return value;
        Fail("kit.not-positive");
        return null;
    }

    /// <summary>A member of an enumeration by its word in small letters with dashes.</summary>
    public T Word<T>()
        where T : struct, Enum
    {
        var text = Text();
        var known = Enum.GetValues<T>();
        foreach (var member in known)
            if (Placeholders.Dashed(member.ToString()) == text) return member;
        if (text.Length > 0) Fail("kit.word-unknown", ("word", text), ("known", string.Join(", ", known.Select(m => Placeholders.Dashed(m.ToString())))));
        return default;
    }
}
