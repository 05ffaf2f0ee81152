using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Tests.Databases;
using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.Tests.Revisions;

public class SheetLookupTests
{
    [Theory, BothDatabases]
    public async Task A_sheet_is_found_by_each_of_its_states_and_told_where_it_stands(Kind kind)
    {
        await using var world = await World.Make(kind);
        var lookup = new SheetLookup(world.Archive);
        var frozen = await world.Frozen();
        var inCheck = (await lookup.ByPrefix([frozen.DocumentHash]))!;
        Assert.Equal((1, RevisionState.InCheck, "Europe/Oslo", null), (inCheck.Number, inCheck.State, inCheck.Zone, inCheck.Reason));
        Assert.Equal(new SheetPrefix(Journey.Sheet.Length, frozen.DocumentHash), Assert.Single(inCheck.Prefixes));

        await world.Accept.Do(world.By(world.Otto), new AcceptRequest(frozen.RevisionId, frozen.PackageHash));
        await world.Sign.Do(world.By(world.Ines), await world.SignRequest(world.Ines, frozen.RevisionId, SignatureField.Designer));
        var last = await world.Sign.Do(world.By(world.Otto), await world.SignRequest(world.Otto, frozen.RevisionId, SignatureField.Checker));
        await world.Issue.Do(world.By(world.Mara), new IssueRequest(frozen.RevisionId, world.IssueFacts(last.DocumentHash)));
        foreach (var hash in new[] { frozen.DocumentHash, last.DocumentHash })
        {
            var issued = (await lookup.ByPrefix(["0", hash]))!;
            Assert.Equal(RevisionState.Issued, issued.State);
            Assert.Equal([frozen.DocumentHash, last.DocumentHash], [issued.Prefixes[0].Hash, issued.Prefixes[2].Hash]);
        }

        Assert.Equal(RevisionState.Issued, (await lookup.ByPackage(frozen.PackageHash))!.State);
        await world.Withdraw.Do(world.By(world.Mara), new WithdrawRequest(frozen.RevisionId, "Wrong skew."));
        var withdrawn = (await lookup.ByPrefix([last.DocumentHash]))!;
        Assert.Equal((RevisionState.Withdrawn, "Wrong skew."), (withdrawn.State, withdrawn.Reason));
        Assert.Equal(world.Clock.GetUtcNow(), withdrawn.Since);
    }

    [Theory, BothDatabases]
    public async Task Bytes_that_are_not_there_are_not_found(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Frozen();
        var lookup = new SheetLookup(world.Archive);
        Assert.Null(await lookup.ByPrefix([Fingerprint.Of("another sheet")]));
        Assert.Null(await lookup.ByPrefix([]));
        Assert.Null(await lookup.ByPackage(Fingerprint.Of("another package")));
    }

    [Theory, BothDatabases]
    public async Task A_returned_sheet_is_told_without_the_checkers_remark(Kind kind)
    {
        await using var world = await World.Make(kind);
        var frozen = await world.Frozen();
        await world.Return.Do(world.By(world.Otto), new ReturnRequest(frozen.RevisionId, [new RemarkText("The pads are too thin.")]));
        var found = (await new SheetLookup(world.Archive).ByPrefix([frozen.DocumentHash]))!;
        Assert.Equal((RevisionState.Returned, null), (found.State, found.Reason));
    }
}
