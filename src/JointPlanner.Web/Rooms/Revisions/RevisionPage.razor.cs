using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Rights;
using JointPlanner.Web.Shared;
using JointPlanner.Web.Shell;
using Microsoft.AspNetCore.Components;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Rooms.Revisions;

/// <summary>One revision: what was frozen, what differs from the last issue, who signed, and the next step of its life.</summary>
public sealed partial class RevisionPage : IDisposable
{
    private RevisionView? view;
    private string says = "";
    private bool isMissing;

    /// <summary>Id of the revision.</summary>
    [Parameter]
    public Guid Id { get; set; }

    /// <summary>What a plain form that led here had to say.</summary>
    [SupplyParameterFromQuery(Name = FormSays.Name)]
    public string? Said { get; set; }

    [Inject]
    private IDbContextFactory<ArchiveContext> Archive { get; set; } = null!;

    [Inject]
    private Caller Caller { get; set; } = null!;

    [Inject]
    private FormSays Forms { get; set; } = null!;

    [Inject]
    private Preferences Preferences { get; set; } = null!;

    /// <inheritdoc/>
    public void Dispose() => Preferences.Changed -= Redraw;

    /// <inheritdoc/>
    protected override void OnInitialized() => Preferences.Changed += Redraw;

    /// <inheritdoc/>
    protected override Task OnParametersSetAsync() => Read();

    private IEnumerable<string> Says(RevisionView shown)
    {
        if (shown.Alteration.Length > 0) yield return shown.Alteration;
        if (says.Length > 0) yield return says;
        else if (Said is { Length: > 0 } note && Forms.Open(note, Id) is { } said) yield return said;
    }

    private async Task Read()
    {
        if (await Caller.Person() is not { } person) return;
        try
        {
            await using var scope = await ArchiveScope.Enter(Archive, person);
            view = await RevisionView.Read(scope, Id);
            if (view.Frozen?.Stored is { } stored) Preferences.Suggest(stored.Package.Units == "us" ? UnitProfile.Us : UnitProfile.Metric);
        }
        catch (NotFound)
        {
            isMissing = true;
        }
    }

    private async Task Done(string refusal)
    {
        says = refusal;
        try
        {
            await Read();
        }
        catch (Exception problem) when (ArchiveSilence.Is(problem))
        {
            says = ArchiveSilence.Says;
        }
    }

    private void Redraw() => InvokeAsync(StateHasChanged);
}
