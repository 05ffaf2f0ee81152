using JointPlanner.Archive.Chains;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Auditing;

/// <summary>An event that is no act of the archive: sign-in, failed sign-in, link used, export, import.</summary>
/// <param name="What">One word ("SignedIn").</param>
/// <param name="Subject">Kind and id; never a secret.</param>
public sealed record AuditNote(string What, string From, string Subject)
{
    public Guid? PersonId { get; init; }
    public string? PersonName { get; init; }
    public Guid? StructureId { get; init; }
    public Guid? OrganisationId { get; init; }
    public string? Detail { get; init; }
}

/// <summary>Adds such events to the audit; the acts add their own entries.</summary>
public sealed class AuditTrail(IDbContextFactory<ArchiveContext> archive, TimeProvider clock)
{
    public async Task Write(AuditNote note, CancellationToken cancel = default)
    {
        await using var context = await archive.CreateDbContextAsync(cancel);
        await using var transaction = await AppendLock.Take(context, cancel);
        var entry = new AuditEntry
        {
            What = note.What,
            PersonId = note.PersonId,
            PersonName = note.PersonName,
            From = note.From,
            Subject = note.Subject,
            StructureId = note.StructureId,
            OrganisationId = note.OrganisationId,
            Detail = note.Detail,
        };
        await ArchiveChain.Append(context, ChainName.Audit, entry, clock.GetUtcNow(), cancel);
        await context.SaveChangesAsync(cancel);
        await transaction.CommitAsync(cancel);
    }
}
