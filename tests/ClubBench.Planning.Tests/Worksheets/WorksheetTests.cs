using System.Globalization;
using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Tables;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Text;
using ClubBench.Planning.Worksheets;

namespace ClubBench.Planning.Tests.Worksheets;

public class WorksheetTests
{
    private static readonly Dictionary<string, double> Defaults = new(StringComparer.Ordinal);

    [Fact]
    public void Run_EveryWorksheetWithItsDefaults_GivesFiguresWithWorking() => Assert.All(WorksheetList.All, w =>
    {
        var figures = w.Run(Defaults).Value.Figures;

        Assert.NotEmpty(figures);
        Assert.All(figures, f => Assert.Equal(w.Id, f.Working!.MethodId));
        Assert.All(figures, f => Assert.NotNull(Sources.Find(f.Working!.Source.SourceId)));
        Assert.All(figures, f => Assert.NotEmpty(QuantityText.Format(f, CultureInfo.InvariantCulture)));
    });

    [Fact]
    public void All_IdsInputsFiguresAndVerdicts_HaveTexts()
    {
        var codes = WorksheetList.All.SelectMany(w => new[] { "worksheet." + w.Id, "method." + w.Id, "worksheet-group." + w.Group, w.Run(Defaults).Value.VerdictCode ?? "worksheet." + w.Id }
            .Concat(w.Inputs.Select(i => "worksheet-input." + i.Name))
            .Concat(w.Run(Defaults).Value.Figures.Select(f => "figure." + f.Name)));

        Assert.Equal("", string.Join(", ", codes.Where(c => !Phrases.Has(c)).Distinct(StringComparer.Ordinal)));
    }

    [Fact]
    public void Verdicts_EveryMember_HasAWord()
    {
        var codes = Codes<Verdict>().Concat(Codes<WindingAction>()).Concat(Codes<CrystalControlState>()).Concat(Codes<SpanShortfall>())
            .Concat(Codes<PreamplifierVerdict>()).Concat(Codes<LowPassSearchEnding>());

        Assert.Equal("", string.Join(", ", codes.Where(c => !Phrases.Has(c))));
    }

    [Fact]
    public void All_Ids_AreUnique() => Assert.Equal(WorksheetList.All.Count, WorksheetList.All.Select(w => w.Id).Distinct(StringComparer.Ordinal).Count());

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(-1000)]
    [InlineData(double.PositiveInfinity)]
    public void Run_EveryInputBroken_NamesEveryOne(double si) => Assert.All(WorksheetList.All, w =>
    {
        var broken = w.Inputs.ToDictionary(i => i.Name, _ => si, StringComparer.Ordinal);

        var messages = w.Run(broken).Messages;

        Assert.Equal(string.Join(',', w.Inputs.Select(i => i.Name)), string.Join(',', messages.Select(m => m.Path)));
        Assert.All(messages, m => Assert.NotEmpty(Phrases.Say(m, culture: CultureInfo.InvariantCulture)));
    });

    [Theory]
    [InlineData("chebyshev-low-pass", "order", 11, "worksheet-message.too-large")]
    [InlineData("chebyshev-low-pass", "order", 2, "worksheet-message.too-small")]
    [InlineData("chebyshev-low-pass", "order", 5.5, "worksheet-message.not-whole")]
    [InlineData("output-stage", "efficiency", 1.2, "worksheet-message.too-large")]
    [InlineData("output-stage", "saturation", -0.1, "worksheet-message.negative")]
    [InlineData("resonance", "inductance", 0, "worksheet-message.not-positive")]
    public void Run_ValueOutsideItsLimits_NamesTheFieldAndTheLimit(string id, string input, double si, string code)
    {
        var message = Assert.Single(Run(id, (input, si)).Messages);

        Assert.Equal((input, code), (message.Path, message.Code));
    }

    [Fact]
    public void Run_ValueAboveItsLimit_SaysTheLimitInTheUnitsOfTheField()
    {
        var message = Run("external-noise", ("frequency", 1e9)).Messages.Single();

        Assert.Equal("Must be 250.00\u00A0MHz or less.", Phrases.Say(message, culture: CultureInfo.InvariantCulture));
    }

    [Theory]
    [InlineData("chebyshev-low-pass", "order", 4, "order")]
    [InlineData("output-stage", "saturation", 20, "supply,saturation")]
    [InlineData("load-and-heat", "saturation", 20, "collector-supply,saturation")]
    [InlineData("load-and-heat", "sink-to-air", 5000, "wanted-power,junction-to-case,case-to-sink,sink-to-air")]
    [InlineData("capacitor-pair", "members-per-decade", 7, "members-per-decade")]
    [InlineData("trimmer-coverage", "trimmer-most", 4e-12, "trimmer-least,trimmer-most")]
    [InlineData("trimmer-coverage", "stray-most", 2e-12, "stray-least,stray-most")]
    [InlineData("trimmer-coverage", "highest-frequency", 13e6, "lowest-frequency,highest-frequency")]
    [InlineData("toroid-fit", "inner-diameter", 0.01, "outer-diameter,inner-diameter")]
    [InlineData("ferrite-choke", "ferrite-mix", 77, "ferrite-mix")]
    [InlineData("ferrite-winding", "lowest-frequency", 144e6, "ferrite-mix,lowest-frequency")]
    [InlineData("low-pass-search", "highest-frequency", 13e6, "lowest-frequency,highest-frequency")]
    [InlineData("pulled-crystal-range", "tuning-most", 12e-12, "tuning-least,tuning-most")]
    [InlineData("pulled-crystal-range", "series-inductance", 200e-6, "series-inductance,coil-capacitance")]
    [InlineData("receive-offset", "tuning-setting", 200e-12, "tuning-setting,tuning-least,tuning-most")]
    [InlineData("device-gain", "feedback-capacitance", 1e-9, "collector-current,transition,feedback-capacitance")]
    [InlineData("base-return-trend", "known-drive", 0.03, "known-drive,known-resistor,drive-peak")]
    [InlineData("emission-limit", "frequency", 50.1e6, "limit-set,frequency")]
    [InlineData("preamplifier", "receiver-noise", 1, "receiver-noise,direct-conversion")]
    [InlineData("audio-band-pass", "section-gain", 32, "section-q,section-gain")]
    public void Run_InputsThatContradict_NamesEachOfThem(string id, string input, double si, string fields)
    {
        var messages = Run(id, (input, si), ("direct-conversion", 1)).Messages;

        Assert.Equal(fields, string.Join(',', messages.Select(m => m.Path)));
        Assert.All(messages, m => Assert.NotEmpty(Phrases.Say(m, culture: CultureInfo.InvariantCulture)));
        Assert.True(WorksheetList.Find(id)!.Run(Defaults).Succeeded);
    }

    private static Outcome<WorksheetAnswer> Run(string id, params (string Name, double Si)[] given) =>
        WorksheetList.Find(id)!.Run(given.ToDictionary(g => g.Name, g => g.Si, StringComparer.Ordinal));

    private static IEnumerable<string> Codes<T>()
        where T : struct, Enum => Enum.GetValues<T>().Select(Phrases.CodeOf);
}
