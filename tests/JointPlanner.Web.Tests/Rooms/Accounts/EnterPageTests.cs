using System.Net;
using System.Text.Json;
using System.Text.RegularExpressions;
using Microsoft.AspNetCore.Mvc.Testing;

namespace JointPlanner.Web.Tests.Rooms.Accounts;

public sealed class EnterPageTests
{
    private static HttpClient Browser(Site site) => site.CreateClient(new WebApplicationFactoryClientOptions { AllowAutoRedirect = false });

    private static string Password(Site site, string account) =>
        JsonSerializer.Deserialize<Dictionary<string, string>>(File.ReadAllText(Path.Combine(site.Folder, "demo-people.json")))![account];

    private static async Task<HttpResponseMessage> Enter(HttpClient browser, string account, string password, string query = "")
    {
        var form = await browser.GetStringAsync($"/account/enter{query}");
        var token = Regex.Match(form, "name=\"__RequestVerificationToken\" value=\"([^\"]+)\"").Groups[1].Value;
        return await browser.PostAsync($"/account/enter{query}", new FormUrlEncodedContent(new Dictionary<string, string>
        {
            ["_handler"] = "enter",
            ["__RequestVerificationToken"] = token,
            ["Entry.Account"] = account,
            ["Entry.Password"] = password,
        }));
    }

    [Fact]
    public async Task A_demo_person_enters_with_the_password_of_this_installation()
    {
        await using var site = new Site();
        var browser = Browser(site);
        var answer = await Enter(browser, "designer", Password(site, "designer"));
        Assert.Equal(HttpStatusCode.Redirect, answer.StatusCode);
        var cookie = Assert.Single(answer.Headers.GetValues("Set-Cookie"), c => c.StartsWith("joint-planner=", StringComparison.Ordinal));
        Assert.Contains("httponly", cookie, StringComparison.OrdinalIgnoreCase);
        Assert.Contains("samesite=lax", cookie, StringComparison.OrdinalIgnoreCase);
    }

    [Fact]
    public async Task Two_installations_have_different_passwords()
    {
        await using var one = new Site();
        await using var other = new Site();
        (_, _) = (Browser(one), Browser(other));
        Assert.NotEqual(Password(one, "owner"), Password(other, "owner"));
    }

    [Fact]
    public async Task Five_wrong_tries_close_the_account_even_for_the_right_password()
    {
        await using var site = new Site();
        var browser = Browser(site);
        for (var i = 0; i < 5; i++) await Enter(browser, "checker", "wrong password");
        var answer = await Enter(browser, "checker", Password(site, "checker"));
        Assert.Contains("closed for ten minutes", await answer.Content.ReadAsStringAsync(), StringComparison.Ordinal);
        Assert.DoesNotContain(answer.Headers, h => h.Key == "Set-Cookie" && h.Value.Any(v => v.StartsWith("joint-planner=", StringComparison.Ordinal)));
    }

    [Theory]
    [InlineData("//elsewhere.example/")]
    [InlineData("/\\elsewhere.example")]
    [InlineData("https://elsewhere.example/")]
    public async Task Entering_never_leads_to_another_site(string back)
    {
        await using var site = new Site();
        var browser = Browser(site);
        var answer = await Enter(browser, "designer", Password(site, "designer"), $"?back={Uri.EscapeDataString(back)}");
        Assert.Equal(HttpStatusCode.Redirect, answer.StatusCode);
        Assert.DoesNotContain("elsewhere", answer.Headers.Location!.ToString(), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("/account/enter")]
    [InlineData("/account/leave")]
    public async Task A_form_from_another_site_is_refused(string path)
    {
        await using var site = new Site();
        var answer = await Browser(site).PostAsync(path, new FormUrlEncodedContent(new Dictionary<string, string> { ["_handler"] = "enter", ["back"] = "x" }));
        Assert.Equal(HttpStatusCode.BadRequest, answer.StatusCode);
    }
}
