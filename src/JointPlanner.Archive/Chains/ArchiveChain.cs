using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Chains;

/// <summary>The first place where the archive is not what was written.</summary>
/// <param name="Row">Kind and id of the row, or the chain's name where a row is missing.</param>
/// <param name="What">A sentence.</param>
public sealed record ChainBreak(string Chain, long Position, string Row, string What);

/// <param name="Rows">How many rows were walked and found whole.</param>
public sealed record ChainReport(long Rows, ChainBreak? FirstBreak)
{
    public bool Whole => FirstBreak is null;
}

/// <summary>
/// The chains of what was issued, set, read, confirmed and audited. The audit entry of each act names the end of the chain it wrote to, so that rows cut off a
/// chain's end show too; only the end of the audit itself has nothing behind it in the database: keep its last hash elsewhere, for example with the backup.
/// </summary>
public static class ArchiveChain
{
    /// <summary>Joins a row to its chain; needs the append lock and a save after it.</summary>
    internal static async Task<ChainTip> Append(ArchiveContext archive, string chain, ChainedRow row, DateTimeOffset at, CancellationToken cancel)
    {
        var tip = await archive.ChainTips.FindAsync([chain], cancel);
        if (tip is null)
        {
            tip = new ChainTip { Chain = chain };
            archive.ChainTips.Add(tip);
        }

        row.Link(tip, at);
        archive.Add(row);
        return tip;
    }

    /// <summary>Walks every chain from its first row, with the hashes of the packages and sheets in them.</summary>
    public static async Task<ChainReport> Verify(IDbContextFactory<ArchiveContext> factory, CancellationToken cancel = default)
    {
        await using var archive = await factory.CreateDbContextAsync(cancel);
        archive.ChangeTracker.QueryTrackingBehavior = QueryTrackingBehavior.NoTracking;
        await using var stillness = await archive.Database.BeginTransactionAsync(System.Data.IsolationLevel.Serializable, cancel);
        return await new ChainWalk(archive).Verify(cancel);
    }
}
