using JointPlanner.Archive.Guarding;
using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Sqlite;

/// <summary>
/// The archive in one file, for one office and one running instance: a lock file beside it is held while this object lives, and a second instance is refused.
/// </summary>
public sealed class SqliteArchive : ArchiveDatabase
{
    private readonly string _path;
    private readonly FileStream _lock;

    public SqliteArchive(string path)
    {
        _path = Path.GetFullPath(path);
        Directory.CreateDirectory(Path.GetDirectoryName(_path)!);
        try
        {
            _lock = new FileStream(_path + ".lock", FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None);
        }
        catch (IOException problem)
        {
            throw new ArchiveNotReady($"Another running instance holds the archive {_path} ({problem.Message}). Stop it first; for several instances at once use PostgreSQL.");
        }
    }

    public override void Configure(DbContextOptionsBuilder options) => Configure(options, _path);

    internal static void Configure(DbContextOptionsBuilder options, string path)
    {
        var connection = new SqliteConnectionStringBuilder { DataSource = path, ForeignKeys = true };
        options.UseSqlite(connection.ToString(), sqlite => sqlite.MigrationsAssembly(typeof(SqliteArchive).Assembly.GetName().Name))
            .AddInterceptors(new SafeConnection());
    }

    public override async ValueTask DisposeAsync()
    {
        await using (var context = CreateDbContext())
            SqliteConnection.ClearPool((SqliteConnection)context.Database.GetDbConnection());
        await _lock.DisposeAsync();
    }

    // The file lock already keeps every other instance out.
    protected override ValueTask<IAsyncDisposable> TakeMigrationLock(CancellationToken cancel) => ValueTask.FromResult<IAsyncDisposable>(new NothingToRelease());

    protected override IReadOnlyList<Guard> Guards(ArchiveContext context) => SqliteGuards.All(context.Model);

    protected override async Task<IReadOnlySet<string>> StandingGuards(ArchiveContext context, CancellationToken cancel) =>
        (await context.Database.SqlQueryRaw<string>("SELECT name AS \"Value\" FROM sqlite_master WHERE type = 'trigger'").ToListAsync(cancel)).ToHashSet();

    protected override async Task AssertSafe(ArchiveContext context, bool production, CancellationToken cancel)
    {
        await context.Database.OpenConnectionAsync(cancel);
        try
        {
            var keys = await Pragma(context, "foreign_keys", cancel);
            var synchronous = await Pragma(context, "synchronous", cancel);
            if (keys != 1) throw new ArchiveNotReady("SQLite does not watch foreign keys on this connection; the program does not start without it.");
            if (synchronous != 2) throw new ArchiveNotReady($"SQLite runs with synchronous = {synchronous}; the program starts only with 2 (FULL), so that what was issued survives a power cut.");
        }
        finally
        {
            await context.Database.CloseConnectionAsync();
        }
    }

    private static async Task<long> Pragma(ArchiveContext context, string name, CancellationToken cancel)
    {
        await using var command = context.Database.GetDbConnection().CreateCommand();
#pragma warning disable CA2100 // the name comes from the two calls above
        command.CommandText = $"PRAGMA {name}";
#pragma warning restore CA2100
        return (long)(await command.ExecuteScalarAsync(cancel))!;
    }

    private sealed class NothingToRelease : IAsyncDisposable
    {
        public ValueTask DisposeAsync() => ValueTask.CompletedTask;
    }
}
