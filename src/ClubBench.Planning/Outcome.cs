namespace ClubBench.Planning;

/// <summary>How grave a message about an input field is.</summary>
public enum MessageSeverity
{
    /// <summary>The input is refused.</summary>
    Error,

    /// <summary>The input is taken; the person should look twice.</summary>
    Warning,

    /// <summary>A hint.</summary>
    Advice,
}

/// <summary>What is to be said about one input field. Words are rendered later from the code.</summary>
/// <param name="Path">Field path, e.g. <c>stages[2].parts[0].capacitanceF</c>; empty for the whole input.</param>
/// <param name="Code">Stable code, a key of the texts.</param>
/// <param name="Severity">How grave it is.</param>
/// <param name="Arguments">Values for the text, by name.</param>
public sealed record FieldMessage(string Path, string Code, MessageSeverity Severity, IReadOnlyDictionary<string, string> Arguments)
{
    /// <summary>A refusal of one field.</summary>
    public static FieldMessage Error(string path, string code, params (string Name, string Value)[] arguments) =>
        new(path, code, MessageSeverity.Error, arguments.ToDictionary(a => a.Name, a => a.Value, StringComparer.Ordinal));

    /// <summary>A warning about one field.</summary>
    public static FieldMessage Warning(string path, string code, params (string Name, string Value)[] arguments) =>
        new(path, code, MessageSeverity.Warning, arguments.ToDictionary(a => a.Name, a => a.Value, StringComparer.Ordinal));
}

/// <summary>A value, perhaps with warnings, or the messages that say why there is none. All issues are collected, not only the first.</summary>
/// <typeparam name="T">What a success carries.</typeparam>
public sealed class Outcome<T>
    where T : notnull
{
    private readonly T? _value;

    private Outcome(T? value, IReadOnlyList<FieldMessage> messages, bool succeeded) => (_value, Messages, Succeeded) = (value, messages, succeeded);

    /// <summary>Errors of a failure, or warnings beside a success.</summary>
    public IReadOnlyList<FieldMessage> Messages { get; }

    /// <summary>Whether there is a value.</summary>
    public bool Succeeded { get; }

    /// <summary>The value. Throws on a failure: look at <see cref="Succeeded"/> first.</summary>
    public T Value => Succeeded ? _value! : throw new InvalidOperationException("There is no value: " + string.Join("; ", Messages.Select(m => $"{m.Path} {m.Code}")));

    /// <summary>A success with optional warnings.</summary>
    public static Outcome<T> Success(T value, params IEnumerable<FieldMessage> warnings) => new(value, [.. warnings], true);

    /// <summary>A failure with at least one message.</summary>
    public static Outcome<T> Failure(params IEnumerable<FieldMessage> messages) => new(default, [.. messages], false);

    /// <summary>Success if none of the messages is an error, else failure.</summary>
    public static Outcome<T> From(Func<T> value, IReadOnlyList<FieldMessage> messages) =>
        messages.Any(m => m.Severity == MessageSeverity.Error) ? Failure(messages) : Success(value(), messages);

    /// <summary>Carries a success on; failures pass through.</summary>
    public Outcome<TOther> Then<TOther>(Func<T, TOther> next)
        where TOther : notnull =>
        Succeeded ? Outcome<TOther>.Success(next(_value!), Messages) : Outcome<TOther>.Failure(Messages);
}
