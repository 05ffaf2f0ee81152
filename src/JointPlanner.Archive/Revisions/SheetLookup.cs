using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Revisions;

/// <summary>One archived state of a sheet: its first so many bytes and their SHA-256.</summary>
public sealed record SheetPrefix(long Length, string Hash);

/// <summary>What the archive tells anybody who holds a sheet's bytes: where its revision stands. No names, no ids, nothing of what is in it.</summary>
/// <param name="Number">Number of the revision, which the sheet shows itself.</param>
/// <param name="State">Where it stands now.</param>
/// <param name="Since">Since when.</param>
/// <param name="Zone">IANA zone of the structure.</param>
/// <param name="Reason">Why it was withdrawn; null in any other state.</param>
/// <param name="Prefixes">Every archived state of the sheet, shortest first.</param>
public sealed record FoundSheet(int Number, RevisionState State, DateTimeOffset Since, string Zone, string? Reason, IReadOnlyList<SheetPrefix> Prefixes);

/// <summary>Finds a sheet by its bytes, for anybody: who can give the hash has the sheet.</summary>
public sealed class SheetLookup(IDbContextFactory<ArchiveContext> archive)
{
    /// <summary>The sheet that one of these hashes is an archived state of; of several the one with the longest.</summary>
    public Task<FoundSheet?> ByPrefix(IReadOnlyCollection<string> hashes, CancellationToken cancel = default) => Find(
        context => context.PdfSegments.Where(segment => hashes.Contains(segment.PrefixHash)).OrderByDescending(segment => segment.PrefixLength).Select(segment => segment.RevisionId), cancel);

    /// <summary>The sheet into which this calculation package was frozen.</summary>
    public Task<FoundSheet?> ByPackage(string hash, CancellationToken cancel = default) => Find(
        context => context.FrozenPackages.Where(package => package.PackageHash == hash).OrderByDescending(package => package.Position).Select(package => package.RevisionId), cancel);

    private async Task<FoundSheet?> Find(Func<ArchiveContext, IQueryable<Guid>> ids, CancellationToken cancel)
    {
        await using var context = await archive.CreateDbContextAsync(cancel);
        var found = await ids(context).Take(1).ToListAsync(cancel);
        if (found.Count == 0) return null;
        var revision = await context.Revisions.AsNoTracking().Include(row => row.States).Include(row => row.Structure).SingleAsync(row => row.Id == found[0], cancel);
        var last = revision.States.MaxBy(entry => entry.Ordinal)!;
        var prefixes = await context.PdfSegments.AsNoTracking().Where(segment => segment.RevisionId == revision.Id).OrderBy(segment => segment.Ordinal)
            .Select(segment => new SheetPrefix(segment.PrefixLength, segment.PrefixHash)).ToListAsync(cancel);
        return new FoundSheet(revision.Number, last.State, last.At, revision.Structure!.Zone, last.State == RevisionState.Withdrawn ? last.Reason : null, prefixes);
    }
}
