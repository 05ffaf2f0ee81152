using JointPlanner.Archive.Auditing;
using JointPlanner.Archive.Drafts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Setting;
using JointPlanner.Archive.Structures;
using JointPlanner.Archive.Tests.Databases;
using Microsoft.AspNetCore.DataProtection.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Tests;

public class ArchiveContextTests
{
    [Theory, BothDatabases]
    public async Task Instants_with_different_offsets_are_ordered_and_compared_by_when_they_are(Kind kind)
    {
        await using var world = await World.Make(kind);
        var noon = new DateTimeOffset(2031, 7, 1, 12, 0, 0, TimeSpan.Zero);
        DateTimeOffset[] moments = [noon.AddMinutes(90).ToOffset(TimeSpan.FromHours(-7)), noon, noon.AddMinutes(-30).ToOffset(TimeSpan.FromHours(5.5)), noon.AddTicks(10)];
        await using (var context = world.Archive.CreateDbContext())
        {
            foreach (var moment in moments)
                context.Structures.Add(new Structure { OrganisationId = world.Elsewhere.Id, Name = "x", Zone = "UTC", CreatedAt = moment });
            await context.SaveChangesAsync();
        }

        await using var scope = await world.As(world.Stranger);
        var ordered = await scope.Structures().OrderBy(row => row.CreatedAt).Select(row => row.CreatedAt).ToListAsync();
        Assert.Equal(moments.Order(), ordered);
        Assert.All(ordered, moment => Assert.Equal(TimeSpan.Zero, moment.Offset));
        Assert.Equal(2, await scope.Structures().CountAsync(row => row.CreatedAt > noon));
        Assert.Equal(moments.Max(), await scope.Structures().MaxAsync(row => row.CreatedAt));
    }

    [Theory, BothDatabases]
    public async Task An_instant_is_kept_to_the_microsecond_on_both_databases_alike(Kind kind)
    {
        await using var world = await World.Make(kind);
        var fine = new DateTimeOffset(2031, 7, 1, 12, 0, 0, TimeSpan.Zero).AddTicks(17);
        await using (var context = world.Archive.CreateDbContext())
        {
            context.Structures.Add(new Structure { OrganisationId = world.Elsewhere.Id, Name = "x", Zone = "UTC", CreatedAt = fine });
            await context.SaveChangesAsync();
        }

        await using var scope = await world.As(world.Stranger);
        Assert.Equal(fine.AddTicks(-7), (await scope.Structures().SingleAsync()).CreatedAt);
    }

    [Theory, BothDatabases]
    public async Task The_second_of_two_writers_of_one_row_is_told(Kind kind)
    {
        await using var world = await World.Make(kind);
        var board = await world.Organisations.Create(world.By(world.Ada), "A new board");
        await using var one = world.Archive.CreateDbContext();
        await using var other = world.Archive.CreateDbContext();
        var mine = await one.Organisations.SingleAsync(row => row.Id == board.OrganisationId);
        var theirs = await other.Organisations.SingleAsync(row => row.Id == board.OrganisationId);
        await using var third = world.Archive.CreateDbContext();
        var removed = await third.Organisations.SingleAsync(row => row.Id == board.OrganisationId);
        var version = mine.Version;
        mine.Name = "One";
        await one.SaveChangesAsync();
        Assert.Equal(version + 1, mine.Version);
        theirs.Name = "Other";
        await Assert.ThrowsAsync<DbUpdateConcurrencyException>(() => other.SaveChangesAsync());
        await Assert.ThrowsAsync<DbUpdateConcurrencyException>(() => other.SaveChangesAsync());
        third.Remove(removed);
        await Assert.ThrowsAsync<DbUpdateConcurrencyException>(() => third.SaveChangesAsync());
    }

