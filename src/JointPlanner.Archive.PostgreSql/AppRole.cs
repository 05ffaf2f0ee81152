using JointPlanner.Archive.Guarding;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata;
using Npgsql;

namespace JointPlanner.Archive.PostgreSql;

/// <summary>What the role that the program runs as may do, and the proof that it may not do more.</summary>
internal static class AppRole
{
    public static IEnumerable<string> Grants(IModel model, string role)
    {
        var quoted = new NpgsqlCommandBuilder().QuoteIdentifier(role);
        yield return $"REVOKE ALL ON ALL TABLES IN SCHEMA public FROM {quoted}";
        yield return $"REVOKE CREATE ON SCHEMA public FROM {quoted}, PUBLIC";
        yield return $"GRANT USAGE ON SCHEMA public TO {quoted}";
        yield return $"GRANT USAGE ON ALL SEQUENCES IN SCHEMA public TO {quoted}";
        yield return $"GRANT SELECT ON public.\"__EFMigrationsHistory\" TO {quoted}";
        foreach (var type in model.GetEntityTypes())
        {
            if (type.GetTableName() is not { } table) continue;
            yield return $"GRANT {Rights(type.ClrType)} ON public.\"{table}\" TO {quoted}";
        }
    }

    /// <summary>Throws when the connected role owns guarded tables or may change their rows.</summary>
    public static async Task AssertHarmless(ArchiveContext context, CancellationToken cancel)
    {
        var insertOnly = Tables(context, GuardedTables.InsertOnly);
        var conditional = Tables(context, GuardedTables.Conditional);
        var owned = await context.Database.SqlQuery<string>(
            $"""
            SELECT c.relname::text AS "Value" FROM pg_class c JOIN pg_namespace n ON n.oid = c.relnamespace
            WHERE n.nspname = 'public' AND c.relname = ANY ({insertOnly.Concat(conditional).ToArray()}) AND pg_has_role(current_user, c.relowner, 'MEMBER')
            """).ToListAsync(cancel);
        if (owned.Count > 0)
            throw new ArchiveNotReady($"The program's database role owns the guarded table {owned[0]}, or can become its owner. In Production it must run as another role: run `admin migrate` with the owning role and `--app-role`, and give the program that role.");

        var changeable = await context.Database.SqlQuery<string>(
            $"""
            SELECT c.relname::text || ' (' || p.name || ')' AS "Value"
            FROM pg_class c JOIN pg_namespace n ON n.oid = c.relnamespace CROSS JOIN (VALUES ('UPDATE'), ('DELETE'), ('TRUNCATE'), ('TRIGGER')) AS p(name)
            WHERE n.nspname = 'public' AND has_table_privilege(current_user, c.oid, p.name)
              AND (c.relname = ANY ({insertOnly}) OR (c.relname = ANY ({conditional}) AND p.name <> 'UPDATE'))
            """).ToListAsync(cancel);
        if (changeable.Count > 0)
            throw new ArchiveNotReady($"The program's database role may change the guarded table {changeable[0]}. Run `admin migrate` with the owning role and `--app-role` to set the grants again.");
    }

    private static string Rights(Type type)
    {
        if (GuardedTables.InsertOnly.Contains(type)) return "SELECT, INSERT";
        return GuardedTables.Conditional.Contains(type) ? "SELECT, INSERT, UPDATE" : "SELECT, INSERT, UPDATE, DELETE";
    }

    private static string[] Tables(ArchiveContext context, IEnumerable<Type> types) =>
        [.. types.Select(type => GuardedTables.TableOf(context.Model, type))];
}
