using ClubBench.Planning.Advising;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.Cards;

/// <summary>A line of text by code, with its figures.</summary>
/// <param name="Code">Text code.</param>
/// <param name="Figures">Figures for the text.</param>
public sealed record Line(string Code, IReadOnlyList<Figure> Figures)
{
    /// <summary>A line with figures.</summary>
    public static Line Of(string code, params IReadOnlyList<Figure> figures) => new(code, figures);
}

/// <summary>What a stage kind adds to the card besides parts and readings.</summary>
/// <param name="BeforePower">Checks before power, in order.</param>
/// <param name="SupplyLimit">Current limit for the first power-up; null where the stage draws none of its own.</param>
/// <param name="IfOutside">What to do when a reading is outside, cheapest first; three at most.</param>
/// <param name="Cautions">Dangers of this stage.</param>
/// <param name="SetUpAll">Set-up that holds for all readings of the card; null for none.</param>
public sealed record CardNotes(IReadOnlyList<Line> BeforePower, Figure? SupplyLimit, IReadOnlyList<Line> IfOutside, IReadOnlyList<Line> Cautions, Line? SetUpAll);

/// <summary>One row of the fitting list: equal parts of one card stand together.</summary>
/// <param name="Designators">Places, in order.</param>
/// <param name="Part">The part that goes in (values of one place).</param>
/// <param name="MarkingOnPart">What stands on the part, piece by piece ("271", "yellow core"); empty where unknown.</param>
/// <param name="PiecesPerPlace">Pieces in one place (2 for a parallel pair).</param>
/// <param name="IsTuned">Whether only low-loss parts may go here.</param>
/// <param name="Pocket">Compartment of the bag: a, b, c.</param>
public sealed record FittingRow(IReadOnlyList<string> Designators, Part Part, IReadOnlyList<string> MarkingOnPart, int PiecesPerPlace, bool IsTuned, string Pocket);

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
    IReadOnlyList<ExpectedReading> Measure);
