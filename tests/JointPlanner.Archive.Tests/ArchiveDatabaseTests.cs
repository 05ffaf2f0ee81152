using JointPlanner.Archive.Chains;
using JointPlanner.Archive.People;
using JointPlanner.Archive.PostgreSql;
using JointPlanner.Archive.Sqlite;
using JointPlanner.Archive.Tests.Databases;
using Microsoft.EntityFrameworkCore;
using Npgsql;

namespace JointPlanner.Archive.Tests;

public class ArchiveDatabaseTests
{
    [Theory, BothDatabases]
    public async Task The_migrations_hold_every_change_of_the_model(Kind kind)
    {
        await using var database = await TestDatabase.Migrated(kind);
        await using var context = database.Archive.CreateDbContext();
        Assert.False(context.Database.HasPendingModelChanges());
    }

    [Theory, BothDatabases]
    public async Task A_migrated_database_is_ready(Kind kind)
    {
        await using var database = await TestDatabase.Migrated(kind);
        await database.Archive.AssertReady(production: false);
    }

    [Theory, BothDatabases]
    public async Task An_unmigrated_database_is_refused_with_what_to_do(Kind kind)
    {
        await using var database = await TestDatabase.Empty(kind);
        var refusal = await Assert.ThrowsAsync<ArchiveNotReady>(() => database.Archive.AssertReady(production: false));
        Assert.Contains("admin migrate", refusal.Message, StringComparison.Ordinal);
    }

    [Theory, BothDatabases]
    public async Task A_database_newer_than_the_program_is_refused(Kind kind)
    {
        await using var database = await TestDatabase.Migrated(kind);
        await database.Insider("""INSERT INTO "__EFMigrationsHistory" ("MigrationId", "ProductVersion") VALUES ('29990101000000_Later', '99.0')""");
        var atStart = await Assert.ThrowsAsync<ArchiveNotReady>(() => database.Archive.AssertReady(production: false));
        var atMigration = await Assert.ThrowsAsync<ArchiveNotReady>(() => database.Archive.Migrate());
        Assert.Contains("29990101000000_Later", atStart.Message, StringComparison.Ordinal);
        Assert.Contains("newer than this program", atMigration.Message, StringComparison.Ordinal);
    }

    [Theory, BothDatabases]
    public async Task A_lost_guard_is_noticed_at_start_and_made_again_by_migrating(Kind kind)
    {
        await using var database = await TestDatabase.Migrated(kind);
        await database.Insider(kind == Kind.Sqlite
            ? "DROP TRIGGER guard_auditentries_update"
            : """DROP TRIGGER guard_auditentries_update ON "AuditEntries" """);
        var refusal = await Assert.ThrowsAsync<ArchiveNotReady>(() => database.Archive.AssertReady(production: false));
        Assert.Contains("guard_auditentries_update", refusal.Message, StringComparison.Ordinal);
        await database.Archive.Migrate();
        await database.Archive.AssertReady(production: false);
    }

    [Fact]
    public async Task Four_instances_may_migrate_and_seed_an_empty_server_database_at_once()
    {
        await using var database = await TestDatabase.Empty(Kind.PostgreSql);
        var seeded = 0;
        async Task Seed(ArchiveContext context, CancellationToken cancel)
        {
            if (await context.Organisations.AnyAsync(cancel)) return;
            context.Organisations.Add(new Organisation { Name = "Harbour Authority of Ostrand" });
            await context.SaveChangesAsync(cancel);
            Interlocked.Increment(ref seeded);
        }

        await Task.WhenAll(Enumerable.Range(0, 4).Select(_ => Task.Run(() => new PostgreSqlArchive(database.ConnectionString).Migrate(Seed))));
        Assert.Equal(1, seeded);
        await database.Archive.AssertReady(production: false);
    }

    [Fact]
    public async Task A_second_instance_on_one_file_is_refused_until_the_first_has_ended()
    {
        await using var database = await TestDatabase.Migrated(Kind.Sqlite);
        var refusal = Assert.Throws<ArchiveNotReady>(() => new SqliteArchive(database.SqliteFile));
        Assert.Contains("Another running instance", refusal.Message, StringComparison.Ordinal);
        await database.Archive.DisposeAsync();
        await using var next = new SqliteArchive(database.SqliteFile);
        await next.AssertReady(production: true);
    }

    [Fact]
    public async Task In_production_a_role_that_owns_the_tables_is_refused_and_the_granted_one_is_not()
    {
        await using var database = await TestDatabase.Empty(Kind.PostgreSql);
        await using var roles = await Roles.Make(database);
        var owner = new PostgreSqlArchive(roles.Owner, roles.AppName);
        await owner.Migrate();

        var refusal = await Assert.ThrowsAsync<ArchiveNotReady>(() => owner.AssertReady(production: true));
        Assert.Contains("owns the guarded table", refusal.Message, StringComparison.Ordinal);
        await owner.AssertReady(production: false);
        await new PostgreSqlArchive(roles.App).AssertReady(production: true);
    }

    [Fact]
    public async Task The_granted_role_can_do_every_act()
    {
        await using var database = await TestDatabase.Empty(Kind.PostgreSql);
        await using var roles = await Roles.Make(database);
        await new PostgreSqlArchive(roles.Owner, roles.AppName).Migrate();
        var world = await FullArchive.Fill(await World.On(database, new PostgreSqlArchive(roles.App)));
        var draft = await world.Drafts.Open(world.Ines.Id, world.StructureId);
        await world.Drafts.Bin(world.Ines.Id, draft.Id, draft.Version);
        world.Clock.Now = world.Clock.Now.AddDays(31);
        Assert.Equal(1, await world.Drafts.EmptyBin());
        Assert.True((await ArchiveChain.Verify(world.Archive)).Whole);
    }

    [Fact]
    public async Task In_production_a_role_with_a_grant_too_many_is_refused()
    {
        await using var database = await TestDatabase.Empty(Kind.PostgreSql);
        await using var roles = await Roles.Make(database);
        await new PostgreSqlArchive(roles.Owner, roles.AppName).Migrate();
        await database.Insider($"""GRANT DELETE ON "PdfSegments" TO {roles.AppName}""");
        var refusal = await Assert.ThrowsAsync<ArchiveNotReady>(() => new PostgreSqlArchive(roles.App).AssertReady(production: true));
        Assert.Contains("PdfSegments (DELETE)", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_granted_role_cannot_switch_a_guard_off()
    {
        await using var database = await TestDatabase.Empty(Kind.PostgreSql);
        await using var roles = await Roles.Make(database);
        await new PostgreSqlArchive(roles.Owner, roles.AppName).Migrate();
        await using var app = new NpgsqlConnection(roles.App);
        await app.OpenAsync();
        foreach (var statement in (string[])
                 [
                     """ALTER TABLE "AuditEntries" DISABLE TRIGGER ALL""", """DROP TABLE "AuditEntries" """, "SET session_replication_role = replica",
                     """UPDATE "AuditEntries" SET "What" = 'nothing'""", """DELETE FROM "AuditEntries" """, """TRUNCATE "AuditEntries" """,
                 ])
        {
            var refusal = await Assert.ThrowsAsync<PostgresException>(() => TestDatabase.Execute(app, statement));
            Assert.Equal(PostgresErrorCodes.InsufficientPrivilege, refusal.SqlState);
        }
    }
}
