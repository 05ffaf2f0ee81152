using System.Data.Common;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Guarding;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Tests.Databases;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Tests.Guarding;

/// <summary>What the database itself refuses, tried by somebody with all rights on the tables.</summary>
public class GuardTests
{
    [Theory, BothDatabases]
    public async Task No_row_of_a_guarded_table_can_be_changed_removed_or_truncated(Kind kind)
    {
        await using var world = await FullArchive.Make(kind);
        await using var insider = await world.Database.AsInsider();
        await using var context = world.Archive.CreateDbContext();
        foreach (var type in GuardedTables.InsertOnly.Concat(GuardedTables.Conditional))
        {
            var table = GuardedTables.TableOf(context.Model, type);
            Assert.True(await Count(insider, table) > 0, $"{table} is empty: nothing would be tried.");
            if (GuardedTables.InsertOnly.Contains(type))
            {
                foreach (var column in context.Model.FindEntityType(type)!.GetProperties().Select(property => property.GetColumnName()))
                    await RefusedByGuard(insider, $"UPDATE \"{table}\" SET \"{column}\" = \"{column}\"");
            }

            await RefusedByGuard(insider, $"DELETE FROM \"{table}\"");
            if (kind == Kind.PostgreSql) await RefusedByGuard(insider, $"TRUNCATE \"{table}\" CASCADE");
        }
    }

    [Fact]
    public async Task On_sqlite_no_row_of_a_guarded_table_can_be_replaced()
    {
        await using var world = await FullArchive.Make(Kind.Sqlite);
        await using var insider = await world.Database.AsInsider();
        await using var context = world.Archive.CreateDbContext();
        foreach (var type in GuardedTables.InsertOnly.Concat(GuardedTables.Conditional))
        {
            var table = GuardedTables.TableOf(context.Model, type);
            var before = await Count(insider, table);
            await RefusedByGuard(insider, $"INSERT OR REPLACE INTO \"{table}\" SELECT * FROM \"{table}\" LIMIT 1");
            Assert.Equal(before, await Count(insider, table));
        }
    }

    [Theory, BothDatabases]
    public async Task A_draft_can_be_changed_and_a_frozen_revision_cannot(Kind kind)
    {
        await using var world = await World.Make(kind);
        const string Statement = """UPDATE "Revisions" SET "PlanText" = '{}'""";
        await using var insider = await world.Database.AsInsider();
        Assert.Equal(1, await TestDatabase.Execute(insider, Statement));
        await RefusedByGuard(insider, """UPDATE "Revisions" SET "Number" = 7""");
        await world.Frozen();
        await RefusedByGuard(insider, Statement);
    }

    [Theory, BothDatabases]
    public async Task The_end_of_a_chain_only_moves_forward(Kind kind)
    {
        await using var world = await World.Make(kind);
        await using var insider = await world.Database.AsInsider();
        await RefusedByGuard(insider, """UPDATE "ChainTips" SET "Position" = "Position" - 1 WHERE "Chain" = 'audit'""");
        await RefusedByGuard(insider, """UPDATE "ChainTips" SET "Hash" = 'x' WHERE "Chain" = 'audit'""");
    }

