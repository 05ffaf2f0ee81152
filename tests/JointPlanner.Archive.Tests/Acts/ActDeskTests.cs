using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Confirming;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Tests.Databases;
using JointPlanner.Archive.Values;
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

    [Theory, BothDatabases]
    public async Task A_grave_act_is_refused_without_the_password_of_the_last_five_minutes(Kind kind)
    {
        await using var world = await World.Make(kind);
        var rule = new OwnerRule(IssuedBy.Owner, true, true);
        foreach (var given in (DateTimeOffset?[])[null, world.Clock.Now.AddMinutes(-5).AddSeconds(-1), world.Clock.Now.AddMinutes(2)])
            await Journey.Refused(RefusalReason.PasswordNeeded, () => world.Organisations.SetRule(world.By(world.Mara) with { PasswordAt = given }, world.Owner.Id, rule));
        await world.Organisations.SetRule(world.By(world.Mara) with { PasswordAt = world.Clock.Now.AddMinutes(-5) }, world.Owner.Id, rule);
    }

    /// <summary>Walks every grave act; each is called by somebody who may do it, so that only the password stands in the way.</summary>
    [Theory, BothDatabases]
    public async Task No_grave_act_is_done_without_the_password_again(Kind kind)
    {
        await using var world = await FullArchive.Make(kind);
        await using var scope = await world.As(world.Mara);
        var issued = await scope.Revisions().Where(row => row.States.Any(state => state.State == RevisionState.Issued)).Select(row => row.Id).SingleAsync();
        ActCall Bare(Person person) => world.By(person) with { PasswordAt = null };
        var acts = new Dictionary<Act, Func<Task>>
        {
            [Act.Sign] = () => world.Sign.Do(Bare(world.Ines), new SignRequest(issued, SignatureField.Designer, "", [1], new SignatureFacts("", "", []))),
            [Act.Issue] = () => world.Issue.Do(Bare(world.Mara), new IssueRequest(issued, world.IssueFacts(""))),
            [Act.Withdraw] = () => world.Withdraw.Do(Bare(world.Mara), new WithdrawRequest(issued, "x")),
            [Act.GiveAccess] = () => world.Structures.GiveAccess(Bare(world.Mara), world.StructureId, world.Elsewhere.Id, [Role.Designer]),
            [Act.ConfirmValue] = () => world.Confirmations.Confirm(Bare(world.Mara), new ConfirmRequest(world.Owner.Id, "v", "d", "e", "p", new DateOnly(2031, 1, 1))),
            [Act.RevokeConfirmation] = () => world.Confirmations.Revoke(Bare(world.Mara), Guid.CreateVersion7(), "x"),
            [Act.SetRule] = () => world.Organisations.SetRule(Bare(world.Mara), world.Owner.Id, new OwnerRule(IssuedBy.Owner, true, true)),
            [Act.ManageAccounts] = () => world.Accounts.SetActive(Bare(world.Ada), world.Kim.Id, active: false),
            [Act.ChangePassword] = () => world.Accounts.MakeOwnLink(Bare(world.Ines), LinkToken.New()),
            [Act.ManageOrganisations] = () => world.Organisations.SetRoles(Bare(world.Ada), world.Owner.Id, world.Kim.Id, [Role.Designer]),
            [Act.ConfirmCertificate] = () => world.Certificates.Confirm(Bare(world.Ada), Guid.CreateVersion7(), "x"),
        };
        foreach (var act in acts.Values) await Journey.Refused(RefusalReason.PasswordNeeded, act);

        // Acts of the installation that no room offers yet.
        Assert.Equal([Act.ManagePublicAddress, Act.ManageRoots, Act.ManageSeal, Act.ManageTimeStamp], RightsTable.PasswordAgain.Except(acts.Keys).OrderBy(act => act.ToString(), StringComparer.Ordinal));
    }

    private static async Task<int> AuditCount(World world)
    {
        await using var context = world.Archive.CreateDbContext();
        return await context.AuditEntries.CountAsync();
    }
}
