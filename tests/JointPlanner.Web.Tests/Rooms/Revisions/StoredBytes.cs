using Microsoft.Data.Sqlite;

namespace JointPlanner.Web.Tests.Rooms.Revisions;

/// <summary>Somebody with the database's file: takes the guard away and changes one byte.</summary>
public static class StoredBytes
{
    /// <summary>Alters one digit of a frozen package.</summary>
    public static async Task Alter(string folder, Guid revision)
    {
        await using var connection = new SqliteConnection(new SqliteConnectionStringBuilder { DataSource = Path.Combine(folder, "archive.db"), Pooling = false }.ToString());
        await connection.OpenAsync();
        foreach (var guard in await Guards(connection)) await Run(connection, $"DROP TRIGGER \"{guard}\"");
        var changed = await Run(connection, "UPDATE \"FrozenPackages\" SET \"PackageText\" = replace(\"PackageText\", 'calculation/1', 'calculation/2') WHERE upper(\"RevisionId\") = $id", ("$id", revision.ToString().ToUpperInvariant()));
        Assert.Equal(1, changed);
    }

    private static async Task<IReadOnlyList<string>> Guards(SqliteConnection connection)
    {
        await using var command = connection.CreateCommand();
        command.CommandText = "SELECT name FROM sqlite_master WHERE type = 'trigger' AND tbl_name = 'FrozenPackages'";
        var names = new List<string>();
        await using var reader = await command.ExecuteReaderAsync();
        while (await reader.ReadAsync()) names.Add(reader.GetString(0));
        Assert.NotEmpty(names);
        return names;
    }

    private static async Task<int> Run(SqliteConnection connection, string statement, params (string Name, object Value)[] values)
    {
        await using var command = connection.CreateCommand();
#pragma warning disable CA2100 // The names come from the database itself.
        command.CommandText = statement;
#pragma warning restore CA2100
        foreach (var (name, value) in values) command.Parameters.AddWithValue(name, value);
        return await command.ExecuteNonQueryAsync();
    }
}
