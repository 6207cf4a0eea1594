using System.Collections.Concurrent;
using System.Net;
using Microsoft.Playwright;

namespace ClubBench.Browser.Tests.Site;

/// <summary>One person at a browser. Records every request and console error; both are checked when the person leaves.</summary>
public sealed class Visitor : IAsyncDisposable
{
    private static readonly string[] OwnHosts = ["127.0.0.1", "localhost", "hall.test"];
    private readonly IBrowserContext _context;
    private readonly ConcurrentQueue<string> _foreign = new();
    private readonly ConcurrentQueue<string> _errors = new();

    internal Visitor(IBrowserContext context, IPage page)
    {
        _context = context;
        Page = page;
        context.Request += (_, request) =>
        {
            var address = new Uri(request.Url);
            if (address.Scheme is "http" or "https" or "ws" or "wss" && !OwnHosts.Contains(address.Host)) _foreign.Enqueue(request.Url);
        };
        page.Console += (_, message) => { if (message.Type == "error" && !MayFail(message.Text)) _errors.Enqueue($"{message.Text} at {message.Location}"); };
        page.PageError += (_, error) => _errors.Enqueue(error);
    }

    public IPage Page { get; }

    /// <summary>Whether lost connections are part of the test.</summary>
    public bool NetworkMayFail { get; set; }

    /// <summary>Whether a missing page is part of the test.</summary>
    public bool AnswersMayBeMissing { get; set; }

    public IReadOnlyCollection<string> ForeignRequests => _foreign;

    public IReadOnlyCollection<string> Errors => _errors;

    public async Task<IResponse?> GoAsync(string path)
    {
        var answer = await Page.GotoAsync(path);
        if (answer is not { Ok: false }) await SettledAsync();
        return answer;
    }

    /// <summary>Waits until a circuit page reacts and a script page has started.</summary>
    public async Task SettledAsync() =>
        await Page.WaitForFunctionAsync("() => !document.querySelector('[data-interactive=no]') && (!document.getElementById('bench') || document.body.dataset.ready === 'yes')");

    public Task SetOfflineAsync(bool offline)
    {
        NetworkMayFail = true;
        return _context.SetOfflineAsync(offline);
    }

    public async ValueTask DisposeAsync()
    {
        await _context.CloseAsync();
        Assert.Empty(_foreign);
        Assert.Empty(_errors);
    }

    private bool MayFail(string text) =>
        (AnswersMayBeMissing && text.Contains("status of 404", StringComparison.Ordinal))
        || (NetworkMayFail && (text.Contains("net::ERR_", StringComparison.Ordinal) || text.Contains("WebSocket", StringComparison.Ordinal)));
}
