using System.Net;
using System.Text;
using System.Text.Json.Nodes;
using ClubBench.Planning.Kits;

namespace ClubBench.Web.Tests.Api;

public sealed class KitInterfaceTests(DemoInterface api) : IClassFixture<DemoInterface>
{
    private static JsonNode Sound
    {
        get
        {
            using var file = new MemoryStream();
            KitFile.Write(DemoKits.QuernThirty, file);
            return JsonNode.Parse(file.ToArray())!;
        }
    }

    [Fact]
    public async Task Kits_List_NamesTheKitOfTheDemonstration() =>
        Assert.Contains(await api.ItemsAsync("kits"), k => k["name"]!.GetValue<string>() == DemoKits.QuernThirty.Name && k["stages"]!.GetValue<int>() == 12);

    [Fact]
    public async Task ImportKit_OfASoundFile_IsMadeAndListed()
    {
        var kit = Sound;
        kit["name"] = "Quern-30 of Ingrid";
        kit["id"] = Guid.NewGuid().ToString();

        using var answer = await api.PostAsync("kits", kit.ToJsonString());

        Assert.Equal(HttpStatusCode.Created, answer.StatusCode);
        var id = (await DemoInterface.JsonOf(answer))["id"]!.GetValue<string>();
        Assert.EndsWith($"/api/v1/kits/{id}", answer.Headers.Location?.OriginalString, StringComparison.Ordinal);
    }

    public static TheoryData<string, string, string> Faults => new()
    {
        { "mode", "7", "mode" },
        { "stages[0].parts[0].values.frequencyHz", "\"ten\"", "stages[0].parts[0].values.frequencyHz" },
        { "stages[0].parts[0].values.frequencyHz", "-10120000", "stages[0].parts[0].values.frequencyHz" },
        { "stages[0].kind", "\"time-machine\"", "stages[0].kind" },
    };

    [Theory]
    [MemberData(nameof(Faults))]
    public async Task ImportKit_WithAFault_NamesTheFieldAndChangesNothing(string at, string value, string path)
    {
        var before = await api.GetAsync("kits");
        var kit = Sound;
        Put(kit, at, JsonNode.Parse(value));

        using var answer = await api.PostAsync("kits", kit.ToJsonString());

        var problems = await DemoInterface.ProblemsOf(answer, HttpStatusCode.BadRequest);
        Assert.Contains(problems, p => p.Path == path && p.Message.Contains(' ', StringComparison.Ordinal));
        Assert.True(JsonNode.DeepEquals(before, await api.GetAsync("kits")));
    }

    [Fact]
    public async Task ImportKit_OfElevenMegabytes_IsRefusedInWords()
    {
        var before = await api.GetAsync("kits");

        using var answer = await api.PostAsync("kits", $"{{\"name\":\"{new string('x', 11 * 1024 * 1024)}\"}}");

        var problem = Assert.Single(await DemoInterface.ProblemsOf(answer, HttpStatusCode.BadRequest));
        Assert.Equal("file", problem.Path);
        Assert.Contains("10 MB", problem.Message, StringComparison.Ordinal);
        Assert.True(JsonNode.DeepEquals(before, await api.GetAsync("kits")));
    }

    [Fact]
    public async Task ImportKit_NestedAThousandDeep_IsRefusedInWords()
    {
        var before = await api.GetAsync("kits");

        using var answer = await api.PostAsync("kits", new StringBuilder().Insert(0, "{\"a\":", 1000).Append('1').Append('}', 1000).ToString());

        Assert.NotEmpty(await DemoInterface.ProblemsOf(answer, HttpStatusCode.BadRequest));
        Assert.True(JsonNode.DeepEquals(before, await api.GetAsync("kits")));
    }

    [Fact]
    public async Task BackCheck_OfTheDemonstration_ComparesEveryStage()
    {
        var kit = (await api.ItemsAsync("kits"))[0]["id"]!.GetValue<string>();

        var stages = (await api.GetAsync($"kits/{kit}/back-check"))["stages"]!.AsArray();

        Assert.Equal(12, stages.Count);
        Assert.DoesNotContain(stages, s => s!["verdict"]!.GetValue<string>() == "differs");
    }

    [Fact]
    public async Task Bands_OfTheDemonstration_KeepTheOwnBandAndJudgeTheOthers()
    {
        var kit = (await api.ItemsAsync("kits"))[0]["id"]!.GetValue<string>();

        var bands = await api.ItemsAsync($"kits/{kit}/bands");

        Assert.Equal("30 m", Assert.Single(bands, b => b["isOwnBand"]!.GetValue<bool>())["band"]!.GetValue<string>());
        Assert.All(bands, b => Assert.Equal(12, b["stages"]!.AsArray().Count));
    }

    [Theory]
    [InlineData("back-check")]
    [InlineData("bands")]
    public async Task Kit_NobodyKnows_IsNotFoundByPath(string leaf)
    {
        using var answer = await api.Program.GetAsync($"/api/v1/kits/{Guid.NewGuid()}/{leaf}", TestContext.Current.CancellationToken);

        Assert.Equal("kitId", Assert.Single(await DemoInterface.ProblemsOf(answer, HttpStatusCode.NotFound)).Path);
    }

    /// <summary>Sets a value by its field path.</summary>
    private static void Put(JsonNode root, string path, JsonNode? value)
    {
        var steps = path.Replace("[", ".[", StringComparison.Ordinal).Split('.');
        var node = steps[..^1].Aggregate(root, (n, s) => s.StartsWith('[') ? n[int.Parse(s[1..^1], System.Globalization.CultureInfo.InvariantCulture)]! : n[s]!);
        node[steps[^1]] = value;
    }
}