    [Theory]
    [InlineData(Kind.Sqlite, double.NaN)]
    [InlineData(Kind.Sqlite, double.NegativeInfinity)]
    [InlineData(Kind.PostgreSql, double.NaN)]
    [InlineData(Kind.PostgreSql, double.PositiveInfinity)]
    public async Task What_is_no_finite_number_is_refused_before_it_is_saved(Kind kind, double value)
    {
        await using var world = await World.Make(kind);
        await using var context = world.Archive.CreateDbContext();
        context.Add(new SettingPoint
        {
            SettingRecordId = Guid.CreateVersion7(),
            Ordinal = 1,
            Place = "axis",
            Opening = value,
            Direction = "normal",
            Temperature = 1,
            Method = "air",
            Uncertainty = 1,
        });
        var refusal = await Assert.ThrowsAsync<ArgumentOutOfRangeException>(() => context.SaveChangesAsync());
        Assert.Contains("SettingPoint.Opening", refusal.Message, StringComparison.Ordinal);
    }

    [Theory, BothDatabases]
    public async Task Numbers_come_back_bit_for_bit(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Issued();
        double[] openings = [0.1 + 0.2, double.Epsilon, 1.0 / 3, 0.041200000000000001];
        var request = FullArchive.Record(world.RevisionId);
        await world.Setting.Record(world.By(world.Kim), request with { Points = [.. openings.Select(opening => request.Points[0] with { Opening = opening })] });
        await using var scope = await world.As(world.Kim);
        var record = await scope.SettingRecords().SingleAsync();
        Assert.Equal(openings.Select(BitConverter.DoubleToInt64Bits), record.Points.OrderBy(point => point.Ordinal).Select(point => BitConverter.DoubleToInt64Bits(point.Opening)));
    }

    [Theory, BothDatabases]
    public async Task A_frozen_text_comes_back_character_for_character(Kind kind)
    {
        await using var world = await World.Make(kind);
        const string Odd = "{\"b\":1,  \"a\" : \"α 6″ \\u00b0 𝛼 é e\u0301\",\r\n\t\"b2\":1.0}";
        var answer = await world.Freeze.Do(world.By(world.Ines), Journey.FreezeRequest(world.RevisionId) with { PackageText = Odd });
        await using var scope = await world.As(world.Otto);
        var package = await scope.Packages().SingleAsync();
        Assert.Equal(Odd, package.PackageText);
        Assert.True(package.IsIntact);
        Assert.Equal(answer.PackageHash, package.PackageHash);
    }

    [Theory, BothDatabases]
    public async Task A_row_that_was_not_joined_to_its_chain_is_not_saved(Kind kind)
    {
        await using var world = await World.Make(kind);
        await using var context = world.Archive.CreateDbContext();
        context.AuditEntries.Add(new AuditEntry { What = "x", From = "x", Subject = "x" });
        await Assert.ThrowsAsync<InvalidOperationException>(() => context.SaveChangesAsync());
    }

    [Theory, BothDatabases]
    public async Task Foreign_keys_hold_and_nothing_goes_by_cascade(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Drafts.Open(world.Ines.Id, world.StructureId);
        await using var context = world.Archive.CreateDbContext();
        context.Add(new Membership { PersonId = Guid.CreateVersion7(), OrganisationId = world.Owner.Id, Role = Role.Owner });
        await Assert.ThrowsAsync<DbUpdateException>(() => context.SaveChangesAsync());
        await context.Database.OpenConnectionAsync();
        foreach (var table in (string[])["People", "Organisations", "Structures"])
            await Assert.ThrowsAnyAsync<System.Data.Common.DbException>(() => TestDatabase.Execute(context.Database.GetDbConnection(), $"DELETE FROM \"{table}\""));
        Assert.Equal(1, await context.Set<Draft>().CountAsync());
    }

    [Theory, BothDatabases]
    public async Task Data_protection_keys_are_kept(Kind kind)
    {
        await using var world = await World.Make(kind);
        await using (var context = world.Archive.CreateDbContext())
        {
            context.DataProtectionKeys.Add(new DataProtectionKey { FriendlyName = "key", Xml = "<key/>" });
            await context.SaveChangesAsync();
        }

        await using var again = world.Archive.CreateDbContext();
        Assert.Equal("<key/>", (await again.DataProtectionKeys.SingleAsync()).Xml);
    }
}
