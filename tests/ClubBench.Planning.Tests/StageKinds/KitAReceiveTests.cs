using System.Globalization;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.Tests.Builders;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Tests.StageKinds;

/// <summary>What holds for all receive, audio and supply stages of the demonstration kit.</summary>
public class KitAReceiveTests
{
    private static readonly string[] Keys = ["A6", "A7", "A8", "A9", "A10", "A11", "A12"];

    public static TheoryData<string> Stages => [.. Keys];

    public static TheoryData<string, string, double, string, double> Recomputed
    {
        get
        {
            var data = new TheoryData<string, string, double, string, double>();
            foreach (var c in File.ReadLines(Path.Combine(AppContext.BaseDirectory, "ReferenceValues", "kit_a_receive.csv")).Skip(1).Select(l => l.Split(',')))
                data.Add(c[0], c[1], double.Parse(c[2], CultureInfo.InvariantCulture), c[3], double.Parse(c[4], CultureInfo.InvariantCulture));
            return data;
        }
    }

    [Theory]
    [MemberData(nameof(Recomputed))]
    public void Figure_OneInputMoved_AgreesWithTheSecondRoute(string key, string moved, double factor, string figure, double expected)
    {
        var stage = Quern.Moved(Quern.Stage(key), moved, factor);

        Assert.Equal(expected, Quern.Figure(stage, figure, Places.ThirtyMetres), 1e-5 * Math.Abs(expected));
    }

    [Theory]
    [MemberData(nameof(Stages))]
    public void Validate_KitAsPublished_IsSilent(string key) =>
        Assert.Empty(Quern.KindOf(Quern.Stage(key)).Validate(Quern.Stage(key), "stage"));

    [Theory]
    [MemberData(nameof(Stages))]
    public void Judge_OwnBand_AsksForNothing(string key) => Assert.Empty(Quern.Judge(Quern.Stage(key), Places.ThirtyMetres));

    [Fact]
    public void BackCheck_WholeKit_NoReceiveStageMustChange()
    {
        var check = BackCheck.Of(DemoKits.QuernThirty, LearntValues.None);

        Assert.All(check.Stages.Where(s => Keys.Contains(s.Stage)), s => Assert.DoesNotContain(s.Findings, f => f.AtLeast >= StageAction.Change && !f.Code.StartsWith("budget.", StringComparison.Ordinal)));
    }

    [Theory]
    [InlineData(1.83)]
    [InlineData(7.03)]
    [InlineData(14.06)]
    [InlineData(28.06)]
    public void Judge_BroadbandAndAudioStages_StayOnEveryBand(double megahertz)
    {
        var there = Places.On(megahertz, megahertz + 0.01, megahertz);

        Assert.All(["A8", "A9", "A10", "A11", "A12"], key => Assert.Empty(Quern.Judge(Quern.Stage(key), there)));
    }

    [Theory]
    [MemberData(nameof(Stages))]
    public void Figures_All_HaveNamesAndMethodsInWords(string key)
    {
        var stage = Quern.Stage(key);
        var figures = Quern.KindOf(stage).Model(stage, Places.ThirtyMetres).Figures;

        Assert.All(figures.Concat(figures.SelectMany(f => f.Working?.Inputs ?? [])), f => Assert.True(Phrases.Has("figure." + f.Name, stage.Kind), f.Name));
        Assert.All(figures.Where(f => f.Working is not null), f => Assert.True(Phrases.Has("method." + f.Working!.MethodId, stage.Kind), f.Working!.MethodId));
    }

    [Theory]
    [MemberData(nameof(Stages))]
    public void Description_All_IsInWords(string key)
    {
        var stage = Quern.Stage(key);
        var description = Quern.KindOf(stage).Description;
        string[] codes =
        [
            "title", "title.short", "about",
            .. description.Ports.Select(p => "port." + p.Name), .. description.Roles.Select(r => "role." + r.Name), .. description.Settings.Select(s => "setting." + s.Name),
        ];

        Assert.All(codes, c => Assert.True(Phrases.Has(c, stage.Kind), c));
    }

    [Theory]
    [MemberData(nameof(Stages))]
    public void Card_NotesAndReadings_AreInWords(string key)
    {
        var stage = Quern.Stage(key);
        var kind = Quern.KindOf(stage);
        var notes = kind.Notes(stage, Places.ThirtyMetres);
        var readings = kind.Expect(stage, kind.Model(stage, Places.ThirtyMetres), Places.ThirtyMetres);

        Assert.NotEmpty(readings);
        Assert.All(notes.BeforePower.Concat(notes.IfOutside).Concat(notes.Cautions), l => Assert.NotEmpty(Phrases.Say(l, stage.Kind, CultureInfo.InvariantCulture)));
        Assert.All(readings, r => Assert.True(Phrases.Has(r.SetUp, stage.Kind) && r.LowSi < r.Nominal && r.Nominal < r.HighSi, r.Point));
        Assert.All(readings.Where(r => r.Winding is null), r => Assert.True(Phrases.Has("point." + r.Point.Split('.')[^1], stage.Kind), r.Point));
    }

    [Theory]
    [MemberData(nameof(Stages))]
    public void Draw_KitAsPublished_ShowsPartsUntouched(string key)
    {
        var stage = Quern.Stage(key);

        var drawing = Quern.KindOf(stage).Draw(stage, null);

        Assert.NotEmpty(drawing.Symbols);
        Assert.All(drawing.Symbols, s => Assert.Equal(Drawings.Marking.Untouched, s.Marking));
    }

    [Fact]
    public void Validate_TrimmerWithoutSwing_IsRefused()
    {
        var stage = Quern.With(Quern.Stage("A7"), "TC3", PartValue.MaximumCapacitance, 8e-12);

        Assert.Contains(Quern.KindOf(stage).Validate(stage, "stage"), m => m.Code == "kit.trimmer-without-swing");
    }
}
