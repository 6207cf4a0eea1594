namespace ClubBench.Club.UseCases;

/// <summary>Result of a use case that has nothing to tell but that it was done.</summary>
public readonly record struct Done;
