using System.Data.Common;
using JointPlanner.Archive.PostgreSql;
using JointPlanner.Archive.Sqlite;
using Microsoft.Data.Sqlite;
using Npgsql;

namespace JointPlanner.Archive.Tests.Databases;

/// <summary>A database of its own for one test: empty, or migrated (a copy of one that was migrated once in this run).</summary>
public sealed class TestDatabase : IAsyncDisposable
{
    private static readonly SemaphoreSlim OneMaker = new(1);
    private static readonly Dictionary<Kind, TestDatabase> Templates = [];

    private readonly string _place;
    private readonly bool _template;

    private TestDatabase(Kind kind, string place, bool template = false)
    {
        Kind = kind;
        _place = place;
        _template = template;
        Archive = kind == Kind.Sqlite ? new SqliteArchive(SqliteFile) : new PostgreSqlArchive(ConnectionString);
    }

    public Kind Kind { get; }
    public ArchiveDatabase Archive { get; }

    public string SqliteFile => Path.Combine(_place, "archive.db");

    public string ConnectionString => new NpgsqlConnectionStringBuilder(ThrowawayPostgres.Server) { Database = _place, Pooling = !_template, MaxPoolSize = 20 }.ToString();

    public static async Task<TestDatabase> Empty(Kind kind)
    {
        if (kind == Kind.Sqlite) return new TestDatabase(kind, Directory.CreateTempSubdirectory("joint-planner-sqlite-").FullName);
        var name = NewName();
        await OnServer($"CREATE DATABASE {name}");
        return new TestDatabase(kind, name);
    }

    public static async Task<TestDatabase> Migrated(Kind kind)
    {
        await OneMaker.WaitAsync();
        try
        {
            var template = await Template(kind);
            if (kind == Kind.PostgreSql)
            {
                var name = NewName();
                await OnServer($"CREATE DATABASE {name} TEMPLATE {template._place}");
                return new TestDatabase(kind, name);
            }

            var folder = Directory.CreateTempSubdirectory("joint-planner-sqlite-").FullName;
            File.Copy(template.SqliteFile, Path.Combine(folder, "archive.db"));
            return new TestDatabase(kind, folder);
        }
        finally
        {
            OneMaker.Release();
        }
    }

    /// <summary>A connection that is not the program's: as somebody with the file, or as the server's superuser.</summary>
    public async Task<DbConnection> AsInsider()
    {
        DbConnection connection = Kind == Kind.Sqlite
            ? new SqliteConnection(new SqliteConnectionStringBuilder { DataSource = SqliteFile, Pooling = false }.ToString())
            : new NpgsqlConnection(new NpgsqlConnectionStringBuilder(ConnectionString) { Pooling = false }.ToString());
        await connection.OpenAsync();
        return connection;
    }

    public async Task Insider(string statement)
    {
        await using var connection = await AsInsider();
        await Execute(connection, statement);
    }

    public static async Task<int> Execute(DbConnection connection, string statement)
    {
        await using var command = connection.CreateCommand();
        command.CommandText = statement;
        return await command.ExecuteNonQueryAsync();
    }

    /// <summary>Takes every guard away, as only an owner of the tables can.</summary>
    public async Task DropGuards()
    {
        await using var connection = await AsInsider();
        await using var command = connection.CreateCommand();
        command.CommandText = Kind == Kind.Sqlite
            ? "SELECT 'DROP TRIGGER \"' || name || '\"' FROM sqlite_master WHERE type = 'trigger'"
            : "SELECT 'DROP TRIGGER \"' || tgname || '\" ON ' || tgrelid::regclass FROM pg_trigger WHERE tgname LIKE 'guard\\_%'";
        var drops = new List<string>();
        await using (var reader = await command.ExecuteReaderAsync())
        {
            while (await reader.ReadAsync()) drops.Add(reader.GetString(0));
        }

        Assert.NotEmpty(drops);
        foreach (var drop in drops) await Execute(connection, drop);
    }

    public async ValueTask DisposeAsync()
    {
        await Archive.DisposeAsync();
        if (Kind == Kind.Sqlite)
        {
            Directory.Delete(_place, recursive: true);
            return;
        }

        await using (var connection = new NpgsqlConnection(ConnectionString)) NpgsqlConnection.ClearPool(connection);
        await OnServer($"DROP DATABASE {_place} WITH (FORCE)");
    }

    /// <summary>At the end of the run: nothing stays behind, also on a server that is not thrown away.</summary>
    public static async Task ForgetTemplates()
    {
        foreach (var template in Templates.Values) await template.DisposeAsync();
        Templates.Clear();
    }

    public static async Task OnServer(string statement)
    {
        await using var connection = new NpgsqlConnection(ThrowawayPostgres.Server);
        await connection.OpenAsync();
        await Execute(connection, statement);
    }

    public static string NewName() => $"t_{Guid.NewGuid():N}";

    private static async Task<TestDatabase> Template(Kind kind)
    {
        if (Templates.TryGetValue(kind, out var known)) return known;
        var place = kind == Kind.Sqlite ? Directory.CreateTempSubdirectory("joint-planner-sqlite-template-").FullName : NewName();
        if (kind == Kind.PostgreSql) await OnServer($"CREATE DATABASE {place}");
        var template = new TestDatabase(kind, place, template: true);
        await template.Archive.Migrate();

        // Closed, so that its file is whole and its database can be a template.
        await template.Archive.DisposeAsync();
        return Templates[kind] = template;
    }
}
