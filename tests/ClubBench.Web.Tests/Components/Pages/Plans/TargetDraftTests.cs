using System.Globalization;
using ClubBench.Calculation.Bands;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Web.Components.Pages.Plans;

namespace ClubBench.Web.Tests.Components.Pages.Plans;

public sealed class TargetDraftTests
{
    private const string Ingrid = "Ingrid";

    public static TheoryData<string> Bands => [.. AmateurBands.Names.Where(b => TargetDefaults.On(b, DemoKits.QuernThirty, ItuRegion.Region1) is not null)];

    [Theory]
    [MemberData(nameof(Bands))]
    public void Read_NothingTyped_GivesTheSameTarget(string band)
    {
        var target = TargetDefaults.On(band, DemoKits.QuernThirty, ItuRegion.Region1)! with { LimitsConfirmedBy = Ingrid };

        Assert.Equal(target, TargetDraft.Of(target).Read(Ingrid).Value);
        Assert.Equal(target with { LimitsConfirmedBy = null }, TargetDraft.Of(target with { LimitsConfirmedBy = null }).Read(Ingrid).Value);
    }

    [Theory]
    [InlineData("en-GB")]
    [InlineData("de-DE")]
    public void Read_DecimalComma_IsTheSameAsThePoint(string culture)
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
            var (comma, point) = (Draft(), Draft());
            (comma.Reference, comma.Power, comma.WishMargin) = ("14,0605", "1,5", "7,5");
            (point.Reference, point.Power, point.WishMargin) = ("14.0605", "1.5", "7.5");

            Assert.Equal(point.Read(Ingrid).Value, comma.Read(Ingrid).Value);
            Assert.Equal((14_060_500, 1.5), (comma.Read(Ingrid).Value.Reference.Hertz, comma.Read(Ingrid).Value.WantedPower!.Value.Watt));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void Read_OtherUnits_AreConverted()
    {
        var draft = Draft();
        (draft.Reference, draft.Power) = ("14060 kHz", "800 mW");

        var read = draft.Read(Ingrid).Value;

        Assert.Equal((14_060_000, 0.8), (read.Reference.Hertz, read.WantedPower!.Value.Watt));
    }

    [Fact]
    public void Read_NoPower_MeansNoTransmitter()
    {
        var draft = Draft();
        draft.Power = " ";

        Assert.Null(draft.Read(Ingrid).Value.WantedPower);
    }

    [Theory]
    [InlineData("low", "", "quantity.empty")]
    [InlineData("low", "14.08", "kit.band-reversed", "high")]
    [InlineData("high", "14.05,2", "quantity.two-marks")]
    [InlineData("reference", "fourteen", "quantity.not-a-number")]
    [InlineData("reference", "14.06 V", "quantity.unit-unknown")]
    [InlineData("power", "-1", "quantity.negative")]
    [InlineData("power", "0", "field.not-positive")]
    [InlineData("low", "0", "field.not-positive")]
    [InlineData("pitch", "0", "field.not-positive")]
    [InlineData("pitch", "x", "quantity.not-a-number")]
    [InlineData("wish", "10 W", "quantity.unit-unknown")]
    public void Read_WrongNumber_NamesItsField(string field, string typed, string code, string? at = null)
    {
        var draft = Draft();
        Type(draft, field, typed);

        var read = draft.Read(Ingrid);

        Assert.False(read.Succeeded);
        Assert.Equal((at ?? field, code), Assert.Single(read.Messages.Select(m => (m.Path, m.Code))));
    }

    [Fact]
    public void Read_SeveralWrongNumbers_NamesThemAll()
    {
        var draft = Draft();
        Type(draft, "reference", "x");
        Type(draft, "power", "-1");
        Type(draft, "wish", "");

        Assert.Equal(["reference", "power", "wish"], draft.Read(Ingrid).Messages.Select(m => m.Path));
    }

    internal static TargetDraft Draft() => TargetDraft.Of(TargetDefaults.On("20 m", DemoKits.QuernThirty, ItuRegion.Region1)!);

    internal static void Type(TargetDraft draft, string field, string text) => _ = field switch
    {
        "low" => draft.Low = text,
        "high" => draft.High = text,
        "reference" => draft.Reference = text,
        "power" => draft.Power = text,
        "pitch" => draft.Pitch = text,
        "wish" => draft.WishMargin = text,
        _ => throw new ArgumentOutOfRangeException(nameof(field), field, "No such field."),
    };
}
