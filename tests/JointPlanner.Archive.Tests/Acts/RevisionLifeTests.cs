using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Tests.Databases;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Tests.Acts;

/// <summary>The table of the life of a revision, walked in both databases.</summary>
public class RevisionLifeTests
{
    [Theory, BothDatabases]
    public async Task A_revision_goes_from_draft_to_issued_and_the_one_before_is_superseded(Kind kind)
    {
        await using var world = await World.Make(kind);
        Assert.Equal(RevisionState.Draft, await world.StateOf(world.RevisionId));
        await world.Frozen();
        Assert.Equal(RevisionState.InCheck, await world.StateOf(world.RevisionId));

        var second = await world.Begin.Do(world.By(world.Ines), new BeginRequest(world.StructureId));
        Assert.Equal(2, second.Number);

        var package = await PackageHash(world);
        await world.Accept.Do(world.By(world.Otto), new AcceptRequest(world.RevisionId, package));
        Assert.Equal(RevisionState.Checked, await world.StateOf(world.RevisionId));
        await world.Sign.Do(world.By(world.Ines), await world.SignRequest(world.Ines, world.RevisionId, SignatureField.Designer));
        var signed = await world.Sign.Do(world.By(world.Otto), await world.SignRequest(world.Otto, world.RevisionId, SignatureField.Checker));
        Assert.Equal(RevisionState.Checked, await world.StateOf(world.RevisionId));
        var first = await world.Issue.Do(world.By(world.Mara), new IssueRequest(world.RevisionId, world.IssueFacts(signed.DocumentHash)));
        Assert.Null(first.SupersededId);
        Assert.Equal(RevisionState.Issued, await world.StateOf(world.RevisionId));

        var next = await world.Issued(second.RevisionId);
        Assert.Equal(world.RevisionId, next.SupersededId);
        Assert.Equal(RevisionState.Superseded, await world.StateOf(world.RevisionId));
        Assert.Equal(RevisionState.Issued, await world.StateOf(second.RevisionId));
    }

    [Theory, BothDatabases]
    public async Task A_returned_revision_is_kept_and_the_work_goes_on_in_a_new_draft(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Frozen();
        var answer = await world.Return.Do(world.By(world.Otto), new ReturnRequest(world.RevisionId, [new("The skew is missing.", "joints/j1/skew")]));
        Assert.Equal(RevisionState.Returned, await world.StateOf(world.RevisionId));
        Assert.Equal(RevisionState.Draft, await world.StateOf(answer.DraftId));
        Assert.Equal(2, answer.DraftNumber);

        await using var scope = await world.As(world.Ines);
        Assert.Equal(Journey.Package, (await scope.Packages().SingleAsync()).PackageText);
        Assert.Equal("The skew is missing.", (await scope.Remarks().SingleAsync()).Text);
        Assert.Equal(World.FirstPlan, (await scope.Revisions().SingleAsync(revision => revision.Id == answer.DraftId)).PlanText);
    }

    [Theory, BothDatabases]
    public async Task An_issued_revision_is_withdrawn_with_its_reason(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Issued();
        await Journey.Refused(RefusalReason.ReasonMissing, () => world.Withdraw.Do(world.By(world.Mara), new WithdrawRequest(world.RevisionId, "  ")));
        await world.Withdraw.Do(world.By(world.Mara), new WithdrawRequest(world.RevisionId, "A wrong support was read from the drawing."));
        Assert.Equal(RevisionState.Withdrawn, await world.StateOf(world.RevisionId));
        await using var scope = await world.As(world.Kim);
        var last = await scope.StateEntries().OrderBy(entry => entry.Ordinal).LastAsync();
        Assert.Equal("A wrong support was read from the drawing.", last.Reason);
    }

