using Microsoft.AspNetCore.Components;
using Microsoft.JSInterop;

namespace JointPlanner.Web.Shell;

/// <summary>Name, rooms, units, paper, person.</summary>
public sealed partial class TopBar : IDisposable
{
    /// <summary>True on a small screen in the field: no rooms, short words.</summary>
    [Parameter]
    public bool IsBrief { get; set; }

    [Inject]
    private Preferences Preferences { get; set; } = null!;

    [Inject]
    private IJSRuntime Script { get; set; } = null!;

    /// <inheritdoc/>
    public void Dispose() => Preferences.Changed -= Redraw;

    /// <inheritdoc/>
    protected override void OnInitialized() => Preferences.Changed += Redraw;

    private void Redraw() => InvokeAsync(StateHasChanged);

    private string Pressed(UnitProfile units) => Preferences.Units == units ? "true" : "false";

    private async Task Show(UnitProfile units)
    {
        Preferences.Choose(units);
        await Script.InvokeVoidAsync("jointPlanner.remember", RememberedPreferences.UnitsCookie, units == UnitProfile.Us ? "us" : "metric");
    }

    private async Task TurnPaper()
    {
        Preferences.Choose(!Preferences.IsDark);
        await Script.InvokeVoidAsync("jointPlanner.paper", Preferences.IsDark ? "dark" : "light");
    }
}
