using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Values;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Acts;

/// <param name="HashShown">The package's hash as the checker's page showed it.</param>
public sealed record AcceptRequest(Guid RevisionId, string HashShown);

public sealed record AcceptAnswer(Guid RevisionId, string PackageHash);

/// <summary>In check → checked, by somebody who designed none of it.</summary>
public sealed class AcceptRevision(ActDesk desk)
{
    public Task<AcceptAnswer> Do(ActCall call, AcceptRequest request, CancellationToken cancel = default) =>
        desk.Once(call, Act.Accept, $"revision {request.RevisionId:D}", (run, stop) => Accept(run, request, stop), cancel);

    private static async Task<AcceptAnswer> Accept(ActRun run, AcceptRequest request, CancellationToken cancel)
    {
        var revision = await run.Revision(request.RevisionId, Act.Accept, cancel);
        var package = await StoredPackage.Intact(run.Archive, revision.Id, cancel);
        await StoredDocument.Read(run.Archive, revision.Id, cancel);
        if (!Fingerprint.Same(request.HashShown, package.PackageHash))
            throw new ActRefused(RefusalReason.HashDiffers, $"What your page showed has the hash {request.HashShown}, what is frozen has {package.PackageHash}. Load the page again and check that.");

        var designers = await Designers.Of(run.Archive, revision, cancel);
        if (designers.Contains(run.Person.Id))
            throw new ActRefused(RefusalReason.CheckerIsDesigner, "You changed inputs since the last issue, or froze them, and so count as designer; another person has to check.");
        await Designers.RefuseSharedKey(run.Archive, designers, run.Person.Id, cancel);
        await run.Move(revision, Act.Accept, reason: null, package.PackageHash, cancel);
        return new AcceptAnswer(revision.Id, package.PackageHash);
    }
}
