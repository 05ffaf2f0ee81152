using JointPlanner.Archive.Guarding;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive;

/// <summary>A database of one kind, and what has to hold before the program works on it.</summary>
public abstract class ArchiveDatabase : IDbContextFactory<ArchiveContext>, IAsyncDisposable
{
    /// <summary>Sets provider, migrations and connection.</summary>
    public abstract void Configure(DbContextOptionsBuilder options);

    /// <summary>
    /// Brings an empty or older database up to this program, seeds it and makes the guards again, all under one lock. Safe to call at every start and by several
    /// instances at once.
    /// </summary>
    public async Task Migrate(Func<ArchiveContext, CancellationToken, Task>? seed = null, CancellationToken cancel = default)
    {
        await using var gate = await TakeMigrationLock(cancel);
        await using (var context = CreateDbContext())
        {
            await RefuseNewer(context, cancel);
            await context.Database.MigrateAsync(cancel);
        }

        if (seed is not null)
        {
            await using var context = CreateDbContext();
            await seed(context, cancel);
        }

        // Last, because a migration that rebuilds a table drops its triggers without a word.
        await using (var context = CreateDbContext())
        {
            foreach (var statement in GuardStatements(context)) await context.Database.ExecuteSqlRawAsync(Literal(statement), cancel);
        }
    }

    /// <summary>Throws <see cref="ArchiveNotReady"/> with the sentence for the console when the program must not start on this database.</summary>
    public async Task AssertReady(bool production, CancellationToken cancel = default)
    {
        await AssertCurrent(cancel);
        await using var context = CreateDbContext();
        await AssertSafe(context, production, cancel);
        var unguarded = await MissingGuards(context, cancel);
        if (unguarded.Count > 0)
            throw new ArchiveNotReady($"The database has lost the guard {unguarded[0]} ({unguarded.Count} missing). Run `admin migrate` to make the guards again and `verify-archive` to see whether anything was changed meanwhile.");
    }

    /// <summary>Throws where the schema is older or newer than this program's.</summary>
    public async Task AssertCurrent(CancellationToken cancel = default)
    {
        await using var context = CreateDbContext();
        await RefuseNewer(context, cancel);
        var missing = (await context.Database.GetPendingMigrationsAsync(cancel)).ToList();
        if (missing.Count > 0)
            throw new ArchiveNotReady($"The database lacks {missing.Count} schema step(s), first \"{missing[0]}\". Run `admin migrate` with the owning role, then start again.");
    }

    /// <summary>Throws where the archive holds a person of the demonstration, and with them the keys made for them.</summary>
    public async Task AssertNoDemonstration(CancellationToken cancel = default)
    {
        await using var context = CreateDbContext();
        if (await context.Users.Where(person => person.Demonstration).OrderBy(person => person.UserName).Select(person => person.UserName).FirstOrDefaultAsync(cancel) is { } account)
            throw new ArchiveNotReady($"The archive holds the demonstration's account \"{account}\", whose password and key lie in a file. Such an archive is never used for real work: give Archive:Folder or Archive:ConnectionString of an empty one.");
    }

    public ArchiveContext CreateDbContext()
    {
        var options = new DbContextOptionsBuilder<ArchiveContext>();
        Configure(options);
        return new ArchiveContext(options.Options);
    }

    public abstract ValueTask DisposeAsync();

    protected abstract ValueTask<IAsyncDisposable> TakeMigrationLock(CancellationToken cancel);

    protected abstract IReadOnlyList<Guard> Guards(ArchiveContext context);

    /// <summary>Statements that make every guard again, and on PostgreSQL the grants.</summary>
    protected virtual IEnumerable<string> GuardStatements(ArchiveContext context) => Guards(context).SelectMany(guard => guard.Statements);

    /// <summary>Names of the guards that stand in the database and are switched on.</summary>
    protected abstract Task<IReadOnlySet<string>> StandingGuards(ArchiveContext context, CancellationToken cancel);

    protected abstract Task AssertSafe(ArchiveContext context, bool production, CancellationToken cancel);

    private async Task<IReadOnlyList<string>> MissingGuards(ArchiveContext context, CancellationToken cancel)
    {
        var standing = await StandingGuards(context, cancel);
        return [.. Guards(context).Select(guard => guard.Name).Where(name => !standing.Contains(name))];
    }

    private static async Task RefuseNewer(ArchiveContext context, CancellationToken cancel)
    {
        if (!await context.Database.CanConnectAsync(cancel)) return;
        var known = context.Database.GetMigrations().ToHashSet();
        var newer = (await context.Database.GetAppliedMigrationsAsync(cancel)).FirstOrDefault(step => !known.Contains(step));
        if (newer is not null)
            throw new ArchiveNotReady($"The database is newer than this program: it holds the schema step \"{newer}\". Start the program version that made it, or a later one.");
    }

    // EF reads braces as places for parameters.
    private static string Literal(string statement) => statement.Replace("{", "{{", StringComparison.Ordinal).Replace("}", "}}", StringComparison.Ordinal);
}

/// <summary>The program must not start on this database as it stands.</summary>
public sealed class ArchiveNotReady(string sentence) : Exception(sentence);
