using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Structures;
using JointPlanner.Exchange.Plans;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Rooms.Structures;

/// <summary>Puts a beginning into the archive as a new structure with its first draft.</summary>
public sealed class FirstDraft(IDbContextFactory<ArchiveContext> archive, StructureRegister register)
{
    /// <summary>Begins it in the first organisation where the person may; null where there is none.</summary>
    public async Task<Guid?> Begin(ActCall call, string name, string zone, PlanDocument plan)
    {
        await using var scope = await ArchiveScope.Enter(archive, call.PersonId);
        foreach (var organisation in await scope.Organisations().OrderBy(o => o.Name).ToListAsync())
        {
            if (!await scope.MayIn(Act.CreateStructure, organisation.Id)) continue;
            var known = zone.Trim() is { Length: > 0 } given ? given : "Etc/UTC";
            return (await register.Create(call, new CreateRequest(organisation.Id, name, known, plan.ToJson()))).StructureId;
        }

        return null;
    }
}
