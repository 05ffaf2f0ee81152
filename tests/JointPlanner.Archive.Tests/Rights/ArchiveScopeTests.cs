using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Confirming;
using JointPlanner.Archive.Drafts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Setting;
using JointPlanner.Archive.Tests.Databases;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Tests.Rights;

public class ArchiveScopeTests
{
    [Theory, BothDatabases]
    public async Task A_stranger_finds_nothing_of_another_organisation(Kind kind)
    {
        await using var world = await FullArchive.Make(kind);
        await world.Drafts.Open(world.Ines.Id, world.StructureId);
        await using var scope = await world.As(world.Stranger);
        Assert.Empty(await scope.Structures().ToListAsync());
        Assert.Empty(await scope.Revisions().ToListAsync());
        Assert.Empty(await scope.StateEntries().ToListAsync());
        Assert.Empty(await scope.Packages().ToListAsync());
        Assert.Empty(await scope.PdfSegments().ToListAsync());
        Assert.Empty(await scope.Remarks().ToListAsync());
        Assert.Empty(await scope.Edits().ToListAsync());
        Assert.Empty(await scope.Drafts().ToListAsync());
        Assert.Empty(await scope.SettingRecords().ToListAsync());
        Assert.Empty(await scope.SettingAcceptances().ToListAsync());
        Assert.Empty(await scope.Readings().ToListAsync());
        Assert.Empty(await scope.FieldLinks().ToListAsync());
        Assert.Empty(await scope.Confirmations().ToListAsync());
        Assert.Empty(await scope.Certificates().ToListAsync());
        Assert.Empty(await scope.Audit().ToListAsync());
        Assert.Equal(world.Elsewhere.Id, (await scope.Organisations().SingleAsync()).Id);
        Assert.All(await scope.Memberships().ToListAsync(), member => Assert.Equal(world.Elsewhere.Id, member.OrganisationId));
    }

    [Theory, BothDatabases]
    public async Task A_foreign_id_is_not_found_in_every_act(Kind kind)
    {
        await using var world = await FullArchive.Make(kind);
        var call = () => world.By(world.Stranger);
        var id = world.RevisionId;
        await using var owner = await world.As(world.Mara);
        var record = await owner.SettingRecords().SingleAsync();
        var confirmation = await owner.Confirmations().SingleAsync();
        var acts = new Func<Task>[]
        {
            () => world.Begin.Do(call(), new BeginRequest(world.StructureId)),
            () => world.Freeze.Do(call(), Journey.FreezeRequest(id)),
            () => world.Return.Do(call(), new ReturnRequest(id, [new("x")])),
            () => world.Accept.Do(call(), new AcceptRequest(id, "")),
            () => world.Sign.Do(call(), new SignRequest(id, SignatureField.Designer, "", [1], new SignatureFacts("", "", []))),
            () => world.Issue.Do(call(), new IssueRequest(id, world.IssueFacts(""))),
            () => world.Withdraw.Do(call(), new WithdrawRequest(id, "x")),
            () => world.Drafts.Open(world.Stranger.Id, world.StructureId),
            () => world.Drafts.Share(call(), new ShareRequest(world.StructureId)),
            () => world.Structures.GiveAccess(call(), world.StructureId, world.Elsewhere.Id, [Role.Designer]),
            () => world.Structures.Close(call(), world.StructureId),
            () => world.Structures.Create(call(), new Structures.CreateRequest(world.Owner.Id, "x", "Europe/Oslo", "{}")),
            () => world.Confirmations.Confirm(call(), new ConfirmRequest(world.Owner.Id, "v", "d", "e", "p", new DateOnly(2031, 1, 1))),
            () => world.Confirmations.Revoke(call(), confirmation.Id, "x"),
            () => world.Setting.Record(call(), FullArchive.Record(id)),
            () => world.Setting.Accept(call(), record.Id, null),
            () => world.Links.Make(call(), new LinkRequest(id, "j1", FieldLinks.NewToken(), world.Clock.Now.AddDays(1))),
            () => world.Links.Revoke(call(), Guid.CreateVersion7()),
            () => world.Organisations.SetRule(call(), world.Owner.Id, new OwnerRule(IssuedBy.Owner, true, true)),
            async () =>
            {
                await using var scope = await world.As(world.Stranger);
                await scope.Document(id);
            },
        };
        foreach (var act in acts) await Assert.ThrowsAsync<NotFound>(act);
    }

    [Theory, BothDatabases]
    public async Task A_contractor_sees_what_is_issued_and_no_work(Kind kind)
    {
        await using var world = await World.Make(kind);
        await using (var before = await world.As(world.Kim)) Assert.Empty(await before.Revisions().ToListAsync());
        await world.Issued();
        await world.Begin.Do(world.By(world.Ines), new BeginRequest(world.StructureId));
        await using var scope = await world.As(world.Kim);
        Assert.Equal(world.RevisionId, (await scope.Revisions().SingleAsync()).Id);
        Assert.Empty(await scope.Edits().ToListAsync());
        await using var owner = await world.As(world.Mara);
        Assert.Equal(2, await owner.Revisions().CountAsync());
    }

    [Theory, BothDatabases]
    public async Task A_designer_knows_the_owner_of_the_structure_and_who_stands_under_it_by_name(Kind kind)
    {
        await using var world = await FullArchive.Make(kind);
        await using var designer = await world.As(world.Ines);
        Assert.Equal(world.Owner.Name, (await designer.Owners().SingleAsync()).Name);
        var known = await designer.Names();
        Assert.Equal("Mara Ekholm", known[world.Mara.Id]);
        Assert.Equal(4, known.Count);
        await using var stranger = await world.As(world.Stranger);
        Assert.Empty(await stranger.Owners().ToListAsync());
        Assert.Equal([world.Stranger.Id], (await stranger.Names()).Keys);
    }

    [Theory, BothDatabases]
    public async Task Nobody_reads_another_persons_draft(Kind kind)
    {
        await using var world = await World.Make(kind);
        var draft = await world.Drafts.Open(world.Ines.Id, world.StructureId);
        await using var scope = await world.As(world.Jon);
        Assert.Empty(await scope.Drafts().ToListAsync());
        await Assert.ThrowsAsync<NotFound>(() => world.Drafts.Save(world.Jon.Id, draft.Id, draft.Version, "{}"));
    }

    [Theory, BothDatabases]
    public async Task A_deactivated_person_has_no_scope(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Accounts.SetActive(world.By(world.Ada), world.Kim.Id, active: false);
        await Assert.ThrowsAsync<NotFound>(() => world.As(world.Kim));
    }
}
