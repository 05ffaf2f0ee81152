using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Tests.Databases;
using JointPlanner.Archive.Values;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Tests.People;

public class AccountRegisterTests
{
    private static AccountRequest Request(string account = "lena", bool administrator = false) => new(account, "Lena Falk", administrator, LinkToken.New());

    [Theory, BothDatabases]
    public async Task The_first_administrator_is_made_at_the_console_and_set_by_the_link(Kind kind)
    {
        await using var world = await World.Make(kind);
        var request = Request(administrator: true);
        var made = await world.Accounts.AddAtConsole(request);
        Assert.Equal(world.Clock.Now.AddHours(48), made.LinkExpiresAt);
        Assert.Equal("Lena Falk", (await world.PasswordLinks.Look(request.Token)).Name);
        await world.PasswordLinks.Use(Guid.CreateVersion7(), request.Token, "hash", "192.0.2.7");
        await using var context = world.Archive.CreateDbContext();
        var person = await context.Users.SingleAsync(row => row.UserName == "lena");
        Assert.True(person is { Administrator: true, Active: true, LockoutEnabled: true, PasswordHash: "hash", Demonstration: false });

        await using var scope = await world.As(world.Ada);
        var entries = await scope.Audit().OrderBy(row => row.Position).ToListAsync();
        Assert.Contains(entries, entry => entry is { What: "ManageAccounts", From: "console", PersonId: null, Detail: "administrator" });
        Assert.Equal(("SetPassword", person.Id, "192.0.2.7"), (entries[^1].What, entries[^1].PersonId, entries[^1].From));
    }

    [Theory, BothDatabases]
    public async Task Only_the_hash_of_a_link_is_kept(Kind kind)
    {
        await using var world = await World.Make(kind);
        var request = Request();
        await world.Accounts.Add(world.By(world.Ada), request);
        await using var context = world.Archive.CreateDbContext();
        Assert.Equal(LinkToken.HashOf(request.Token), (await context.PasswordLinks.SingleAsync()).TokenHash);
        Assert.DoesNotContain(await context.ActReceipts.ToListAsync(), row => (row.Subject + row.Answer).Contains(request.Token, StringComparison.Ordinal));
        Assert.DoesNotContain(await context.AuditEntries.ToListAsync(), row => (row.Subject + row.Detail).Contains(request.Token, StringComparison.Ordinal));
    }

    [Theory, BothDatabases]
    public async Task A_link_is_used_once_and_of_eight_at_once_one_sets_the_password(Kind kind)
    {
        await using var world = await World.Make(kind);
        var request = Request();
        await world.Accounts.Add(world.By(world.Ada), request);
        var outcomes = await Task.WhenAll(Enumerable.Range(0, 8).Select(number => Task.Run(async () =>
        {
            try
            {
                await world.PasswordLinks.Use(Guid.CreateVersion7(), request.Token, $"hash {number}", "test");
                return true;
            }
            catch (NotFound)
            {
                return false;
            }
        })));
        Assert.Single(outcomes, done => done);
        await Assert.ThrowsAsync<NotFound>(() => world.PasswordLinks.Look(request.Token));
    }

    [Theory, BothDatabases]
    public async Task A_link_ends_with_its_time_with_a_newer_one_and_with_the_account(Kind kind)
    {
        await using var world = await World.Make(kind);
        var (first, second, third) = (Request(), LinkToken.New(), LinkToken.New());
        var made = await world.Accounts.Add(world.By(world.Ada), first);
        await world.Accounts.MakeLink(world.By(world.Ada), made.PersonId, second);
        await Assert.ThrowsAsync<NotFound>(() => world.PasswordLinks.Look(first.Token));
        await world.PasswordLinks.Look(second);

        await world.Accounts.SetActive(world.By(world.Ada), made.PersonId, active: false);
        await Assert.ThrowsAsync<NotFound>(() => world.PasswordLinks.Use(Guid.CreateVersion7(), second, "hash", "test"));
        await Journey.Refused(RefusalReason.ValueOutOfRange, () => world.Accounts.MakeLink(world.By(world.Ada), made.PersonId, third));
        await world.Accounts.SetActive(world.By(world.Ada), made.PersonId, active: true);
        await world.Accounts.MakeLink(world.By(world.Ada), made.PersonId, third);
        world.Clock.Now = world.Clock.Now.AddHours(48);
        await Assert.ThrowsAsync<NotFound>(() => world.PasswordLinks.Look(third));
        foreach (var nonsense in (string[])["", "abc", LinkToken.New()]) await Assert.ThrowsAsync<NotFound>(() => world.PasswordLinks.Look(nonsense));
    }

