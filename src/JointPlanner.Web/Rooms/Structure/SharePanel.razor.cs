using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Drafts;
using JointPlanner.Exchange.Plans;
using JointPlanner.Web.Shared;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>Saving of the own draft, and merging it into the plan that all share.</summary>
public sealed partial class SharePanel : IDisposable
{
    private readonly Dictionary<string, Take> choices = [];
    private IReadOnlyList<Clash> clashes = [];
    private string? sharedHash;
    private string says = "";
    private bool isWorking;

    /// <summary>Saves the draft.</summary>
    [Parameter, EditorRequired]
    public DraftSaver Saver { get; set; } = null!;

    /// <summary>Id of the structure.</summary>
    [Parameter, EditorRequired]
    public Guid StructureId { get; set; }

    /// <summary>Told when the draft went into the shared plan.</summary>
    [Parameter]
    public EventCallback OnShared { get; set; }

    [Inject]
    private DraftShelf Drafts { get; set; } = null!;

    [Inject]
    private Caller Caller { get; set; } = null!;

    /// <inheritdoc/>
    public void Dispose() => Saver.Changed -= Redraw;

    /// <inheritdoc/>
    protected override void OnInitialized() => Saver.Changed += Redraw;

    private async Task Share()
    {
        isWorking = true;
        try
        {
            await Saver.Flush();
            var answer = await Drafts.Share(await Caller.Now(), new ShareRequest(StructureId, sharedHash, choices));
            (clashes, sharedHash) = (answer.Clashes, answer.SharedHash);
            foreach (var settled in choices.Keys.Except(clashes.Select(c => c.Path)).ToList()) choices.Remove(settled);
            says = answer.Shared ? "" : $"{clashes.Count} fields were changed by another person too.";
            if (answer.Shared) await OnShared.InvokeAsync();
        }
        catch (ActRefused refused)
        {
            says = refused.Message;
        }
        finally
        {
            isWorking = false;
        }
    }

    private Take? Chosen(string path) => choices.TryGetValue(path, out var take) ? take : null;

    private static string FieldName(string path) => PlanFields.Table.At(path)?.Name is { } name ? $"{name} ({path})" : path;

    private void Redraw() => InvokeAsync(StateHasChanged);
}
