using System.Net;

namespace JointPlanner.Web.Tests.Rooms.Accounts;

public sealed class DoorTests
{
    [Fact]
    public async Task Signing_in_failing_being_closed_out_and_signing_out_are_audited_with_who_and_when()
    {
        await using var site = new Site();
        var browser = new Browser(site);
        await browser.Enter("checker", "wrong password 0");
        Assert.Equal(HttpStatusCode.Redirect, (await browser.Enter("checker", Browser.Password(site, "checker"))).StatusCode);
        await browser.Send("/people", "/account/leave");
        for (var i = 1; i <= 6; i++) await browser.Enter("checker", $"wrong password {i}");
        await browser.Enter("nobody of that name", "wrong password 7");

        var id = await AuditBook.IdOf(site, "checker");
        var entries = (await AuditBook.Entries(site)).SkipWhile(entry => entry.What != "SignInFailed").ToList();
        Assert.Equal(
            ["SignInFailed", "SignedIn", "SignedOut", "SignInFailed", "SignInFailed", "SignInFailed", "SignInFailed", "SignInFailed", "LockedOut", "SignInFailed", "SignInFailed"],
            entries.Select(entry => entry.What));
        Assert.All(entries.SkipLast(1), entry => Assert.Equal((id, "Milan Prochazka"), (entry.PersonId!.Value, entry.PersonName!)));
        Assert.Equal((null, "account", "unknown account"), (entries[^1].PersonId, entries[^1].Subject, entries[^1].Detail));
        Assert.Equal("the account was closed", entries[^2].Detail);
        Assert.All(entries, entry => Assert.False(string.IsNullOrEmpty(entry.From)));

        // A password typed into the wrong field must not end in a book that is never erased.
        Assert.DoesNotContain(entries, entry => $"{entry.Subject} {entry.Detail} {entry.PersonName}".Contains("wrong password", StringComparison.Ordinal)
            || $"{entry.Subject} {entry.Detail}".Contains("nobody of that name", StringComparison.Ordinal));
    }

    [Fact]
    public async Task The_password_again_gives_a_mark_to_its_own_browser_and_a_wrong_one_gives_none()
    {
        await using var site = new Site();
        var browser = await Browser.In(site, "owner");
        var wrong = await browser.Again("wrong password");
        Assert.Equal(HttpStatusCode.Forbidden, wrong.StatusCode);
        Assert.Contains("not your password", await wrong.Content.ReadAsStringAsync(), StringComparison.Ordinal);
        Assert.DoesNotContain(wrong.Headers, header => header.Key == "Set-Cookie");

        var right = await browser.Again(Browser.Password(site, "owner"));
        Assert.Equal(HttpStatusCode.OK, right.StatusCode);
        Assert.Contains(right.Headers.GetValues("Set-Cookie"), cookie => cookie.StartsWith("joint-planner=", StringComparison.Ordinal));
        Assert.True(right.Headers.CacheControl!.NoStore);
        Assert.Equal(["PasswordAgainFailed", "PasswordAgain"], (await AuditBook.Entries(site)).TakeLast(2).Select(entry => entry.What));
    }

    [Fact]
    public async Task Nobody_types_a_password_again_without_being_signed_in()
    {
        await using var site = new Site();
        var answer = await new Browser(site).Send("/account/enter", "/account/again", ("password", "x"));
        Assert.Equal(HttpStatusCode.Redirect, answer.StatusCode);
        Assert.Contains("/account/enter", answer.Headers.Location!.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Five_wrong_tries_of_the_password_again_close_the_account()
    {
        await using var site = new Site();
        var browser = await Browser.In(site, "owner");
        for (var i = 0; i < 5; i++) await browser.Again("wrong password");
        var answer = await browser.Again(Browser.Password(site, "owner"));
        Assert.Equal(HttpStatusCode.Forbidden, answer.StatusCode);
        Assert.Contains("closed for ten minutes", await answer.Content.ReadAsStringAsync(), StringComparison.Ordinal);
    }
}
