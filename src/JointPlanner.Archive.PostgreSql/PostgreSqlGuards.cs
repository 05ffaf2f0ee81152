using JointPlanner.Archive.Guarding;
using Microsoft.EntityFrameworkCore.Metadata;

namespace JointPlanner.Archive.PostgreSql;

/// <summary>The guards as PostgreSQL triggers, each with its function.</summary>
internal static class PostgreSqlGuards
{
    public static IReadOnlyList<Guard> All(IModel model) => [.. GuardRule.All(model).Select(Trigger)];

    private static Guard Trigger(GuardRule rule)
    {
        var refuse = $"RAISE EXCEPTION USING MESSAGE = '{rule.Sentence}', ERRCODE = 'restrict_violation';";
        var body = rule.Condition is null ? refuse : $"IF {rule.Condition} THEN {refuse} END IF; RETURN NEW;";
        var each = rule.Event == GuardedEvent.Truncate ? "STATEMENT" : "ROW";
        return new Guard(
            rule.Name,
            [
                // The search path is fixed: a session's own temporary table must not pass for the real one.
                $"""
                CREATE OR REPLACE FUNCTION public."{rule.Name}"() RETURNS trigger LANGUAGE plpgsql SET search_path = public, pg_temp AS $guard$
                BEGIN {body} END $guard$
                """,
                $"DROP TRIGGER IF EXISTS \"{rule.Name}\" ON public.\"{rule.Table}\"",
                $"""
                CREATE TRIGGER "{rule.Name}" BEFORE {rule.Event.ToString().ToUpperInvariant()} ON public."{rule.Table}"
                FOR EACH {each} EXECUTE FUNCTION public."{rule.Name}"()
                """,
            ]);
    }
}
