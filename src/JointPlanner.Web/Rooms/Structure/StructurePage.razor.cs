using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Drafts;
using JointPlanner.Archive.Rights;
using JointPlanner.Exchange.Plans;
using JointPlanner.Web.Shell;
using JointPlanner.Web.Start;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Authorization;
using Microsoft.EntityFrameworkCore;
using Side = JointPlanner.Archive.Drafts.Take;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>One structure: the person's own draft of it where they may edit, else the latest revision to look at.</summary>
public sealed partial class StructurePage : IAsyncDisposable
{
    private Workbench? bench;
    private DraftSaver? saver;
    private bool isMissing;
    private int sharedAgain;

    /// <summary>Id of the structure.</summary>
    [Parameter]
    public Guid Id { get; set; }

    [CascadingParameter]
    private Task<AuthenticationState> SignedIn { get; set; } = null!;

    [Inject]
    private IDbContextFactory<ArchiveContext> Archive { get; set; } = null!;

    [Inject]
    private DraftShelf Drafts { get; set; } = null!;

    [Inject]
    private PlanDesk Desk { get; set; } = null!;

    [Inject]
    private Preferences Preferences { get; set; } = null!;

    [Inject]
    private ILogger<StructurePage> Log { get; set; } = null!;

    /// <inheritdoc/>
    public async ValueTask DisposeAsync() => await Close();

    /// <inheritdoc/>
    protected override Task OnInitializedAsync() => Open();

    private async Task Open()
    {
        if (PersonClaims.IdOf((await SignedIn).User) is not { } person) return;
        try
        {
            await using var scope = await ArchiveScope.Enter(Archive, person);
            if (await scope.May(Act.Edit, Id)) await OpenDraft(person);
            else await OpenRevision(scope);
        }
        catch (NotFound)
        {
            isMissing = true;
        }
    }

    private async Task OpenDraft(Guid person)
    {
        var draft = await Drafts.Open(person, Id);
        Take(draft.Text, isReadOnly: false);
        if (!RendererInfo.IsInteractive) return;
        saver = new DraftSaver(Drafts, person, draft, Follow, Log);
        bench!.Edited += saver.Note;
    }

    private async Task OpenRevision(ArchiveScope scope)
    {
        var latest = await scope.Revisions().Where(r => r.StructureId == Id).OrderByDescending(r => r.Number).FirstOrDefaultAsync() ?? throw new NotFound("structure");
        Take(latest.PlanText, isReadOnly: true);
    }

    private void Take(string text, bool isReadOnly)
    {
        var (document, faults) = PlanDocument.Parse(text);
        if (document is null) throw new InvalidDataException($"The stored plan cannot be read: {faults[0].Wrong}");
        Preferences.Suggest(document.TextAt("display") == "us" ? UnitProfile.Us : UnitProfile.Metric);
        bench = new Workbench(document, Desk.Known, Desk.Compute, isReadOnly);
    }

    // The page goes on with what the draft holds now: what others saved comes in, what was typed meanwhile stays.
    private async Task<string> Follow(string before, string now)
    {
        var typed = bench!.Document;
        var merged = PlanMerge.Merge(before, typed.ToJson(), now);
        if (merged.Clashes.Count > 0) merged = PlanMerge.Merge(before, typed.ToJson(), now, merged.Clashes.ToDictionary(c => c.Path, _ => Side.Mine));
        if (PlanDocument.Parse(merged.Text).Document is not { } document || document.ToJson() == typed.ToJson()) return "";
        var known = typed.Texts().ToHashSet();
        var came = document.Texts().Count(text => !known.Contains(text));
        await bench.Take(document, "what came from elsewhere");
        return $"From elsewhere came {came} {(came == 1 ? "entry" : "entries")}.";
    }

    private async Task Close()
    {
        if (saver is not null) await saver.DisposeAsync();
        saver = null;
        bench?.Dispose();
    }
}
