using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Drafts;
using JointPlanner.Archive.Tests.Databases;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Tests.Drafts;

public class DraftShelfTests
{
    [Theory, BothDatabases]
    public async Task A_draft_comes_back_as_last_saved(Kind kind)
    {
        await using var world = await World.Make(kind);
        var draft = await world.Drafts.Open(world.Ines.Id, world.StructureId);
        Assert.Equal(World.FirstPlan, draft.Text);
        var text = With("40 m", "131 ft 3 in");
        var version = await world.Drafts.Save(world.Ines.Id, draft.Id, draft.Version, text);
        var again = await world.Drafts.Open(world.Ines.Id, world.StructureId);
        Assert.Equal(draft.Id, again.Id);
        Assert.Equal(version, again.Version);
        Assert.Equal(text, again.Text);
        Assert.Equal(World.FirstPlan, await SharedPlan(world));
    }

    [Theory, BothDatabases]
    public async Task Two_editors_of_different_fields_both_find_their_changes_in_the_shared_plan(Kind kind)
    {
        await using var world = await World.Make(kind);
        await Save(world, world.Ines, With("40 m", "41 m"));
        await Save(world, world.Jon, With("35 m", "36 m"));
        Assert.True((await world.Drafts.Share(world.By(world.Ines), new ShareRequest(world.StructureId))).Shared);
        var second = await world.Drafts.Share(world.By(world.Jon), new ShareRequest(world.StructureId));
        Assert.True(second.Shared);
        var shared = await SharedPlan(world);
        Assert.Contains("41 m", shared, StringComparison.Ordinal);
        Assert.Contains("36 m", shared, StringComparison.Ordinal);
        Assert.Equal(World.PlanHash(shared), second.SharedHash);

        await using var scope = await world.As(world.Mara);
        Assert.Equal([world.Mara.Id, world.Ines.Id, world.Jon.Id], await scope.Edits().OrderBy(edit => edit.Position).Select(edit => edit.PersonId).ToListAsync());
    }

    [Theory, BothDatabases]
    public async Task Two_editors_of_one_field_see_the_clash_and_nothing_is_lost(Kind kind)
    {
        await using var world = await World.Make(kind);
        await Save(world, world.Ines, With("40 m", "41 m"));
        await Save(world, world.Jon, With("40 m", "42 m"));
        await world.Drafts.Share(world.By(world.Ines), new ShareRequest(world.StructureId));
        var answer = await world.Drafts.Share(world.By(world.Jon), new ShareRequest(world.StructureId));
        Assert.False(answer.Shared);
        Assert.Equal(new Clash("segments/s1/length", "\"40 m\"", "\"42 m\"", "\"41 m\""), Assert.Single(answer.Clashes));
        Assert.Equal(With("40 m", "41 m"), await SharedPlan(world));
        Assert.Equal(With("40 m", "42 m"), (await world.Drafts.Open(world.Jon.Id, world.StructureId)).Text);

        var choices = new Dictionary<string, Take> { ["segments/s1/length"] = Take.Mine };
        var decided = await world.Drafts.Share(world.By(world.Jon), new ShareRequest(world.StructureId, answer.SharedHash, choices));
        Assert.True(decided.Shared);
        Assert.Contains("42 m", await SharedPlan(world), StringComparison.Ordinal);
    }

    [Theory, BothDatabases]
    public async Task A_choice_made_before_the_shared_plan_moved_again_decides_nothing(Kind kind)
    {
        await using var world = await World.Make(kind);
        await Save(world, world.Ines, With("40 m", "41 m"));
        await Save(world, world.Jon, With("40 m", "42 m"));
        await world.Drafts.Share(world.By(world.Ines), new ShareRequest(world.StructureId));
        var shown = await world.Drafts.Share(world.By(world.Jon), new ShareRequest(world.StructureId));
        await Save(world, world.Ines, With("40 m", "43 m"));
        await world.Drafts.Share(world.By(world.Ines), new ShareRequest(world.StructureId));

        var choices = new Dictionary<string, Take> { ["segments/s1/length"] = Take.Mine };
        var late = await world.Drafts.Share(world.By(world.Jon), new ShareRequest(world.StructureId, shown.SharedHash, choices));
        Assert.False(late.Shared);
        Assert.Equal("\"43 m\"", Assert.Single(late.Clashes).Theirs);
    }

