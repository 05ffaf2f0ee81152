using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Auditing;
using JointPlanner.Archive.Drafts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Tests.Databases;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Tests.Acts;

/// <summary>Each need of the table, refused by name when it is not met, with nothing changed.</summary>
public class RefusalTests
{
    [Theory, BothDatabases]
    public async Task A_plan_with_a_fault_is_not_frozen(Kind kind)
    {
        await using var world = await World.Make(kind);
        var request = Journey.FreezeRequest(world.RevisionId) with { Faults = ["segments/s1/length is negative."] };
        var sentence = await Journey.Refused(RefusalReason.PlanFaults, () => world.Freeze.Do(world.By(world.Ines), request));
        Assert.Contains("segments/s1/length", sentence, StringComparison.Ordinal);
        await StillIn(world, RevisionState.Draft);
    }

    [Theory, BothDatabases]
    public async Task A_calculation_made_from_an_older_plan_is_not_frozen(Kind kind)
    {
        await using var world = await World.Make(kind);
        var draft = await world.Drafts.Open(world.Jon.Id, world.StructureId);
        await world.Drafts.Save(world.Jon.Id, draft.Id, draft.Version, World.FirstPlan.Replace("40 m", "41 m", StringComparison.Ordinal));
        await world.Drafts.Share(world.By(world.Jon), new ShareRequest(world.StructureId));
        await Journey.Refused(RefusalReason.PlanMoved, () => world.Frozen());
        await StillIn(world, RevisionState.Draft);
    }

    [Theory, BothDatabases]
    public async Task A_revision_is_not_returned_without_a_remark(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Frozen();
        await Journey.Refused(RefusalReason.RemarkMissing, () => world.Return.Do(world.By(world.Otto), new ReturnRequest(world.RevisionId, [])));
        await Journey.Refused(RefusalReason.TextMissing, () => world.Return.Do(world.By(world.Otto), new ReturnRequest(world.RevisionId, [new(" ")])));
        await StillIn(world, RevisionState.InCheck);
    }

    [Theory, BothDatabases]
    public async Task Who_is_no_checker_does_not_accept(Kind kind)
    {
        await using var world = await World.Make(kind);
        var frozen = await world.Frozen();
        await Journey.Refused(RefusalReason.NotYourAct, () => world.Accept.Do(world.By(world.Jon), new AcceptRequest(world.RevisionId, frozen.PackageHash)));
        await StillIn(world, RevisionState.InCheck);
    }

    [Theory, BothDatabases]
    public async Task Who_froze_does_not_check_though_a_checker_by_role(Kind kind)
    {
        await using var world = await World.Make(kind);
        var frozen = await world.Frozen(world.Otto);
        await Journey.Refused(RefusalReason.CheckerIsDesigner, () => world.Accept.Do(world.By(world.Otto), new AcceptRequest(world.RevisionId, frozen.PackageHash)));
        await StillIn(world, RevisionState.InCheck);
    }

    [Theory, BothDatabases]
    public async Task Who_edited_an_input_since_the_last_issue_counts_as_designer_and_after_the_next_issue_no_more(Kind kind)
    {
        await using var world = await World.Make(kind);
        var edited = World.FirstPlan.Replace("40 m", "41 m", StringComparison.Ordinal);
        var draft = await world.Drafts.Open(world.Otto.Id, world.StructureId);
        await world.Drafts.Save(world.Otto.Id, draft.Id, draft.Version, edited);
        await world.Drafts.Share(world.By(world.Otto), new ShareRequest(world.StructureId));
        var frozen = await world.Freeze.Do(world.By(world.Ines), Journey.FreezeRequest(world.RevisionId, edited));
        await Journey.Refused(RefusalReason.CheckerIsDesigner, () => world.Accept.Do(world.By(world.Otto), new AcceptRequest(world.RevisionId, frozen.PackageHash)));

        // Another checker lets it pass; the edit is then before the last issue.
        await using (var context = world.Archive.CreateDbContext())
        {
            context.Memberships.Add(new Membership { PersonId = world.Jon.Id, OrganisationId = world.Office.Id, Role = Role.Checker });
            await context.SaveChangesAsync();
        }

        await world.Accept.Do(world.By(world.Jon), new AcceptRequest(world.RevisionId, frozen.PackageHash));
        await world.Sign.Do(world.By(world.Ines), await world.SignRequest(world.Ines, world.RevisionId, SignatureField.Designer));
        var signed = await world.Sign.Do(world.By(world.Jon), await world.SignRequest(world.Jon, world.RevisionId, SignatureField.Checker));
        var facts = new IssueFacts(signed.DocumentHash, [], [], [], [new(SignatureField.Designer, Journey.KeyOf(world.Ines)), new(SignatureField.Checker, Journey.KeyOf(world.Jon))]);
        await world.Issue.Do(world.By(world.Mara), new IssueRequest(world.RevisionId, facts));

        var next = await world.Begin.Do(world.By(world.Ines), new BeginRequest(world.StructureId));
        var again = await world.Freeze.Do(world.By(world.Ines), Journey.FreezeRequest(next.RevisionId, edited));
        await world.Accept.Do(world.By(world.Otto), new AcceptRequest(next.RevisionId, again.PackageHash));
        Assert.Equal(RevisionState.Checked, await world.StateOf(next.RevisionId));
    }

