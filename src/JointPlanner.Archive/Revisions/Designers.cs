using JointPlanner.Archive.Acts;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Revisions;

/// <summary>Who counts as designer of a revision.</summary>
internal static class Designers
{
    /// <summary>Everybody who changed an input since the last issue, and who froze it.</summary>
    public static async Task<IReadOnlySet<Guid>> Of(ArchiveContext archive, Revision revision, CancellationToken cancel)
    {
        var issued = archive.StateEntries.Where(entry => entry.State == RevisionState.Issued).Select(entry => entry.RevisionId);
        var lastIssued = await archive.Revisions.Where(row => row.StructureId == revision.StructureId && row.Number < revision.Number && issued.Contains(row.Id))
            .MaxAsync(row => (int?)row.Number, cancel) ?? 0;
        var edited = await archive.RevisionEdits
            .Where(row => row.Revision!.StructureId == revision.StructureId && row.Revision.Number > lastIssued && row.Revision.Number <= revision.Number)
            .Select(row => row.PersonId).Distinct().ToListAsync(cancel);
        var frozen = await archive.FrozenPackages.Where(row => row.RevisionId == revision.Id).Select(row => row.DesignerId).ToListAsync(cancel);
        return edited.Concat(frozen).ToHashSet();
    }

    /// <summary>Two persons with one key are one signer.</summary>
    public static async Task RefuseSharedKey(ArchiveContext archive, IReadOnlySet<Guid> designers, Guid checkerId, CancellationToken cancel)
    {
        var designing = designers.ToList();
        var keys = archive.Certificates.Where(certificate => designing.Contains(certificate.PersonId)).Select(certificate => certificate.PublicKeyHash);
        if (await archive.Certificates.AnyAsync(certificate => certificate.PersonId == checkerId && keys.Contains(certificate.PublicKeyHash), cancel))
            throw new ActRefused(RefusalReason.SameKey, "Your registered certificate has the same key as a designer's of this revision; designer and checker need keys of their own.");
    }
}
