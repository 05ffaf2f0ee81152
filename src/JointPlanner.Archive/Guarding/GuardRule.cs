using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Revisions;
using Microsoft.EntityFrameworkCore.Metadata;

namespace JointPlanner.Archive.Guarding;

public enum GuardedEvent
{
    Insert,
    Update,
    Delete,
    Truncate,
}

/// <summary>What the database refuses. Both kinds of database get their triggers from these rules.</summary>
/// <param name="Condition">SQL over NEW and OLD that both databases read alike; null refuses always.</param>
/// <param name="Sentence">What the refused statement is told; without apostrophes.</param>
public sealed record GuardRule(string Table, GuardedEvent Event, string? Condition, string Sentence)
{
    public string Name => $"guard_{Table}_{Event}".ToLowerInvariant();

    public static IReadOnlyList<GuardRule> All(IModel model)
    {
        var rules = new List<GuardRule>();
        foreach (var type in GuardedTables.InsertOnly)
        {
            var table = GuardedTables.TableOf(model, type);
            foreach (var refused in (GuardedEvent[])[GuardedEvent.Update, GuardedEvent.Delete, GuardedEvent.Truncate])
                rules.Add(new GuardRule(table, refused, null, $"Rows of {table} are only ever added; they are not changed or removed."));
        }

        foreach (var type in GuardedTables.Conditional)
        {
            var table = GuardedTables.TableOf(model, type);
            foreach (var refused in (GuardedEvent[])[GuardedEvent.Delete, GuardedEvent.Truncate])
                rules.Add(new GuardRule(table, refused, null, $"Rows of {table} are not removed."));
        }

        rules.Add(FrozenRevision(GuardedTables.TableOf(model, typeof(Revision))));
        rules.Add(ForwardTip(GuardedTables.TableOf(model, typeof(ChainTip))));
        rules.Add(AllowedMove(GuardedTables.TableOf(model, typeof(StateEntry))));
        return rules;
    }

    private static GuardRule FrozenRevision(string table) => new(
        table,
        GuardedEvent.Update,
        """
        EXISTS (SELECT 1 FROM "StateEntries" AS s WHERE s."RevisionId" = OLD."Id" AND s."State" <> 'Draft')
        OR NEW."Id" <> OLD."Id" OR NEW."StructureId" <> OLD."StructureId" OR NEW."Number" <> OLD."Number"
        """,
        "A revision is changed only while it is a draft, and never its number.");

    private static GuardRule ForwardTip(string table) => new(
        table,
        GuardedEvent.Update,
        """NEW."Chain" <> OLD."Chain" OR NEW."Position" <= OLD."Position" """,
        "The end of a chain only moves forward.");

    private static GuardRule AllowedMove(string table)
    {
        var moves = string.Join(", ", Transitions.Moves.Select(move => $"'{move.From}>{move.To}'"));
        return new GuardRule(
            table,
            GuardedEvent.Insert,
            $"""
            NEW."Ordinal" <> (SELECT coalesce(max(s."Ordinal"), 0) + 1 FROM "StateEntries" AS s WHERE s."RevisionId" = NEW."RevisionId")
            OR (coalesce((SELECT s."State" FROM "StateEntries" AS s WHERE s."RevisionId" = NEW."RevisionId" ORDER BY s."Ordinal" DESC LIMIT 1), '')
                || '>' || NEW."State") NOT IN ({moves})
            OR (NEW."State" = 'Issued' AND EXISTS (
                SELECT 1 FROM "StateEntries" AS s JOIN "Revisions" AS r ON r."Id" = s."RevisionId"
                WHERE s."State" = 'Issued' AND r."StructureId" = (SELECT o."StructureId" FROM "Revisions" AS o WHERE o."Id" = NEW."RevisionId")
                AND NOT EXISTS (SELECT 1 FROM "StateEntries" AS l WHERE l."RevisionId" = s."RevisionId" AND l."Ordinal" > s."Ordinal")))
            """,
            "This is no step in the life of a revision, or another revision of the structure is issued.");
    }
}
