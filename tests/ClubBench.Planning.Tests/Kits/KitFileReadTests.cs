using System.Globalization;
using System.Text;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Tests.Kits;

public class KitFileReadTests
{
    [Theory]
    [InlineData(KitFiles.SuperhetExcerpt)]
    [InlineData(KitFiles.MixingTransmitterExcerpt)]
    public void ReadDocument_SoundFile_HasNoMessages(string file) => Assert.Empty(Messages(file));

    [Fact]
    public void ReadDocument_TextWithUnits_BecomesSi()
    {
        var kit = KitFile.ReadDocument(KitFiles.StreamOf(KitFiles.SuperhetExcerpt)).Value;

        Assert.Equal(270e-12, kit.Stage("B2").Part("C1").Need(PartValue.Capacitance));
        Assert.Equal(0.3e-3, kit.Stage("B2").Part("L1").Need(PartValue.WireDiameter));
        Assert.Equal(8e-12, kit.Stage("B4").Setting("strayF", 0));
        Assert.Equal(100e3, kit.Stage("B5").Part("R3").Need(PartValue.Resistance));
    }

    [Theory]
    [InlineData("\"formatVersion\": 1", "\"formatVersion\": 7", "formatVersion", "kit.version-unknown")]
    [InlineData("\"formatVersion\": 1,", "", "formatVersion", "kit.missing")]
    [InlineData("\"revision\": 1", "\"revision\": 0", "revision", "kit.not-positive")]
    [InlineData("\"revision\": 1", "\"revision\": 1.5", "revision", "kit.not-whole")]
    [InlineData("5f2f0f6e-8c9e", "zz2f0f6e-8c9e", "id", "kit.id-malformed")]
    [InlineData("\"name\": \"Hobnail-80\"", "\"name\": 80", "name", "kit.not-a-text")]
    [InlineData("\"name\": \"Hobnail-80\"", "\"name\": \"\"", "name", "kit.empty")]
    [InlineData("\"mode\": \"cw\"", "\"mode\": \"morse\"", "mode", "kit.word-unknown")]
    [InlineData("\"highHz\": 3580000", "\"highHz\": 3400000", "band", "kit.band-reversed")]
    [InlineData("\"lowHz\": 3500000", "\"lowHz\": -3500000", "band.lowHz", "kit.not-positive")]
    [InlineData("\"lowHz\": 3500000", "\"lowHz\": 1e999", "band.lowHz", "kit.not-a-number")]
    [InlineData("\"lowHz\": 3500000", "\"lowHz\": true", "band.lowHz", "kit.not-a-number")]
    [InlineData("\"supplyVoltageV\": 12", "\"supplyVoltageVolt\": 12", "supplyVoltageVolt", "kit.property-unknown")]
    [InlineData("\"270 pF\"", "\"2.70,5 pF\"", "stages[0].parts[1].values.capacitanceF", "quantity.two-marks")]
    [InlineData("\"270 pF\"", "\"270\"", "stages[0].parts[1].values.capacitanceF", "quantity.no-unit")]
    [InlineData("\"270 pF\"", "[270]", "stages[0].parts[1].values.capacitanceF", "kit.not-a-number")]
    [InlineData("\"pieces\": 2", "\"pieces\": 0", "stages[0].parts[1].place.pieces", "kit.not-positive")]
    [InlineData("\"from\": \"published\"", "\"from\": \"heard\"", "stages[0].parts[1].from", "kit.word-unknown")]
    [InlineData("\"key\": \"B3\"", "\"key\": \"B2\"", "stages[1].key", "kit.key-twice")]
    [InlineData("\"key\": \"B3\"", "\"key\": \"B.3\"", "stages[1].key", "kit.key-malformed")]
    [InlineData("\"designator\": \"R3\"", "\"designator\": \"C1\"", "stages[3].parts[0].designator", "kit.designator-twice")]
    [InlineData("\"role\": \"bias-resistor\", ", "", "stages[3].parts[0].role", "kit.missing")]
    [InlineData("\"from\": \"antenna\"", "\"from\": \"aerial\"", "connections[0].from", "kit.port-malformed")]
    [InlineData("\"to\": \"B2.input\"", "\"to\": \"B9.input\"", "connections[0].to", "kit.stage-unknown")]
    [InlineData("\"bringUp\": [ \"B8\"", "\"bringUp\": [ \"B7\"", "bringUp[0]", "kit.stage-unknown")]
    [InlineData("\"bringUp\": [ \"B8\"", "\"bringUp\": [ \"B4\"", "bringUp[1]", "kit.stage-twice")]
    [InlineData("\"mixer\": \"B3\"", "\"mixer\": \"B1\"", "scheme.conversions[0].mixer", "kit.stage-unknown")]
    [InlineData(", \"intermediateFrequencyHz\": 5999120", "", "scheme.conversions[0].intermediateFrequencyHz", "kit.conversion-needs-frequency")]
    [InlineData("\"side\": \"sum\"", "\"side\": \"same\"", "scheme.conversions[0].intermediateFrequencyHz", "kit.conversion-without-frequency")]
    [InlineData("\"turns\": 36,", "\"turns\": 36, \"turns\": 37,", "stages[0].parts[0].values.turns", "kit.property-twice")]
    public void ReadDocument_OneFault_IsNamedWithItsPath(string sound, string faulty, string path, string code)
    {
        Assert.Contains(sound, KitFiles.SuperhetExcerpt, StringComparison.Ordinal);

        var messages = Messages(KitFiles.SuperhetExcerpt.Replace(sound, faulty, StringComparison.Ordinal));

        Assert.Contains((path, code), messages.Select(m => (m.Path, m.Code)));
    }

