using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Tests.Databases;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Tests.Acts;

public class ActDeskTests
{
    [Theory, BothDatabases]
    public async Task The_second_call_with_one_request_id_gets_the_first_answer_and_changes_nothing(Kind kind)
    {
        await using var world = await World.Make(kind);
        var call = world.By(world.Ines);
        var first = await world.Freeze.Do(call, Journey.FreezeRequest(world.RevisionId));
        var before = await AuditCount(world);
        var second = await world.Freeze.Do(call, Journey.FreezeRequest(world.RevisionId));
        Assert.Equal(first, second);
        Assert.Equal(before, await AuditCount(world));
    }

    [Theory, BothDatabases]
    public async Task Eight_presses_at_once_do_the_act_once(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Frozen();
        var call = world.By(world.Ines);
        var answers = await Task.WhenAll(Enumerable.Range(0, 8).Select(_ => Task.Run(() => world.Begin.Do(call, new BeginRequest(world.StructureId)))));
        Assert.Single(answers.Distinct());
        await using var context = world.Archive.CreateDbContext();
        Assert.Equal(2, await context.Revisions.CountAsync());
    }

    [Theory, BothDatabases]
    public async Task Of_eight_different_requests_at_once_one_is_done_and_seven_are_refused(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Frozen();
        var outcomes = await Task.WhenAll(Enumerable.Range(0, 8).Select(_ => Task.Run(async () =>
        {
            try
            {
                await world.Begin.Do(world.By(world.Ines), new BeginRequest(world.StructureId));
                return (RefusalReason?)null;
            }
            catch (ActRefused refused)
            {
                return refused.Reason;
            }
        })));
        Assert.Single(outcomes, outcome => outcome is null);
        Assert.Equal(7, outcomes.Count(outcome => outcome == RefusalReason.DraftExists));
    }

    [Theory, BothDatabases]
    public async Task A_request_id_used_for_another_act_or_by_another_person_is_refused(Kind kind)
    {
        await using var world = await World.Make(kind);
        var call = world.By(world.Ines);
        var frozen = await world.Freeze.Do(call, Journey.FreezeRequest(world.RevisionId));
        await Journey.Refused(RefusalReason.RequestIdReused, () => world.Begin.Do(call, new BeginRequest(world.StructureId)));
        await Journey.Refused(RefusalReason.RequestIdReused, () => world.Freeze.Do(call with { PersonId = world.Jon.Id }, Journey.FreezeRequest(world.RevisionId)));
        Assert.Equal(frozen, await world.Freeze.Do(call, Journey.FreezeRequest(world.RevisionId)));
    }

    [Theory, BothDatabases]
    public async Task A_refused_act_leaves_no_receipt_so_that_it_can_be_repeated(Kind kind)
    {
        await using var world = await World.Make(kind);
        var call = world.By(world.Ines);
        await Journey.Refused(RefusalReason.PlanFaults, () => world.Freeze.Do(call, Journey.FreezeRequest(world.RevisionId) with { Faults = ["One."] }));
        await world.Freeze.Do(call, Journey.FreezeRequest(world.RevisionId));
    }

    [Theory, BothDatabases]
    public async Task Every_act_leaves_an_audit_entry_that_names_where_its_chain_ends(Kind kind)
    {
        await using var world = await World.Make(kind);
        var answer = await world.Frozen();
        await using var context = world.Archive.CreateDbContext();
        var entry = await context.AuditEntries.OrderBy(row => row.Position).LastAsync();
        var state = await context.StateEntries.Where(row => row.RevisionId == answer.RevisionId).OrderBy(row => row.Ordinal).LastAsync();
        Assert.Equal("Freeze", entry.What);
        Assert.Equal("Ines Brandt", entry.PersonName);
        Assert.Equal("test", entry.From);
        Assert.Equal(state.Hash, entry.HashAfter);
        Assert.NotEqual(entry.HashBefore, entry.HashAfter);
        Assert.Equal(world.StructureId, entry.StructureId);
    }

    private static async Task<int> AuditCount(World world)
    {
        await using var context = world.Archive.CreateDbContext();
        return await context.AuditEntries.CountAsync();
    }
}
