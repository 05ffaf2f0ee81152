using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Structures;
using JointPlanner.Archive.Tests.Databases;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Tests.Rights;

public class RightsTableTests
{
    [Fact]
    public void Every_act_stands_in_the_table_or_is_the_administrators_or_ones_own_or_follows()
    {
        foreach (var act in Enum.GetValues<Act>())
        {
            var places = new[]
            {
                RightsTable.Rows.Any(row => row.Act == act), RightsTable.OfAdministrator.Contains(act), RightsTable.OfOneself.Contains(act), RightsTable.Following.Contains(act),
            };
            Assert.True(places.Count(stands => stands) == 1, $"{act} stands in {places.Count(stands => stands)} places.");
        }
    }

    [Fact]
    public void No_row_stands_twice_and_none_allows_nothing()
    {
        Assert.Equal(RightsTable.Rows.Count, RightsTable.Rows.DistinctBy(row => (row.Act, row.Role)).Count());
        Assert.All(RightsTable.Rows, row => Assert.True(row.Own || row.Other));
    }

    [Fact]
    public void The_printed_table_has_a_line_for_every_right()
    {
        var lines = RightsTable.Printed().Split('\n', StringSplitOptions.RemoveEmptyEntries);
        Assert.Equal(2 + RightsTable.Rows.Count + RightsTable.OfAdministrator.Count + RightsTable.OfOneself.Count, lines.Length);
        Assert.Contains("| Issue | Owner | yes | no | yes |", lines);
    }

    /// <summary>Each role × act on an own structure, on one opened in that role, on one opened in another role, and on a foreign one; by query and by question.</summary>
    [Theory, BothDatabases]
    public async Task The_scope_allows_what_the_table_says_and_nothing_else(Kind kind)
    {
        await using var world = await World.Make(kind);
        var walked = 0;
        foreach (var role in Enum.GetValues<Role>())
        {
            var (person, own, opened, otherwise, foreign) = await Prepare(world, role);
            await using var scope = await world.As(person);
            foreach (var act in Enum.GetValues<Act>())
            {
                var row = RightsTable.Rows.SingleOrDefault(row => row.Act == act && row.Role == role);
                await Demand(act, own, row is { Own: true });
                await Demand(act, opened, row is { Other: true });
                await Demand(act, otherwise, false);
                await Demand(act, foreign, false);
                Assert.False(scope.MayAdminister(act));
                walked++;
            }

            async Task Demand(Act act, Guid structure, bool expected)
            {
                Assert.True(expected == await scope.May(act, structure), $"{role} {act}: expected {expected} by question.");
                Assert.True(expected == await scope.Structures(act).AnyAsync(row => row.Id == structure), $"{role} {act}: expected {expected} by query.");
            }
        }

        Assert.Equal(Enum.GetValues<Role>().Length * Enum.GetValues<Act>().Length, walked);
    }

    [Theory, BothDatabases]
    public async Task An_administrator_reads_no_calculation(Kind kind)
    {
        await using var world = await FullArchive.Make(kind);
        await using var scope = await world.As(world.Ada);
        Assert.True(scope.MayAdminister(Act.ManageAccounts));
        Assert.Empty(await scope.Structures().ToListAsync());
        Assert.Empty(await scope.Revisions().ToListAsync());
        Assert.Empty(await scope.Packages().ToListAsync());
        Assert.Empty(await scope.Confirmations().ToListAsync());
        Assert.DoesNotContain(await scope.Audit().ToListAsync(), entry => entry.StructureId is not null);
        Assert.NotEmpty(await scope.Audit().ToListAsync());
    }

    private static async Task<(Person, Guid Own, Guid Opened, Guid Otherwise, Guid Foreign)> Prepare(World world, Role role)
    {
        await using var context = world.Archive.CreateDbContext();
        var person = new Person { Name = $"Tester {role}", UserName = $"tester-{role}", NormalizedUserName = $"TESTER-{role}" };
        var home = new Organisation { Name = $"Home of {role}" };
        var away = new Organisation { Name = $"Away of {role}" };
        context.AddRange(person, home, away);
        await context.SaveChangesAsync();
        context.Add(new Membership { PersonId = person.Id, OrganisationId = home.Id, Role = role });
        var structures = new[] { home, away, away, away }
            .Select((owner, index) => new Structure { OrganisationId = owner.Id, Name = $"{role} {index}", Zone = "Europe/Oslo", CreatedAt = world.Clock.Now }).ToArray();
        context.AddRange(structures);
        await context.SaveChangesAsync();
        context.Add(new StructureAccess { StructureId = structures[1].Id, OrganisationId = home.Id, Role = role });
        var others = Enum.GetValues<Role>().Where(other => other != role);
        context.AddRange(others.Select(other => new StructureAccess { StructureId = structures[2].Id, OrganisationId = home.Id, Role = other }));
        await context.SaveChangesAsync();
        return (person, structures[0].Id, structures[1].Id, structures[2].Id, structures[3].Id);
    }
}
