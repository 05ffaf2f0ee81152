using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Values;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Drafts;

/// <param name="SharedHash">Hash of the shared plan that the clashes were shown against; the choices hold only for that one.</param>
public sealed record ShareRequest(Guid StructureId, string? SharedHash = null, IReadOnlyDictionary<string, Take>? Choices = null);

/// <param name="Shared">False when clashes are left: then nothing was changed.</param>
/// <param name="SharedHash">Hash of the shared plan as it stands now.</param>
public sealed record ShareAnswer(bool Shared, string SharedHash, IReadOnlyList<Clash> Clashes);

/// <summary>Each person's drafts: saved while typing, taken up again after a lost connection, shared by a merge.</summary>
public sealed class DraftShelf(IDbContextFactory<ArchiveContext> archive, ActDesk desk, TimeProvider clock)
{
    private static readonly TimeSpan InBin = TimeSpan.FromDays(30);

    /// <summary>The person's draft as last saved, or a new one from the structure's latest revision.</summary>
    public async Task<Draft> Open(Guid personId, Guid structureId, CancellationToken cancel = default)
    {
        await using var context = await archive.CreateDbContextAsync(cancel);
        var scope = await ArchiveScope.Of(context, personId, cancel);
        if (!await scope.Structures(Act.Edit).AnyAsync(structure => structure.Id == structureId, cancel)) throw new NotFound("structure");
        var draft = await scope.Drafts().FirstOrDefaultAsync(row => row.StructureId == structureId && row.BinnedAt == null, cancel);
        if (draft is not null) return draft;

        var latest = await context.Revisions.AsNoTracking().Where(revision => revision.StructureId == structureId)
            .OrderByDescending(revision => revision.Number).FirstOrDefaultAsync(cancel) ?? throw new NotFound("revision");
        draft = new Draft
        {
            StructureId = structureId,
            PersonId = personId,
            RevisionId = latest.Id,
            BaseText = latest.PlanText,
            Text = latest.PlanText,
            SavedAt = clock.GetUtcNow(),
        };
        context.Drafts.Add(draft);
        try
        {
            await context.SaveChangesAsync(cancel);
            return draft;
        }
        catch (DbUpdateException)
        {
            // Two windows opened at once: the other's draft is this person's draft.
            context.ChangeTracker.Clear();
            return await scope.Drafts().FirstOrDefaultAsync(row => row.StructureId == structureId && row.BinnedAt == null, cancel) ?? throw new NotFound("draft");
        }
    }

    /// <summary>Saves the text as typed.</summary>
    /// <param name="version">Version of the draft that the page holds; a second window that saved meanwhile is not overwritten.</param>
    /// <returns>The new version.</returns>
    public Task<long> Save(Guid personId, Guid draftId, long version, string text, CancellationToken cancel = default)
    {
        PlanDocument.Check(text);
        return Change(personId, draftId, version, draft => draft.Text = text, cancel);
    }

    /// <summary>Puts the draft into the bin, for 30 days.</summary>
    public Task<long> Bin(Guid personId, Guid draftId, long version, CancellationToken cancel = default) =>
        Change(personId, draftId, version, draft => draft.BinnedAt = clock.GetUtcNow(), cancel);

    /// <summary>Takes it out of the bin; refused while another draft of the structure is open.</summary>
    public async Task<long> TakeBack(Guid personId, Guid draftId, long version, CancellationToken cancel = default)
    {
        try
        {
            return await Change(personId, draftId, version, draft => draft.BinnedAt = null, cancel);
        }
        catch (DbUpdateException problem) when (problem is not DbUpdateConcurrencyException)
        {
            throw new ActRefused(RefusalReason.DraftExists, "You have another draft of this structure; put that into the bin first, or share it.");
        }
    }

    /// <summary>Removes what has been in the bin for 30 days. Says how many.</summary>
    public async Task<int> EmptyBin(CancellationToken cancel = default)
    {
        await using var context = await archive.CreateDbContextAsync(cancel);
        var before = clock.GetUtcNow() - InBin;
        return await context.Drafts.Where(draft => draft.BinnedAt != null && draft.BinnedAt < before).ExecuteDeleteAsync(cancel);
    }

    /// <summary>Merges the person's draft into the structure's shared draft revision.</summary>
    public Task<ShareAnswer> Share(ActCall call, ShareRequest request, CancellationToken cancel = default) =>
        desk.Once(call, Act.Edit, $"structure {request.StructureId:D}", (run, stop) => Share(run, request, stop), cancel);

    private static async Task<ShareAnswer> Share(ActRun run, ShareRequest request, CancellationToken cancel)
    {
        await run.Structure(request.StructureId, Act.Edit, cancel);
        var draft = await run.Scope.Drafts().FirstOrDefaultAsync(row => row.StructureId == request.StructureId && row.BinnedAt == null, cancel) ?? throw new NotFound("draft");
        var shared = await BeginRevision.OpenDraft(run, request.StructureId, cancel)
            ?? throw new ActRefused(RefusalReason.WrongState, "No revision of this structure is a draft: the last one is frozen. Begin a new revision, then save into it; your own draft is kept.");

        // Choices were made looking at one shared plan; against another they would decide what nobody saw.
        var choices = request.SharedHash == shared.PlanHash ? request.Choices : null;
        var merged = PlanMerge.Merge(draft.BaseText, draft.Text, shared.PlanText, choices);
        if (merged.Clashes.Count > 0)
        {
            run.Detail = $"{merged.Clashes.Count} clash(es), nothing changed";
            return new ShareAnswer(false, shared.PlanHash, merged.Clashes);
        }

        var before = shared.PlanHash;
        var after = Fingerprint.Of(merged.Text);
        if (after != before)
        {
            shared.PlanText = merged.Text;
            shared.PlanHash = after;
            var edit = new RevisionEdit { RevisionId = shared.Id, PersonId = run.Person.Id, PlanHashBefore = before, PlanHashAfter = after };
            await run.Append(ChainName.Structure(request.StructureId), edit, cancel);
        }

        draft.RevisionId = shared.Id;
        draft.BaseText = merged.Text;
        draft.Text = merged.Text;
        draft.SavedAt = run.Now;
        return new ShareAnswer(true, after, []);
    }

    private async Task<long> Change(Guid personId, Guid draftId, long version, Action<Draft> change, CancellationToken cancel)
    {
        await using var context = await archive.CreateDbContextAsync(cancel);
        var scope = await ArchiveScope.Of(context, personId, cancel);
        var draft = await scope.Drafts().FirstOrDefaultAsync(row => row.Id == draftId, cancel) ?? throw new NotFound("draft");
        context.Entry(draft).Property(row => row.Version).OriginalValue = version;
        change(draft);
        draft.SavedAt = clock.GetUtcNow();
        try
        {
            await context.SaveChangesAsync(cancel);
            return draft.Version;
        }
        catch (DbUpdateConcurrencyException)
        {
            throw new ActRefused(RefusalReason.PlanMoved, "This draft was saved from another window meanwhile. Load it again; what you typed here is still in this window.");
        }
    }
}
