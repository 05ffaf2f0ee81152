using System.CommandLine;
using JointPlanner.Archive;
using JointPlanner.Archive.Chains;
using JointPlanner.Archive.PostgreSql;
using JointPlanner.Archive.Sqlite;

namespace JointPlanner.Cli.Admin;

/// <summary><c>admin migrate</c>: brings the database up to this program with the owning role, and makes guards and grants again.</summary>
internal static class AdminCommand
{
    /// <summary>The command with its parts.</summary>
    public static Command Make()
    {
        var migrate = new Command("migrate",
            "Migrates the database named by Archive__Kind (sqlite or postgresql), Archive__ConnectionString (PostgreSQL) or Archive__Folder (SQLite), and grants to Archive__AppRole.");
        migrate.SetAction(async (parsed, cancellation) =>
        {
            try
            {
                await using var archive = Open();
                await archive.Migrate(null, cancellation);
                await parsed.InvocationConfiguration.Output.WriteLineAsync("The database is at this program's schema; guards and grants were made again.");
                return ExitCodes.Done;
            }
            catch (ArchiveNotReady refused)
            {
                await parsed.InvocationConfiguration.Error.WriteLineAsync(refused.Message);
                return ExitCodes.FaultyInput;
            }
        });
        var verify = new Command("verify-archive", "Walks every hash chain of the archive; exit code 3 where one is broken.");
        verify.SetAction((parsed, cancellation) => Walk(parsed.InvocationConfiguration, cancellation));
        return new Command("admin", "Administration of the database and of its first account.") { migrate, AccountCommands.Create(), AccountCommands.Link(), verify };
    }

    private static async Task<int> Walk(InvocationConfiguration console, CancellationToken cancellation)
    {
        try
        {
            await using var archive = Open();
            var walk = await ArchiveChain.Verify(archive, cancellation);
            await console.Output.WriteLineAsync(walk.FirstBreak is { } broken
                ? FormattableString.Invariant($"Broken: chain {broken.Chain}, position {broken.Position}, {broken.Row}. {broken.What}")
                : FormattableString.Invariant($"Whole: {walk.Rows} rows, each with its predecessor's hash."));
            return walk.Whole ? ExitCodes.Done : ExitCodes.CannotBeIssued;
        }
        catch (ArchiveNotReady refused)
        {
            await console.Error.WriteLineAsync(refused.Message);
            return ExitCodes.FaultyInput;
        }
    }

    /// <summary>The database that the environment names.</summary>
    internal static ArchiveDatabase Open() => Setting("Archive__Kind") switch
    {
        null or "sqlite" => new SqliteArchive(Path.Combine(
            Setting("Archive__Folder") ?? throw new ArchiveNotReady("Archive__Folder is missing: the folder that holds the SQLite database."), "archive.db")),
        "postgresql" => new PostgreSqlArchive(
            Setting("Archive__ConnectionString") ?? throw new ArchiveNotReady("Archive__Kind is postgresql, but Archive__ConnectionString is missing."), Environment.GetEnvironmentVariable("Archive__AppRole")),
        var other => throw new ArchiveNotReady($"Archive__Kind is \"{other}\". Allowed are sqlite and postgresql."),
    };

    /// <summary>A setting of the environment; null where it is missing or empty.</summary>
    internal static string? Setting(string name) => Environment.GetEnvironmentVariable(name) is { Length: > 0 } value ? value : null;
}