    /// <summary>Every act from every state in which the table has no row for it.</summary>
    [Theory, BothDatabases]
    public async Task An_act_that_has_no_row_in_the_table_is_refused_from_every_such_state(Kind kind)
    {
        var tried = 0;
        foreach (var state in Enum.GetValues<RevisionState>())
        {
            await using var world = await World.Make(kind);
            await BringTo(world, state);
            Assert.Equal(state, await world.StateOf(world.RevisionId));
            foreach (var (act, attempt) in Attempts(world))
            {
                if (Transitions.Table.Any(row => row.From == state && row.Act == act)) continue;
                var sentence = await Journey.Refused(RefusalReason.WrongState, attempt);
                Assert.Contains(Transitions.Words(state), sentence, StringComparison.Ordinal);
                Assert.Equal(state, await world.StateOf(world.RevisionId));
                tried++;
            }
        }

        // 7 states × 6 acts, less the 7 rows of the table that stand for them.
        Assert.Equal(7 * 6 - 7, tried);
    }

    [Fact]
    public void The_roles_of_the_table_are_those_of_the_rights_table()
    {
        foreach (var act in Transitions.Table.Where(row => row.Act != Act.Supersede).Select(row => row.Act).Distinct())
        {
            var here = Transitions.Table.Where(row => row.Act == act).SelectMany(row => row.By).Distinct().Order();
            Assert.Equal(RightsTable.Roles(act, own: true).Order(), here);
        }
    }

    [Theory, BothDatabases]
    public async Task A_second_draft_beside_an_open_one_is_refused(Kind kind)
    {
        await using var world = await World.Make(kind);
        await Journey.Refused(RefusalReason.DraftExists, () => world.Begin.Do(world.By(world.Ines), new BeginRequest(world.StructureId)));
    }

    [Theory, BothDatabases]
    public async Task A_closed_structure_takes_no_new_work_and_its_issued_revision_can_still_be_withdrawn(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Issued();
        await world.Structures.Close(world.By(world.Mara), world.StructureId);
        await Journey.Refused(RefusalReason.StructureClosed, () => world.Begin.Do(world.By(world.Ines), new BeginRequest(world.StructureId)));
        await world.Withdraw.Do(world.By(world.Mara), new WithdrawRequest(world.RevisionId, "The bridge was taken down."));
        Assert.Equal(RevisionState.Withdrawn, await world.StateOf(world.RevisionId));
    }

    private static async Task<string> PackageHash(World world)
    {
        await using var scope = await world.As(world.Otto);
        return (await scope.Packages().SingleAsync()).PackageHash;
    }

    private static async Task BringTo(World world, RevisionState state)
    {
        switch (state)
        {
            case RevisionState.Draft:
                return;
            case RevisionState.InCheck:
                await world.Frozen();
                return;
            case RevisionState.Returned:
                await world.Frozen();
                await world.Return.Do(world.By(world.Otto), new ReturnRequest(world.RevisionId, [new("Again.")]));
                return;
            case RevisionState.Checked:
                await world.Checked();
                return;
            case RevisionState.Issued:
                await world.Issued();
                return;
            case RevisionState.Withdrawn:
                await world.Issued();
                await world.Withdraw.Do(world.By(world.Mara), new WithdrawRequest(world.RevisionId, "Wrong."));
                return;
            case RevisionState.Superseded:
                await world.Issued();
                var next = await world.Begin.Do(world.By(world.Ines), new BeginRequest(world.StructureId));
                await world.Issued(next.RevisionId);
                return;
            default:
                throw new ArgumentOutOfRangeException(nameof(state), state, "No such state.");
        }
    }

    private static IEnumerable<(Act, Func<Task>)> Attempts(World world)
    {
        var id = world.RevisionId;
        var facts = new SignatureFacts(Journey.FingerprintOf(world.Ines), Journey.KeyOf(world.Ines), []);
        yield return (Act.Freeze, () => world.Freeze.Do(world.By(world.Ines), Journey.FreezeRequest(id)));
        yield return (Act.Return, () => world.Return.Do(world.By(world.Otto), new ReturnRequest(id, [new("Again.")])));
        yield return (Act.Accept, () => world.Accept.Do(world.By(world.Otto), new AcceptRequest(id, "")));
        yield return (Act.Sign, () => world.Sign.Do(world.By(world.Ines), new SignRequest(id, SignatureField.Designer, "", [1], facts)));
        yield return (Act.Issue, () => world.Issue.Do(world.By(world.Mara), new IssueRequest(id, world.IssueFacts(""))));
        yield return (Act.Withdraw, () => world.Withdraw.Do(world.By(world.Mara), new WithdrawRequest(id, "Wrong.")));
    }
}
