using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Values;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.People;

public sealed record OrganisationAnswer(Guid OrganisationId);

public sealed record RolesAnswer(Guid OrganisationId, Guid PersonId, IReadOnlyList<Role> Roles);

/// <param name="IssuedBy">Who issues revisions of this organisation's structures.</param>
public sealed record OwnerRule(IssuedBy IssuedBy, bool DesignerSignatureRequired, bool CheckerSignatureRequired);

/// <summary>Organisations, who is what in them, and their rule for issuing.</summary>
public sealed class OrganisationRegister(ActDesk desk)
{
    public Task<OrganisationAnswer> Create(ActCall call, string name, CancellationToken cancel = default) =>
        desk.Once(call, Act.ManageOrganisations, $"organisation named {name}", async (run, stop) =>
        {
            run.NeedAdministrator(Act.ManageOrganisations);
            var kept = PlainText.Required("name", name, PlainText.NameLimit);
            if (await run.Archive.Organisations.AnyAsync(row => row.Name == kept, stop))
                throw new ActRefused(RefusalReason.AlreadyDone, $"There is an organisation \"{kept}\" already.");
            var organisation = new Organisation { Name = kept };
            run.Archive.Organisations.Add(organisation);
            run.OrganisationId = organisation.Id;
            return new OrganisationAnswer(organisation.Id);
        }, cancel);

    /// <summary>Sets which roles the person has there; none takes the person out.</summary>
    public Task<RolesAnswer> SetRoles(ActCall call, Guid organisationId, Guid personId, IReadOnlyList<Role> roles, CancellationToken cancel = default) =>
        desk.Once(call, Act.ManageOrganisations, $"organisation {organisationId:D} person {personId:D}", async (run, stop) =>
        {
            run.NeedAdministrator(Act.ManageOrganisations);
            if (!await run.Archive.Organisations.AnyAsync(row => row.Id == organisationId, stop)) throw new NotFound("organisation");
            if (!await run.Archive.Users.AnyAsync(row => row.Id == personId, stop)) throw new NotFound("person");
            var held = await run.Archive.Memberships.Where(row => row.OrganisationId == organisationId && row.PersonId == personId).ToListAsync(stop);
            run.Archive.Memberships.RemoveRange(held.Where(row => !roles.Contains(row.Role)));
            foreach (var role in roles.Distinct().Except(held.Select(row => row.Role)))
                run.Archive.Memberships.Add(new Membership { OrganisationId = organisationId, PersonId = personId, Role = role });
            run.OrganisationId = organisationId;
            run.Detail = $"from [{string.Join(", ", held.Select(row => row.Role))}] to [{string.Join(", ", roles)}]";
            return new RolesAnswer(organisationId, personId, [.. roles.Distinct()]);
        }, cancel);

    public Task<OrganisationAnswer> SetRule(ActCall call, Guid organisationId, OwnerRule rule, CancellationToken cancel = default) =>
        desk.Once(call, Act.SetRule, $"organisation {organisationId:D}", async (run, stop) =>
        {
            await run.NeedIn(Act.SetRule, organisationId, stop);
            var organisation = await run.Archive.Organisations.SingleAsync(row => row.Id == organisationId, stop);
            (organisation.IssuedBy, organisation.DesignerSignatureRequired, organisation.CheckerSignatureRequired) =
                (rule.IssuedBy, rule.DesignerSignatureRequired, rule.CheckerSignatureRequired);
            run.Detail = rule.ToString();
            return new OrganisationAnswer(organisationId);
        }, cancel);
}
