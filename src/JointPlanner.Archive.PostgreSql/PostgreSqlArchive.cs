using JointPlanner.Archive.Guarding;
using Microsoft.EntityFrameworkCore;
using Npgsql;

namespace JointPlanner.Archive.PostgreSql;

/// <summary>
/// The archive on a PostgreSQL server. Migrations run as the role that owns the tables; in Production the program runs as another one, which may only add
/// rows to guarded tables.
/// </summary>
/// <param name="connectionString">To an existing database.</param>
/// <param name="appRole">Role that the program runs as; it gets its grants at each migration. Null where owner and program are one (Development).</param>
public sealed class PostgreSqlArchive(string connectionString, string? appRole = null) : ArchiveDatabase
{
    // "JointPln" as eight bytes: any number will do as long as it stays the same.
    private const long MigrationLock = 0x4A6F696E74506C6E;

    private readonly string _connectionString = InPublicSchema(connectionString);

    // An empty name would break the grants half way through a migration.
    private readonly string? _appRole = appRole is null || !string.IsNullOrWhiteSpace(appRole) ? appRole
        : throw new ArchiveNotReady("Archive:AppRole is empty. Name the database role that the program runs as, or leave the setting out where it runs as the owner (Development).");

    public override void Configure(DbContextOptionsBuilder options) => Configure(options, _connectionString);

    internal static void Configure(DbContextOptionsBuilder options, string connectionString) => options.UseNpgsql(
        connectionString,
        server => server.SetPostgresVersion(15, 0).MigrationsAssembly(typeof(PostgreSqlArchive).Assembly.GetName().Name));

    public override ValueTask DisposeAsync() => ValueTask.CompletedTask;

    protected override async ValueTask<IAsyncDisposable> TakeMigrationLock(CancellationToken cancel)
    {
        // A connection outside the pool: closing it ends the session, and the lock with it, whatever happened.
        var gate = new NpgsqlConnection(new NpgsqlConnectionStringBuilder(_connectionString) { Pooling = false, CommandTimeout = 0 }.ToString());
        await gate.OpenAsync(cancel);
        await using var command = new NpgsqlCommand("SELECT pg_advisory_lock(@key)", gate);
        command.Parameters.AddWithValue("key", MigrationLock);
        await command.ExecuteNonQueryAsync(cancel);
        return gate;
    }

    protected override IReadOnlyList<Guard> Guards(ArchiveContext context) => PostgreSqlGuards.All(context.Model);

    protected override IEnumerable<string> GuardStatements(ArchiveContext context) =>
        _appRole is null ? base.GuardStatements(context) : base.GuardStatements(context).Concat(AppRole.Grants(context.Model, _appRole));

    protected override async Task<IReadOnlySet<string>> StandingGuards(ArchiveContext context, CancellationToken cancel) =>
        (await context.Database.SqlQueryRaw<string>(
            """
            SELECT t.tgname::text AS "Value" FROM pg_trigger t JOIN pg_class c ON c.oid = t.tgrelid JOIN pg_namespace n ON n.oid = c.relnamespace
            WHERE n.nspname = 'public' AND NOT t.tgisinternal AND t.tgenabled IN ('O', 'A')
            """).ToListAsync(cancel)).ToHashSet();

    protected override Task AssertSafe(ArchiveContext context, bool production, CancellationToken cancel) =>
        production ? AppRole.AssertHarmless(context, cancel) : Task.CompletedTask;

    // Guards and grants name this schema; a role's own search path must not lead elsewhere.
    private static string InPublicSchema(string connectionString) =>
        new NpgsqlConnectionStringBuilder(connectionString) { SearchPath = "public" }.ToString();
}
