namespace ClubBench.Printing.Drawings;

/// <summary>A finished drawing: one SVG for light and dark screens and for paper.</summary>
/// <param name="Svg">SVG text with <c>role="img"</c>, a title and a one-sentence description.</param>
/// <param name="Width">Its own width in CSS pixels.</param>
/// <param name="Height">Its own height.</param>
/// <param name="Description">The sentence that says what it shows.</param>
public sealed record Drawing(string Svg, float Width, float Height, string Description);
