using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Drafts;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Values;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Acts;

/// <param name="PlanText">The plan to begin with; null takes the one of the latest revision.</param>
public sealed record BeginRequest(Guid StructureId, string? PlanText = null);

public sealed record BeginAnswer(Guid RevisionId, int Number);

/// <summary>Begins the next draft of a structure.</summary>
public sealed class BeginRevision(ActDesk desk)
{
    public Task<BeginAnswer> Do(ActCall call, BeginRequest request, CancellationToken cancel = default) =>
        desk.Once(call, Act.Begin, $"structure {request.StructureId:D}", (run, stop) => Begin(run, request, stop), cancel);

    private static async Task<BeginAnswer> Begin(ActRun run, BeginRequest request, CancellationToken cancel)
    {
        await run.Structure(request.StructureId, Act.Begin, cancel);
        if (await OpenDraft(run, request.StructureId, cancel) is { } open)
            throw new ActRefused(RefusalReason.DraftExists, $"Revision {open.Number} of this structure is a draft already; work on that one.");
        var begun = await Next(run, request.StructureId, request.PlanText, Act.Begin, cancel);
        return new BeginAnswer(begun.Id, begun.Number);
    }

    internal static async Task<Revision?> OpenDraft(ActRun run, Guid structureId, CancellationToken cancel)
    {
        var revisions = await run.Archive.Revisions.Include(revision => revision.States).Where(revision => revision.StructureId == structureId)
            .OrderByDescending(revision => revision.Number).ToListAsync(cancel);
        return revisions.FirstOrDefault(revision => revision.State == RevisionState.Draft);
    }

    internal static async Task<Revision> Next(ActRun run, Guid structureId, string? planText, Act act, CancellationToken cancel)
    {
        var latest = await run.Archive.Revisions.Where(revision => revision.StructureId == structureId)
            .OrderByDescending(revision => revision.Number).FirstOrDefaultAsync(cancel);
        var text = planText ?? latest?.PlanText ?? throw new ActRefused(RefusalReason.TextMissing, "A structure's first revision needs a plan to begin with.");
        PlanDocument.Check(text);
        var next = new Revision
        {
            StructureId = structureId,
            Number = (latest?.Number ?? 0) + 1,
            PlanText = text,
            PlanHash = Fingerprint.Of(text),
        };
        run.Archive.Revisions.Add(next);
        await run.Archive.SaveChangesAsync(cancel);
        if (next.PlanHash != latest?.PlanHash)
        {
            var edit = new RevisionEdit
            {
                RevisionId = next.Id,
                PersonId = run.Person.Id,
                PlanHashBefore = latest?.PlanHash ?? Fingerprint.None,
                PlanHashAfter = next.PlanHash,
            };
            await run.Append(ChainName.Structure(structureId), edit, cancel);
        }

        var first = new StateEntry { RevisionId = next.Id, Ordinal = 1, State = RevisionState.Draft, Act = act, PersonId = run.Person.Id };
        await run.Append(ChainName.Structure(structureId), first, cancel);
        await run.Archive.SaveChangesAsync(cancel);
        return next;
    }
}
