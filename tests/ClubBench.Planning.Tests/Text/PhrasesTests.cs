using System.Globalization;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Tests.Text;

public class PhrasesTests
{
    private static readonly CultureInfo English = CultureInfo.GetCultureInfo("en-GB");

    [Fact]
    public void Say_TextWithFigures_FillsThemWithUnits()
    {
        var step = new Step("advice.spread", [new Figure("value", QuantityKind.Inductance, 0.714e-6), new Figure("expected", QuantityKind.Inductance, 0.675e-6)]);

        Assert.Equal("Leave the turns. Spread them slightly; 0.714\u00A0µH should come down to 0.675\u00A0µH.", Phrases.Say(step, culture: English));
    }

    [Fact]
    public void Say_UnknownCode_Throws() => Assert.Throws<KeyNotFoundException>(() => Phrases.Say("advice.no-such-thing", []));

    [Fact]
    public void Say_FigureMissing_Throws() => Assert.Throws<KeyNotFoundException>(() => Phrases.Say("advice.spread", []));

    [Theory]
    [InlineData("advice.spread", true)]
    [InlineData("advice.no-such-thing", false)]
    public void Has_Code_TellsWhetherThereIsAText(string code, bool has) => Assert.Equal(has, Phrases.Has(code));

    [Fact]
    public void Say_FieldMessage_FillsItsArguments()
    {
        var message = QuantityText.Parse("1.000,5 pF", QuantityKind.Capacitance).Messages.Single();

        Assert.Equal("Two decimal marks. Type 14.052 or 14,052.", Phrases.Say(message, culture: English));
    }

    [Fact]
    public void SayAlternative_IdWithDetail_FillsWhatStandsBehindTheColon()
    {
        var kind = StageKindList.All.First(k => Phrases.Has("alternative.choke", k.Description.Id)).Description.Id;

        Assert.Equal("choke 6.8\u00A0µH", Phrases.SayAlternative("choke:6.8uH", kind, English));
        Assert.Equal("Keep as it is", Phrases.SayAlternative(Choice.Keep, kind, English));
    }

    [Fact]
    public void Source_EveryStatus_ReadsWithAndWithoutAPlace()
    {
        var texts = from status in Enum.GetValues<SourceStatus>() from place in new[] { "", "table 3" } select Phrases.Source(new SourceRef("common-practice", place, status), English);

        Assert.All(texts, t => Assert.NotEmpty(t));
    }

    [Theory]
    [InlineData(typeof(StageAction))]
    [InlineData(typeof(Severity))]
    [InlineData(typeof(Verdict))]
    [InlineData(typeof(ReadingVerdict))]
    [InlineData(typeof(InstrumentClass))]
    [InlineData(typeof(WindowSides))]
    [InlineData(typeof(Provenance))]
    [InlineData(typeof(Mode))]
    [InlineData(typeof(SchemeKind))]
    [InlineData(typeof(MixingSide))]
    [InlineData(typeof(PartClass))]
    [InlineData(typeof(RoleNeed))]
    [InlineData(typeof(SearchEffort))]
    [InlineData(typeof(MessageSeverity))]
    public void Word_EveryMember_HasAText(Type type)
    {
        var without = Enum.GetNames(type).Select(n => $"{Placeholders.Dashed(type.Name)}.{Placeholders.Dashed(n)}").Where(c => !Phrases.Has(c));

        Assert.Empty(without);
    }

    [Fact]
    public void Word_Member_IsItsWord() => Assert.Equal("LC meter", Phrases.Word(InstrumentClass.LcMeter, English));
}
