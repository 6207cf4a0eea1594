using Bunit;
using ClubBench.Web.State;
using Microsoft.Extensions.DependencyInjection;
using MudBlazor.Services;

namespace ClubBench.Web.Tests.Components;

/// <summary>Renders components as the application does, without a server.</summary>
public class PageContext : BunitContext
{
    public PageContext()
    {
        JSInterop.Mode = JSRuntimeMode.Loose;
        Services.AddLocalization();
        Services.AddLogging();
        Services.AddMudServices();
        Services.AddScoped<OpenPlace>();
    }
}
