using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.Acts;

/// <param name="PlanHash">Hash of the plan that the package was computed from.</param>
/// <param name="Faults">What is wrong with the plan, as sentences.</param>
/// <param name="PackageText">The calculation package, as it will be hashed and attached.</param>
/// <param name="Pdf">The sheet, unsigned, with its prepared fields.</param>
public sealed record FreezeRequest(
    Guid RevisionId, string PlanHash, IReadOnlyList<string> Faults, string PackageText, string ResultsText, byte[] Pdf, string EngineVersion);

/// <param name="DocumentHash">Hash of the sheet: what the first signer expects.</param>
public sealed record FreezeAnswer(Guid RevisionId, string PackageHash, string ResultsHash, string DocumentHash);

/// <summary>Draft → in check: package, results and sheet are stored once and never change again.</summary>
public sealed class FreezeRevision(ActDesk desk)
{
    public Task<FreezeAnswer> Do(ActCall call, FreezeRequest request, CancellationToken cancel = default) =>
        desk.Once(call, Act.Freeze, $"revision {request.RevisionId:D}", (run, stop) => Freeze(run, request, stop), cancel);

    private static async Task<FreezeAnswer> Freeze(ActRun run, FreezeRequest request, CancellationToken cancel)
    {
        var revision = await run.Revision(request.RevisionId, Act.Freeze, cancel);
        if (request.Faults.Count > 0)
            throw new ActRefused(RefusalReason.PlanFaults, $"The plan has {request.Faults.Count} fault(s), first: {request.Faults[0]} Mend them, then freeze.");
        if (request.PlanHash != revision.PlanHash)
            throw new ActRefused(RefusalReason.PlanMoved, "The shared plan was changed after this calculation was made. Load the page again, look at the new results, then freeze.");
        if (request.Pdf.Length == 0) throw new ActRefused(RefusalReason.TextMissing, "There is no sheet to freeze; make the sheet first.");

        var package = new FrozenPackage
        {
            RevisionId = revision.Id,
            DesignerId = run.Person.Id,
            PackageText = request.PackageText,
            PackageHash = Fingerprint.Of(request.PackageText),
            ResultsText = request.ResultsText,
            ResultsHash = Fingerprint.Of(request.ResultsText),
            EngineVersion = request.EngineVersion,
        };
        var sheet = StoredDocument.Next(revision.Id, before: null, request.Pdf, signer: null);
        var chain = ChainName.Structure(revision.StructureId);
        await run.Append(chain, package, cancel);
        await run.Append(chain, sheet, cancel);
        await run.Move(revision, Act.Freeze, reason: null, package.PackageHash, cancel);
        return new FreezeAnswer(revision.Id, package.PackageHash, package.ResultsHash, sheet.PrefixHash);
    }
}
