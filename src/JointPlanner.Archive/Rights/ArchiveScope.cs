using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Auditing;
using JointPlanner.Archive.Confirming;
using JointPlanner.Archive.Drafts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Setting;
using JointPlanner.Archive.Structures;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Rights;

/// <summary>
/// The archive as one person sees it: every query of the program starts here. What the person has no right to is not there, so a foreign id is "not found".
/// Rights are looked up in the database by each query, never remembered.
/// </summary>
public sealed class ArchiveScope : IAsyncDisposable
{
    private readonly ArchiveContext _archive;
    private readonly Guid _me;

    private ArchiveScope(ArchiveContext archive, Person person)
    {
        _archive = archive;
        _me = person.Id;
        Person = person;
    }

    public Person Person { get; }

    /// <summary>Opens a scope for reading; a person who is unknown or deactivated has none.</summary>
    public static async Task<ArchiveScope> Enter(IDbContextFactory<ArchiveContext> archive, Guid personId, CancellationToken cancel = default)
    {
        var context = await archive.CreateDbContextAsync(cancel);
        context.ChangeTracker.QueryTrackingBehavior = QueryTrackingBehavior.NoTracking;
        try
        {
            return await Of(context, personId, cancel);
        }
        catch
        {
            await context.DisposeAsync();
            throw;
        }
    }

    internal static async Task<ArchiveScope> Of(ArchiveContext context, Guid personId, CancellationToken cancel)
    {
        var person = await context.Users.AsNoTracking().FirstOrDefaultAsync(person => person.Id == personId && person.Active, cancel);
        return new ArchiveScope(context, person ?? throw new NotFound("person"));
    }

    /// <summary>Structures on which the person may do the act.</summary>
    public IQueryable<Structure> Structures(Act act = Act.ReadIssued)
    {
        var own = RightsTable.Roles(act, own: true);
        var other = RightsTable.Roles(act, own: false);
        return _archive.Structures.Where(structure =>
            _archive.Memberships.Any(member => member.PersonId == _me && member.OrganisationId == structure.OrganisationId && own.Contains(member.Role))
            || structure.Access.Any(access => other.Contains(access.Role)
                && _archive.Memberships.Any(member => member.PersonId == _me && member.OrganisationId == access.OrganisationId && member.Role == access.Role)));
    }

    /// <summary>All revisions where the person may read work in progress; elsewhere those that are or were issued.</summary>
    public IQueryable<Revision> Revisions()
    {
        var work = Structures(Act.ReadWork).Select(structure => structure.Id);
        var issued = Structures().Select(structure => structure.Id);
        return _archive.Revisions.Where(revision => work.Contains(revision.StructureId)
            || (issued.Contains(revision.StructureId) && revision.States.Any(entry => entry.State == RevisionState.Issued)));
    }

    public IQueryable<StateEntry> StateEntries() => _archive.StateEntries.Where(row => RevisionIds().Contains(row.RevisionId));

    public IQueryable<FrozenPackage> Packages() => _archive.FrozenPackages.Where(row => RevisionIds().Contains(row.RevisionId));

    public IQueryable<PdfSegment> PdfSegments() => _archive.PdfSegments.Where(row => RevisionIds().Contains(row.RevisionId));

    public IQueryable<Remark> Remarks() => _archive.Remarks.Where(row => WorkIds().Contains(row.Revision!.StructureId));

    public IQueryable<RevisionEdit> Edits() => _archive.RevisionEdits.Where(row => WorkIds().Contains(row.Revision!.StructureId));

    /// <summary>The person's own drafts; nobody reads another's.</summary>
    public IQueryable<Draft> Drafts()
    {
        var editable = Structures(Act.Edit).Select(structure => structure.Id);
        return _archive.Drafts.Where(draft => draft.PersonId == _me && editable.Contains(draft.StructureId));
    }

    public IQueryable<SettingRecord> SettingRecords() => _archive.SettingRecords.Where(row => IssuedIds().Contains(row.StructureId));

    public IQueryable<SettingAcceptance> SettingAcceptances() =>
        _archive.SettingAcceptances.Where(row => IssuedIds().Contains(row.Record!.StructureId));

    public IQueryable<Reading> Readings() => _archive.Readings.Where(row => IssuedIds().Contains(row.StructureId));

    public IQueryable<FieldLink> FieldLinks()
    {
        var mine = Structures(Act.MakeLink).Select(structure => structure.Id);
        return _archive.FieldLinks.Where(row => mine.Contains(row.StructureId));
    }

    /// <summary>Confirmations of the person's organisations and of the owners whose structures the person may read.</summary>
    public IQueryable<Confirmation> Confirmations()
    {
        var owners = Structures().Select(structure => structure.OrganisationId);
        return _archive.Confirmations.Include(row => row.Revocation).Where(row => owners.Contains(row.OrganisationId)
            || _archive.Memberships.Any(member => member.PersonId == _me && member.OrganisationId == row.OrganisationId));
    }

