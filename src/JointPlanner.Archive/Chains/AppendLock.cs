using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Storage;

namespace JointPlanner.Archive.Chains;

/// <summary>
/// A transaction in which rows are added to chains. One at a time in the whole archive: acts are rare and short, and so each reads what the one before wrote,
/// takes its place in the audit after it, and no two can lock each other out.
/// </summary>
internal static class AppendLock
{
    // "JointAct" as eight bytes; not the migration's number.
    private const long Number = 0x4A6F696E74416374;

    public static async Task<IDbContextTransaction> Take(ArchiveContext archive, CancellationToken cancel)
    {
        // On SQLite the transaction itself is the lock: it begins IMMEDIATE.
        var transaction = await archive.Database.BeginTransactionAsync(cancel);
        if (archive.IsSqlite) return transaction;
        try
        {
            await archive.Database.ExecuteSqlAsync($"SELECT pg_advisory_xact_lock({Number})", cancel);
            return transaction;
        }
        catch
        {
            await transaction.DisposeAsync();
            throw;
        }
    }
}