    [Theory, BothDatabases]
    public async Task A_second_window_does_not_overwrite_what_the_first_saved(Kind kind)
    {
        await using var world = await World.Make(kind);
        var draft = await world.Drafts.Open(world.Ines.Id, world.StructureId);
        await world.Drafts.Save(world.Ines.Id, draft.Id, draft.Version, With("40 m", "41 m"));
        await Journey.Refused(RefusalReason.PlanMoved, () => world.Drafts.Save(world.Ines.Id, draft.Id, draft.Version, With("40 m", "42 m")));
        Assert.Contains("41 m", (await world.Drafts.Open(world.Ines.Id, world.StructureId)).Text, StringComparison.Ordinal);
    }

    [Theory, BothDatabases]
    public async Task A_frozen_revision_takes_no_share_and_the_draft_waits_for_the_next(Kind kind)
    {
        await using var world = await World.Make(kind);
        await Save(world, world.Jon, With("35 m", "36 m"));
        await world.Frozen();
        await Journey.Refused(RefusalReason.WrongState, () => world.Drafts.Share(world.By(world.Jon), new ShareRequest(world.StructureId)));
        var next = await world.Begin.Do(world.By(world.Ines), new BeginRequest(world.StructureId));
        Assert.True((await world.Drafts.Share(world.By(world.Jon), new ShareRequest(world.StructureId))).Shared);
        Assert.Equal(next.RevisionId, (await world.Drafts.Open(world.Jon.Id, world.StructureId)).RevisionId);
        Assert.Contains("36 m", await SharedPlan(world), StringComparison.Ordinal);
    }

    [Theory, BothDatabases]
    public async Task A_binned_draft_can_be_taken_back_for_thirty_days_and_then_is_gone(Kind kind)
    {
        await using var world = await World.Make(kind);
        var draft = await world.Drafts.Open(world.Ines.Id, world.StructureId);
        var version = await world.Drafts.Save(world.Ines.Id, draft.Id, draft.Version, With("40 m", "41 m"));
        version = await world.Drafts.Bin(world.Ines.Id, draft.Id, version);

        var fresh = await world.Drafts.Open(world.Ines.Id, world.StructureId);
        Assert.NotEqual(draft.Id, fresh.Id);
        await Journey.Refused(RefusalReason.DraftExists, () => world.Drafts.TakeBack(world.Ines.Id, draft.Id, version));
        await world.Drafts.Bin(world.Ines.Id, fresh.Id, fresh.Version);
        version = await world.Drafts.TakeBack(world.Ines.Id, draft.Id, version);
        Assert.Contains("41 m", (await world.Drafts.Open(world.Ines.Id, world.StructureId)).Text, StringComparison.Ordinal);

        await world.Drafts.Bin(world.Ines.Id, draft.Id, version);
        world.Clock.Now = world.Clock.Now.AddDays(30);
        Assert.Equal(0, await world.Drafts.EmptyBin());
        world.Clock.Now = world.Clock.Now.AddSeconds(1);
        Assert.Equal(2, await world.Drafts.EmptyBin());
    }

    [Theory, BothDatabases]
    public async Task A_draft_that_is_no_json_or_too_large_is_refused_and_the_last_one_stays(Kind kind)
    {
        await using var world = await World.Make(kind);
        var draft = await world.Drafts.Open(world.Ines.Id, world.StructureId);
        await Journey.Refused(RefusalReason.PlanUnreadable, () => world.Drafts.Save(world.Ines.Id, draft.Id, draft.Version, "{"));
        var large = "{\"name\":\"" + new string('ä', 1024 * 1024 + 1) + "\"}";
        await Journey.Refused(RefusalReason.TextTooLong, () => world.Drafts.Save(world.Ines.Id, draft.Id, draft.Version, large));
        Assert.Equal(World.FirstPlan, (await world.Drafts.Open(world.Ines.Id, world.StructureId)).Text);
    }

    private static string With(string from, string to) => World.FirstPlan.Replace(from, to, StringComparison.Ordinal);

    private static async Task Save(World world, Archive.People.Person person, string text)
    {
        var draft = await world.Drafts.Open(person.Id, world.StructureId);
        await world.Drafts.Save(person.Id, draft.Id, draft.Version, text);
    }

    private static async Task<string> SharedPlan(World world)
    {
        await using var scope = await world.As(world.Ines);
        return (await scope.Revisions().OrderByDescending(revision => revision.Number).FirstAsync()).PlanText;
    }
}
