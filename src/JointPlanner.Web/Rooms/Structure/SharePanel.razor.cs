using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Drafts;
using JointPlanner.Web.Shared;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>Saving of the own draft, and merging it into the plan that all share.</summary>
public sealed partial class SharePanel
{
    private readonly Dictionary<string, Take> choices = [];
    private IReadOnlyList<Clash> clashes = [];
    private ElementReference button, board;
    private bool isBoardNew, wasDecided;
    private string? sharedHash;
    private string says = "", done = "";
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

    [Inject]
    private NavigationManager Navigation { get; set; } = null!;

    /// <inheritdoc/>
    public override void Dispose()
    {
        Saver.Changed -= Redraw;
        base.Dispose();
    }

    /// <inheritdoc/>
    protected override void OnInitialized()
    {
        base.OnInitialized();
        Saver.Changed += Redraw;
    }

    /// <inheritdoc/>
    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        // What a person has to decide is where they go next; once it is decided they are back where they came from.
        if (isBoardNew && clashes.Count > 0) await board.FocusAsync();
        else if (wasDecided) await button.FocusAsync();
        isBoardNew = wasDecided = false;
    }

    private async Task Share()
    {
        if (isWorking) return;
        (isWorking, says, done) = (true, "", "");
        var shown = clashes.Count;
        try
        {
            var call = await Caller.Now();
            if (await Saver.Share(() => Drafts.Share(call, new ShareRequest(StructureId, sharedHash, choices))) is not { } found) return;
            (var answer, done) = (found.Answer, found.Answer.Shared ? $"Saved for all. {found.CameIn}".TrimEnd() : "");
            (clashes, sharedHash) = (answer.Clashes, answer.SharedHash);
            foreach (var settled in choices.Keys.Except(clashes.Select(c => c.Path)).ToList()) choices.Remove(settled);
            says = answer.Shared ? "" : clashes.Count == 1 ? "One field was changed by another person too. Nothing was saved for all yet." : $"{clashes.Count} fields were changed by another person too. Nothing was saved for all yet.";
            if (answer.Shared) await OnShared.InvokeAsync();
            (isBoardNew, wasDecided) = (clashes.Count > 0, shown > 0 && clashes.Count == 0);
        }
        catch (ActRefused refused)
        {
            says = refused.Message;
        }
        catch (Exception problem) when (ArchiveSilence.Is(problem))
        {
            says = ArchiveSilence.Says;
        }
        finally
        {
            isWorking = false;
        }
    }

    private Take? Chosen(string path) => choices.TryGetValue(path, out var take) ? take : null;

    private void LoadAgain() => Navigation.NavigateTo(Navigation.Uri, forceLoad: true);
}
