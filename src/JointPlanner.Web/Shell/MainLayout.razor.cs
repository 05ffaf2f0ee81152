using JointPlanner.Web.Start;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Web;

namespace JointPlanner.Web.Shell;

/// <summary>Bar, content and foot of every working page.</summary>
public sealed partial class MainLayout : IDisposable
{
    private ErrorBoundary? boundary;

    [Inject]
    private Preferences Preferences { get; set; } = null!;

    [Inject]
    private DemoMode Demo { get; set; } = null!;

    [Inject]
    private NavigationManager Navigation { get; set; } = null!;

    // A bare "#content" would be read from the site's root, not from this page.
    private string SkipTo => $"{Navigation.ToBaseRelativePath(Navigation.Uri).Split('#')[0]}#content";

    /// <inheritdoc/>
    public void Dispose() => Preferences.Changed -= Redraw;

    /// <inheritdoc/>
    protected override void OnInitialized() => Preferences.Changed += Redraw;

    private void Redraw() => InvokeAsync(StateHasChanged);

    private void Again() => boundary?.Recover();
}
