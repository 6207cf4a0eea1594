using System.Globalization;
using System.Text.Json;
using Microsoft.Playwright;

namespace ClubBench.Browser.Tests.Site;

/// <summary>The builder's page as a thumb uses it. What to type is taken from the page's own expected windows.</summary>
internal sealed class BenchScreen
{
    private readonly Visitor _visitor;

    private BenchScreen(Visitor visitor, string tag, IReadOnlyList<BenchScreenPoint> points) => (_visitor, Tag, Points) = (visitor, tag, points);

    public string Tag { get; }

    public IReadOnlyList<BenchScreenPoint> Points { get; }

    private IPage Page => _visitor.Page;

    /// <summary>Reads the page a builder has landed on.</summary>
    public static async Task<BenchScreen> OfAsync(Visitor visitor)
    {
        await visitor.SettledAsync();
        var json = JsonDocument.Parse(await visitor.Page.Locator("#bench").TextContentAsync() ?? "{}").RootElement;
        var points = json.GetProperty("points").EnumerateArray().Select(BenchScreenPoint.Of).ToList();
        return new BenchScreen(visitor, json.GetProperty("board").GetString()!, points);
    }

    /// <summary>A point with an instrument and a window open to both sides.</summary>
    public BenchScreenPoint PointAt(int index) => Points.Where(p => p.HasInstrument && p.Slips && p.Signless).ElementAt(index);

    public ILocator Form(BenchScreenPoint point) => Page.Locator($"form.entry[data-point='{point.Point}']");

    public ILocator Field(BenchScreenPoint point) => Form(point).Locator("input[name=text]");

    public ILocator Advice(BenchScreenPoint point) => Form(point).Locator("[data-advice]");

    public ILocator Sync => Page.Locator("#sync");

    /// <summary>The screens of a stage, in order.</summary>
    public Task<string[]> StepsAsync(string stage) =>
        Page.EvaluateAsync<string[]>("s => [...document.querySelectorAll('[data-part]')].map(p => p.id).filter(id => id.startsWith(s + '-') || id.startsWith(s + '.'))", stage);

    public async Task GoToStepAsync(string step)
    {
        await Page.EvaluateAsync("s => { location.hash = s; }", step);
        await Page.Locator($"[id='{step}']").WaitForAsync(new() { State = WaitForSelectorState.Visible });
    }

    public async Task GoToAsync(BenchScreenPoint point)
    {
        await Page.EvaluateAsync("p => { location.hash = document.querySelector(`form.entry[data-point='${p}']`).closest('[data-part]').id; }", point.Point);
        await Field(point).WaitForAsync(new() { State = WaitForSelectorState.Visible });
    }

    public Task SaveAsync(BenchScreenPoint point) => Form(point).Locator("button[data-show=typing]").ClickAsync();

    public async Task TypeAndSaveAsync(BenchScreenPoint point, string text)
    {
        await GoToAsync(point);
        await Field(point).FillAsync(text);
        await SaveAsync(point);
    }

    /// <summary>Waits until everything typed has reached the server.</summary>
    public Task AllSentAsync() => Page.WaitForFunctionAsync("() => !Object.keys(localStorage).some(k => k.startsWith('clubbench.outbox.'))");

    public Task<int> WaitingAsync() => Page.EvaluateAsync<int>("() => Object.keys(localStorage).filter(k => k.startsWith('clubbench.outbox.')).length");
}

/// <summary>One point as the page describes it.</summary>
internal sealed record BenchScreenPoint(string Point, string Label, double Nominal, double Low, double High, bool Slips, bool Signless, bool HasInstrument, double FirstFactor, double OffsetSi)
{
    public static BenchScreenPoint Of(JsonElement p)
    {
        var instruments = p.GetProperty("instruments");
        return new BenchScreenPoint(
            p.GetProperty("point").GetString()!,
            p.GetProperty("label").GetString()!,
            p.GetProperty("nominal").GetDouble(),
            p.GetProperty("low").GetDouble(),
            p.GetProperty("high").GetDouble(),
            p.GetProperty("slips").GetBoolean() && p.GetProperty("sides").GetString() == "Both",
            !p.GetProperty("signed").GetBoolean(),
            instruments.GetArrayLength() > 0,
            p.GetProperty("units")[0].GetProperty("factor").GetDouble(),
            instruments.GetArrayLength() > 0 ? instruments[0].GetProperty("offset").GetDouble() : 0);
    }

    /// <summary>What the first instrument shows inside the window: the middle, moved by a share of the window's width.</summary>
    public string Typed(double place = 0) => Written(Nominal + (place * (High - Low)));

    /// <summary>What a slip of the decimal point makes of the expected value.</summary>
    public string Slipped(double factor) => Written((Nominal * factor) - OffsetSi);

    private string Written(double si) => ((si + OffsetSi) / FirstFactor).ToString("G7", CultureInfo.InvariantCulture);
}
