using System.Text.Json.Serialization;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.Cards;

/// <summary>A line of text by code, with its figures.</summary>
/// <param name="Code">Text code.</param>
/// <param name="Figures">Figures for the text.</param>
public record Line(string Code, IReadOnlyList<Figure> Figures)
{
    /// <summary>A line with figures.</summary>
    public static Line Of(string code, params IReadOnlyList<Figure> figures) => new(code, figures);
}

/// <summary>Steps of a card at which something can happen to somebody.</summary>
public enum CardStep
{
    /// <summary>Looking over the board and switching the supply on.</summary>
    BeforePower,

    /// <summary>Taking the readings.</summary>
    Measure,
}

/// <summary>A danger, told at the step where it arises.</summary>
/// <param name="Code">Text code.</param>
/// <param name="Figures">Figures for the text.</param>
/// <param name="At">The step; null where it holds for the whole stage, as on cards from before steps were told apart.</param>
public sealed record Caution(string Code, IReadOnlyList<Figure> Figures, CardStep? At) : Line(Code, Figures)
{
    /// <summary>A caution for the moment before the supply comes on.</summary>
    public static Caution BeforePower(string code) => new(code, [], CardStep.BeforePower);

    /// <summary>A caution for taking the readings.</summary>
    public static Caution Measuring(string code) => new(code, [], CardStep.Measure);
}

/// <summary>What a stage kind adds to the card besides parts and readings.</summary>
/// <param name="BeforePower">Checks before power, in order.</param>
/// <param name="SupplyLimit">Current limit for the first power-up; null where the stage draws none of its own.</param>
/// <param name="IfOutside">What to do when a reading is outside, cheapest first; three at most.</param>
/// <param name="Cautions">Dangers of this stage, each with its step.</param>
/// <param name="SetUpAll">Set-up that holds for all readings of the card; null for none.</param>
public sealed record CardNotes(IReadOnlyList<Line> BeforePower, Figure? SupplyLimit, IReadOnlyList<Line> IfOutside, IReadOnlyList<Caution> Cautions, Line? SetUpAll)
{
    /// <summary>Dangers of one step; null those of the whole stage.</summary>
    public IReadOnlyList<Caution> CautionsAt(CardStep? step) => [.. Cautions.Where(c => c.At == step)];
}

/// <summary>One row of the fitting list: equal parts of one card stand together.</summary>
/// <param name="Designators">Places, in order.</param>
/// <param name="Part">The part that goes in (values of one place).</param>
/// <param name="MarkingOnPart">What stands on the part, piece by piece ("271", "yellow core"); empty where unknown.</param>
/// <param name="PiecesPerPlace">Pieces in one place (2 for a parallel pair).</param>
/// <param name="IsTuned">Whether only low-loss parts may go here.</param>
/// <param name="Pocket">Compartment of the bag: a, b, c.</param>
public sealed record FittingRow(IReadOnlyList<string> Designators, Part Part, IReadOnlyList<string> MarkingOnPart, int PiecesPerPlace, bool IsTuned, string Pocket)
{
    /// <summary>Whether to say that only this type may go in; of a coil the core says so itself.</summary>
    [JsonIgnore]
    public bool AsksForItsType => IsTuned && Part.Value(PartValue.Turns) is null && Part.Type.Length > 0;
}

/// <summary>One winding to make.</summary>
/// <param name="Designator">Coil.</param>
/// <param name="Core">Core designation.</param>
/// <param name="Colour">Paint colour.</param>
/// <param name="Turns">Turns as whole passes through the hole.</param>
/// <param name="LinkTurns">Turns of the link; null without one.</param>
/// <param name="WireDiameter">Bare wire diameter.</param>
/// <param name="CutLength">Wire to cut, rounded up.</param>
/// <param name="LinkCutLength">Wire to cut for the link; null without one.</param>
/// <param name="Low">Lower end of the inductance window.</param>
/// <param name="High">Upper end.</param>
public sealed record WindingRow(string Designator, string Core, string Colour, int Turns, int? LinkTurns, Figure WireDiameter, Figure CutLength, Figure? LinkCutLength, Figure? Low, Figure? High);

/// <summary>What a build card holds: codes and figures, no words, so that it can be printed again with the same figures.</summary>
/// <param name="Stage">Stage key.</param>
/// <param name="Kind">Stage kind id, for its words.</param>
/// <param name="Action">What the plan says.</param>
/// <param name="Why">Why it changed or must be measured; null where it is kept.</param>
/// <param name="Drawing">Schematic with the changes marked.</param>
/// <param name="Remove">Parts that leave the board.</param>
/// <param name="Fit">Parts to fit, in fitting order.</param>
/// <param name="Windings">Windings to make.</param>
/// <param name="Notes">Checks, ladder, cautions.</param>
/// <param name="Measure">Readings to take.</param>
/// <param name="Substitute">What may go in instead; null where the plan knows of nothing.</param>
/// <param name="Response">Response old and new against the limit; null where the stage has none.</param>
public sealed record CardContent(
    string Stage,
    string Kind,
    StageAction Action,
    Finding? Why,
    Schematic Drawing,
    IReadOnlyList<Part> Remove,
    IReadOnlyList<FittingRow> Fit,
    IReadOnlyList<WindingRow> Windings,
    CardNotes Notes,
    IReadOnlyList<ExpectedReading> Measure,
    Substitute? Substitute = null,
    Plot? Response = null);
