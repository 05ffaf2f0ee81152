using JointPlanner.Archive.Auditing;
using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Tests.Databases;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Tests.Auditing;

public class AuditTrailTests
{
    [Theory, BothDatabases]
    public async Task Twenty_events_at_once_make_one_chain_without_a_gap(Kind kind)
    {
        await using var world = await World.Make(kind);
        await Task.WhenAll(Enumerable.Range(0, 20).Select(number => Task.Run(() =>
            world.Audit.Write(new AuditNote("SignInFailed", $"10.0.0.{number}", "account")))));
        await using var scope = await world.As(world.Ada);
        Assert.Equal(20, await scope.Audit().CountAsync(entry => entry.What == "SignInFailed"));
        Assert.True((await ArchiveChain.Verify(world.Archive)).Whole);
    }

    [Theory, BothDatabases]
    public async Task An_owner_reads_what_was_done_to_the_own_structures_and_no_others(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Audit.Write(new AuditNote("SignedIn", "10.0.0.1", "account") { PersonId = world.Kim.Id });
        await using var owner = await world.As(world.Mara);
        var entries = await owner.Audit().ToListAsync();
        Assert.NotEmpty(entries);
        Assert.All(entries, entry => Assert.Equal(world.StructureId, entry.StructureId));
        await using var designer = await world.As(world.Ines);
        Assert.Empty(await designer.Audit().ToListAsync());
    }
}