    [Fact]
    public void ReadDocument_ManyFaults_AreAllNamedAndHaveTexts()
    {
        var file = KitFiles.SuperhetExcerpt
            .Replace("\"revision\": 1", "\"revision\": -1", StringComparison.Ordinal)
            .Replace("\"270 pF\"", "\"2,7,0 pF\"", StringComparison.Ordinal)
            .Replace("\"designator\": \"R3\"", "\"designator\": \"L1\"", StringComparison.Ordinal)
            .Replace("\"to\": \"phones\"", "\"to\": \"B7.input\"", StringComparison.Ordinal);

        var messages = Messages(file);

        Assert.Equal("kit.not-positive quantity.two-marks kit.designator-twice kit.stage-unknown", string.Join(' ', messages.Select(m => m.Code)));
        Assert.All(messages, m => Assert.NotEmpty(Phrases.Say(m, culture: CultureInfo.InvariantCulture)));
    }

    [Fact]
    public void Read_UnknownKind_IsNamed()
    {
        var messages = KitFile.Read(KitFiles.StreamOf(KitFiles.MixingTransmitterExcerpt), _ => null).Messages;

        Assert.Equal("stages[0].kind stages[1].kind stages[2].kind stages[3].kind", string.Join(' ', messages.Where(m => m.Code == "kit.kind-unknown").Select(m => m.Path)));
    }

    [Fact]
    public void ReadDocument_StageMissingInBringUp_IsAWarningBesideTheKit()
    {
        var outcome = KitFile.ReadDocument(KitFiles.StreamOf(KitFiles.SuperhetExcerpt.Replace("\"B8\", \"B4\"", "\"B4\"", StringComparison.Ordinal)));

        Assert.True(outcome.Succeeded);
        Assert.Equal("kit.bring-up-incomplete", outcome.Messages.Single().Code);
    }

    [Theory]
    [InlineData("", "kit.not-json")]
    [InlineData("{", "kit.not-json")]
    [InlineData("not json", "kit.not-json")]
    [InlineData("{\"formatVersion\": 1,}", "kit.not-json")]
    [InlineData("[]", "kit.not-an-object")]
    [InlineData("null", "kit.not-an-object")]
    [InlineData("{}", "kit.missing")]
    public void Read_NoKitFile_GetsAMessageNotAnException(string text, string code) =>
        Assert.Contains(KitFile.Read(KitFiles.StreamOf(text)).Messages, m => m.Code == code);

    [Fact]
    public void Read_ElevenMegabytes_IsRefusedNamingTheLimit()
    {
        var file = KitFiles.StreamOf("{\"notes\":\"" + new string('a', 11 * 1024 * 1024) + "\"}");

        var message = KitFile.Read(file).Messages.Single();

        Assert.Equal("kit.too-large", message.Code);
        Assert.Contains("10 MB", Phrases.Say(message, culture: CultureInfo.InvariantCulture), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(33)]
    [InlineData(1000)]
    [InlineData(1_000_000)]
    public void Read_NestedTooDeep_IsRefusedNamingTheLimit(int levels)
    {
        var message = KitFile.Read(KitFiles.StreamOf(new string('[', levels) + new string(']', levels))).Messages.Single();

        Assert.Equal("kit.too-deep", message.Code);
        Assert.Contains("32", Phrases.Say(message, culture: CultureInfo.InvariantCulture), StringComparison.Ordinal);
    }

    [Fact]
    public void Read_NestedToTheLimit_IsNotTooDeep() =>
        Assert.DoesNotContain(KitFile.Read(KitFiles.StreamOf(new string('[', 32) + new string(']', 32))).Messages, m => m.Code == "kit.too-deep");

    [Fact]
    public void ReadDocument_ByteOrderMark_IsPassedOver() =>
        Assert.True(KitFile.ReadDocument(new MemoryStream([.. Encoding.UTF8.GetPreamble(), .. Encoding.UTF8.GetBytes(KitFiles.SuperhetExcerpt)])).Succeeded);

    [Fact]
    public void ReadDocument_ThousandsOfFaults_AreCutToAReadableNumber()
    {
        var file = KitFiles.SuperhetExcerpt.Replace("\"notes\"", "", StringComparison.Ordinal)
            .Replace("\"bringUp\": [", "\"bringUp\": [" + string.Concat(Enumerable.Repeat("\"Z\", ", 5000)), StringComparison.Ordinal);

        Assert.InRange(Messages(file).Count, 1, 200);
    }

    private static IReadOnlyList<FieldMessage> Messages(string file) => KitFile.ReadDocument(KitFiles.StreamOf(file)).Messages;
}
