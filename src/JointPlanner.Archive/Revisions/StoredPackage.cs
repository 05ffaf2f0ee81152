using JointPlanner.Archive.Acts;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Revisions;

internal static class StoredPackage
{
    /// <summary>The frozen package, its hashes computed again from the stored texts; one altered byte refuses.</summary>
    public static async Task<FrozenPackage> Intact(ArchiveContext archive, Guid revisionId, CancellationToken cancel)
    {
        var package = await archive.FrozenPackages.AsNoTracking().SingleAsync(row => row.RevisionId == revisionId, cancel);
        if (package.IsIntact) return package;
        throw new ActRefused(
            RefusalReason.Altered,
            $"The stored calculation package was altered: it was frozen with the hash {package.PackageHash} and no longer gives it. Nothing is done with it; tell the administrator to run `verify-archive`.");
    }
}