    [Theory, BothDatabases]
    public async Task A_checker_with_a_designers_key_does_not_accept(Kind kind)
    {
        await using var world = await World.Make(kind);
        var frozen = await world.Frozen();
        await world.Certified(world.Ines);
        await world.Certified(world.Otto, key: Journey.KeyOf(world.Ines));
        await Journey.Refused(RefusalReason.SameKey, () => world.Accept.Do(world.By(world.Otto), new AcceptRequest(world.RevisionId, frozen.PackageHash)));
        await StillIn(world, RevisionState.InCheck);
    }

    [Theory, BothDatabases]
    public async Task Another_hash_than_the_frozen_one_is_not_accepted(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Frozen();
        await Journey.Refused(RefusalReason.HashDiffers, () => world.Accept.Do(world.By(world.Otto), new AcceptRequest(world.RevisionId, new string('a', 64))));
        await StillIn(world, RevisionState.InCheck);
    }

    [Theory, BothDatabases]
    public async Task One_altered_byte_of_the_stored_package_makes_accept_refuse_and_is_audited(Kind kind)
    {
        await using var world = await World.Make(kind);
        var frozen = await world.Frozen();
        await world.Database.DropGuards();
        await world.Database.Insider("""UPDATE "FrozenPackages" SET "PackageText" = replace("PackageText", '1.2e-5', '1.3e-5')""");
        await Journey.Refused(RefusalReason.Altered, () => world.Accept.Do(world.By(world.Otto), new AcceptRequest(world.RevisionId, frozen.PackageHash)));
        await StillIn(world, RevisionState.InCheck);
        await using var context = world.Archive.CreateDbContext();
        var entry = await context.AuditEntries.OrderBy(row => row.Position).LastAsync();
        Assert.Equal("AlterationFound", entry.What);
        Assert.Equal(world.Otto.Id, entry.PersonId);
    }

    [Theory, BothDatabases]
    public async Task One_altered_byte_of_the_stored_sheet_makes_issue_refuse(Kind kind)
    {
        await using var world = await World.Make(kind);
        var hash = await world.Signed();
        await world.Database.DropGuards();
        await world.Database.Insider(kind == Kind.Sqlite
            ? """UPDATE "Blobs" SET "Bytes" = CAST(replace(CAST("Bytes" AS TEXT), 'frozen', 'frazen') AS BLOB)"""
            : """UPDATE "Blobs" SET "Bytes" = overlay("Bytes" placing 'a'::bytea from 21)""");
        await Journey.Refused(RefusalReason.Altered, () => world.Issue.Do(world.By(world.Mara), new IssueRequest(world.RevisionId, world.IssueFacts(hash))));
        await StillIn(world, RevisionState.Checked);
    }

    [Theory, BothDatabases]
    public async Task Unanswered_matters_keep_a_revision_from_being_issued(Kind kind)
    {
        await using var world = await World.Make(kind);
        var facts = world.IssueFacts(await world.Signed());
        var cases = new (RefusalReason, IssueFacts)[]
        {
            (RefusalReason.MemoryValueUnconfirmed, facts with { UnconfirmedValues = ["procedure-a/cold/steel"] }),
            (RefusalReason.SilenceUnanswered, facts with { UnansweredSilences = ["braking at installation"] }),
            (RefusalReason.CauseNotIncluded, facts with { CausesLeftOut = ["substructure movement"] }),
            (RefusalReason.SignatureMissing, facts with { Signatures = [facts.Signatures[0]] }),
            (RefusalReason.SignatureMissing, facts with { Signatures = [facts.Signatures[0], new(SignatureField.Checker, Journey.KeyOf(world.Kim))] }),
            (RefusalReason.DocumentMoved, facts with { DocumentHash = new string('b', 64) }),
        };
        foreach (var (reason, missing) in cases)
        {
            await Journey.Refused(reason, () => world.Issue.Do(world.By(world.Mara), new IssueRequest(world.RevisionId, missing)));
            await StillIn(world, RevisionState.Checked);
        }
    }

