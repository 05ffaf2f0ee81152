using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Setting;
using JointPlanner.Archive.Tests.Databases;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Tests.Setting;

public class FieldLinksTests
{
    [Theory, BothDatabases]
    public async Task A_link_opens_the_issued_results_of_one_joint_and_its_use_is_audited(Kind kind)
    {
        await using var world = await World.Make(kind);
        var token = await Link(world);
        var view = await world.Links.Open(token, "10.0.0.7");
        Assert.Equal(("Tarn Street overbridge", "j1", 1, Journey.Results, null), (view.StructureName, view.Joint, view.RevisionNumber, view.ResultsText, view.WhyNot));
        await using var scope = await world.As(world.Mara);
        var entry = await scope.Audit().OrderBy(row => row.Position).LastAsync();
        Assert.Equal(("LinkUsed", "10.0.0.7", null), (entry.What, entry.From, entry.PersonId));
    }

    [Theory, BothDatabases]
    public async Task Only_the_tokens_hash_is_kept(Kind kind)
    {
        await using var world = await World.Make(kind);
        var token = await Link(world);
        await using var context = world.Archive.CreateDbContext();
        var link = await context.FieldLinks.SingleAsync();
        Assert.NotEqual(token, link.TokenHash);
        Assert.Equal(64, link.TokenHash.Length);
        Assert.DoesNotContain(await context.ActReceipts.ToListAsync(), receipt => (receipt.Answer + receipt.Subject).Contains(token, StringComparison.Ordinal));
        Assert.DoesNotContain(await context.AuditEntries.ToListAsync(), entry => (entry.Subject + entry.Detail).Contains(token, StringComparison.Ordinal));
    }

    [Fact]
    public void Tokens_have_128_bits_and_differ()
    {
        var tokens = Enumerable.Range(0, 200).Select(_ => FieldLinks.NewToken()).ToList();
        Assert.Equal(200, tokens.Distinct().Count());
        Assert.All(tokens, token => Assert.Equal(16, System.Buffers.Text.Base64Url.DecodeFromChars(token).Length));
    }

    [Theory, BothDatabases]
    public async Task Unknown_expired_and_revoked_links_are_not_found(Kind kind)
    {
        await using var world = await World.Make(kind);
        var token = await Link(world);
        foreach (var wrong in (string[])["", "x", FieldLinks.NewToken(), token[..21], token + token]) await Assert.ThrowsAsync<NotFound>(() => world.Links.Open(wrong, "test"));

        var expires = world.Clock.Now.AddDays(90);
        world.Clock.Now = expires.AddSeconds(-1);
        await world.Links.Open(token, "test");
        world.Clock.Now = expires;
        await Assert.ThrowsAsync<NotFound>(() => world.Links.Open(token, "test"));

        world.Clock.Now = expires.AddSeconds(-1);
        await using var scope = await world.As(world.Ines);
        await world.Links.Revoke(world.By(world.Ines), (await scope.FieldLinks().SingleAsync()).Id);
        await Assert.ThrowsAsync<NotFound>(() => world.Links.Open(token, "test"));
    }

    [Theory, BothDatabases]
    public async Task A_link_to_a_withdrawn_revision_says_why_and_shows_no_number(Kind kind)
    {
        await using var world = await World.Make(kind);
        var token = await Link(world);
        await world.Withdraw.Do(world.By(world.Mara), new WithdrawRequest(world.RevisionId, "A wrong support was read."));
        var view = await world.Links.Open(token, "test");
        Assert.Null(view.ResultsText);
        Assert.Contains("withdrawn", view.WhyNot, StringComparison.Ordinal);
        Assert.Contains("A wrong support was read.", view.WhyNot, StringComparison.Ordinal);
    }

    [Theory, BothDatabases]
    public async Task A_record_made_through_a_link_is_nobodys_until_a_designer_accepts_it(Kind kind)
    {
        await using var world = await World.Make(kind);
        var token = await Link(world);
        var request = FullArchive.Record(world.RevisionId);
        var id = Guid.CreateVersion7();
        var answer = await world.Setting.RecordByLink(id, "10.0.0.7", token, "Kim from the site", request);
        Assert.Equal(answer, await world.Setting.RecordByLink(id, "10.0.0.7", token, "Kim from the site", request));
        await Assert.ThrowsAsync<NotFound>(() => world.Setting.RecordByLink(Guid.CreateVersion7(), "x", token, "Kim", request with { Joint = "j2" }));

        await using var scope = await world.As(world.Ines);
        var record = await scope.SettingRecords().SingleAsync();
        Assert.Null(record.PersonId);
        Assert.NotNull(record.FieldLinkId);
        Assert.Equal("Kim from the site", record.PersonName);
        Assert.Empty(await scope.SettingAcceptances().ToListAsync());
        await world.Setting.Accept(world.By(world.Ines), answer.RecordId, null);
        Assert.Single(await scope.SettingAcceptances().ToListAsync());
    }

    [Theory, BothDatabases]
    public async Task A_link_to_a_draft_or_into_the_past_is_refused(Kind kind)
    {
        await using var world = await World.Make(kind);
        var request = new LinkRequest(world.RevisionId, "j1", FieldLinks.NewToken(), world.Clock.Now.AddDays(1));
        await Journey.Refused(RefusalReason.WrongState, () => world.Links.Make(world.By(world.Ines), request));
        await world.Issued();
        await Journey.Refused(RefusalReason.ValueOutOfRange, () => world.Links.Make(world.By(world.Ines), request with { ExpiresAt = world.Clock.Now }));
        await Journey.Refused(RefusalReason.ValueOutOfRange, () => world.Links.Make(world.By(world.Ines), request with { Token = "short" }));
        await Journey.Refused(RefusalReason.NotYourAct, () => world.Links.Make(world.By(world.Kim), request));
    }

    private static async Task<string> Link(World world)
    {
        await world.Issued();
        var token = FieldLinks.NewToken();
        await world.Links.Make(world.By(world.Ines), new LinkRequest(world.RevisionId, "j1", token, world.Clock.Now.AddDays(90)));
        return token;
    }
}