    /// <summary>Every pair of states, tried as a bare INSERT behind the program's back.</summary>
    [Theory, BothDatabases]
    public async Task The_database_lets_only_the_moves_of_the_table_into_a_revisions_life(Kind kind)
    {
        await using var world = await World.Make(kind);
        await using var insider = await world.Database.AsInsider();
        var copy = $"""
            INSERT INTO "StateEntries" ("Id", "RevisionId", "Ordinal", "State", "Act", "PersonId", "Chain", "Position", "At", "PreviousHash", "Hash")
            SELECT @id, "RevisionId", "Ordinal" + 1, @state, "Act", "PersonId", @id, 1, "At", "PreviousHash", "Hash" FROM "StateEntries" ORDER BY "Ordinal" DESC LIMIT 1
            """;
        var allowed = Transitions.Moves.Where(move => move.From is not null).Select(move => (move.From!.Value, move.To)).ToHashSet();
        var ways = new RevisionState[][]
        {
            [], [RevisionState.InCheck], [RevisionState.InCheck, RevisionState.Returned], [RevisionState.InCheck, RevisionState.Checked],
            [RevisionState.InCheck, RevisionState.Checked, RevisionState.Issued],
            [RevisionState.InCheck, RevisionState.Checked, RevisionState.Issued, RevisionState.Superseded],
            [RevisionState.InCheck, RevisionState.Checked, RevisionState.Issued, RevisionState.Withdrawn],
        };
        var let = 0;
        foreach (var way in ways)
        {
            foreach (var to in Enum.GetValues<RevisionState>())
            {
                // Every try starts from the first draft and is undone.
                await using var transaction = await insider.BeginTransactionAsync();
                foreach (var step in way) await Insert(insider, transaction, copy, step);
                var from = way.Length == 0 ? RevisionState.Draft : way[^1];
                if (allowed.Contains((from, to)))
                {
                    await Insert(insider, transaction, copy, to);
                    let++;
                }
                else
                {
                    await Assert.ThrowsAnyAsync<DbException>(() => Insert(insider, transaction, copy, to));
                }

                await transaction.RollbackAsync();
            }
        }

        Assert.Equal(allowed.Count, let);
    }

    [Theory, BothDatabases]
    public async Task The_database_lets_no_second_revision_of_a_structure_be_issued(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Issued();
        var next = await world.Begin.Do(world.By(world.Ines), new BeginRequest(world.StructureId));
        await world.Checked(next.RevisionId);
        await using var insider = await world.Database.AsInsider();
        var sentence = await RefusedByGuard(insider, $"""
            INSERT INTO "StateEntries" ("Id", "RevisionId", "Ordinal", "State", "Act", "PersonId", "Chain", "Position", "At", "PreviousHash", "Hash")
            SELECT "PersonId", "RevisionId", "Ordinal" + 1, 'Issued', "Act", "PersonId", 'x', 1, "At", "PreviousHash", "Hash" FROM "StateEntries"
            WHERE "State" = 'Checked' AND "RevisionId" <> (SELECT "RevisionId" FROM "StateEntries" WHERE "State" = 'Issued')
            """);
        Assert.Contains("another revision of the structure is issued", sentence, StringComparison.Ordinal);
    }

    private static async Task Insert(DbConnection connection, DbTransaction transaction, string statement, RevisionState state)
    {
        await using var command = connection.CreateCommand();
        command.CommandText = statement;
        command.Transaction = transaction;
        Add("id", Guid.CreateVersion7());
        Add("state", state.ToString());
        Assert.Equal(1, await command.ExecuteNonQueryAsync());

        void Add(string name, object value)
        {
            var parameter = command.CreateParameter();
            (parameter.ParameterName, parameter.Value) = (name, value);
            command.Parameters.Add(parameter);
        }
    }

    private static async Task<string> RefusedByGuard(DbConnection connection, string statement)
    {
        var refusal = await Assert.ThrowsAnyAsync<DbException>(() => TestDatabase.Execute(connection, statement));
        Assert.True(
            refusal.Message.Contains("only ever added", StringComparison.Ordinal) || refusal.Message.Contains("not removed", StringComparison.Ordinal)
            || refusal.Message.Contains("not replaced", StringComparison.Ordinal) || refusal.Message.Contains("only while it is a draft", StringComparison.Ordinal)
            || refusal.Message.Contains("only moves forward", StringComparison.Ordinal) || refusal.Message.Contains("no step in the life", StringComparison.Ordinal),
            $"{statement} was refused, but not by a guard: {refusal.Message}");
        return refusal.Message;
    }

    private static async Task<long> Count(DbConnection connection, string table)
    {
        await using var command = connection.CreateCommand();
        command.CommandText = $"SELECT count(*) FROM \"{table}\"";
        return (long)(await command.ExecuteScalarAsync())!;
    }
}
