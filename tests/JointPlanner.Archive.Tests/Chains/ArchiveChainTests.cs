using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Setting;
using JointPlanner.Archive.Tests.Databases;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Tests.Chains;

public class ArchiveChainTests
{
    [Theory, BothDatabases]
    public async Task An_untouched_archive_is_whole(Kind kind)
    {
        await using var world = await FullArchive.Make(kind);
        var report = await ArchiveChain.Verify(world.Archive);
        Assert.Null(report.FirstBreak);
        Assert.True(report.Rows > 20, $"Only {report.Rows} rows were walked.");
    }

    /// <summary>Each is done by somebody who has first taken the guards away.</summary>
    public static readonly TheoryData<Kind, string, string> Tampering = new(
        from kind in Enum.GetValues<Kind>()
        from tampering in new (string Statement, string Row)[]
        {
            ("""UPDATE "StateEntries" SET "Reason" = 'none' WHERE "State" = 'Issued'""", "StateEntry"),
            ("""UPDATE "RevisionEdits" SET "PersonId" = (SELECT "DesignerId" FROM "FrozenPackages" LIMIT 1)""", "RevisionEdit"),
            ("""UPDATE "Remarks" SET "Text" = 'All good.'""", "Remark"),
            ("""UPDATE "FrozenPackages" SET "PackageText" = '{}'""", "FrozenPackage"),
            ("""UPDATE "FrozenPackages" SET "ResultsText" = replace("ResultsText", '0.0123', '0.0124')""", "FrozenPackage"),
            ("""UPDATE "FrozenPackages" SET "EngineVersion" = '9'""", "FrozenPackage"),
            ("""UPDATE "PdfSegments" SET "SignerId" = NULL WHERE "Ordinal" = 2""", "PdfSegment"),
            ("""UPDATE "Blobs" SET "Bytes" = (SELECT "Bytes" FROM "Blobs" ORDER BY length("Bytes") DESC LIMIT 1)""", "PdfSegment"),
            ("""UPDATE "SettingRecords" SET "HoldsAtMinimum" = NOT "HoldsAtMinimum" """, "SettingRecord"),
            ("""UPDATE "SettingPoints" SET "Opening" = 0.0413 WHERE "Ordinal" = 1""", "SettingRecord"),
            ("""UPDATE "SettingAcceptances" SET "Reason" = 'It may stay.'""", "SettingAcceptance"),
            ("""UPDATE "Readings" SET "Opening" = 0.0476""", "Reading"),
            ("""UPDATE "Confirmations" SET "Edition" = '2019'""", "Confirmation"),
            ("""UPDATE "ConfirmationRevocations" SET "Reason" = 'x'""", "ConfirmationRevocation"),
            ("""UPDATE "AuditEntries" SET "PersonName" = 'Nobody' WHERE "What" = 'Issue'""", "AuditEntry"),
            ("""DELETE FROM "AuditEntries" WHERE "What" = 'Freeze'""", "AuditEntry"),
            ("""DELETE FROM "Readings" """, "SettingAcceptance"),
            ("""DELETE FROM "SettingAcceptances" """, "Reading"),
        }
        select (kind, tampering.Statement, tampering.Row));

    [Theory, MemberData(nameof(Tampering))]
    public async Task A_tampered_row_is_found_and_named(Kind kind, string statement, string row)
    {
        await using var world = await FullArchive.Make(kind);
        await world.Database.DropGuards();
        await world.Database.Insider(statement);
        var report = await ArchiveChain.Verify(world.Archive);
        Assert.False(report.Whole);
        Assert.StartsWith(row + " ", report.FirstBreak!.Row, StringComparison.Ordinal);
    }

    /// <summary>The insider has the program's own code and gives the altered row a hash that fits it.</summary>
    [Theory, BothDatabases]
    public async Task A_row_altered_with_a_fitting_hash_shows_at_the_row_behind_it(Kind kind)
    {
        await using var world = await FullArchive.Make(kind);
        await world.Database.DropGuards();
        await using (var context = world.Archive.CreateDbContext())
        {
            var remark = await context.Remarks.SingleAsync();
            context.Entry(remark).Property(row => row.Text).CurrentValue = "All good.";
            context.Entry(remark).Property(row => row.Hash).CurrentValue = remark.ComputeHash();
            await context.SaveChangesAsync();
        }

        var report = await ArchiveChain.Verify(world.Archive);
        Assert.Contains("does not follow the one before it", report.FirstBreak!.What, StringComparison.Ordinal);
        Assert.StartsWith("StateEntry ", report.FirstBreak.Row, StringComparison.Ordinal);
    }

    [Theory, BothDatabases]
    public async Task Rows_cut_off_the_end_show_even_when_the_end_is_set_back_too(Kind kind)
    {
        await using var world = await FullArchive.Make(kind);
        await world.Database.DropGuards();
        await world.Database.Insider("""DELETE FROM "Readings" """);
        await world.Database.Insider("""
            UPDATE "ChainTips" SET "Position" = (SELECT "Position" FROM "SettingAcceptances"), "Hash" = (SELECT "Hash" FROM "SettingAcceptances")
            WHERE "Chain" LIKE 'joint/%'
            """);
        var report = await ArchiveChain.Verify(world.Archive);
        Assert.Contains("where the audit says it does", report.FirstBreak!.What, StringComparison.Ordinal);
    }

    [Theory, BothDatabases]
    public async Task A_row_put_on_a_chain_of_its_own_shows(Kind kind)
    {
        await using var world = await FullArchive.Make(kind);
        await world.Database.DropGuards();
        await world.Database.Insider("""UPDATE "Readings" SET "Chain" = 'joint/elsewhere'""");
        await world.Database.Insider("""
            UPDATE "ChainTips" SET "Position" = (SELECT "Position" FROM "SettingAcceptances"), "Hash" = (SELECT "Hash" FROM "SettingAcceptances")
            WHERE "Chain" LIKE 'joint/%'
            """);
        Assert.False((await ArchiveChain.Verify(world.Archive)).Whole);
    }

    [Theory, BothDatabases]
    public async Task A_whole_chain_that_no_act_wrote_shows(Kind kind)
    {
        await using var world = await FullArchive.Make(kind);
        await using (var context = world.Archive.CreateDbContext())
        {
            var planted = new Reading
            {
                StructureId = world.StructureId,
                Joint = "j9",
                Device = "none",
                Point = "axis",
                Date = new DateOnly(2031, 6, 1),
                Opening = 0.03,
                Direction = "along the deck",
                PersonId = world.Kim.Id,
            };
            await ArchiveChain.Append(context, ChainName.Joint(world.StructureId, "j9"), planted, world.Clock.Now, CancellationToken.None);
            await context.SaveChangesAsync();
        }

        var report = await ArchiveChain.Verify(world.Archive);
        Assert.Contains("added by no act", report.FirstBreak!.What, StringComparison.Ordinal);
    }
}
