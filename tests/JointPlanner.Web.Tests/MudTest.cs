using Bunit;
using JointPlanner.Web.Shell;
using Microsoft.Extensions.DependencyInjection;
using MudBlazor.Services;

namespace JointPlanner.Web.Tests;

/// <summary>A component test with the component library's services; it disposes asynchronously because some of them must be.</summary>
public abstract class MudTest : BunitContext, IAsyncLifetime
{
    protected MudTest()
    {
        // Waiting ends with the change that is awaited; only a failure takes this long, on a busy machine too.
        DefaultWaitTimeout = TimeSpan.FromSeconds(20);
        JSInterop.Mode = JSRuntimeMode.Loose;
        Services.AddMudServices(options => options.PopoverOptions.CheckForPopoverProvider = false);
        Services.AddScoped<Preferences>();
    }

    public ValueTask InitializeAsync() => ValueTask.CompletedTask;

    public new async ValueTask DisposeAsync()
    {
        await base.DisposeAsync();
        GC.SuppressFinalize(this);
    }
}
