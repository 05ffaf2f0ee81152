using JointPlanner.Archive.Auditing;
using JointPlanner.Archive.Chains;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Structures;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Acts;

/// <summary>An act while it is being done: the context of its transaction, the person's scope in it, and the rows it adds.</summary>
internal sealed class ActRun(ArchiveContext archive, ArchiveScope? scope, DateTimeOffset now)
{
    private ChainTip? _tip;
    private string? _hashBefore;

    public ArchiveContext Archive { get; } = archive;
    public DateTimeOffset Now { get; } = now;

    /// <summary>There is none when the act came through a field link.</summary>
    public ArchiveScope Scope => scope ?? throw new InvalidOperationException("Nobody is signed in for this act.");

    public Person Person => Scope.Person;
    public Guid? StructureId { get; set; }
    public Guid? OrganisationId { get; set; }
    public string? Detail { get; set; }

    /// <summary>Joins a row to the end of its chain.</summary>
    public async Task Append(string chain, ChainedRow row, CancellationToken cancel)
    {
        var tip = await ArchiveChain.Append(Archive, chain, row, Now, cancel);
        if (_tip is null) _hashBefore = row.PreviousHash;
        else if (_tip.Chain != chain) throw new InvalidOperationException("An act writes to one chain, so that its audit entry can name where that chain ends.");
        _tip = tip;
    }

    /// <summary>The structure, if the person may do the act on it.</summary>
    public async Task<Structure> Structure(Guid structureId, Act act, CancellationToken cancel)
    {
        var structure = await Scope.Structures().FirstOrDefaultAsync(structure => structure.Id == structureId, cancel) ?? throw new NotFound("structure");
        await Need(act, structureId, cancel);
        if (structure.ClosedAt is not null && act is not (Act.Withdraw or Act.RevokeLink))
            throw new ActRefused(RefusalReason.StructureClosed, $"The structure \"{structure.Name}\" is closed; nothing new is done on it.");
        StructureId = structureId;
        OrganisationId = structure.OrganisationId;
        return structure;
    }

    /// <summary>The revision with its structure and states, if the person may do the act and the revision's life allows it from where it stands.</summary>
    public async Task<Revision> Revision(Guid revisionId, Act act, CancellationToken cancel)
    {
        var revision = await Scope.Revisions().Include(revision => revision.States).Include(revision => revision.Structure)
            .FirstOrDefaultAsync(revision => revision.Id == revisionId, cancel) ?? throw new NotFound("revision");
        await Structure(revision.StructureId, act, cancel);
        Transitions.Find(revision.State, act);
        return revision;
    }

    /// <summary>Adds the step and saves it at once: the database's guard on states looks at the one before.</summary>
    public async Task<StateEntry> Move(Revision revision, Act act, string? reason, string? subjectHash, CancellationToken cancel)
    {
        var from = revision.States.Count == 0 ? (RevisionState?)null : revision.State;
        var entry = new StateEntry
        {
            RevisionId = revision.Id,
            Ordinal = revision.States.Count + 1,
            State = Transitions.Find(from, act).To,
            Act = act,
            PersonId = Person.Id,
            Reason = reason,
            SubjectHash = subjectHash,
        };
        await Append(ChainName.Structure(revision.StructureId), entry, cancel);
        await Archive.SaveChangesAsync(cancel);
        return entry;
    }

    public async Task Need(Act act, Guid structureId, CancellationToken cancel)
    {
        if (await Scope.May(act, structureId, cancel)) return;
        var roles = RightsTable.Rows.Where(row => row.Act == act).Select(row => row.Role.ToString().ToLowerInvariant()).Distinct();
        throw new ActRefused(RefusalReason.NotYourAct, $"\"{act}\" needs the role {string.Join(" or ", roles)} for this structure, which you do not hold. Ask the structure's owner or a colleague who holds it.");
    }

    public async Task NeedIn(Act act, Guid organisationId, CancellationToken cancel)
    {
        if (!await Scope.Organisations().AnyAsync(organisation => organisation.Id == organisationId, cancel)) throw new NotFound("organisation");
        if (!await Scope.MayIn(act, organisationId, cancel))
        {
            var roles = RightsTable.Roles(act, own: true).Select(role => role.ToString().ToLowerInvariant());
            throw new ActRefused(RefusalReason.NotYourAct, $"\"{act}\" needs the role {string.Join(" or ", roles)} in this organisation, which you do not hold.");
        }

        OrganisationId = organisationId;
    }

    public void NeedAdministrator(Act act)
    {
        if (!Scope.MayAdminister(act)) throw new ActRefused(RefusalReason.NotYourAct, $"\"{act}\" is for an administrator of the installation.");
    }

    /// <summary>Writes the audit entry.</summary>
    public async Task Close(Act act, string from, string subject, CancellationToken cancel)
    {
        var entry = new AuditEntry
        {
            What = act.ToString(),
            PersonId = scope?.Person.Id,
            PersonName = scope?.Person.Name,
            From = from,
            Subject = subject,
            StructureId = StructureId,
            OrganisationId = OrganisationId,
            Detail = Detail,
            SubjectChain = _tip?.Chain,
            HashBefore = _hashBefore,
            HashAfter = _tip?.Hash,
        };
        await ArchiveChain.Append(Archive, ChainName.Audit, entry, Now, cancel);
    }
}
