using JointPlanner.Exchange.Printing;
using JointPlanner.Web.Shell;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>A part of the page that shows the open structure and follows its changes and the choice of units.</summary>
public abstract class WorkbenchPart : ComponentBase, IDisposable
{
    /// <summary>The open structure.</summary>
    [CascadingParameter]
    public Workbench Bench { get; set; } = null!;

    /// <summary>Units shown.</summary>
    [Inject]
    protected Preferences Preferences { get; set; } = null!;

    /// <summary>Profile of the units shown.</summary>
    protected DisplayProfile Profile => Preferences.Profile;

    /// <inheritdoc/>
    public virtual void Dispose()
    {
        Bench.Changed -= Redraw;
        Preferences.Changed -= Redraw;
        GC.SuppressFinalize(this);
    }

    /// <inheritdoc/>
    protected override void OnInitialized()
    {
        Bench.Changed += Redraw;
        Preferences.Changed += Redraw;
    }

    /// <summary>Draws this part again.</summary>
    protected void Redraw() => InvokeAsync(StateHasChanged);
}
