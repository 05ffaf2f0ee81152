using JointPlanner.Archive.Guarding;
using Microsoft.EntityFrameworkCore.Metadata;

namespace JointPlanner.Archive.Sqlite;

/// <summary>The guards as SQLite triggers. There is no TRUNCATE; instead REPLACE could put a new row in an old one's place, so that is guarded.</summary>
internal static class SqliteGuards
{
    public static IReadOnlyList<Guard> All(IModel model)
    {
        var rules = GuardRule.All(model).Where(rule => rule.Event != GuardedEvent.Truncate);
        var guarded = GuardedTables.InsertOnly.Concat(GuardedTables.Conditional);
        return [.. rules.Select(rule => Trigger(rule.Name, rule)), .. guarded.Select(type => NoReplace(model, type))];
    }

    private static Guard NoReplace(IModel model, Type type)
    {
        var table = GuardedTables.TableOf(model, type);
        var taken = GuardedTables.UniqueColumns(model, type).Select(columns =>
            $"EXISTS (SELECT 1 FROM \"{table}\" AS o WHERE {string.Join(" AND ", columns.Select(column => $"o.\"{column}\" = NEW.\"{column}\""))})");
        var rule = new GuardRule(table, GuardedEvent.Insert, string.Join(" OR ", taken), $"Another row of {table} stands in this place; it is not replaced.");
        return Trigger($"guard_{table}_replace".ToLowerInvariant(), rule);
    }

    private static Guard Trigger(string name, GuardRule rule) => new(
        name,
        [
            $"DROP TRIGGER IF EXISTS \"{name}\"",
            $"""
            CREATE TRIGGER "{name}" BEFORE {rule.Event.ToString().ToUpperInvariant()} ON "{rule.Table}"
            BEGIN SELECT RAISE(ABORT, '{rule.Sentence}') WHERE {rule.Condition ?? "1"}; END
            """,
        ]);
}
