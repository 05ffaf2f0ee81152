using Npgsql;

namespace JointPlanner.Archive.Tests.Databases;

/// <summary>Two roles of the server as an installation has them: one that owns the tables and one that the program runs as.</summary>
public sealed class Roles : IAsyncDisposable
{
    private readonly TestDatabase _database;
    private readonly string _owner;

    private Roles(TestDatabase database, string owner, string app)
    {
        _database = database;
        _owner = owner;
        AppName = app;
    }

    public string AppName { get; }
    public string Owner => As(_owner);
    public string App => As(AppName);

    public static async Task<Roles> Make(TestDatabase database)
    {
        var roles = new Roles(database, TestDatabase.NewName(), TestDatabase.NewName());
        await database.Insider($"CREATE ROLE {roles._owner} LOGIN");
        await database.Insider($"CREATE ROLE {roles.AppName} LOGIN");
        await database.Insider($"GRANT ALL ON SCHEMA public TO {roles._owner}");
        return roles;
    }

    public async ValueTask DisposeAsync()
    {
        await _database.Insider($"DROP OWNED BY {AppName}, {_owner} CASCADE");
        await _database.Insider($"DROP ROLE {AppName}, {_owner}");
    }

    private string As(string role) => new NpgsqlConnectionStringBuilder(_database.ConnectionString) { Username = role, Pooling = false }.ToString();
}
