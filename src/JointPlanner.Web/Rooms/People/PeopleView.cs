using System.Security.Cryptography.X509Certificates;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Rights;
using JointPlanner.Issuing;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Rooms.People;

/// <summary>One person's roles in one organisation.</summary>
public sealed record RolesThere(Guid OrganisationId, string Organisation, IReadOnlyList<Role> Roles);

/// <summary>One person as the page shows them.</summary>
public sealed record PersonLine(Guid Id, string Name, string Account, bool Active, bool Administrator, IReadOnlyList<RolesThere> Roles);

/// <summary>A certificate, whose it is and what stands in it.</summary>
public sealed record CertificateLine(Certificate Row, string Person, HandedInCertificate Facts);

/// <summary>People, organisations and certificates as one person may see them.</summary>
public sealed record PeopleView
{
    /// <summary>The person who looks.</summary>
    public required PersonLine Me { get; init; }
    /// <summary>Whether they may do what is the administrator's.</summary>
    public required bool MayAdminister { get; init; }
    /// <summary>Everybody for an administrator, else the colleagues in one's organisations.</summary>
    public required IReadOnlyList<PersonLine> People { get; init; }
    /// <summary>The organisations.</summary>
    public required IReadOnlyList<Organisation> Organisations { get; init; }
    /// <summary>One's own certificates, newest first.</summary>
    public required IReadOnlyList<CertificateLine> Mine { get; init; }
    /// <summary>Certificates that wait for an administrator.</summary>
    public required IReadOnlyList<CertificateLine> Unconfirmed { get; init; }

    internal static async Task<PeopleView> Read(ArchiveScope scope, DateTimeOffset now)
    {
        var organisations = await scope.Organisations().OrderBy(o => o.Name).ToListAsync();
        var memberships = await scope.Memberships().ToListAsync();
        var names = await scope.Names();
        var accounts = await scope.People().ToDictionaryAsync(p => p.Id);
        var certificates = await scope.Certificates().OrderByDescending(c => c.RegisteredAt).ToListAsync();
        var people = names.Keys.Where(id => memberships.Any(m => m.PersonId == id)).Concat(accounts.Keys).Distinct()
            .Select(Line).OrderBy(p => p.Name, StringComparer.OrdinalIgnoreCase).ToList();
        return new PeopleView
        {
            Me = Line(scope.Person.Id),
            MayAdminister = scope.MayAdminister(Act.ManageAccounts),
            People = people,
            Organisations = organisations,
            Mine = [.. certificates.Where(c => c.PersonId == scope.Person.Id).Select(Certificate)],
            Unconfirmed = scope.MayAdminister(Act.ConfirmCertificate) ? [.. certificates.Where(c => c.ConfirmedAt is null && c.RevokedAt is null).Select(Certificate)] : [],
        };

        PersonLine Line(Guid id)
        {
            accounts.TryGetValue(id, out var account);
            var roles = organisations.Select(o => new RolesThere(o.Id, o.Name, [.. memberships.Where(m => m.PersonId == id && m.OrganisationId == o.Id).Select(m => m.Role).Order()])).Where(r => r.Roles.Count > 0);
            return new PersonLine(id, account?.Name ?? names[id], account?.UserName ?? "", account?.Active ?? true, account?.Administrator ?? false, [.. roles]);
        }

        CertificateLine Certificate(Certificate row)
        {
            using var read = X509CertificateLoader.LoadCertificate(row.Encoded);
            return new(row, accounts.TryGetValue(row.PersonId, out var person) ? person.Name : "", HandedInCertificate.Of(read, now));
        }
    }
}
