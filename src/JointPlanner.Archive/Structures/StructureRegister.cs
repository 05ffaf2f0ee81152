using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Values;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Structures;

/// <param name="Zone">IANA zone of the place ("Europe/Oslo").</param>
public sealed record CreateRequest(Guid OrganisationId, string Name, string Zone, string PlanText);

public sealed record StructureAnswer(Guid StructureId);

/// <param name="RevisionId">Its first revision, a draft.</param>
public sealed record CreateAnswer(Guid StructureId, Guid RevisionId);

/// <summary>Structures, to whom they are opened, and their closing.</summary>
public sealed class StructureRegister(ActDesk desk)
{
    /// <summary>Creates the structure with its first draft.</summary>
    public Task<CreateAnswer> Create(ActCall call, CreateRequest request, CancellationToken cancel = default) =>
        desk.Once(call, Act.CreateStructure, $"organisation {request.OrganisationId:D} structure named {request.Name}", async (run, stop) =>
        {
            await run.NeedIn(Act.CreateStructure, request.OrganisationId, stop);
            if (!TimeZoneInfo.TryFindSystemTimeZoneById(request.Zone, out var zone) || !zone.HasIanaId)
                throw new ActRefused(RefusalReason.ValueOutOfRange, $"The field \"zone\" is \"{request.Zone}\"; it has to be an IANA time zone like Europe/Oslo or America/Denver.");
            var structure = new Structure
            {
                OrganisationId = request.OrganisationId,
                Name = PlainText.Required("name", request.Name, PlainText.NameLimit),
                Zone = request.Zone,
                CreatedAt = run.Now,
            };
            run.Archive.Structures.Add(structure);
            run.StructureId = structure.Id;
            var first = await BeginRevision.Next(run, structure.Id, request.PlanText, Act.Begin, stop);
            return new CreateAnswer(structure.Id, first.Id);
        }, cancel);

    /// <summary>Opens the structure to an organisation in these roles; none closes it to that organisation.</summary>
    public Task<StructureAnswer> GiveAccess(ActCall call, Guid structureId, Guid organisationId, IReadOnlyList<Role> roles, CancellationToken cancel = default) =>
        desk.Once(call, Act.GiveAccess, $"structure {structureId:D} organisation {organisationId:D}", async (run, stop) =>
        {
            await run.Structure(structureId, Act.GiveAccess, stop);
            if (!await run.Archive.Organisations.AnyAsync(row => row.Id == organisationId, stop)) throw new NotFound("organisation");
            var held = await run.Archive.StructureAccess.Where(row => row.StructureId == structureId && row.OrganisationId == organisationId).ToListAsync(stop);
            run.Archive.StructureAccess.RemoveRange(held.Where(row => !roles.Contains(row.Role)));
            foreach (var role in roles.Distinct().Except(held.Select(row => row.Role)))
                run.Archive.StructureAccess.Add(new StructureAccess { StructureId = structureId, OrganisationId = organisationId, Role = role });
            run.Detail = $"from [{string.Join(", ", held.Select(row => row.Role))}] to [{string.Join(", ", roles)}]";
            return new StructureAnswer(structureId);
        }, cancel);

    /// <summary>Ends new work on the structure; nothing of it is removed.</summary>
    public Task<StructureAnswer> Close(ActCall call, Guid structureId, CancellationToken cancel = default) =>
        desk.Once(call, Act.CloseStructure, $"structure {structureId:D}", async (run, stop) =>
        {
            var structure = await run.Structure(structureId, Act.CloseStructure, stop);
            structure.ClosedAt = run.Now;
            return new StructureAnswer(structureId);
        }, cancel);
}
