using JointPlanner.Archive.People;
using JointPlanner.Archive.Revisions;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Acts;

/// <param name="PublicKeyHash">SHA-256 of the subject public key info that the signature verified with.</param>
public sealed record VerifiedSignature(SignatureField Field, string PublicKeyHash);

/// <summary>What the calculation and the verifier say about the revision at this moment.</summary>
/// <param name="DocumentHash">Hash of the document whose signatures were verified.</param>
/// <param name="UnconfirmedValues">Memory values used and not confirmed, as they are printed.</param>
/// <param name="UnansweredSilences">Questions on which the code is silent and the designer has not decided.</param>
/// <param name="CausesLeftOut">Causes of movement that the sheet names as not included.</param>
public sealed record IssueFacts(
    string DocumentHash,
    IReadOnlyList<string> UnconfirmedValues,
    IReadOnlyList<string> UnansweredSilences,
    IReadOnlyList<string> CausesLeftOut,
    IReadOnlyList<VerifiedSignature> Signatures);

public sealed record IssueRequest(Guid RevisionId, IssueFacts Facts);

/// <param name="SupersededId">The revision that was issued before, if one was.</param>
public sealed record IssueAnswer(Guid RevisionId, int Number, string DocumentHash, Guid? SupersededId);

/// <summary>Checked → issued, and the one issued before → superseded, in one transaction.</summary>
public sealed class IssueRevision(ActDesk desk)
{
    public Task<IssueAnswer> Do(ActCall call, IssueRequest request, CancellationToken cancel = default) =>
        desk.Once(call, Act.Issue, $"revision {request.RevisionId:D}", (run, stop) => Issue(run, request, stop), cancel);

    private static async Task<IssueAnswer> Issue(ActRun run, IssueRequest request, CancellationToken cancel)
    {
        var revision = await run.Revision(request.RevisionId, Act.Issue, cancel);
        var rule = await run.Archive.Organisations.AsNoTracking().SingleAsync(row => row.Id == revision.Structure!.OrganisationId, cancel);
        await RefuseByRule(run, revision, rule, cancel);
        RefuseOpenQuestions(request.Facts);
        await StoredPackage.Intact(run.Archive, revision.Id, cancel);
        var stored = await StoredDocument.Read(run.Archive, revision.Id, cancel);
        await RefuseSignatures(run, stored, rule, request.Facts, cancel);

        var earlier = await Earlier(run, revision, cancel);
        if (earlier is not null) await run.Move(earlier, Act.Supersede, $"Revision {revision.Number} was issued.", subjectHash: null, cancel);
        await run.Move(revision, Act.Issue, reason: null, stored.Hash, cancel);
        return new IssueAnswer(revision.Id, revision.Number, stored.Hash, earlier?.Id);
    }

    private static async Task RefuseByRule(ActRun run, Revision revision, Organisation rule, CancellationToken cancel)
    {
        var roles = await run.Scope.RolesFor(Act.Issue, revision.StructureId, cancel);
        var allowed = rule.IssuedBy switch
        {
            IssuedBy.Designer => roles.Contains(Role.Designer),
            IssuedBy.Owner => roles.Contains(Role.Owner),
            IssuedBy.DesignerOrOwner => true,
            _ => throw new InvalidOperationException($"No such rule: {rule.IssuedBy}."),
        };
        if (!allowed)
            throw new ActRefused(RefusalReason.NotYourAct, $"By the rule of {rule.Name} a revision is issued by the {rule.IssuedBy.ToString().ToLowerInvariant()}; you do not hold that role.");
    }

    private static void RefuseOpenQuestions(IssueFacts facts)
    {
        if (facts.UnconfirmedValues.Count > 0)
            throw new ActRefused(RefusalReason.MemoryValueUnconfirmed, $"{facts.UnconfirmedValues.Count} value(s) held from memory are not confirmed, first: {facts.UnconfirmedValues[0]}. The owner confirms them, then a new draft is frozen.");
        if (facts.UnansweredSilences.Count > 0)
            throw new ActRefused(RefusalReason.SilenceUnanswered, $"{facts.UnansweredSilences.Count} question(s) on which the code is silent are not answered, first: {facts.UnansweredSilences[0]}. Answer them in a new draft.");
        if (facts.CausesLeftOut.Count > 0)
            throw new ActRefused(RefusalReason.CauseNotIncluded, $"{facts.CausesLeftOut.Count} cause(s) of movement are not included, first: {facts.CausesLeftOut[0]}. Enter them, as zero with a source if there is none, in a new draft.");
    }

    private static async Task RefuseSignatures(ActRun run, StoredDocument stored, Organisation rule, IssueFacts facts, CancellationToken cancel)
    {
        if (facts.DocumentHash != stored.Hash)
            throw new ActRefused(RefusalReason.DocumentMoved, $"The sheet has changed since its signatures were verified: it now has the hash {stored.Hash}. Load the page again.");
        foreach (var (field, required) in ((SignatureField, bool)[])[(SignatureField.Designer, rule.DesignerSignatureRequired), (SignatureField.Checker, rule.CheckerSignatureRequired)])
        {
            var segment = stored.Segments.SingleOrDefault(segment => segment.Field == field);
            if (segment is null && !required) continue;
            var word = field.ToString().ToLowerInvariant();
            if (segment is null)
                throw new ActRefused(RefusalReason.SignatureMissing, $"The {word}'s field is not signed; {rule.Name} requires it.");
            if (!facts.Signatures.Any(signature => signature.Field == field && signature.PublicKeyHash == segment.PublicKeyHash))
                throw new ActRefused(RefusalReason.SignatureMissing, $"The {word}'s signature does not verify; the sheet is not issued.");
            if (!await run.Archive.Certificates.AnyAsync(row => row.Fingerprint == segment.CertificateFingerprint && row.RevokedAt == null, cancel))
                throw new ActRefused(RefusalReason.SignatureMissing, $"The certificate of the {word}'s signature was revoked; the sheet is not issued.");
        }
    }

    private static async Task<Revision?> Earlier(ActRun run, Revision revision, CancellationToken cancel)
    {
        var others = await run.Archive.Revisions.Include(row => row.States).Where(row => row.StructureId == revision.StructureId && row.Id != revision.Id).ToListAsync(cancel);
        var newer = others.FirstOrDefault(row => row.Number > revision.Number && row.States.Any(entry => entry.State == RevisionState.Issued));
        if (newer is not null)
            throw new ActRefused(RefusalReason.NewerIssued, $"Revision {newer.Number} was issued already; revision {revision.Number} is older and is not issued after it.");
        return others.SingleOrDefault(row => row.State == RevisionState.Issued);
    }
}
