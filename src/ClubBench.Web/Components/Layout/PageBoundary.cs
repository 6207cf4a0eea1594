using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Rendering;
using Microsoft.AspNetCore.Components.Routing;
using Microsoft.AspNetCore.Components.Web;

namespace ClubBench.Web.Components.Layout;

/// <summary>Catches what a page could not: tells the person a reference number, tells the log the rest, and is whole again on the next page.</summary>
public sealed partial class PageBoundary : ErrorBoundaryBase, IDisposable
{
    private string _reference = "";

    [Inject] private ILogger<PageBoundary> Logger { get; set; } = default!;

    [Inject] private NavigationManager Navigation { get; set; } = default!;

    protected override void OnInitialized() => Navigation.LocationChanged += OnMoved;

    protected override Task OnErrorAsync(Exception exception)
    {
        _reference = Guid.NewGuid().ToString("N")[..8];
        LogFailure(Logger, exception, _reference, Navigation.ToBaseRelativePath(Navigation.Uri));
        return Task.CompletedTask;
    }

    protected override void BuildRenderTree(RenderTreeBuilder builder)
    {
        if (CurrentException is null)
        {
            builder.AddContent(0, ChildContent);
            return;
        }

        builder.OpenComponent<ProblemNotice>(1);
        builder.AddComponentParameter(2, nameof(ProblemNotice.Reference), _reference);
        builder.AddComponentParameter(3, nameof(ProblemNotice.OnRetry), EventCallback.Factory.Create(this, Recover));
        builder.CloseComponent();
    }

    private void OnMoved(object? sender, LocationChangedEventArgs e) => _ = InvokeAsync(Recover);

    public void Dispose() => Navigation.LocationChanged -= OnMoved;

    [LoggerMessage(LogLevel.Error, "Page {Path} failed, reference {Reference}")]
    private static partial void LogFailure(ILogger logger, Exception exception, string reference, string path);
}
