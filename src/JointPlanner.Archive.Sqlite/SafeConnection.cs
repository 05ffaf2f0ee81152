using System.Data.Common;
using Microsoft.EntityFrameworkCore.Diagnostics;

namespace JointPlanner.Archive.Sqlite;

/// <summary>
/// Every connection waits for the disk and watches foreign keys; recursive triggers make REPLACE fire the guards on deletion.
/// </summary>
internal sealed class SafeConnection : DbConnectionInterceptor
{
    private const string Settings = "PRAGMA synchronous = FULL; PRAGMA foreign_keys = ON; PRAGMA recursive_triggers = ON;";

    public override void ConnectionOpened(DbConnection connection, ConnectionEndEventData eventData)
    {
        using var command = connection.CreateCommand();
        command.CommandText = Settings;
        command.ExecuteNonQuery();
    }

    public override async Task ConnectionOpenedAsync(DbConnection connection, ConnectionEndEventData eventData, CancellationToken cancellationToken = default)
    {
        await using var command = connection.CreateCommand();
        command.CommandText = Settings;
        await command.ExecuteNonQueryAsync(cancellationToken);
    }
}
