using System.Text.Json.Nodes;
using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using JointPlanner.Exchange.Plans;
using JointPlanner.Issuing;
using JointPlanner.Web.Rooms.Structure;
using Microsoft.AspNetCore.Identity;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>Issues a demo structure through the archive's own acts with results into which numbers were planted: what a page then shows can only come from there.</summary>
internal static class PlantedArchive
{
    /// <summary>Freezes, accepts and issues the structure's draft; a new one is begun where there is none.</summary>
    /// <param name="site">The running site.</param>
    /// <param name="structure">Name of the structure.</param>
    /// <param name="plant">Changes the results before they are frozen.</param>
    /// <returns>Id of the structure and of the revision.</returns>
    public static async Task<(Guid Structure, Guid Revision)> IssuePlanted(this RunningSite site, string structure, Action<JsonNode> plant)
    {
        await using var services = site.Services.CreateAsyncScope();
        var at = services.ServiceProvider;
        var archive = at.GetRequiredService<IDbContextFactory<ArchiveContext>>();
        var people = at.GetRequiredService<UserManager<Person>>();
        async Task<ActCall> By(string account) => ActCall.AtConsole((await people.FindByNameAsync(account))!.Id, TimeProvider.System.GetUtcNow());
        await using var scope = await ArchiveScope.Enter(archive, (await By("designer")).PersonId);
        var revision = await Latest(scope, structure);
        if (revision.State != RevisionState.Draft)
        {
            await at.GetRequiredService<BeginRevision>().Do(await By("designer"), new BeginRequest(revision.StructureId));
            revision = await Latest(scope, structure);
        }

        var organisation = await scope.Structures().Where(s => s.Id == revision.StructureId).Select(s => s.OrganisationId).SingleAsync();
        await at.GetRequiredService<OrganisationRegister>().SetRule(await By("owner"), organisation, new OwnerRule(IssuedBy.DesignerOrOwner, DesignerSignatureRequired: false, CheckerSignatureRequired: false));

        var frozen = FrozenCalculation.Of(at.GetRequiredService<PlanDesk>().Compute(PlanDocument.Parse(revision.PlanText).Document!, CancellationToken.None), [],
            new SheetTitle { Revision = "1", Date = DateTimeOffset.UnixEpoch });
        var results = JsonNode.Parse(frozen.Results)!;
        plant(results);
        var package = System.Text.Encoding.UTF8.GetString(frozen.Package);
        var freeze = await at.GetRequiredService<FreezeRevision>().Do(await By("designer"),
            new FreezeRequest(revision.Id, revision.PlanHash, [], package, results.ToJsonString(), frozen.Sheet.Bytes, ProgramVersion.Number));
        await at.GetRequiredService<AcceptRevision>().Do(await By("checker"), new AcceptRequest(revision.Id, freeze.PackageHash));
        var document = await scope.Document(revision.Id);
        await at.GetRequiredService<IssueRevision>().Do(await By("owner"), new IssueRequest(revision.Id, new IssueFacts(document.Hash, [], [], [], [])));
        return (revision.StructureId, revision.Id);
    }

    private static Task<Revision> Latest(ArchiveScope scope, string structure) =>
        scope.Revisions().Include(r => r.States).Where(r => r.Structure!.Name == structure).OrderByDescending(r => r.Number).FirstAsync();
}
