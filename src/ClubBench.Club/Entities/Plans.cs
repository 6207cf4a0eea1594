using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;

namespace ClubBench.Club.Entities;

/// <summary>How far a plan revision has got.</summary>
public enum PlanState
{
    Draft,

    /// <summary>Tried on one board.</summary>
    Tried,

    Issued,

    Withdrawn,
}

/// <summary>A plan over all its revisions.</summary>
public sealed class StoredPlan : EditableRow
{
    public Guid KitId { get; init; }

    public required string Name { get; set; }

    /// <summary>Band it goes to, as in the band table.</summary>
    public required string BandName { get; set; }

    public int NewestRevision { get; set; }

    /// <summary>Newest revision that was issued; null while none was.</summary>
    public int? IssuedRevision { get; set; }

    /// <summary>The revision boards are built by: the issued one, else the newest.</summary>
    public int RevisionInForce => IssuedRevision ?? NewestRevision;
}

/// <summary>One computed revision of a plan with everything it was made of. Only its state moves.</summary>
public sealed class PlanRevision : EditableRow
{
    public Guid PlanId { get; init; }

    public int Revision { get; init; }

    public int KitRevision { get; init; }

    public required string InputsJson { get; init; }

    public required string OutputsJson { get; init; }

    public required string CalculationVersion { get; init; }

    /// <summary>Hash of the outputs.</summary>
    public required string Hash { get; init; }

    public PlanState State { get; set; }

    public int OpenItems { get; init; }

    public Verdict Judgement { get; init; }

    public DateTime AtUtc { get; init; }

    public Guid By { get; init; }
}

/// <summary>The build card of a stage. Its number counts changes of content; the same content keeps its number.</summary>
public sealed class Card : Row
{
    public Guid PlanId { get; init; }

    public required string Stage { get; init; }

    public int Number { get; init; }

    public required string ContentHash { get; init; }

    public required string ContentJson { get; init; }

    /// <summary>First plan revision with this content.</summary>
    public int FirstPlanRevision { get; init; }
}

/// <summary>One expected reading of a plan revision, for questions over many boards.</summary>
public sealed class ExpectedReadingRow : Row
{
    public Guid PlanId { get; init; }

    public int PlanRevision { get; init; }

    public required string Stage { get; init; }

    public required string Point { get; init; }

    public QuantityKind Kind { get; init; }

    public double NominalSi { get; init; }

    public double LowSi { get; init; }

    public double HighSi { get; init; }

    public WindowSides Sides { get; init; }
}

/// <summary>A card that was printed, and for which board.</summary>
public sealed class PrintLogEntry : Row
{
    public Guid CardId { get; init; }

    public Guid? BoardId { get; init; }

    public int Copies { get; init; }

    public DateTime AtUtc { get; init; }

    public Guid By { get; init; }
}