    [Theory, BothDatabases]
    public async Task A_new_password_ends_open_sessions_and_opens_a_closed_account(Kind kind)
    {
        await using var world = await World.Make(kind);
        var token = LinkToken.New();
        await using (var context = world.Archive.CreateDbContext())
        {
            var kim = await context.Users.SingleAsync(row => row.Id == world.Kim.Id);
            (kim.SecurityStamp, kim.LockoutEnd, kim.AccessFailedCount) = ("before", world.Clock.Now.AddMinutes(9), 4);
            await context.SaveChangesAsync();
        }

        await world.Accounts.MakeOwnLink(world.By(world.Kim), token);
        await world.PasswordLinks.Use(Guid.CreateVersion7(), token, "hash", "test");
        await using var after = world.Archive.CreateDbContext();
        var person = await after.Users.SingleAsync(row => row.Id == world.Kim.Id);
        Assert.Equal((null, 0), (person.LockoutEnd, person.AccessFailedCount));
        Assert.NotEqual("before", person.SecurityStamp);
    }

    [Theory, BothDatabases]
    public async Task Accounts_are_the_administrators_and_each_refusal_says_why(Kind kind)
    {
        await using var world = await World.Make(kind);
        await Journey.Refused(RefusalReason.NotYourAct, () => world.Accounts.Add(world.By(world.Mara), Request()));
        await Journey.Refused(RefusalReason.NotYourAct, () => world.Accounts.MakeLink(world.By(world.Mara), world.Kim.Id, LinkToken.New()));
        foreach (var wrong in (string[])["", "a", "Lena", "lena falk", "1lena", "lena/../x", new string('a', 51)])
            Assert.Contains("a-z", await Journey.Refused(RefusalReason.ValueOutOfRange, () => world.Accounts.Add(world.By(world.Ada), Request(wrong))), StringComparison.Ordinal);
        await Journey.Refused(RefusalReason.TextMissing, () => world.Accounts.Add(world.By(world.Ada), Request() with { Name = " " }));
        await Journey.Refused(RefusalReason.ValueOutOfRange, () => world.Accounts.Add(world.By(world.Ada), Request() with { Token = "short" }));
        await Journey.Refused(RefusalReason.AlreadyDone, () => world.Accounts.Add(world.By(world.Ada), Request("kim")));
        await Journey.Refused(RefusalReason.ValueOutOfRange, () => world.Accounts.MakeLinkAtConsole("nobody", LinkToken.New()));
        await Assert.ThrowsAsync<NotFound>(() => world.Accounts.MakeLink(world.By(world.Ada), Guid.CreateVersion7(), LinkToken.New()));
    }

    [Theory, BothDatabases]
    public async Task The_last_administrator_cannot_be_switched_off(Kind kind)
    {
        await using var world = await World.Make(kind);
        await Journey.Refused(RefusalReason.ValueOutOfRange, () => world.Accounts.SetActive(world.By(world.Ada), world.Ada.Id, active: false));
        await world.Accounts.Add(world.By(world.Ada), Request(administrator: true));
        await world.Accounts.SetActive(world.By(world.Ada), world.Ada.Id, active: false);
    }

    [Theory, BothDatabases]
    public async Task An_archive_with_a_person_of_the_demonstration_is_refused(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Archive.AssertNoDemonstration();
        await using (var context = world.Archive.CreateDbContext())
        {
            // Switched off, they count all the same: their key files still lie about.
            context.Users.Add(new Person { UserName = "designer", NormalizedUserName = "DESIGNER", Name = "x", Demonstration = true, Active = false });
            await context.SaveChangesAsync();
        }

        var refused = await Assert.ThrowsAsync<ArchiveNotReady>(() => world.Archive.AssertNoDemonstration());
        Assert.Contains("\"designer\"", refused.Message, StringComparison.Ordinal);
    }
}
