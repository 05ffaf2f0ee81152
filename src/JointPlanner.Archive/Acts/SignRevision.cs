using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Revisions;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Acts;

/// <summary>What the verifier found in the signed document; the archive itself reads no PDF.</summary>
/// <param name="CertificateFingerprint">SHA-256 of the signing certificate.</param>
/// <param name="PublicKeyHash">SHA-256 of its subject public key info.</param>
/// <param name="Objections">Everything that is not exactly one added signature in the prepared field, as sentences.</param>
public sealed record SignatureFacts(string CertificateFingerprint, string PublicKeyHash, IReadOnlyList<string> Objections);

/// <param name="ExpectedPreviousHash">Hash of the document that was signed, as the signer's page showed it; the facts were found against it.</param>
/// <param name="Document">The whole document with the new signature.</param>
public sealed record SignRequest(Guid RevisionId, SignatureField Field, string ExpectedPreviousHash, byte[] Document, SignatureFacts Facts);

public sealed record SignAnswer(Guid RevisionId, string DocumentHash);

/// <summary>Adds one signature in its own field; the archived bytes are an exact prefix of the signed document.</summary>
public sealed class SignRevision(ActDesk desk)
{
    public Task<SignAnswer> Do(ActCall call, SignRequest request, CancellationToken cancel = default) =>
        desk.Once(call, Act.Sign, Subject(request.RevisionId, request.Field), (run, stop) => Sign(run, request, stop), cancel);

    /// <summary>What this request was answered before; null where it was not. A signature is made anew at each press, so a second press has to ask first.</summary>
    public Task<SignAnswer?> Given(ActCall call, Guid revisionId, SignatureField field, CancellationToken cancel = default) =>
        desk.Given<SignAnswer>(call, Act.Sign, Subject(revisionId, field), cancel);

    private static async Task<SignAnswer> Sign(ActRun run, SignRequest request, CancellationToken cancel)
    {
        var revision = await run.Revision(request.RevisionId, Act.Sign, cancel);
        await RefuseForeignField(run, revision, request.Field, cancel);
        var stored = await StoredDocument.Read(run.Archive, revision.Id, cancel);
        if (stored.Segments.Any(segment => segment.Field == request.Field))
            throw new ActRefused(RefusalReason.FieldTaken, $"The {Word(request.Field)}'s field is signed already.");
        if (stored.Hash != request.ExpectedPreviousHash)
            throw new ActRefused(RefusalReason.DocumentMoved, $"The sheet has changed since you took it: it now has the hash {stored.Hash}. Somebody else signed meanwhile; take the sheet again and sign that.");
        if (request.Document.Length <= stored.Bytes.Length || !request.Document.AsSpan().StartsWith(stored.Bytes))
            throw new ActRefused(RefusalReason.NotAPrefix, "The signed document does not begin with the archived sheet, byte for byte. Sign the downloaded file with a program that only appends a signature.");
        await RefuseCertificate(run, stored, request.Facts, cancel);
        if (request.Facts.Objections.Count > 0)
            throw new ActRefused(RefusalReason.SignatureObjection, $"The signed document is not accepted: {string.Join(" ", request.Facts.Objections)}");

        var signer = new SignerOfSegment(request.Field, run.Person.Id, request.Facts.CertificateFingerprint, request.Facts.PublicKeyHash);
        var segment = StoredDocument.Next(revision.Id, stored, request.Document, signer);
        await run.Append(ChainName.Structure(revision.StructureId), segment, cancel);
        return new SignAnswer(revision.Id, segment.PrefixHash);
    }

    // The designer's field belongs to who froze, the checker's to who accepted.
    private static async Task RefuseForeignField(ActRun run, Revision revision, SignatureField field, CancellationToken cancel)
    {
        var act = field == SignatureField.Designer ? Act.Freeze : Act.Accept;
        var entry = revision.States.SingleOrDefault(entry => entry.Act == act);
        if (entry is null)
            throw new ActRefused(RefusalReason.WrongState, "The checker's field is signed with or after accepting; accept the revision first.");
        if (entry.PersonId != run.Person.Id)
            throw new ActRefused(RefusalReason.FieldNotYours, $"The {Word(field)}'s field belongs to another person: to the one who {(field == SignatureField.Designer ? "froze" : "accepted")} this revision.");
        await run.Need(act, revision.StructureId, cancel);
    }

    private static async Task RefuseCertificate(ActRun run, StoredDocument stored, SignatureFacts facts, CancellationToken cancel)
    {
        var registered = await run.Archive.Certificates.SingleOrDefaultAsync(certificate => certificate.Fingerprint == facts.CertificateFingerprint, cancel);
        if (registered is not { Counts: true } || registered.PersonId != run.Person.Id || registered.PublicKeyHash != facts.PublicKeyHash)
            throw new ActRefused(RefusalReason.CertificateUnknown, "The signing certificate is not one that is registered for you and confirmed by an administrator. Register it under your name, or sign with the registered one.");
        if (stored.Segments.Any(segment => segment.PublicKeyHash == facts.PublicKeyHash))
            throw new ActRefused(RefusalReason.SameKey, "The other field was signed with the same key; designer and checker need keys of their own.");
    }

    private static string Subject(Guid revisionId, SignatureField field) => $"revision {revisionId:D} field {field}";

    private static string Word(SignatureField field) => field == SignatureField.Designer ? "designer" : "checker";
}
