using System.Net;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Values;
using Microsoft.Extensions.DependencyInjection;

namespace JointPlanner.Web.Tests.Rooms.Accounts;

public sealed class LinkPageTests
{
    private const string Sentence = "a bridge too near the river";

    private static async Task<string> NewPerson(Site site)
    {
        _ = site.CreateClient();
        var token = LinkToken.New();
        var administrator = await AuditBook.IdOf(site, "administrator");
        await site.Services.GetRequiredService<AccountRegister>().Add(
            ActCall.AtConsole(administrator, TimeProvider.System.GetUtcNow()), new AccountRequest("lena", "Lena Falk", Administrator: false, token));
        return $"/account/link/{token}";
    }

    private static Task<HttpResponseMessage> Set(Browser browser, string link, string first, string second) =>
        browser.Send(link, link, ("_handler", "set-password"), ("Entry.First", first), ("Entry.Second", second));

    [Fact]
    public async Task A_link_sets_the_password_once_and_the_person_enters_with_it()
    {
        await using var site = new Site();
        var link = await NewPerson(site);
        var browser = new Browser(site);
        var page = await browser.Client.GetAsync(link);
        Assert.Contains("Lena Falk", await page.Content.ReadAsStringAsync(), StringComparison.Ordinal);
        Assert.Equal("no-referrer", Assert.Single(page.Headers.GetValues("Referrer-Policy")));
        Assert.True(page.Headers.CacheControl!.NoStore);

        var set = await Set(browser, link, Sentence, Sentence);
        Assert.Equal("account/enter?set=yes", set.Headers.Location!.ToString().Replace("https://localhost/", "", StringComparison.Ordinal));
        Assert.Equal(HttpStatusCode.NotFound, (await browser.Client.GetAsync(link)).StatusCode);
        Assert.Equal(HttpStatusCode.Redirect, (await browser.Enter("lena", Sentence)).StatusCode);
    }

    [Fact]
    public async Task In_production_the_first_administrator_enters_and_the_cookie_goes_over_https_alone()
    {
        await using var site = new RealSite();
        var browser = new Browser(site);
        var token = LinkToken.New();
        await site.Services.GetRequiredService<AccountRegister>().AddAtConsole(new AccountRequest("jonas", "Jonas Varga", Administrator: true, token));
        await Set(browser, $"/account/link/{token}", Sentence, Sentence);
        var answer = await browser.Enter("jonas", Sentence);
        var cookie = Assert.Single(answer.Headers.GetValues("Set-Cookie"), c => c.StartsWith("joint-planner=", StringComparison.Ordinal)).ToLowerInvariant();
        Assert.All((string[])["; secure", "; httponly", "; samesite=lax", "; path=/"], flag => Assert.Contains(flag, cookie, StringComparison.Ordinal));
        Assert.DoesNotContain("expires=", cookie, StringComparison.Ordinal);
        Assert.Contains("Jonas Varga", await browser.Client.GetStringAsync("/people"), StringComparison.Ordinal);
        Assert.Equal("Healthy", await new Browser(site).Client.GetStringAsync("/health"));
    }

    [Theory]
    [InlineData("short", "short", "12 characters")]
    [InlineData("aaaaaaaaaaaaaaaa", "aaaaaaaaaaaaaaaa", "6")]
    [InlineData(Sentence, "a bridge too near the sea", "The two entries differ")]
    [InlineData("my name is Lena, in short", "my name is Lena, in short", "holds the account")]
    public async Task A_password_that_is_too_easy_or_mistyped_is_told_and_the_link_still_works(string first, string second, string says)
    {
        await using var site = new Site();
        var link = await NewPerson(site);
        var browser = new Browser(site);
        var answer = await Set(browser, link, first, second);
        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        Assert.Contains(says, await answer.Content.ReadAsStringAsync(), StringComparison.Ordinal);
        Assert.Equal(HttpStatusCode.Redirect, (await Set(browser, link, Sentence, Sentence)).StatusCode);
    }

    [Fact]
    public async Task A_link_that_nobody_made_says_no_more_than_that_it_does_not_work()
    {
        await using var site = new Site();
        var answer = await new Browser(site).Client.GetAsync($"/account/link/{LinkToken.New()}");
        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
        Assert.Contains("This link does not work", await answer.Content.ReadAsStringAsync(), StringComparison.Ordinal);
    }
}
