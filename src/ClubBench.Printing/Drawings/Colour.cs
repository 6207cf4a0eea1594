namespace ClubBench.Printing.Drawings;

/// <summary>Colours of drawings: the page's variable, and what stands for it where there is no page.</summary>
internal static class Colour
{
    public const string None = "none";
    public const string Ink = "var(--ink,#17212A)";
    public const string Ink2 = "var(--ink2,#47545C)";
    public const string Old = "var(--old,#5C6760)";
    public const string Line = "var(--line,#6F7A73)";
    public const string Rule = "var(--rule,#C6CEC6)";
    public const string Grid = "var(--grid,#DDE4DD)";
    public const string Sheet = "var(--sheet,#FBFBF7)";
    public const string Change = "var(--change,#00578A)";
    public const string Limit = "var(--rethink,#A23A00)";
    public const string Wire = "var(--wire,#A6541B)";
    public const string Wish = "var(--check,#7A4F00)";
}
