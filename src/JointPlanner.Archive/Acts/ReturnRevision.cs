using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.Acts;

/// <param name="About">Path in the plan or key of a result, or null.</param>
public sealed record RemarkText(string Text, string? About = null);

public sealed record ReturnRequest(Guid RevisionId, IReadOnlyList<RemarkText> Remarks);

/// <param name="DraftId">The draft in which the work goes on: begun by this act, or one that stood already.</param>
public sealed record ReturnAnswer(Guid RevisionId, Guid DraftId, int DraftNumber);

/// <summary>In check → returned, with remarks; the frozen one is kept and a new draft with the next number stands.</summary>
public sealed class ReturnRevision(ActDesk desk)
{
    public Task<ReturnAnswer> Do(ActCall call, ReturnRequest request, CancellationToken cancel = default) =>
        desk.Once(call, Act.Return, $"revision {request.RevisionId:D}", (run, stop) => Return(run, request, stop), cancel);

    private static async Task<ReturnAnswer> Return(ActRun run, ReturnRequest request, CancellationToken cancel)
    {
        var revision = await run.Revision(request.RevisionId, Act.Return, cancel);
        if (request.Remarks.Count == 0) throw new ActRefused(RefusalReason.RemarkMissing, "A revision is returned with at least one remark; write what has to change.");
        foreach (var remark in request.Remarks)
        {
            var row = new Remark
            {
                RevisionId = revision.Id,
                PersonId = run.Person.Id,
                About = PlainText.Optional("about", remark.About, PlainText.NameLimit),
                Text = PlainText.Required("remark", remark.Text, PlainText.NoteLimit),
            };
            await run.Append(ChainName.Structure(revision.StructureId), row, cancel);
        }

        await run.Move(revision, Act.Return, reason: null, subjectHash: null, cancel);
        var draft = await BeginRevision.OpenDraft(run, revision.StructureId, cancel)
            ?? await BeginRevision.Next(run, revision.StructureId, revision.PlanText, Act.Return, cancel);
        return new ReturnAnswer(revision.Id, draft.Id, draft.Number);
    }
}
