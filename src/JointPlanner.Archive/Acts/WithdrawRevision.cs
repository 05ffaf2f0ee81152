using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.Acts;

public sealed record WithdrawRequest(Guid RevisionId, string Reason);

public sealed record WithdrawAnswer(Guid RevisionId, string Reason);

/// <summary>Issued → withdrawn; the reason shows at once wherever the revision is looked up.</summary>
public sealed class WithdrawRevision(ActDesk desk)
{
    public Task<WithdrawAnswer> Do(ActCall call, WithdrawRequest request, CancellationToken cancel = default) =>
        desk.Once(call, Act.Withdraw, $"revision {request.RevisionId:D}", (run, stop) => Withdraw(run, request, stop), cancel);

    private static async Task<WithdrawAnswer> Withdraw(ActRun run, WithdrawRequest request, CancellationToken cancel)
    {
        var revision = await run.Revision(request.RevisionId, Act.Withdraw, cancel);
        if (string.IsNullOrWhiteSpace(request.Reason))
            throw new ActRefused(RefusalReason.ReasonMissing, "A revision is withdrawn with a reason; write what is wrong with it.");
        var reason = PlainText.Required("reason", request.Reason, PlainText.NoteLimit);
        await run.Move(revision, Act.Withdraw, reason, subjectHash: null, cancel);
        return new WithdrawAnswer(revision.Id, reason);
    }
}
