using ClubBench.Calculation.Bands;
using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Budgets;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.Plans;

/// <summary>Where a plan moves the kit.</summary>
/// <param name="BandName">Band name of the table, e.g. "20 m".</param>
/// <param name="Segment">Segment the rig shall cover as far as its scheme allows.</param>
/// <param name="Reference">Frequency the club meets on.</param>
/// <param name="Region">ITU region.</param>
/// <param name="Site">Noise category of the site.</param>
/// <param name="WantedPower">Output wanted at the antenna; null for a receiver.</param>
/// <param name="Pitch">Audio pitch a station is heard at.</param>
/// <param name="LimitSetId">Emission limit set.</param>
/// <param name="LimitsConfirmedBy">Who confirmed that it fits the licence; null while nobody has.</param>
/// <param name="WishMargin">Margin that ranks alternatives.</param>
public sealed record Target(
    string BandName,
    FrequencyRange Segment,
    Frequency Reference,
    ItuRegion Region,
    NoiseSite Site,
    Power? WantedPower,
    Frequency Pitch,
    string LimitSetId,
    string? LimitsConfirmedBy,
    Decibels WishMargin);

/// <summary>How hard a search tries.</summary>
public enum SearchEffort
{
    /// <summary>Bounded: symmetric, singles and stocked pairs. Inside the planner.</summary>
    Quick,

    /// <summary>The whole window, as a job.</summary>
    Thorough,
}

/// <summary>What a person chose for a stage.</summary>
/// <param name="Stage">Stage key.</param>
/// <param name="AlternativeId">Id of an alternative, or <see cref="Keep"/>, or <see cref="Accept"/>.</param>
/// <param name="Override">The stage as the person wants it; null to take the alternative as computed.</param>
/// <param name="Reason">Why.</param>
/// <param name="By">Who.</param>
public sealed record Choice(string Stage, string AlternativeId, StageDocument? Override = null, string? Reason = null, string By = "")
{
    /// <summary>Id that keeps the stage as it is.</summary>
    public const string Keep = "keep";

    /// <summary>Id that takes the planner's own choice and accepts what stays open there, with a reason.</summary>
    public const string Accept = "accept";
}

/// <summary>Everything a plan is made of. Same inputs, same plan.</summary>
/// <param name="Kit">The kit revision.</param>
/// <param name="Target">Where it goes.</param>
/// <param name="Choices">What people chose.</param>
/// <param name="Shelf">What the club has and may buy.</param>
/// <param name="Learnt">What readings taught.</param>
/// <param name="Effort">How hard to search.</param>
/// <param name="Seed">Seed of every yield.</param>
/// <param name="CalculationVersion">Version of the calculations.</param>
public sealed record PlanInputs(
    Kit Kit,
    Target Target,
    IReadOnlyList<Choice> Choices,
    Shelf Shelf,
    LearntValues Learnt,
    SearchEffort Effort,
    ulong Seed,
    string CalculationVersion);

/// <summary>One change of a part.</summary>
/// <param name="Designator">Place.</param>
/// <param name="Before">Part that leaves; null where a place was empty.</param>
/// <param name="After">Part that goes in; null where the place stays empty.</param>
public sealed record PartChange(string Designator, Part? Before, Part? After);

/// <summary>A way to make a stage do.</summary>
/// <param name="Id">Stable id, e.g. "rewind:T50-6".</param>
/// <param name="After">The stage with its new parts.</param>
/// <param name="Changes">What changes.</param>
/// <param name="Consequences">What it costs or brings.</param>
/// <param name="Figures">Figures that compare alternatives, the same names for all of one stage.</param>
/// <param name="WorstMargin">The smallest margin over everything asked.</param>
/// <param name="FitsPlaces">Whether every new part fits its place.</param>
/// <param name="InStock">Whether the club has every new part for one board.</param>
/// <param name="IsExhaustive">Whether the search behind it tried its whole window ("best"), or not ("best found").</param>
public sealed record Alternative(
    string Id,
    StageDocument After,
    IReadOnlyList<PartChange> Changes,
    IReadOnlyList<Finding> Consequences,
    IReadOnlyList<Figure> Figures,
    Figure WorstMargin,
    bool FitsPlaces,
    bool InStock,
    bool IsExhaustive = false);

