using System.Globalization;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Text;

namespace ClubBench.Web.Components.Controls;

/// <summary>The words about the stages of one kit: each stage speaks through its kind's texts.</summary>
public sealed class StageWords(Kit kit)
{
    public Kit Kit => kit;

    public string? KindOf(string stage) => kit.Stages.FirstOrDefault(s => s.Key == stage)?.Kind;

    public string Title(string stage) => KindOf(stage) is { } kind ? Phrases.Say("title", kind) : stage;

    public string ShortTitle(string stage) => KindOf(stage) is { } kind && Phrases.Has("title.short", kind) ? Phrases.Say("title.short", kind) : Title(stage);

    public string Say(Finding finding) => Phrases.Say(finding, KindOf(finding.Stage));

    public string NameOf(Figure figure, string stage) => Phrases.NameOf(figure, KindOf(stage));

    public string Role(string stage, string role) => Phrases.Say($"role.{role}", KindOf(stage));

    public DependsOn DependsOn(string stage) => Description(stage)?.DependsOn ?? ClubBench.Planning.StageKinds.DependsOn.Nothing;

    /// <summary>A part as it is written in a table, for example "15 t T37-6".</summary>
    public string Part(string stage, Part part) => PartText.Short(part, Description(stage)?.Role(part.Role)?.Class ?? PartClass.Other, CultureInfo.CurrentCulture);

    private StageDescription? Description(string stage) => KindOf(stage) is { } kind ? StageKindList.Find(kind)?.Description : null;
}
