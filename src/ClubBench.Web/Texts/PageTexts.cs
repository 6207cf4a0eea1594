namespace ClubBench.Web.Texts;

/// <summary>Names the resource file with the words of frame and planning pages.</summary>
public sealed class PageTexts;