/// <summary>Share of boards that meet their windows.</summary>
/// <param name="Share">Share of passing boards, 0 to 1.</param>
/// <param name="ShareLow">Lower end of the 95 % interval (Wilson).</param>
/// <param name="ShareHigh">Upper end of that interval.</param>
/// <param name="Trials">Boards drawn.</param>
/// <param name="Seed">Seed of the draw.</param>
/// <param name="Requirements">What counts as passing.</param>
/// <param name="Tolerances">What was drawn.</param>
public sealed record BoardYield(double Share, double ShareLow, double ShareHigh, int Trials, ulong Seed, IReadOnlyList<Figure> Requirements, IReadOnlyList<Figure> Tolerances);

/// <summary>What a plan says of one stage.</summary>
/// <param name="Stage">Stage key.</param>
/// <param name="Action">The action.</param>
/// <param name="AlternativeId">The alternative taken; <see cref="Choice.Keep"/> where nothing changes.</param>
/// <param name="Before">The kit's stage.</param>
/// <param name="After">The planned stage; the same document where nothing changes.</param>
/// <param name="Changes">Parts that change.</param>
/// <param name="Alternatives">What else would do, best first.</param>
/// <param name="WhyChanged">Findings about the kept stage on the target: why it changes, or must be measured.</param>
/// <param name="Findings">What the planned stage still has to say.</param>
/// <param name="Figures">The planned stage's figures.</param>
/// <param name="KeptFigures">The kept stage's figures on the target.</param>
/// <param name="Expected">Expected readings.</param>
/// <param name="Yield">Yield of the chosen alternative; null where spread decides nothing.</param>
/// <param name="Drawing">Schematic with the changes marked.</param>
/// <param name="Plots">Plots old, new, limit.</param>
/// <param name="Card">What the build card holds.</param>
public sealed record StagePlan(
    string Stage,
    StageAction Action,
    string AlternativeId,
    StageDocument Before,
    StageDocument After,
    IReadOnlyList<PartChange> Changes,
    IReadOnlyList<Alternative> Alternatives,
    IReadOnlyList<Finding> WhyChanged,
    IReadOnlyList<Finding> Findings,
    IReadOnlyList<Figure> Figures,
    IReadOnlyList<Figure> KeptFigures,
    IReadOnlyList<ExpectedReading> Expected,
    BoardYield? Yield,
    Schematic Drawing,
    IReadOnlyList<Plot> Plots,
    CardContent Card);

/// <summary>Whether the move is worth it.</summary>
public enum Verdict
{
    /// <summary>Go.</summary>
    WorthIt,

    /// <summary>Go with care.</summary>
    WithCare,

    /// <summary>Another design serves better.</summary>
    LeaveIt,
}

/// <summary>Whether a move is worth the evenings, and why.</summary>
/// <param name="Verdict">The verdict.</param>
/// <param name="Effort">Effort as a number that orders moves: parts to change, octaves moved (up counts double), missing drive; common practice.</param>
/// <param name="Reasons">Reasons, weightiest first, at least one.</param>
public sealed record Judgement(Verdict Verdict, double Effort, IReadOnlyList<Finding> Reasons);

/// <summary>A computed plan.</summary>
/// <param name="Inputs">What it was made of.</param>
/// <param name="Stages">One entry per stage, in the kit's order.</param>
/// <param name="Budgets">The chain's sums.</param>
/// <param name="OpenItems">What is not settled; empty before a plan can be issued.</param>
/// <param name="Judgement">Whether it is worth it.</param>
public sealed record Plan(
    PlanInputs Inputs,
    IReadOnlyList<StagePlan> Stages,
    IReadOnlyList<Budget> Budgets,
    IReadOnlyList<OpenItem> OpenItems,
    Judgement Judgement)
{
    /// <summary>The plan of one stage. Throws when there is none.</summary>
    public StagePlan Stage(string key) => Stages.FirstOrDefault(s => s.Stage == key) ?? throw new KeyNotFoundException($"The plan has no stage {key}.");
}