    [Theory, BothDatabases]
    public async Task An_unsigned_field_that_the_owner_requires_keeps_it_from_being_issued_and_one_not_required_does_not(Kind kind)
    {
        await using var world = await World.Make(kind);
        var frozen = await world.Checked();
        var facts = world.IssueFacts(frozen.DocumentHash) with { Signatures = [] };
        await Journey.Refused(RefusalReason.SignatureMissing, () => world.Issue.Do(world.By(world.Mara), new IssueRequest(world.RevisionId, facts)));
        await world.Organisations.SetRule(world.By(world.Mara), world.Owner.Id, new OwnerRule(IssuedBy.Owner, false, false));
        await world.Issue.Do(world.By(world.Mara), new IssueRequest(world.RevisionId, facts));
        await StillIn(world, RevisionState.Issued);
    }

    [Theory, BothDatabases]
    public async Task A_signature_by_a_certificate_revoked_since_keeps_it_from_being_issued(Kind kind)
    {
        await using var world = await World.Make(kind);
        var hash = await world.Signed();
        await using (var context = world.Archive.CreateDbContext())
        {
            var certificate = await context.Certificates.SingleAsync(row => row.PersonId == world.Otto.Id);
            await world.Certificates.Revoke(world.By(world.Otto), certificate.Id);
        }

        var sentence = await Journey.Refused(RefusalReason.SignatureMissing, () => world.Issue.Do(world.By(world.Mara), new IssueRequest(world.RevisionId, world.IssueFacts(hash))));
        Assert.Contains("revoked", sentence, StringComparison.Ordinal);
    }

    [Theory, BothDatabases]
    public async Task The_owners_rule_says_who_issues(Kind kind)
    {
        await using var world = await World.Make(kind);
        var request = new IssueRequest(world.RevisionId, world.IssueFacts(await world.Signed()));
        await world.Organisations.SetRule(world.By(world.Mara), world.Owner.Id, new OwnerRule(IssuedBy.Owner, true, true));
        await Journey.Refused(RefusalReason.NotYourAct, () => world.Issue.Do(world.By(world.Ines), request));
        await world.Organisations.SetRule(world.By(world.Mara), world.Owner.Id, new OwnerRule(IssuedBy.Designer, true, true));
        await Journey.Refused(RefusalReason.NotYourAct, () => world.Issue.Do(world.By(world.Mara), request));
        await world.Issue.Do(world.By(world.Ines), request);
        await StillIn(world, RevisionState.Issued);
    }

    [Theory, BothDatabases]
    public async Task An_older_revision_is_not_issued_after_a_newer_one(Kind kind)
    {
        await using var world = await World.Make(kind);
        var hash = await world.Signed();
        var newer = await world.Begin.Do(world.By(world.Ines), new BeginRequest(world.StructureId));
        await world.Issued(newer.RevisionId);
        await Journey.Refused(RefusalReason.NewerIssued, () => world.Issue.Do(world.By(world.Mara), new IssueRequest(world.RevisionId, world.IssueFacts(hash))));
        await StillIn(world, RevisionState.Checked);
    }

    [Theory, BothDatabases]
    public async Task Roles_are_read_again_at_each_act(Kind kind)
    {
        await using var world = await World.Make(kind);
        await using var scope = await world.As(world.Ines);
        Assert.True(await scope.May(Act.Freeze, world.StructureId));
        await world.Organisations.SetRoles(world.By(world.Ada), world.Office.Id, world.Ines.Id, [Role.Contractor]);
        await Assert.ThrowsAsync<NotFound>(() => world.Frozen());
        await world.Organisations.SetRoles(world.By(world.Ada), world.Office.Id, world.Ines.Id, [Role.Designer]);
        await world.Frozen();
        await world.Accounts.SetActive(world.By(world.Ada), world.Otto.Id, active: false);
        await Assert.ThrowsAsync<NotFound>(() => world.Return.Do(world.By(world.Otto), new ReturnRequest(world.RevisionId, [new("Again.")])));
    }

    private static async Task StillIn(World world, RevisionState state) => Assert.Equal(state, await world.StateOf(world.RevisionId));
}
