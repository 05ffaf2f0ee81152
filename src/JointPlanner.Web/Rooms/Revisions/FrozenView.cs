using System.Text;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using JointPlanner.Issuing.Comparing;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Rooms.Revisions;

/// <summary>A frozen revision as its checker reads it: from the stored package and results alone, beside those of the last issue.</summary>
public sealed record FrozenView
{
    /// <summary>What is stored; null where it cannot be read.</summary>
    public StoredCalculation? Stored { get; init; }
    /// <summary>Why it cannot be read; empty where it can.</summary>
    public string Unreadable { get; init; } = "";
    /// <summary>The revision issued last before this one, also where it was superseded or withdrawn since; null where there is none.</summary>
    public Revision? LastIssue { get; init; }
    /// <summary>What differs from it; null where there is none, or where it cannot be read.</summary>
    public Differences? Differences { get; init; }

    /// <summary>Reads it.</summary>
    internal static async Task<FrozenView> Read(ArchiveScope scope, Revision revision, FrozenPackage package)
    {
        StoredCalculation stored;
        try
        {
            stored = Read(package);
        }
        catch (InvalidDataException unreadable)
        {
            return new FrozenView { Unreadable = unreadable.Message };
        }

        var last = await scope.Revisions().Include(r => r.States)
            .Where(r => r.StructureId == revision.StructureId && r.Number < revision.Number && r.States.Any(s => s.State == RevisionState.Issued))
            .OrderByDescending(r => r.Number).FirstOrDefaultAsync();
        if (last is null || await scope.Packages().FirstOrDefaultAsync(p => p.RevisionId == last.Id) is not { } issued) return new FrozenView { Stored = stored };
        try
        {
            if (!issued.IsIntact) throw new InvalidDataException("it was altered in the database; tell the administrator to run verify-archive.");
            var before = Read(issued);
            return new FrozenView { Stored = stored, LastIssue = last, Differences = await Task.Run(() => Comparison.Of(before, stored)) };
        }
        catch (InvalidDataException unreadable)
        {
            return new FrozenView { Stored = stored, LastIssue = last, Unreadable = $"Revision {last.Number} cannot be compared with: {unreadable.Message}" };
        }
    }

    private static StoredCalculation Read(FrozenPackage package) => StoredCalculation.Read(Encoding.UTF8.GetBytes(package.PackageText), Encoding.UTF8.GetBytes(package.ResultsText));
}
