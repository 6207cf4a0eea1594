namespace ClubBench.Web.Texts;

/// <summary>Names the resource file with the words of door, bench, room, nights and club.</summary>
public sealed class NightTexts;