    /// <summary>The person's organisations; all of them for an administrator.</summary>
    public IQueryable<Organisation> Organisations() => _archive.Organisations.Where(organisation => Person.Administrator
        || organisation.Memberships.Any(member => member.PersonId == _me));

    /// <summary>Owners of the structures that the person may read, with their rule for issuing.</summary>
    public IQueryable<Organisation> Owners()
    {
        var owners = Structures().Select(structure => structure.OrganisationId);
        return _archive.Organisations.Where(organisation => owners.Contains(organisation.Id));
    }

    /// <summary>Names of the persons who stand under what this person may read, and of colleagues; nothing else of their accounts.</summary>
    public async Task<IReadOnlyDictionary<Guid, string>> Names(CancellationToken cancel = default)
    {
        var colleagues = Memberships().Select(member => member.PersonId);
        var acted = StateEntries().Select(row => row.PersonId);
        var edited = Edits().Select(row => row.PersonId);
        var remarked = Remarks().Select(row => row.PersonId);
        var accepted = SettingAcceptances().Select(row => row.PersonId);
        return await _archive.Users
            .Where(person => person.Id == _me || colleagues.Contains(person.Id) || acted.Contains(person.Id) || edited.Contains(person.Id) || remarked.Contains(person.Id) || accepted.Contains(person.Id))
            .ToDictionaryAsync(person => person.Id, person => person.Name, cancel);
    }

    /// <summary>Oneself; for an administrator everybody with an account.</summary>
    public IQueryable<Person> People() => _archive.Users.Where(person => Person.Administrator || person.Id == _me);

    /// <summary>Memberships in the person's organisations; all of them for an administrator.</summary>
    public IQueryable<Membership> Memberships() => _archive.Memberships.Where(member => Person.Administrator
        || _archive.Memberships.Any(mine => mine.PersonId == _me && mine.OrganisationId == member.OrganisationId));

    /// <summary>The person's own certificates; all of them for an administrator, who confirms them.</summary>
    public IQueryable<Certificate> Certificates() => _archive.Certificates.Where(certificate => Person.Administrator || certificate.PersonId == _me);

    /// <summary>For owners the entries about their structures; for an administrator those about no structure.</summary>
    public IQueryable<AuditEntry> Audit()
    {
        var owned = Structures(Act.ReadAudit).Select(structure => (Guid?)structure.Id);
        return _archive.AuditEntries.Where(entry => owned.Contains(entry.StructureId) || (Person.Administrator && entry.StructureId == null));
    }

    /// <summary>The sheet as it stands, every prefix checked against its hash.</summary>
    public async Task<StoredDocument> Document(Guid revisionId, CancellationToken cancel = default)
    {
        if (!await Revisions().AnyAsync(revision => revision.Id == revisionId, cancel)) throw new NotFound("revision");
        return await StoredDocument.Read(_archive, revisionId, cancel);
    }

    /// <summary>Roles by which the person may do the act on the structure; none when not at all.</summary>
    public async Task<IReadOnlyList<Role>> RolesFor(Act act, Guid structureId, CancellationToken cancel = default)
    {
        var own = RightsTable.Roles(act, own: true);
        var other = RightsTable.Roles(act, own: false);
        var roles =
            from member in _archive.Memberships
            where member.PersonId == _me
            where (own.Contains(member.Role) && _archive.Structures.Any(structure => structure.Id == structureId && structure.OrganisationId == member.OrganisationId))
                || (other.Contains(member.Role) && _archive.StructureAccess.Any(access =>
                    access.StructureId == structureId && access.OrganisationId == member.OrganisationId && access.Role == member.Role))
            select member.Role;
        return await roles.Distinct().ToListAsync(cancel);
    }

    public async Task<bool> May(Act act, Guid structureId, CancellationToken cancel = default) => (await RolesFor(act, structureId, cancel)).Count > 0;

    /// <summary>Whether the person may do an act of an organisation.</summary>
    public async Task<bool> MayIn(Act act, Guid organisationId, CancellationToken cancel = default)
    {
        var own = RightsTable.Roles(act, own: true);
        return await _archive.Memberships.AnyAsync(
            member => member.PersonId == _me && member.OrganisationId == organisationId && own.Contains(member.Role), cancel);
    }

    /// <summary>Whether the person may do an act of the installation.</summary>
    public bool MayAdminister(Act act) => Person.Administrator && RightsTable.OfAdministrator.Contains(act);

    public ValueTask DisposeAsync() => _archive.DisposeAsync();

    private IQueryable<Guid> RevisionIds() => Revisions().Select(revision => revision.Id);

    private IQueryable<Guid> IssuedIds() => Structures().Select(structure => structure.Id);

    private IQueryable<Guid> WorkIds() => Structures(Act.ReadWork).Select(structure => structure.Id);
}
