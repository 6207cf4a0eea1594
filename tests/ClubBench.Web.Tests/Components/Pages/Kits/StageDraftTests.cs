using ClubBench.Planning.Kits;
using ClubBench.Web.Components.Pages.Kits;

namespace ClubBench.Web.Tests.Components.Pages.Kits;

public sealed class StageDraftTests
{
    private static readonly Kit Quern = DemoKits.QuernThirty;

    public static TheoryData<string> Stages => [.. Quern.Stages.Select(s => s.Key)];

    [Theory]
    [MemberData(nameof(Stages))]
    public void Read_NothingTyped_GivesTheSameStage(string stage) =>
        Assert.Equal(Written(Quern), Written(Quern.With(new StageDraft(Quern, stage).Read().Value)));

    [Fact]
    public void Read_NothingTyped_KeepsACrystalMeasuredToTheHertz()
    {
        var kit = Quern.With(Quern.Stage("A1").With(Quern.Stage("A1").Part("X1").With((PartValue.Frequency, 10_117_843.25))));

        var read = new StageDraft(kit, "A1").Read().Value;

        Assert.Equal(10_117_843.25, read.Part("X1").Value(PartValue.Frequency));
    }

    [Theory]
    [InlineData("330", 330e-12)]
    [InlineData("0,33 nF", 330e-12)]
    [InlineData("330p", 330e-12)]
    [InlineData("n33", 330e-12)]
    public void Read_ChangedValue_GoesIntoThatPartOnly(string typed, double farad)
    {
        var draft = Typed("A5", "C15", PartValue.Capacitance, typed);

        var read = draft.Read().Value;

        Assert.Equal(farad, read.Part("C15").Need(PartValue.Capacitance), 1e-18);
        Assert.Equal(Written(Quern), Written(Quern.With(read.With(Quern.Stage("A5").Part("C15")))));
    }

    [Theory]
    [InlineData("-270", "quantity.negative")]
    [InlineData("270 uH", "quantity.unit-unknown")]
    [InlineData("2,7.0", "quantity.two-marks")]
    [InlineData("0", "quantity.zero")]
    [InlineData("", "quantity.empty")]
    public void Read_WrongValue_NamesItsFieldAndGivesNoStage(string typed, string code)
    {
        var draft = Typed("A5", "C15", PartValue.Capacitance, typed);

        var read = draft.Read();

        Assert.False(read.Succeeded);
        var message = Assert.Single(read.Messages);
        Assert.Equal((code, "C15-capacitanceF"), (message.Code, draft.FieldOf(message)));
    }

    [Fact]
    public void Read_TwoWrongValues_NamesBoth()
    {
        var draft = Typed("A5", "C15", PartValue.Capacitance, "-270");
        Field(draft, "L4", PartValue.Turns).Typed = "14.5";

        Assert.Equal(["C15-capacitanceF", "L4-turns"], draft.Read().Messages.Select(draft.FieldOf));
    }

    [Fact]
    public void Read_OptionalValueEmptied_IsTakenAway()
    {
        var read = Typed("A5", "C15", PartValue.RatedVoltage, "").Read().Value;

        Assert.Null(read.Part("C15").Value(PartValue.RatedVoltage));
        Assert.Equal(100, read.Part("C16").Value(PartValue.RatedVoltage));
    }

    private static StageDraft Typed(string stage, string part, string value, string text)
    {
        var draft = new StageDraft(Quern, stage);
        Field(draft, part, value).Typed = text;
        return draft;
    }

    private static ValueDraft Field(StageDraft draft, string part, string value) => draft.FieldsOf(draft.Stage.Part(part)).Single(f => f.Name == value);

    private static string Written(Kit kit)
    {
        using var file = new MemoryStream();
        KitFile.Write(kit, file);
        return System.Text.Encoding.UTF8.GetString(file.ToArray());
    }
}
