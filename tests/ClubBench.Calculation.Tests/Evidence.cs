namespace ClubBench.Calculation.Tests;

/// <summary>Where the expected value of a test comes from.</summary>
public enum EvidenceKind
{
    /// <summary>A value printed in a publication, standard or data sheet, with source and locator.</summary>
    PublishedValue,

    /// <summary>A case simple enough for a formula on one line: zero, infinity, resonance, a matched or lossless circuit, direction and proportion in the limit.</summary>
    ClosedFormLimit,

    /// <summary>A relation that must hold between results whatever the input: reciprocity, power balance, scaling, monotony, symmetry.</summary>
    Identity,

    /// <summary>Forth and back: design then analysis, writing then reading, advice then measuring again.</summary>
    RoundTrip,

    /// <summary>The same question answered another way by other code: a script of tests, nodal analysis, quadrature, brute force.</summary>
    IndependentRecomputation,
}

/// <summary>Says for which method of calculation a test is evidence, and of what kind.</summary>
[AttributeUsage(AttributeTargets.Method, AllowMultiple = true)]
public sealed class EvidenceAttribute(Type method, EvidenceKind kind) : Attribute
{
    public Type Method { get; } = method;

    public EvidenceKind Kind { get; } = kind;
}
