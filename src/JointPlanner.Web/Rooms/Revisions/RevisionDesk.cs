using System.Security.Cryptography.X509Certificates;
using System.Text;
using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Confirming;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using JointPlanner.Exchange.Plans;
using JointPlanner.Issuing;
using JointPlanner.Issuing.Comparing;
using JointPlanner.Web.Rooms.Structure;
using JointPlanner.Web.Start;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Rooms.Revisions;

/// <summary>Acts of a revision that need the calculation, the sheet or its signatures beside the archive.</summary>
public sealed class RevisionDesk(
    IDbContextFactory<ArchiveContext> archive, PlanDesk plans, FreezeRevision freezing, SignRevision signing, IssueRevision issuing, DemoMode demo, TimeProvider clock)
{
    /// <summary>Computes the shared plan and freezes it with its sheet.</summary>
    public async Task Freeze(ActCall call, Guid revisionId)
    {
        await using var scope = await ArchiveScope.Enter(archive, call.PersonId);
        var view = await RevisionView.Read(scope, revisionId);
        var text = view.Revision.PlanText;
        var document = PlanDocument.Parse(text).Document ?? throw new InvalidDataException("The stored plan cannot be read.");
        var calculation = await Task.Run(() => plans.Compute(document, CancellationToken.None));
        var faults = calculation.Obstacles;
        if (faults.Count > 0 || calculation.Result is null)
            throw new ActRefused(RefusalReason.PlanFaults, $"The plan has {faults.Count} fault(s), first: {(faults.Count > 0 ? faults[0] : "nothing was computed.")} Mend them, save for all, then freeze.");
        var inForce = await Confirmations.InForce(scope, view.Structure.OrganisationId);
        var owner = await scope.Owners().Where(o => o.Id == view.Structure.OrganisationId).Select(o => o.Name).FirstOrDefaultAsync();
        var frozen = FrozenCalculation.Of(calculation, [.. inForce.Values.Select(Worded)], new SheetTitle
        {
            Revision = view.Revision.Number.ToString(System.Globalization.CultureInfo.InvariantCulture),
            Date = clock.GetUtcNow(),
            Designer = scope.Person.Name,
            Organisation = owner ?? "",
            IsDemonstration = demo.IsOn,
            Letter = document.TextAt("display") == "us",
        });
        await freezing.Do(call, new FreezeRequest(
            revisionId, view.Revision.PlanHash, faults, Encoding.UTF8.GetString(frozen.Package), Encoding.UTF8.GetString(frozen.Results), frozen.Sheet.Bytes, ProgramVersion.Number));
    }

    /// <summary>Takes a sheet that came back with this person's signature.</summary>
    public async Task Sign(ActCall call, Guid revisionId, SignatureField field, string expectedHash, byte[] signed)
    {
        await using var scope = await ArchiveScope.Enter(archive, call.PersonId);
        var stored = await scope.Document(revisionId);
        var mine = await scope.Certificates().Where(c => c.PersonId == call.PersonId && c.ConfirmedAt != null && c.RevokedAt == null).OrderByDescending(c => c.RegisteredAt).FirstOrDefaultAsync()
            ?? throw new ActRefused(RefusalReason.CertificateUnknown, "No confirmed certificate of yours is known here. Hand in your public certificate under People; an administrator confirms it by its fingerprint.");
        using var certificate = X509CertificateLoader.LoadCertificate(mine.Encoded);
        var facts = SignatureJudge.Facts(stored.Bytes, signed, field, certificate, clock.GetUtcNow());
        await signing.Do(call, new SignRequest(revisionId, field, expectedHash, signed, facts));
    }

    /// <summary>Whether this very request has signed already.</summary>
    public async Task<bool> WasSigned(ActCall call, Guid revisionId, SignatureField field) => await signing.Given(call, revisionId, field) is not null;

    /// <summary>Computes a frozen revision again from its stored package and compares; nothing is changed and nothing is written.</summary>
    public async Task<RunAgain> RunAgain(Guid personId, Guid revisionId, CancellationToken cancellation)
    {
        await using var scope = await ArchiveScope.Enter(archive, personId, cancellation);
        var package = await scope.Packages().FirstOrDefaultAsync(p => p.RevisionId == revisionId, cancellation) ?? throw new NotFound("revision");
        return await Task.Run(() => Issuing.Comparing.RunAgain.Of(Encoding.UTF8.GetBytes(package.PackageText), Encoding.UTF8.GetBytes(package.ResultsText), cancellation), cancellation);
    }

    /// <summary>Issues a checked revision, judged from its frozen package and its sheet alone.</summary>
    public async Task Issue(ActCall call, Guid revisionId)
    {
        await using var scope = await ArchiveScope.Enter(archive, call.PersonId);
        var package = await scope.Packages().FirstOrDefaultAsync(p => p.RevisionId == revisionId) ?? throw new NotFound("revision");
        var stored = await scope.Document(revisionId);
        var facts = IssueQuestions.Of(Encoding.UTF8.GetBytes(package.PackageText), stored.Hash, StoredSignatures.Verified(stored));
        await issuing.Do(call, new IssueRequest(revisionId, facts));
    }

    private static Exchange.Packages.Confirmation Worded(Confirmation c) =>
        new(c.ValueId, c.Document, c.Edition, c.Place, c.DemonstrationOnly ? $"{c.PersonName} (confirmed for demonstration only)" : c.PersonName, c.Date);
}
