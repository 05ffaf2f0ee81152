using JointPlanner.Archive.Tests.Databases;
using Npgsql;

[assembly: AssemblyFixture(typeof(ThrowawayPostgres))]

namespace JointPlanner.Archive.Tests.Databases;

/// <summary>
/// One PostgreSQL server for the whole test run: the one that JOINTPLANNER_TEST_POSTGRES names (a superuser's connection string), else one started here on a
/// free loopback port and thrown away. Where neither is to be had the tests fail; they are never skipped.
/// </summary>
public sealed class ThrowawayPostgres : IAsyncLifetime
{
    private const string Variable = "JOINTPLANNER_TEST_POSTGRES";
    private PostgresCluster? _started;

    /// <summary>Connection string of a superuser.</summary>
    public static string Server { get; private set; } = "";

    public async ValueTask InitializeAsync()
    {
        Server = Environment.GetEnvironmentVariable(Variable) ?? await Start();
        await using var connection = new NpgsqlConnection(Server);
        await connection.OpenAsync();
    }

    public async ValueTask DisposeAsync()
    {
        await TestDatabase.ForgetTemplates();
        NpgsqlConnection.ClearAllPools();
        if (_started is not null) await _started.DisposeAsync();
    }

    private async Task<string> Start()
    {
        _started = await PostgresCluster.Make($"or {Variable}");
        return _started.ConnectionString;
    }
}
